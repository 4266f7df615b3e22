import { LENGTH_MAX_IN } from '../../schemas/common.ts'
import { PARTS_OF_INCH } from './formatLength.ts'
import { explainLength, quoted } from './explainLength.ts'
import { plainNotation } from './lengthNotation.ts'

export type ParsedLength = { ok: true; inches: number } | { ok: false; message: string }

export const LENGTH_TEXT_MAX = 60
const MM_PER_INCH = 25.4

const DECIMAL = String.raw`\d+(?:\.\d+)?|\.\d+`
/** `6`, `6.5`, `6 1/2`, `6-1/2`, `1/2`. */
const MIXED = String.raw`\d+ ?[ -] ?\d+ ?\/ ?\d+|\d+ ?\/ ?\d+|${DECIMAL}`
const FOOT = String.raw`'|feet\b\.?|foot\b\.?|ft\b\.?|ft(?=\d)\.?`
const INCH = String.raw`"|inches\b|inch\b|in\b\.?`

const FEET_AND_INCHES = new RegExp(String.raw`^(${MIXED}) ?(?:${FOOT}) ?-? ?(?:(${MIXED}) ?(?:${INCH})?)?$`)
const FEET_DASH_INCHES = new RegExp(String.raw`^(\d+) ?- ?(\d+ \d+ ?\/ ?\d+|\d+-\d+ ?\/ ?\d+|${DECIMAL}) ?(?:${INCH})?$`)
const INCHES = new RegExp(String.raw`^(${MIXED}) ?(?:${INCH})$`)
const FEET = new RegExp(`^(${DECIMAL})$`)
const METRIC = new RegExp(String.raw`^(${DECIMAL}) ?(mm|cm|m|millimet(?:er|re)s?|centimet(?:er|re)s?|met(?:er|re)s?)\.?$`)

/**
 * A length in any notation of the trade, to inches held to the nearest 1/64: `12' 6"`, `12'6`, `12-6 1/2`, `12ft 6in`, `150"`, `12.5` (feet),
 * `3.81 m`, `3,81 m`, `381 cm`. Metric goes by the exact inch, 25.4 mm. Anything else is refused with a sentence that says what is wrong and what would be taken:
 * no sign, no zero, nothing over half a mile, inches under 12 after feet.
 */
export function parseLength(text: string): ParsedLength {
  if (text.length > LENGTH_TEXT_MAX)
    return { ok: false, message: `${quoted(text)} is too long for a length. Write \`12' 6"\` or \`12.5\`.` }
  const inches = inchesIn(text)
  if (inches === null || !Number.isFinite(inches)) return { ok: false, message: explainLength(text) }
  if (inches === 0) return { ok: false, message: `${quoted(text)} is zero. A length is more than zero: write \`12' 6"\` or \`12.5\`.` }
  const held = Math.round(inches * PARTS_OF_INCH) / PARTS_OF_INCH
  if (held === 0) return { ok: false, message: `${quoted(text)} is less than 1/64 inch, the finest that is kept here.` }
  if (held > LENGTH_MAX_IN)
    return { ok: false, message: `${quoted(text)} is longer than half a mile. A bare number is feet: write \`12' 6"\` or \`12.5\`.` }
  return { ok: true, inches: held }
}

/** Whether a text says zero, in any notation of a length: `0`, `0' 0"`, `0 m`. No length is zero, but a place on a plan may be. */
export function isZeroLength(text: string): boolean {
  return text.length <= LENGTH_TEXT_MAX && inchesIn(text) === 0
}

function inchesIn(text: string): number | null {
  const plain = withDecimalPoint(plainNotation(text))
  return plain === null ? null : readInches(plain)
}

/** `3,81` → `3.81`. `1,250` could be either, so it is `null`. */
function withDecimalPoint(plain: string): string | null {
  const isUnclear = /\d,\d{3}(?!\d)/.test(plain)
  return isUnclear ? null : plain.replace(/(?<=\d),(?=\d)/g, '.')
}

function readInches(plain: string): number | null {
  const feetAndInches = FEET_AND_INCHES.exec(plain)
  if (feetAndInches) return addInches(feetAndInches[1] ?? '', feetAndInches[2])
  const dashed = FEET_DASH_INCHES.exec(plain)
  if (dashed) return addInches(dashed[1] ?? '', dashed[2])
  const inches = INCHES.exec(plain)
  if (inches) return readMixed(inches[1] ?? '')
  const feet = FEET.exec(plain)
  if (feet) return Number(feet[1]) * 12
  const metric = METRIC.exec(plain)
  if (metric) return (Number(metric[1]) * mmPerUnit(metric[2] ?? '')) / MM_PER_INCH
  return null
}

/** Feet with inches after them. A part of a foot and inches at once (`12.5' 6"`) could mean two things, so it is `null`; so are 12 inches or more. */
function addInches(feetText: string, inchesText: string | undefined): number | null {
  const feet = readMixed(feetText)
  if (feet === null) return null
  if (inchesText === undefined) return feet * 12
  const inches = readMixed(inchesText)
  const isClear = Number.isInteger(feet) && inches !== null && inches < 12
  return isClear ? feet * 12 + inches : null
}

/** `6 1/2` → 6.5. `null` where the fraction is one or more, or over zero. */
function readMixed(text: string): number | null {
  const parts = /^(?:(\d+) ?[ -] ?)?(\d+) ?\/ ?(\d+)$/.exec(text)
  if (!parts) return Number(text)
  const numerator = Number(parts[2])
  const denominator = Number(parts[3])
  return numerator < denominator ? Number(parts[1] ?? 0) + numerator / denominator : null
}

function mmPerUnit(unit: string): number {
  if (unit === 'mm' || unit.startsWith('milli')) return 1
  return unit === 'cm' || unit.startsWith('centi') ? 10 : 1000
}
