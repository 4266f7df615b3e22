import { expect } from 'vitest'
import { writeWorkbook } from '../../server/features/workbook/writeWorkbook.ts'
import { workbookSheets, type WorkbookContext } from '../../shared/engine/index.ts'
import { ESTIMATE_COLUMN, EstimateLayout } from '../../shared/engine/workbook/estimateLayout.ts'
import { cellAddress } from '../../shared/engine/workbook/cellAddress.ts'
import type { EstimateWhole, Line, Totals } from '../../shared/schemas/estimate.ts'
import { resultsOf } from './buildWorkbookEstimate.ts'
import { recalculateWorkbook, type RecalculatedWorkbook } from './recalculateWorkbook.ts'

const ENDS = ['low', 'likely', 'high'] as const
const TOTAL_NAMES: Record<keyof Totals, string> = {
  directCents: 'direct',
  overheadAndProfitCents: 'overhead',
  salesTaxCents: 'tax',
  permitsCents: 'permits',
  contingencyCents: 'contingency',
  totalCents: 'total',
}
const AMOUNT_COLUMNS = { low: ESTIMATE_COLUMN.amountLow, likely: ESTIMATE_COLUMN.amountLikely, high: ESTIMATE_COLUMN.amountHigh }

/** The file of an estimate. */
export function workbookBytes(whole: EstimateWhole, context: WorkbookContext): Promise<Buffer> {
  return writeWorkbook(workbookSheets(whole, resultsOf(whole), context))
}

/** Opens the file of an estimate in an independent spreadsheet engine, with every formula computed anew. */
export async function openWorkbook(whole: EstimateWhole, context: WorkbookContext): Promise<RecalculatedWorkbook> {
  return recalculateWorkbook(await workbookBytes(whole, context))
}

/** Every total, and the amounts of every line that counts, as the engine has them: to the cent. */
export function expectAgreement(workbook: RecalculatedWorkbook, whole: EstimateWhole): void {
  const results = resultsOf(whole)
  for (const [key, name] of Object.entries(TOTAL_NAMES) as [keyof Totals, string][]) {
    for (const end of ENDS) {
      expect({ [`${name}_${end}`]: centsOf(workbook.named(`${name}_${end}`)) }).toEqual({ [`${name}_${end}`]: results.totals[key][end] })
    }
  }
  const layout = new EstimateLayout(whole.lines.length)
  const leftOut = new Set(results.errors.map(({ path }) => Number(/^lines\[(\d+)\]/.exec(path)?.[1] ?? -1)))
  const figures = new Map(results.lines.map((line) => [line.key, line]))
  whole.lines.forEach(({ id, description }, index) => {
    if (leftOut.has(index)) return
    const row = layout.rowOf(index + 1)
    for (const end of ENDS) {
      const amount = centsOf(workbook.value('Estimate', cellAddress(row, AMOUNT_COLUMNS[end])))
      expect({ line: index + 1, description, [end]: amount }).toEqual({
        line: index + 1,
        description,
        [end]: figures.get(id)?.amountCents[end],
      })
    }
  })
}

/** Every formula of every sheet comes to what the file holds as its last result. */
export function expectResultsStand(workbook: RecalculatedWorkbook): void {
  for (const sheet of workbook.sheetNames()) {
    for (const address of workbook.formulaCells(sheet)) {
      const [now, kept] = [workbook.value(sheet, address), workbook.cached(sheet, address)]
      const place = `${sheet}!${address}: ${workbook.formula(sheet, address)}`
      if (typeof kept === 'number') {
        expect(typeof now, place).toBe('number')
        expect(Math.abs(Number(now) - kept), place).toBeLessThan(1e-9 * Math.max(1, Math.abs(kept)))
      } else expect(now ?? '', place).toBe(kept ?? '')
    }
  }
}

/** The whole with one line changed. */
export function withLine(whole: EstimateWhole, id: string, change: Partial<Line>): EstimateWhole {
  return { ...whole, lines: whole.lines.map((line) => (line.id === id ? { ...line, ...change } : line)) }
}

/** The cell of a line in a column of the estimate sheet. */
export function lineCell(whole: EstimateWhole, id: string, column: keyof typeof ESTIMATE_COLUMN): string {
  const number = whole.lines.findIndex((line) => line.id === id) + 1
  return cellAddress(new EstimateLayout(whole.lines.length).rowOf(number), ESTIMATE_COLUMN[column])
}

function centsOf(dollars: unknown): number {
  expect(typeof dollars).toBe('number')
  const cents = Number(dollars) * 100
  expect(cents).toBeCloseTo(Math.round(cents), 6)
  return Math.round(cents)
}
