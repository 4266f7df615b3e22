import { z } from 'zod'
import { LENGTH_MAX_IN, LINE_MAX_CENTS, UNIT_PRICE_MAX_E4, type LowLikelyHigh } from '../../schemas/common.ts'
import { PARTS_OF_INCH } from '../units/formatLength.ts'
import { isZeroLength, parseLength } from '../units/parseLength.ts'

type Read<T> = { value: T } | { code: string; message: string }

/** JSON Schema of what a field takes: the readers are code, so it is said beside them. */
interface TakenForm {
  type: string | string[]
  description: string
}

const LENGTH: TakenForm = {
  type: ['string', 'number'],
  description: 'A length in any notation, as `12\' 6"` or `3.81 m`, or a number of feet.',
}
const PLACE: TakenForm = { type: ['string', 'number'], description: 'As a length; it may be zero, and below zero.' }
const AMOUNT: TakenForm = { type: 'string', description: 'Dollars as a decimal string, at most 2 decimals.' }
const UNIT_PRICE: TakenForm = { type: 'string', description: 'Dollars as a decimal string, at most 4 decimals.' }
const DECIMAL: TakenForm = { type: ['string', 'number'], description: 'A number, or a decimal string.' }

/** A field that is read by a function of its own; what it refuses becomes the field's problem, with its code. */
function readField<T>(form: TakenForm, read: (value: unknown) => Read<T>) {
  return z
    .unknown()
    .meta({ ...form })
    .transform((value, context): T => {
      const result = value === undefined ? { code: 'invalid-type', message: 'is missing' } : read(value)
      if ('value' in result) return result.value
      context.addIssue({ code: 'custom', message: result.message, params: { code: result.code } })
      return z.NEVER
    })
}

/** A length more than zero, to inches: text in any notation, or a number of feet. */
export const lengthField = readField(LENGTH, readLength)
/** The same, or zero. */
export const lengthOrZeroField = readField(LENGTH, (value) => (isZero(value) ? { value: 0 } : readLength(value)))
/** A place on a plan: it may be zero, and below zero. */
export const placeField = readField(PLACE, readPlace)
/** Dollars to whole cents. */
export const amountField = readField(AMOUNT, (value) => readDollars(value, 2, LINE_MAX_CENTS, 'one billion dollars'))
/** Dollars to ten-thousandths. */
export const unitPriceField = readField(UNIT_PRICE, (value) => readDollars(value, 4, UNIT_PRICE_MAX_E4, 'one million dollars'))
/** A number, or a decimal string. */
export const decimalField = readField(DECIMAL, readDecimal)

export const unitPriceRangeField = rangeOf(unitPriceField)
export const amountRangeField = rangeOf(amountField)

function rangeOf(field: typeof amountField) {
  return z.strictObject({ low: field, likely: field, high: field }).superRefine((range: LowLikelyHigh, context) => {
    const isInOrder = range.low <= range.likely && range.likely <= range.high
    if (!isInOrder)
      context.addIssue({ code: 'custom', message: 'low, likely and high must go up in that order', params: { code: 'out-of-order' } })
  })
}

function readLength(value: unknown): Read<number> {
  if (typeof value === 'number') return readFeet(value)
  if (typeof value !== 'string') return { code: 'invalid-type', message: 'must be a length, as "12\' 6\\"", or a number of feet' }
  const length = parseLength(value)
  return length.ok ? { value: length.inches } : { code: 'bad-length', message: length.message }
}

function readFeet(feet: number): Read<number> {
  const inches = hold(feet * 12)
  if (!(inches > 0)) return { code: 'bad-length', message: `${feet} is not more than zero. A number is feet: write 12.5.` }
  if (inches > LENGTH_MAX_IN) return { code: 'bad-length', message: `${feet} is longer than half a mile. A number is feet: write 12.5.` }
  return { value: inches }
}

function readPlace(value: unknown): Read<number> {
  const isBelow = typeof value === 'number' ? value < 0 : typeof value === 'string' && /^\s*[-−]/.test(value)
  const distance = !isBelow ? value : typeof value === 'number' ? -value : String(value).replace(/^\s*[-−]\s*/, '')
  if (isZero(distance)) return { value: 0 }
  const read = readLength(distance)
  return isBelow && 'value' in read ? { value: -read.value } : read
}

function isZero(value: unknown): boolean {
  return value === 0 || (typeof value === 'string' && isZeroLength(value))
}

function hold(inches: number): number {
  return Math.round(inches * PARTS_OF_INCH) / PARTS_OF_INCH
}

function readDollars(value: unknown, decimals: number, most: number, mostWords: string): Read<number> {
  if (typeof value !== 'string') return { code: 'invalid-type', message: 'must be a decimal string of dollars, as "1250.00"' }
  const parts = /^\s*(-?)(\d*)(?:\.(\d*))?\s*$/.exec(value)
  const [, sign = '', whole = '', fraction = ''] = parts ?? []
  if (parts === null || whole + fraction === '') return { code: 'bad-amount', message: 'must be a decimal string of dollars, as "1250.00"' }
  if (fraction.length > decimals)
    return { code: 'too-many-decimals', message: `has ${fraction.length} decimals; at most ${decimals} are taken here` }
  const scaled = Number(`${whole}${fraction.padEnd(decimals, '0')}`)
  if (sign === '-' && scaled > 0) return { code: 'negative', message: 'must not be negative' }
  if (scaled > most) return { code: 'too-large', message: `must be at most ${mostWords}` }
  return { value: scaled }
}

function readDecimal(value: unknown): Read<number> {
  if (typeof value === 'number') return { value }
  const isDecimal = typeof value === 'string' && /^\s*(?:\d+(?:\.\d*)?|\.\d+)\s*$/.test(value)
  return isDecimal ? { value: Number(value) } : { code: 'invalid-type', message: 'must be a number, or a decimal string as "22.5"' }
}
