import type { Totals } from '../../schemas/estimate.ts'
import type { ResultError } from '../../schemas/results.ts'

/** A total stays under one hundred billion dollars, in cents. */
export const TOTAL_MAX_CENTS = 10_000_000_000_000

/** The error of an estimate whose total is beyond what a house can cost. */
export function totalsProblem({ totalCents }: Totals): ResultError[] {
  if (totalCents.high < TOTAL_MAX_CENTS) return []
  const message = 'The estimate comes to a hundred billion dollars or more. Check the quantities and prices of its largest lines.'
  return [{ path: 'totals.totalCents', code: 'too-large', message }]
}
