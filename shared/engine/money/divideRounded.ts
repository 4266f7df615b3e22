/**
 * The nearest whole number to a quotient; a half goes away from zero, as the trade prints it: 5 / 2 → 3, −5 / 2 → −3.
 * The divisor is more than zero.
 */
export function divideRounded(dividend: bigint, divisor: bigint): bigint {
  const size = dividend < 0n ? -dividend : dividend
  const rounded = (2n * size + divisor) / (2n * divisor)
  return dividend < 0n ? -rounded : rounded
}
