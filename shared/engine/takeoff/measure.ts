import type { Dimension } from '../../catalogue/units.ts'

/** A name that formulas may use, and what it measures. Feet, sq ft, cu ft, or a count. */
export interface Measure {
  name: string
  scope: 'room' | 'house'
  dimension: Dimension
  /** How many of the dimension's base unit one of it holds: 100 for roof squares, else 1. */
  size: number
  title: string
}

/** A measure's figure, or in words why it can't be had. Never a zero in place of what isn't known. */
export type MeasureValue = { ok: true; value: number } | { ok: false; message: string }

export function had(value: number): MeasureValue {
  return { ok: true, value }
}

export function notHad(message: string): MeasureValue {
  return { ok: false, message }
}
