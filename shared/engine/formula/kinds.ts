import type { Dimension } from '../../catalogue/units.ts'

/**
 * What a part of a formula counts. `power` of the foot: 0 a count, 1 a length, 2 an area, 3 a volume. `size`: how many base units one of it holds, 100 for roof squares.
 *
 * `fits` says how strictly: `exactly` that; `any`, as a literal does, which may stand for feet or square feet alike; `divided`, a measure divided by a literal, which may as well be
 * a count (sheets of 32) or a larger unit (squares, cubic yards); `rated`, a measure times a literal, which an item that is counted takes for so many of it (3 bundles a square).
 */
export interface Quantity {
  kind: 'quantity'
  power: number
  size: number
  fits: 'exactly' | 'divided' | 'rated' | 'any'
}

/** A comparison's answer. */
export interface Truth {
  kind: 'truth'
}

export type Kind = Quantity | Truth

export const LITERAL: Quantity = { kind: 'quantity', power: 0, size: 1, fits: 'any' }
export const TRUTH: Truth = { kind: 'truth' }

export const POWERS: Record<Dimension, number> = { count: 0, length: 1, area: 2, volume: 3 }

export function exactly(power: number, size = 1): Quantity {
  return { kind: 'quantity', power, size, fits: 'exactly' }
}

export function dimensionOf({ power }: Quantity): Dimension | null {
  const found = (Object.keys(POWERS) as Dimension[]).find((dimension) => POWERS[dimension] === power)
  return found ?? null
}

/** `sq ft`, `squares`, `a count` … as a sentence says it. */
export function kindWords({ power, size, fits }: Quantity): string {
  if (fits === 'any') return 'a plain number'
  if (power === 2 && size === 100) return 'squares'
  const words: Record<number, string> = { 0: 'a count', 1: 'lineal feet', 2: 'sq ft', 3: 'cu ft' }
  return words[power] ?? `feet to the power of ${power}`
}
