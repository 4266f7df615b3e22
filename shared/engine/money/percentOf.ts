import { divideRounded } from './divideRounded.ts'
import { exactDecimal, type ExactDecimal } from './exactDecimal.ts'

/** Products below this are whole and exact in a double, and so is their division. */
const EXACT_PRODUCT = 2 ** 47

/** A percentage that is taken of many amounts: read once. */
export function exactPercent(percent: number): ExactDecimal {
  return exactDecimal(percent)
}

/** A percentage of whole cents, rounded once, half away from zero: 8.25 % of 472.50 → 38.98. Exact for any size and any decimals. */
export function percentOf(cents: number, percent: ExactDecimal): number {
  const product = cents * Number(percent.digits)
  const hundred = 100 * 10 ** percent.scale
  if (product >= 0 && product < EXACT_PRODUCT) return Math.floor((product + hundred / 2) / hundred)
  return Number(divideRounded(BigInt(cents) * percent.digits, 100n * 10n ** BigInt(percent.scale)))
}
