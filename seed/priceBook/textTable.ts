import type { LowLikelyHigh } from '../../shared/schemas/common.ts'

export interface TableRow {
  /** The text of the row in the column of that name, `''` where it has none. */
  cell: (column: string) => string
  /** The lines below the row. */
  notes: string[]
}

/**
 * Rows of a text table: the header's names give the columns, lines without a `|` are notes of the row above them.
 *
 * @throws Error that names a row with a cell too few or too many.
 */
export function readTable(table: string): TableRow[] {
  const [header, ...lines] = table.trim().split('\n')
  const columns = cellsOf(header ?? '')
  const rows: TableRow[] = []
  for (const line of lines) {
    const isNote = !line.includes('|')
    const rowAbove = rows.at(-1)
    if (!isNote) rows.push(rowOf(columns, cellsOf(line)))
    else rowAbove?.notes.push(line.trim())
  }
  return rows
}

/** `2.40 3 3.90` in ten-thousandths of a dollar; `null` for an empty cell. */
export function readPrice(cell: string): LowLikelyHigh | null {
  if (cell === '') return null
  const [low = NaN, likely = NaN, high = NaN] = cell.split(' ').map((dollars) => Math.round(Number(dollars) * 10_000))
  return { low, likely, high }
}

function cellsOf(line: string): string[] {
  return line.split('|').map((cell) => cell.trim())
}

function rowOf(columns: readonly string[], cells: readonly string[]): TableRow {
  if (cells.length !== columns.length) throw new Error(`Table row ${cells[0]}: ${cells.length} cells below ${columns.length} columns`)
  return { cell: (column) => cells[columns.indexOf(column)] ?? '', notes: [] }
}
