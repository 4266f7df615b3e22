import { divideRounded } from './divideRounded.ts'

/** Products below this are whole and exact in a double, and so is their division by 10,000. */
const EXACT_PRODUCT = 2 ** 47

/**
 * Quantity × unit price to whole cents, half up: 157.5 (15,750 hundredths) at $3.00 (30,000 ten-thousandths) → 47,250 cents.
 * Exact at any size; neither is below zero.
 */
export function lineAmountCents(quantityHundredths: number, unitPriceE4: number): number {
  const product = quantityHundredths * unitPriceE4
  if (product < EXACT_PRODUCT) return Math.floor((product + 5000) / 10_000)
  return Number(divideRounded(BigInt(quantityHundredths) * BigInt(unitPriceE4), 10_000n))
}
