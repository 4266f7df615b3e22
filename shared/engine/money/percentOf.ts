import { divideRounded } from './divideRounded.ts'
import { exactDecimal } from './exactDecimal.ts'

/** Products below this are whole and exact in a double, and so is their division. */
const EXACT_PRODUCT = 2 ** 47

/** A percentage that is taken of many amounts, read once: 8.25 → 825 of 10,000. */
export interface Percent {
  parts: number
  whole: number
}

/** A percentage as the decimal that it prints as. */
export function exactPercent(percent: number): Percent {
  const { digits, scale } = exactDecimal(percent)
  return { parts: Number(digits), whole: 100 * 10 ** scale }
}

/** A percentage of whole cents, rounded once, half away from zero: 8.25 % of 472.50 → 38.98. Exact for any size of amount and any decimals that a number has. */
export function percentOf(cents: number, { parts, whole }: Percent): number {
  const product = cents * parts
  if (product >= 0 && product < EXACT_PRODUCT) return Math.floor((product + whole / 2) / whole)
  return Number(divideRounded(BigInt(cents) * BigInt(parts), BigInt(whole)))
}
