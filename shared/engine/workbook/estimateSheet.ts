import type { LowLikelyHigh } from '../../schemas/common.ts'
import { cellAddress } from './cellAddress.ts'
import { basisWords } from './basisWords.ts'
import { evidenceWords } from './evidenceWords.ts'
import { ESTIMATE_COLUMN as COLUMN, ESTIMATE_FIRST_ROW, ESTIMATE_HEAD_ROW, type EstimateLayout } from './estimateLayout.ts'
import { amountFormula, hoursFormula, quantityFormula, sumFormula } from './moneyFormulas.ts'
import { sumOfHours } from './lineSums.ts'
import { unitDollars, type PricesSheet } from './pricesSheet.ts'
import { live, number, SheetDraft, text } from './sheetDraft.ts'
import { SHEET_TITLES } from './sheetTitles.ts'
import type { WorkbookLine } from './workbookLines.ts'
import type { WorkbookCell, WorkbookSheet } from './workbookModel.ts'

const HEADS: readonly (readonly [head: string, width: number])[] = [
  ['No.', 5],
  ['System', 14],
  ['Room', 13],
  ['Description', 26],
  ['Basis', 10],
  ['Evidence', 11],
  ['Measured', 10],
  ['Waste, %', 7],
  ['Package', 8.5],
  ['Quantity', 10],
  ['Unit', 6.5],
  ['Low', 10],
  ['Likely', 10],
  ['High', 10],
  ['Minimum', 10],
  ['Low', 12],
  ['Likely', 12],
  ['High', 12],
  ['Hours', 8],
  ['Note', 28],
  ['Trade', 20],
  ['Room no.', 9],
  ['Hours a unit', 12],
  ['Quantity as keyed', 28],
  ['Counted', 9],
]
const GROUPS: readonly (readonly [title: string, from: number, to: number])[] = [
  ['How much', COLUMN.measured, COLUMN.unit],
  ['Unit price, $', COLUMN.priceLow, COLUMN.minimum],
  ['Amount', COLUMN.amountLow, COLUMN.amountHigh],
  ['Not printed', COLUMN.trade, COLUMN.counted],
]
const RIGHT_HEADS = new Set<number>([
  COLUMN.number,
  COLUMN.measured,
  COLUMN.waste,
  COLUMN.package,
  COLUMN.quantity,
  COLUMN.priceLow,
  COLUMN.priceLikely,
  COLUMN.priceHigh,
  COLUMN.minimum,
  COLUMN.amountLow,
  COLUMN.amountLikely,
  COLUMN.amountHigh,
  COLUMN.hours,
  COLUMN.roomNumber,
  COLUMN.hoursPerUnit,
])
const ENDS = ['low', 'likely', 'high'] as const
const PRICE_COLUMN = { low: COLUMN.priceLow, likely: COLUMN.priceLikely, high: COLUMN.priceHigh }
const AMOUNT_COLUMN = { low: COLUMN.amountLow, likely: COLUMN.amountLikely, high: COLUMN.amountHigh }

export interface EstimateSheetParts {
  houseName: string
  lines: readonly WorkbookLine[]
  layout: EstimateLayout
  prices: PricesSheet
  /** The measured quantity of a line that counts: a live formula over the rooms sheet, or the number that was keyed. */
  measuredCell(line: WorkbookLine): WorkbookCell
  directCents: LowLikelyHigh
}

/** One row a line, from what was measured to what it comes to, and a foot that the columns add up to. */
export function estimateSheet(parts: EstimateSheetParts): WorkbookSheet {
  const draft = new SheetDraft(SHEET_TITLES.estimate)
  draft.set(1, 1, text(parts.houseName, 'title'))
  draft.set(2, 1, text('Every line and what it stands on. Tinted cells may be changed; all else follows from them.', 'subtitle'))
  for (const [title, from, to] of GROUPS) {
    for (let column = from; column <= to; column += 1) draft.set(ESTIMATE_HEAD_ROW - 1, column, text(column === from ? title : '', 'group'))
    draft.merge(ESTIMATE_HEAD_ROW - 1, from, to)
  }
  HEADS.forEach(([head], index) => {
    draft.set(ESTIMATE_HEAD_ROW, index + 1, text(head, RIGHT_HEADS.has(index + 1) ? 'head-right' : 'head'))
  })
  for (const line of parts.lines) {
    const row = parts.layout.rowOf(line.number)
    setDescription(draft, row, line)
    if (line.problem === null && line.figures) setFigures(draft, row, line, parts)
    else setLeftOut(draft, row, line)
  }
  setFoot(draft, parts)
  return draft.finish({
    widths: HEADS.map(([, width]) => width),
    frozen: { rows: ESTIMATE_HEAD_ROW, columns: COLUMN.description },
    print: { orientation: 'landscape', titleRows: { from: ESTIMATE_HEAD_ROW - 1, to: ESTIMATE_HEAD_ROW } },
    printedColumns: COLUMN.note,
  })
}

