/** A decimal as it is written: `digits / 10^scale`, without the noise of a binary fraction. */
export interface ExactDecimal {
  digits: bigint
  scale: number
}

/** The decimal that a number prints as: 8.25 → 825 / 10². Prices, percentages and factors are keyed as decimals, so this is what was meant. */
export function exactDecimal(value: number): ExactDecimal {
  const [mantissa = '0', exponent = '0'] = String(value).split('e')
  const [whole = '0', fraction = ''] = mantissa.split('.')
  const digits = BigInt(whole + fraction)
  const scale = fraction.length - Number(exponent)
  return scale >= 0 ? { digits, scale } : { digits: digits * 10n ** BigInt(-scale), scale: 0 }
}
