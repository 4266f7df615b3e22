/** How a cell looks. The writer turns each name into fonts, fills, borders and number formats; the sheets only name them. */
export type StyleName =
  | 'firm'
  | 'title'
  | 'subtitle'
  | 'heading'
  | 'heading-right'
  | 'fact'
  | 'fact-right'
  | 'fact-count'
  | 'fact-hours'
  | 'range-label'
  | 'range-money'
  | 'group'
  | 'head'
  | 'head-right'
  | 'label'
  | 'text'
  | 'small'
  | 'notice'
  | 'caution-label'
  | 'problem'
  | 'ribbon'
  | 'ribbon-small'
  | 'count'
  | 'number'
  | 'hours'
  | 'feet'
  | 'percent'
  | 'money'
  | 'unit-price'
  | 'input-number'
  | 'input-quantity'
  | 'input-feet'
  | 'input-percent'
  | 'input-money'
  | 'input-unit-price'
  | 'input-text'
  | 'foot-label'
  | 'foot-money'
  | 'foot-hours'
  | 'foot-count'
  | 'total-label'
  | 'total-money'

/** A plain value, or a formula without `=` and the result that viewers show until they recalculate. */
export type WorkbookCell = { style: StyleName } & (
  | { value: string | number | null; formula?: undefined; result?: undefined }
  | { formula: string; result: string | number; value?: undefined }
)

export interface WorkbookRow {
  /** Points. */
  height: number
  /** By column: `cells[0]` is column A. */
  cells: (WorkbookCell | undefined)[]
}

export interface WorkbookColumn {
  /** Characters of the body font. */
  width: number
}

export interface CellRange {
  /** Rows and columns count from 1. */
  top: number
  left: number
  bottom: number
  right: number
}

export interface PrintSetup {
  orientation: 'portrait' | 'landscape'
  /** Rows that each page repeats, from 1. */
  titleRows: { from: number; to: number } | null
  area: CellRange
}

/** Cells that take one of a list, so that a misspelt rule can't slip in. */
export interface ChoiceRule {
  row: number
  column: number
  choices: readonly string[]
  message: string
}

export interface WorkbookSheet {
  name: string
  columns: WorkbookColumn[]
  rows: WorkbookRow[]
  /** Cells side by side that are one. */
  merges: CellRange[]
  choices: ChoiceRule[]
  /** Rows and columns that stay in view. */
  frozen: { rows: number; columns: number }
  print: PrintSetup
}

/** A name that formulas and people call one cell by. */
export interface NamedCell {
  name: string
  sheet: string
  row: number
  column: number
}

/** A whole workbook as plain data: no library, no clock. */
export interface WorkbookSheets {
  sheets: WorkbookSheet[]
  names: NamedCell[]
  properties: {
    title: string
    creator: string
    /** ISO time that stands for both made and changed, so that the same estimate gives the same bytes. */
    madeAt: string
  }
  /** Running head and foot of each page. */
  pageHead: string
  pageFoot: string
}