function setDescription(
  draft: SheetDraft,
  row: number,
  { line, number: lineNumber, systemTitle, roomTitle, roomNumber, tradeTitle }: WorkbookLine,
): void {
  draft.set(row, COLUMN.number, number(lineNumber, 'count'))
  draft.set(row, COLUMN.system, text(systemTitle))
  draft.set(row, COLUMN.room, text(roomTitle))
  draft.set(row, COLUMN.description, text(line.description))
  draft.set(row, COLUMN.basis, text(basisWords(line.basis)))
  draft.set(row, COLUMN.evidence, text(evidenceWords(line.evidence)))
  draft.set(row, COLUMN.waste, number(line.wastePercent, 'input-percent'))
  draft.set(row, COLUMN.unit, text(line.unit))
  draft.set(row, COLUMN.trade, text(tradeTitle))
  draft.set(row, COLUMN.roomNumber, number(roomNumber, 'count'))
  draft.set(row, COLUMN.keyed, text(line.quantity))
}

function setFigures(draft: SheetDraft, row: number, workbookLine: WorkbookLine, { prices, measuredCell }: EstimateSheetParts): void {
  const { line, figures } = workbookLine
  if (!figures) return
  const at = (column: number) => cellAddress(row, column)
  const isOwnHands = line.basis === 'own-hands'
  const packageSize = isOwnHands ? line.packageSize : null
  draft.set(row, COLUMN.measured, measuredCell(workbookLine))
  draft.set(row, COLUMN.package, packageSize === null ? text('') : number(packageSize, 'input-number'))
  const packageCell = packageSize === null ? null : at(COLUMN.package)
  draft.set(row, COLUMN.quantity, live(quantityFormula(at(COLUMN.measured), at(COLUMN.waste), packageCell), figures.quantity, 'number'))
  draft.set(row, COLUMN.minimum, isOwnHands ? text('') : number(line.minimumChargeCents / 100, 'input-money'))
  const minimum = isOwnHands ? null : at(COLUMN.minimum)
  for (const end of ENDS) {
    draft.set(row, PRICE_COLUMN[end], priceCell(workbookLine, end, prices))
    draft.set(
      row,
      AMOUNT_COLUMN[end],
      live(amountFormula(at(COLUMN.quantity), at(PRICE_COLUMN[end]), minimum), figures.amountCents[end] / 100, 'money'),
    )
  }
  draft.set(row, COLUMN.hours, text(''))
  if (isOwnHands) {
    draft.set(row, COLUMN.hours, live(hoursFormula(at(COLUMN.quantity), at(COLUMN.hoursPerUnit)), figures.hours, 'hours'))
    draft.set(row, COLUMN.hoursPerUnit, number(line.hoursPerUnit, 'input-number'))
  }
  draft.set(row, COLUMN.note, text(lineNote(workbookLine)))
  draft.set(row, COLUMN.counted, text('yes'))
}

function priceCell(workbookLine: WorkbookLine, end: keyof LowLikelyHigh, prices: PricesSheet): WorkbookCell {
  const { line, priceE4 } = workbookLine
  const dollars = unitDollars(priceE4?.[end] ?? 0)
  const takesBook = line.override === null && line.itemKey !== null
  return takesBook ? live(prices.bookPriceCells(workbookLine)[end], dollars, 'unit-price') : number(dollars, 'input-unit-price')
}

function setLeftOut(draft: SheetDraft, row: number, { problem, line }: WorkbookLine): void {
  const noFigures = [
    COLUMN.measured,
    COLUMN.package,
    COLUMN.quantity,
    ...Object.values(PRICE_COLUMN),
    COLUMN.minimum,
    ...Object.values(AMOUNT_COLUMN),
    COLUMN.hours,
  ]
  for (const column of noFigures) draft.set(row, column, text(''))
  const note = `Left out of the sums: ${problem ?? 'it has no figures'}`
  draft.set(row, COLUMN.note, text(line.note === '' ? note : `${note}\n${line.note}`, 'problem'))
  draft.set(row, COLUMN.counted, text('no'))
}

function lineNote({ line }: WorkbookLine): string {
  const ownPrice = line.override ? `Own price: ${line.override.reason}` : ''
  return [ownPrice, line.note].filter((part) => part !== '').join('\n')
}

function setFoot(draft: SheetDraft, { layout, directCents, lines }: EstimateSheetParts): void {
  const row = layout.footRow
  const counted = lines.filter(({ problem }) => problem === null).length
  for (let column = COLUMN.number; column <= COLUMN.note; column += 1) draft.set(row, column, text('', 'foot-label'))
  const leftOut = lines.length - counted
  draft.set(row, COLUMN.number, text(leftOut === 0 ? 'All lines' : `All lines but ${leftOut} left out, see their notes`, 'foot-label'))
  draft.merge(row, COLUMN.number, COLUMN.description)
  const columnOfLines = (column: number) => `${cellAddress(ESTIMATE_FIRST_ROW, column)}:${cellAddress(layout.spacerRow, column)}`
  for (const end of ENDS) {
    draft.set(row, AMOUNT_COLUMN[end], live(sumFormula(columnOfLines(AMOUNT_COLUMN[end])), directCents[end] / 100, 'foot-money'))
  }
  draft.set(row, COLUMN.hours, live(sumFormula(columnOfLines(COLUMN.hours)), sumOfHours(lines), 'foot-hours'))
}
