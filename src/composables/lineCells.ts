import { formatCents } from '../../shared/engine/index.ts'
import { NAME_MAX, NOTE_MAX } from '../../shared/schemas/common.ts'
import { BASES, EVIDENCE_MARKS, type Basis, type LineFields } from '../../shared/schemas/estimate.ts'
import { FORMULA_MAX_CHARS } from '../../shared/schemas/priceItem.ts'
import type { Room } from '../../shared/schemas/room.ts'
import { WHOLE_HOUSE } from './estimateRows.ts'
import type { LineField, LineRow } from './lineRow.ts'
import { keyedPrice } from './keyedPrice.ts'
import { readPastedNumber } from './readPastedNumber.ts'
import { guardText, unguardText } from './tabbedText.ts'

/** The columns of the estimate, from left to right. */
export const CELL_COLUMNS = ['evidence', 'description', 'room', 'quantity', 'basis', 'price', 'amount', 'range', 'hours', 'note'] as const
export type CellColumn = (typeof CELL_COLUMNS)[number]

/** What a column keeps its text in; computed columns keep none. */
export const FIELD_OF_COLUMN: Record<CellColumn, LineField | null> = {
  evidence: 'evidence',
  description: 'description',
  room: 'roomId',
  quantity: 'quantity',
  basis: 'basis',
  price: 'override',
  amount: null,
  range: null,
  hours: null,
  note: 'note',
}

export const BASIS_WORDS: Record<Basis, string> = { 'own-hands': 'own hands', hired: 'hired' }

export type ReadCell = { ok: true; patch: Partial<LineFields> } | { ok: false; words: string }

/** What a cell puts on the clipboard: figures bare of dressing, a quantity as the number that is priced. */
export function cellText(row: LineRow, column: CellColumn, rooms: readonly Room[]): string {
  const { fields, figures } = row
  switch (column) {
    case 'evidence':
      return fields.evidence
    case 'description':
      return guardText(fields.description)
    case 'room':
      return guardText(roomName(fields.roomId, rooms))
    case 'quantity':
      return figures.error === null ? String(figures.quantity) : guardText(fields.quantity)
    case 'basis':
      return BASIS_WORDS[fields.basis]
    case 'price':
      return figures.unitPriceE4 === null ? '' : String(figures.unitPriceE4.likely / 10_000)
    case 'amount':
      return bareDollars(figures.amountCents.likely)
    case 'range':
      return `${bareDollars(figures.amountCents.low)} to ${bareDollars(figures.amountCents.high)}`
    case 'hours':
      return String(figures.hours)
    case 'note':
      return guardText(fields.note)
  }
}

/** The same cell for pasting inside the app: a quantity as it was keyed. */
export function cellSource(row: LineRow, column: CellColumn, rooms: readonly Room[]): string {
  return column === 'quantity' ? row.fields.quantity : cellText(row, column, rooms)
}

/** Reads a pasted or typed text into a line. Computed columns take nothing and mind nothing. */
export function readCell(row: Pick<LineRow, 'fields' | 'book'>, column: CellColumn, text: string, rooms: readonly Room[]): ReadCell {
  const bare = unguardText(text.trim())
  switch (column) {
    case 'evidence':
      return choose(EVIDENCE_MARKS, bare, (evidence) => ({ evidence }))
    case 'basis':
      return choose(BASES, bare.replace(/\s+/g, '-'), (basis) => ({ basis }))
    case 'room':
      return readRoom(bare, rooms)
    case 'description':
      return readText(bare, NAME_MAX, true, (description) => ({ description }))
    case 'note':
      return readText(bare, NOTE_MAX, false, (note) => ({ note }))
    case 'quantity':
      return readQuantity(bare)
    case 'price':
      return readPrice(row, bare)
    default:
      return { ok: true, patch: {} }
  }
}

/** What Delete makes of a cell, or `null` where the cell can't be empty. */
export function clearedCell(row: LineRow, column: CellColumn): Partial<LineFields> | null {
  const isBookPriced = row.fields.itemKey !== null && row.fields.override !== null
  switch (column) {
    case 'note':
      return { note: '' }
    case 'room':
      return { roomId: null }
    case 'quantity':
      return { quantity: '0' }
    case 'price':
      return isBookPriced ? { override: null } : null
    default:
      return null
  }
}

/** A quantity as it is kept: the number that was meant, or the formula without the sign that began it. */
export function keptQuantity(text: string): string {
  const bare = text.trim().replace(/^=\s*/, '')
  const number = readPastedNumber(bare)
  return number === null ? bare : String(Math.round(number * 1e6) / 1e6)
}

export function roomName(roomId: string | null, rooms: readonly Room[]): string {
  if (roomId === null) return WHOLE_HOUSE
  return rooms.find(({ id }) => id === roomId)?.name ?? 'a room that was removed'
}

function readQuantity(text: string): ReadCell {
  const quantity = keptQuantity(text)
  return readText(quantity, FORMULA_MAX_CHARS, true, (kept) => ({ quantity: kept }))
}

function readPrice(row: Pick<LineRow, 'fields' | 'book'>, text: string): ReadCell {
  const likely = readPastedNumber(text)
  if (likely === null) return { ok: false, words: `\`${text}\` is no price. Write \`3.25\`.` }
  const price = keyedPrice(row, likely)
  return price.ok ? { ok: true, patch: { override: { price: price.range, reason: 'Pasted' } } } : { ok: false, words: price.words }
}

function readRoom(text: string, rooms: readonly Room[]): ReadCell {
  const wanted = text.toLowerCase()
  const isHouse = wanted === '' || wanted === 'house' || wanted === WHOLE_HOUSE.toLowerCase()
  if (isHouse) return { ok: true, patch: { roomId: null } }
  const begun = rooms.filter(({ name }) => name.toLowerCase().startsWith(wanted))
  const room = rooms.find(({ name }) => name.toLowerCase() === wanted) ?? (begun.length === 1 ? begun[0] : undefined)
  return room ? { ok: true, patch: { roomId: room.id } } : { ok: false, words: `\`${text}\` is no room of this house.` }
}

function readText(text: string, max: number, isNeeded: boolean, patch: (text: string) => Partial<LineFields>): ReadCell {
  if (isNeeded && text === '') return { ok: false, words: 'It is empty.' }
  if (text.length > max) return { ok: false, words: `It is longer than ${max} characters.` }
  return { ok: true, patch: patch(text) }
}

function choose<T extends string>(choices: readonly T[], text: string, patch: (choice: T) => Partial<LineFields>): ReadCell {
  const wanted = text.toLowerCase()
  const choice = choices.find((known) => wanted !== '' && known.startsWith(wanted))
  const list = choices.map((known) => `\`${known.replace('-', ' ')}\``).join(', ')
  return choice ? { ok: true, patch: patch(choice) } : { ok: false, words: `\`${text}\` isn’t one of ${list}.` }
}

function bareDollars(cents: number): string {
  return formatCents(cents, { cents: true }).replace(/[$,]/g, '')
}
