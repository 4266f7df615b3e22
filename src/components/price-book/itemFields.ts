import { formatCents, formatUnitPrice, parseCents, parseUnitPriceE4 } from '../../../shared/engine/index.ts'
import { HOUSE_SYSTEMS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADES } from '../../../shared/catalogue/trades.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import { priceItemFieldsSchema, type PriceItemFields } from '../../../shared/schemas/priceItem.ts'
import { issueWords } from '../../../shared/schemas/fieldProblems.ts'

export const RANGES = ['materials', 'installed'] as const
export const ENDS = ['low', 'likely', 'high'] as const
export type RangeName = (typeof RANGES)[number]
export type EndName = (typeof ENDS)[number]

/** A cell of the grid that can be keyed into: one end of a price, or a field. */
export type CellField = `${RangeName}.${EndName}` | SingleField
export type SingleField =
  | 'name'
  | 'laborSharePercent'
  | 'wastePercent'
  | 'packageSize'
  | 'packageName'
  | 'minimumChargeCents'
  | 'hoursPerUnit'
  | 'uniformat'
  | 'priceDate'
  | 'note'

type Parsed<T> = { ok: true; value: T } | { ok: false; message: string }

/** Fields of an item in the order that people read them, with the words for each. */
export const FIELD_TITLES: Record<keyof PriceItemFields, string> = {
  key: 'Key',
  name: 'Name',
  system: 'House system',
  trade: 'Trade',
  unit: 'Unit',
  uniformat: 'UNIFORMAT II',
  materials: 'Materials',
  installed: 'Installed',
  laborSharePercent: 'Labor share',
  wastePercent: 'Waste',
  packageSize: 'Package size',
  packageName: 'Package',
  minimumChargeCents: 'Minimum charge',
  hoursPerUnit: 'Hours a unit',
  roomFormula: 'Quantity in a room',
  houseFormula: 'Quantity of the house',
  priceDate: 'Price date',
  note: 'Note',
}

/** A field as a person reads it. */
export function fieldText(fields: PriceItemFields, field: keyof PriceItemFields): string {
  switch (field) {
    case 'materials':
    case 'installed':
      return rangeText(fields[field])
    case 'minimumChargeCents':
      return formatCents(fields.minimumChargeCents, { cents: true })
    case 'laborSharePercent':
    case 'wastePercent':
      return `${fields[field]} %`
    case 'system':
      return HOUSE_SYSTEMS.find(({ key }) => key === fields.system)?.title ?? fields.system
    case 'trade':
      return TRADES.find(({ key }) => key === fields.trade)?.title ?? fields.trade
    default: {
      const value = fields[field]
      return value === null || value === '' ? 'none' : String(value)
    }
  }
}

function rangeText(range: LowLikelyHigh | null): string {
  return range ? ENDS.map((end) => formatUnitPrice(range[end])).join(' / ') : 'none'
}

/** What stands in a cell to be edited: plain figures, no sign. */
export function cellText(fields: PriceItemFields, field: CellField): string {
  const [name, end] = field.split('.') as [keyof PriceItemFields, EndName | undefined]
  if (end !== undefined) {
    const range = fields[name as RangeName]
    return range ? formatUnitPrice(range[end]).replace(/[$,]/g, '') : ''
  }
  if (name === 'minimumChargeCents') return formatCents(fields.minimumChargeCents, { cents: true }).replace(/[$,]/g, '')
  const value = fields[name]
  return value === null ? '' : String(value)
}

/** One end of a price as it was keyed; empty is `null`. */
export function parseEnd(text: string): Parsed<number | null> {
  if (text.trim() === '') return { ok: true, value: null }
  const price = parseUnitPriceE4(text)
  return price.ok ? { ok: true, value: price.e4 } : price
}

/** A field as it was keyed, checked by the schema that the server checks with. */
export function parseSingle(field: SingleField, text: string): Parsed<PriceItemFields[SingleField]> {
  const raw = readSingle(field, text.trim())
  if (!raw.ok) return raw
  const parsed = priceItemFieldsSchema.shape[field].safeParse(raw.value, { error: issueWords })
  return parsed.success ? { ok: true, value: parsed.data } : { ok: false, message: parsed.error.issues[0]?.message ?? 'can’t be taken' }
}

function readSingle(field: SingleField, text: string): Parsed<string | number | null> {
  switch (field) {
    case 'minimumChargeCents': {
      const money = parseCents(text === '' ? '0' : text)
      return money.ok ? { ok: true, value: money.cents } : money
    }
    case 'packageSize':
      return text === '' ? { ok: true, value: null } : readNumber(text, '22.5')
    case 'laborSharePercent':
    case 'wastePercent':
      return readNumber(text.replace(/\s*%$/, '') || '0', '8.25')
    case 'hoursPerUnit':
      return readNumber(text || '0', '0.045')
    default:
      return { ok: true, value: text }
  }
}

function readNumber(text: string, example: string): Parsed<number> {
  const isPlainNumber = /^-?(?:\d+\.?\d*|\.\d+)$/.test(text)
  return isPlainNumber ? { ok: true, value: Number(text) } : { ok: false, message: `\`${text}\` is not a number. Write \`${example}\`` }
}
