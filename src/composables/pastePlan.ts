import type { Line, LineFields } from '../../shared/schemas/estimate.ts'
import type { PriceItem } from '../../shared/schemas/priceItem.ts'
import type { Room } from '../../shared/schemas/room.ts'
import type { LineEdit } from './estimateChange.ts'
import { FIELD_OF_COLUMN, readCell, type CellColumn } from './lineCells.ts'
import { fieldsOfItem, ownLineFields } from './newLineFields.ts'
import type { LineField, LineRow } from './lineRow.ts'

/** A cell whose text can't be taken: it stays in the cell, marked. */
export interface WrongCell {
  /** Key of the line, or the place among the added ones. */
  at: string | number
  field: LineField
  text: string
  words: string
}

export interface PastePlan {
  edits: LineEdit[]
  /** Lines that grow at the end. */
  added: { fields: LineFields; book: Line['book'] }[]
  wrong: WrongCell[]
  rowCount: number
}

interface PasteQuestion {
  cells: readonly (readonly string[])[]
  /** Lines from the focused one down, as they are shown. */
  rows: readonly LineRow[]
  /** Shown columns from the focused one to the right. */
  columns: readonly CellColumn[]
  rooms: readonly Room[]
  /** Looks an item up by its exact name, so that a line that grows brings its price along. */
  findItem(name: string): PriceItem | undefined
  /** Last line that is shown: lines that grow begin in its room and system. */
  last: LineRow | undefined
}

/** What pasting a block of cells would do, without doing it. */
export function planPaste({ cells, rows, columns, rooms, findItem, last }: PasteQuestion): PastePlan {
  const plan: PastePlan = { edits: [], added: [], wrong: [], rowCount: cells.length }
  cells.forEach((texts, index) => {
    const row = rows[index]
    if (row) planEdit(row, texts)
    else planLine(texts)
  })
  return plan

  function planEdit(row: LineRow, texts: readonly string[]): void {
    const { patch, wrong } = readTexts(row, texts)
    plan.wrong.push(...wrong.map((cell) => ({ ...cell, at: row.key })))
    const fields = Object.keys(patch) as LineField[]
    if (fields.length === 0) return
    const before = Object.fromEntries(fields.map((field) => [field, row.fields[field]]))
    plan.edits.push({ key: row.key, before, after: patch })
  }

  function planLine(texts: readonly string[]): void {
    const isBlank = texts.every((text) => text.trim() === '')
    if (isBlank) return
    const start = startOfLine(texts)
    const { patch, wrong } = readTexts(start, texts)
    plan.wrong.push(...wrong.map((cell) => ({ ...cell, at: plan.added.length })))
    plan.added.push({ fields: { ...start.fields, ...patch }, book: start.book })
  }

  function startOfLine(texts: readonly string[]): Pick<LineRow, 'fields' | 'book'> {
    const roomId = last?.fields.roomId ?? null
    const item = findItem(texts[columns.indexOf('description')]?.trim() ?? '')
    if (item)
      return { fields: fieldsOfItem(item, { roomId, basis: 'hired' }), book: { materials: item.materials, installed: item.installed } }
    const place = { roomId, system: last?.fields.system ?? 'permits', trade: last?.fields.trade ?? 'general' }
    return { fields: ownLineFields(place), book: { materials: null, installed: null } }
  }

  function readTexts(row: Pick<LineRow, 'fields' | 'book'>, texts: readonly string[]) {
    let patch: Partial<LineFields> = {}
    const wrong: Omit<WrongCell, 'at'>[] = []
    columns.slice(0, texts.length).forEach((column, index) => {
      const text = texts[index] ?? ''
      const field = FIELD_OF_COLUMN[column]
      if (field === null) return
      const read = readCell(row, column, text, rooms)
      if (read.ok) patch = { ...patch, ...read.patch }
      else wrong.push({ field, text, words: read.words })
    })
    return { patch, wrong }
  }
}
