import { cellText } from './cellText.ts'
import { rowHeight } from './rowHeight.ts'
import type {
  CellRange,
  ChoiceRule,
  NamedCell,
  PrintSetup,
  StyleName,
  WorkbookCell,
  WorkbookColumn,
  WorkbookRow,
  WorkbookSheet,
} from './workbookModel.ts'

/** A text cell. An empty text is a blank cell: text beside it may run over it. */
export function text(value: string, style: StyleName = 'text'): WorkbookCell {
  return { value: value === '' ? null : cellText(value), style }
}

/** A number cell; `null` leaves it blank but dressed. */
export function number(value: number | null, style: StyleName): WorkbookCell {
  return { value, style }
}

/** A live formula, without `=`, and what it comes to now. */
export function live(formula: string, result: number | string, style: StyleName): WorkbookCell {
  return { formula, result, style }
}

/** A sheet while it is put together: cells are set by row and column, both from 1. */
export class SheetDraft {
  readonly names: NamedCell[] = []
  private readonly rows: Pick<WorkbookRow, 'cells'>[] = []
  private readonly merges: CellRange[] = []
  private readonly choices: ChoiceRule[] = []

  constructor(readonly name: string) {}

  /** Number of the last row that holds something. */
  get lastRow(): number {
    return this.rows.length
  }

  set(row: number, column: number, cell: WorkbookCell): void {
    this.rowAt(row).cells[column - 1] = cell
  }

  /** Sets cells side by side; `undefined` leaves one out. */
  setRow(row: number, fromColumn: number, cells: readonly (WorkbookCell | undefined)[]): void {
    cells.forEach((cell, index) => {
      if (cell) this.set(row, fromColumn + index, cell)
    })
  }

  /** Sets a cell and names it. */
  setNamed(name: string, row: number, column: number, cell: WorkbookCell): void {
    this.set(row, column, cell)
    this.names.push({ name, sheet: this.name, row, column })
  }

  merge(row: number, fromColumn: number, toColumn: number): void {
    this.merges.push({ top: row, left: fromColumn, bottom: row, right: toColumn })
  }

  offer(choice: ChoiceRule): void {
    this.choices.push(choice)
  }

  finish(layout: {
    widths: readonly number[]
    frozen: WorkbookSheet['frozen']
    print: Omit<PrintSetup, 'area'>
    printedColumns?: number
  }): WorkbookSheet {
    const columns: WorkbookColumn[] = layout.widths.map((width) => ({ width }))
    const area = { top: 1, left: 1, bottom: Math.max(1, this.lastRow), right: layout.printedColumns ?? columns.length }
    return {
      name: this.name,
      columns,
      rows: this.rows.map(({ cells }, index) => ({ cells, height: rowHeight(cells, index + 1, columns, this.merges) })),
      merges: this.merges,
      choices: this.choices,
      frozen: layout.frozen,
      print: { ...layout.print, area },
    }
  }

  private rowAt(row: number): Pick<WorkbookRow, 'cells'> {
    while (this.rows.length < row) this.rows.push({ cells: [] })
    const found = this.rows[row - 1]
    if (!found) throw new RangeError(`Rows count from 1, not ${row}`)
    return found
  }
}
