import type { LineFields } from '../../shared/schemas/estimate.ts'
import { clearedCell, FIELD_OF_COLUMN, keptQuantity, readCell, type CellColumn } from './lineCells.ts'
import type { LineField, LineRow } from './lineRow.ts'
import { loadFormulaParser } from './formulaParser.ts'
import { isSame } from './mergeFields.ts'
import type { EstimateDesk } from './useEstimateDesk.ts'

const COLUMN_WORDS: Partial<Record<CellColumn, string>> = {
  evidence: 'evidence',
  description: 'description',
  room: 'room',
  quantity: 'quantity',
  basis: 'own hands or hired',
  price: 'price',
  note: 'note',
}

/** What becomes of what is keyed into a cell: kept, marked as wrong, or held against what somebody else made of the field meanwhile. */
export function useGridEditing({ model, edits, say }: EstimateDesk) {
  let started: { key: string; field: LineField; value: unknown } | null = null

  /** An editor opens: what the field holds now is what its entry is measured against. */
  function onStarted(row: LineRow, column: CellColumn): void {
    const field = FIELD_OF_COLUMN[column]
    if (field === null) return
    started = { key: row.key, field, value: row.fields[field] }
    model.setEdited(row.key)
    if (field === 'quantity') void loadFormulaParser()
  }

  function onStopped(): void {
    model.setEdited(null)
  }

  /** Keeps what was keyed into a cell. Rooms come as ids, all else as text. */
  function commit(row: LineRow, column: CellColumn, value: unknown): void {
    const patch = patchOf(row, column, value)
    if (patch === null) return
    const field = FIELD_OF_COLUMN[column]
    const isOverlap = started?.key === row.key && started.field === field && field !== null && !isSame(started.value, row.fields[field])
    started = null
    if (isOverlap && field !== null && !isSame(patch[field], row.fields[field])) {
      model.keepBoth(row.key, field, patch[field] as LineFields[LineField])
      return
    }
    edits.edit([{ key: row.key, after: patch }], wordsOf(column))
  }

  /** `null` when the entry is not taken; what can't be taken is marked in its cell. */
  function patchOf(row: LineRow, column: CellColumn, value: unknown): Partial<LineFields> | null {
    if (column === 'room') return { roomId: value as string | null }
    const text = String(value ?? '')
    const isCleared = text.trim() === ''
    if (column === 'quantity') return readOrMark(row, column, keptQuantity(text) || '0')
    if (column === 'description' && isCleared) {
      say('A line needs a description. Ctrl+Delete removes the line.')
      return null
    }
    return readOrMark(row, column, text)
  }

  function readOrMark(row: LineRow, column: CellColumn, text: string): Partial<LineFields> | null {
    const field = FIELD_OF_COLUMN[column]
    const read = readCell(row, column, text, model.rooms.value)
    if (read.ok) return read.patch
    if (field !== null) edits.mark(row.key, field, { text, words: read.words })
    return null
  }

  /** Delete: empties the cells that can be empty, as one step. */
  function clear(rows: readonly LineRow[], columns: readonly CellColumn[]): void {
    const changes = rows.flatMap((row) => {
      const patches = columns.map((column) => clearedCell(row, column)).filter((patch) => patch !== null)
      const after: Partial<LineFields> = Object.assign({}, ...patches)
      return Object.keys(after).length === 0 ? [] : [{ key: row.key, after }]
    })
    const isDone = changes.length > 0 && edits.edit(changes, 'clearing of cells') !== null
    if (!isDone && columns.length === 1 && columns[0] === 'description') say('A line needs a description. Ctrl+Delete removes the line.')
  }

  /** Fills the cells below from the topmost, as one step. */
  function fillDown(rows: readonly LineRow[], columns: readonly CellColumn[]): void {
    const [top, ...below] = rows
    if (!top || below.length === 0) return
    const fields = columns.map((column) => FIELD_OF_COLUMN[column]).filter((field) => field !== null)
    const after = Object.fromEntries(fields.map((field) => [field, top.fields[field]]))
    edits.edit(
      below.map(({ key }) => ({ key, after })),
      `fill of ${below.length === 1 ? 'a line' : `${below.length} lines`}`,
    )
  }

  return { onStarted, onStopped, commit, clear, fillDown }
}

function wordsOf(column: CellColumn): string {
  return `change of ${COLUMN_WORDS[column] ?? 'a cell'}`
}
