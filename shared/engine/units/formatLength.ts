/** Inches are held and shown to the nearest 1/64, the finest mark of a tape. */
export const PARTS_OF_INCH = 64

/**
 * A length as the trade writes it: 150.5 in → `12' 6 1/2"`, 144 → `12' 0"`, 144.5 → `12' 0 1/2"`, 6.5 → `6 1/2"`. Rounded to the nearest 1/64 in.
 * A place on a plan may lie below zero: −30 → `-2' 6"`.
 */
export function formatLength(inches: number): string {
  const parts = Math.round(Math.abs(inches) * PARTS_OF_INCH)
  const sign = inches < 0 && parts > 0 ? '-' : ''
  const feet = Math.floor(parts / (12 * PARTS_OF_INCH))
  const inchParts = parts - feet * 12 * PARTS_OF_INCH
  const whole = Math.floor(inchParts / PARTS_OF_INCH)
  const rest = inchParts % PARTS_OF_INCH
  if (feet > 0) return `${sign}${feet}' ${whole}${rest === 0 ? '' : ` ${lowestTerms(rest)}`}"`
  if (rest === 0) return `${sign}${whole}"`
  return whole === 0 ? `${sign}${lowestTerms(rest)}"` : `${sign}${whole} ${lowestTerms(rest)}"`
}

function lowestTerms(parts: number): string {
  let numerator = parts
  let denominator = PARTS_OF_INCH
  while (numerator % 2 === 0) {
    numerator /= 2
    denominator /= 2
  }
  return `${numerator}/${denominator}`
}
