import { divideRounded } from './divideRounded.ts'
import { exactDecimal, type ExactDecimal } from './exactDecimal.ts'

/** A percentage that is taken of many amounts: read once. */
export function exactPercent(percent: number): ExactDecimal {
  return exactDecimal(percent)
}

/** A percentage of whole cents, rounded once, half away from zero: 8.25 % of 472.50 → 38.98. Exact for any size and any decimals. */
export function percentOf(cents: number, percent: ExactDecimal): number {
  return Number(divideRounded(BigInt(cents) * percent.digits, 100n * 10n ** BigInt(percent.scale)))
}
