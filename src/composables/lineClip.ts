import type { Room } from '../../shared/schemas/room.ts'
import { cellSource, cellText, type CellColumn } from './lineCells.ts'
import type { LineRow } from './lineRow.ts'
import { formatHtmlTable, formatTabbedText, parseTabbedText } from './tabbedText.ts'
import type { LineToAdd } from './useEstimateEdits.ts'

/** What was last copied here, so that pasting it here again brings formulas, prices and reasons along, which text alone would lose. */
interface LineClip {
  text: string
  cells: string[][]
  /** Whole lines; `null` when cells of lines were copied. */
  lines: LineToAdd[] | null
}

let lastClip: LineClip | null = null

/** The lines as text and as an HTML table for the clipboard; remembered for a paste into this app. */
export function clipLines(rows: readonly LineRow[], columns: readonly CellColumn[], isWholeRows: boolean, rooms: readonly Room[]) {
  const cells = rows.map((row) => columns.map((column) => cellText(row, column, rooms)))
  const text = formatTabbedText(cells)
  lastClip = {
    text,
    cells: rows.map((row) => columns.map((column) => cellSource(row, column, rooms))),
    lines: isWholeRows ? rows.map(({ fields, book }) => ({ fields: { ...fields }, book })) : null,
  }
  return { text, html: formatHtmlTable(cells) }
}

/** What a text on the clipboard means: lines or cells copied here, or a block from elsewhere. */
export function readClip(text: string): Omit<LineClip, 'text'> {
  if (lastClip !== null && lastClip.text === text.replace(/\r\n/g, '\n')) return lastClip
  return { cells: parseTabbedText(text), lines: null }
}
