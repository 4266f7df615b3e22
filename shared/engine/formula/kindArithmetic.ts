import { exactly, LITERAL, type Quantity } from './kinds.ts'

const STRICTNESS: Record<Quantity['fits'], number> = { any: 0, divided: 1, rated: 2, exactly: 3 }

/**
 * What two parts give together where they must be of one kind: sums, comparisons, min, max, the two ends of a condition. `null`: they don't go together.
 * Two measures that were each divided by a literal can both be counts: sheets and sticks.
 */
export function together(left: Quantity, right: Quantity): Quantity | null {
  if (left.fits === 'any') return right
  if (right.fits === 'any') return left
  if (left.power === right.power && left.size === right.size) return STRICTNESS[right.fits] > STRICTNESS[left.fits] ? right : left
  if (left.fits === 'divided' && right.fits === 'divided') return exactly(0)
  if (left.fits === 'divided') return fitsDivided(left, right) ? right : null
  if (right.fits === 'divided') return fitsDivided(right, left) ? left : null
  return null
}

function fitsDivided(divided: Quantity, other: Quantity): boolean {
  return other.power === 0 || (other.power === divided.power && other.size !== 1)
}

/** A literal keeps the other's kind, but of a count it can be anything: 14 ft of casing for each window. Two measures multiply their dimensions. */
export function times(left: Quantity, right: Quantity): Quantity {
  if (left.fits === 'any') return timesLiteral(right)
  if (right.fits === 'any') return timesLiteral(left)
  const isDivided = left.fits === 'divided' || right.fits === 'divided'
  return { kind: 'quantity', power: left.power + right.power, size: left.size * right.size, fits: isDivided ? 'divided' : 'exactly' }
}

function timesLiteral(measure: Quantity): Quantity {
  if (measure.power === 0) return LITERAL
  return measure.fits === 'exactly' ? { ...measure, fits: 'rated' } : measure
}

export function over(left: Quantity, right: Quantity): Quantity {
  if (right.fits === 'any') return left.power === 0 ? LITERAL : { ...left, fits: 'divided' }
  if (left.fits === 'any') return exactly(-right.power)
  const isDivided = left.fits === 'divided' || right.fits === 'divided'
  const power = left.power - right.power
  return { kind: 'quantity', power, size: power === 0 ? 1 : left.size / right.size, fits: isDivided ? 'divided' : 'exactly' }
}

/** `null` where the exponent leaves no whole dimension, as the square root of a length. */
export function toThePower(base: Quantity, exponent: number): Quantity | null {
  if (base.fits === 'any') return base
  const power = base.power * exponent
  if (!Number.isInteger(power)) return null
  return { ...base, power, size: base.size ** exponent }
}
