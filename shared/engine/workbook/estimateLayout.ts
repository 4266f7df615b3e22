import { sheetAddress, sheetColumnRange } from './cellAddress.ts'
import { SHEET_TITLES } from './sheetTitles.ts'

/** Columns of the estimate sheet. Those after `note` serve the sums and the curious; they aren't printed. */
export const ESTIMATE_COLUMN = {
  number: 1,
  system: 2,
  room: 3,
  description: 4,
  basis: 5,
  evidence: 6,
  measured: 7,
  waste: 8,
  package: 9,
  quantity: 10,
  unit: 11,
  priceLow: 12,
  priceLikely: 13,
  priceHigh: 14,
  minimum: 15,
  amountLow: 16,
  amountLikely: 17,
  amountHigh: 18,
  hours: 19,
  note: 20,
  trade: 21,
  roomNumber: 22,
  hoursPerUnit: 23,
  keyed: 24,
  counted: 25,
} as const

export const ESTIMATE_HEAD_ROW = 5
export const ESTIMATE_FIRST_ROW = ESTIMATE_HEAD_ROW + 1

/** Where the lines stand on the estimate sheet, for the sheets that sum them. */
export class EstimateLayout {
  constructor(private readonly lineCount: number) {}

  /** The empty row below the lines; sums reach into it, so that a row put in at the end is counted. */
  get spacerRow(): number {
    return ESTIMATE_FIRST_ROW + this.lineCount
  }

  get footRow(): number {
    return this.spacerRow + 1
  }

  rowOf(lineNumber: number): number {
    return ESTIMATE_FIRST_ROW + lineNumber - 1
  }

  /** A column of all lines, as other sheets write it. */
  range(column: number): string {
    return sheetColumnRange(SHEET_TITLES.estimate, column, ESTIMATE_FIRST_ROW, this.spacerRow)
  }

  /** A cell of the foot, as other sheets write it. */
  foot(column: number): string {
    return sheetAddress(SHEET_TITLES.estimate, this.footRow, column)
  }

  /** The unit price of a line, as other sheets write it. */
  priceCells(lineNumber: number): { low: string; likely: string; high: string } {
    const row = this.rowOf(lineNumber)
    return {
      low: sheetAddress(SHEET_TITLES.estimate, row, ESTIMATE_COLUMN.priceLow),
      likely: sheetAddress(SHEET_TITLES.estimate, row, ESTIMATE_COLUMN.priceLikely),
      high: sheetAddress(SHEET_TITLES.estimate, row, ESTIMATE_COLUMN.priceHigh),
    }
  }
}
