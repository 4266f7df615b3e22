import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { Basis } from '../../schemas/estimate.ts'
import { sheetAddress } from './cellAddress.ts'
import { basisWords } from './basisWords.ts'
import type { EstimateLayout } from './estimateLayout.ts'
import { live, number, SheetDraft, text } from './sheetDraft.ts'
import { SHEET_TITLES } from './sheetTitles.ts'
import type { WorkbookContext } from './workbookContext.ts'
import type { WorkbookLine } from './workbookLines.ts'
import type { WorkbookCell, WorkbookSheet } from './workbookModel.ts'

const COLUMN = { key: 1, name: 2, basis: 3, unit: 4, low: 5, likely: 6, high: 7, date: 8, version: 9, lines: 10, note: 11 } as const
const WIDTHS = [27, 36, 11, 7, 11, 11, 11, 11, 8, 18, 44]
const FIRST_ROW = 5
const HEADS = ['Key', 'Item', 'Basis', 'Unit', 'Low', 'Likely', 'High', 'Price date', 'Book', 'On lines', 'Note']
const OWN_HEADS = ['Line', 'Description', 'Basis', 'Unit', 'Low', 'Likely', 'High', 'Book’s low', 'likely', 'high', 'Reason']

/** One price of the book as the estimate uses it. */
interface UsedPrice {
  itemKey: string
  basis: Basis
  priceE4: LowLikelyHigh | null
  lines: WorkbookLine[]
}

/** The prices sheet, and where each line finds its price on it. */
export interface PricesSheet {
  sheet: WorkbookSheet
  /** Addresses of the low, likely and high price of a line that takes the book's. */
  bookPriceCells(line: WorkbookLine): { low: string; likely: string; high: string }
}

/** Dollars of a unit price in ten-thousandths. */
export function unitDollars(priceE4: number): number {
  return priceE4 / 10_000
}

/** Each price of the book that the estimate stands on, once, and below them the prices that a person set in its place. */
export function pricesSheet(lines: readonly WorkbookLine[], context: WorkbookContext, layout: EstimateLayout): PricesSheet {
  const draft = new SheetDraft(SHEET_TITLES.prices)
  const used = usedPrices(lines)
  draft.set(1, 1, text('Prices used', 'title'))
  draft.set(
    2,
    1,
    text(
      `Unit prices of ${context.regionName}, price book version ${context.priceBook.version}. Own hands: materials alone. Hired: materials and labor. A price changed here changes every line that takes it.`,
      'subtitle',
    ),
  )
  draft.setRow(FIRST_ROW - 1, 1, headCells(HEADS, [COLUMN.low, COLUMN.likely, COLUMN.high, COLUMN.version]))
  const items = new Map(context.items.map((item) => [item.key, item]))
  ;[...used.values()].forEach((price, index) => {
    const item = items.get(price.itemKey)
    draft.setRow(FIRST_ROW + index, 1, [
      text(price.itemKey),
      text(item?.name ?? price.lines[0]?.line.description ?? ''),
      text(basisWords(price.basis)),
      text(item?.unit ?? price.lines[0]?.line.unit ?? ''),
      ...priceCells(price.priceE4),
      text(item?.priceDate ?? ''),
      number(context.priceBook.version, 'count'),
      text(lineNumbers(price.lines.filter(({ line }) => line.override === null))),
      text(usedPriceNote(price)),
    ])
  })
  ownPrices(draft, lines, FIRST_ROW + used.size + 2, layout)
  const sheet = draft.finish({
    widths: WIDTHS,
    frozen: { rows: FIRST_ROW - 1, columns: 2 },
    print: { orientation: 'landscape', titleRows: { from: FIRST_ROW - 1, to: FIRST_ROW - 1 } },
  })
  const rowByPrice = new Map([...used.keys()].map((key, index) => [key, FIRST_ROW + index]))
  return {
    sheet,
    bookPriceCells(line) {
      const row = rowByPrice.get(priceKey(line))
      if (row === undefined) throw new RangeError(`Line ${line.number} takes no price of the book`)
      return {
        low: sheetAddress(SHEET_TITLES.prices, row, COLUMN.low),
        likely: sheetAddress(SHEET_TITLES.prices, row, COLUMN.likely),
        high: sheetAddress(SHEET_TITLES.prices, row, COLUMN.high),
      }
    },
  }
}

function usedPrices(lines: readonly WorkbookLine[]): Map<string, UsedPrice> {
  const used = new Map<string, UsedPrice>()
  for (const line of lines) {
    const { itemKey, basis } = line.line
    if (itemKey === null) continue
    const key = priceKey(line)
    const known = used.get(key)
    if (known) known.lines.push(line)
    else used.set(key, { itemKey, basis, priceE4: line.bookPriceE4, lines: [line] })
  }
  return used
}

/** Lines share a row when item, basis and price are the same; an imported estimate can hold one item at two prices. */
function priceKey({ line, bookPriceE4 }: WorkbookLine): string {
  return JSON.stringify([line.itemKey, line.basis, bookPriceE4 && [bookPriceE4.low, bookPriceE4.likely, bookPriceE4.high]])
}

function priceCells(priceE4: LowLikelyHigh | null): WorkbookCell[] {
  const style = 'input-unit-price'
  if (priceE4 === null) return [text('none'), text('none'), text('none')]
  return [number(unitDollars(priceE4.low), style), number(unitDollars(priceE4.likely), style), number(unitDollars(priceE4.high), style)]
}

function usedPriceNote({ lines, priceE4, basis }: UsedPrice): string {
  const overridden = lines.filter(({ line }) => line.override !== null)
  const missing = priceE4 === null ? `The book has no price for ${basisWords(basis)}.` : ''
  const replaced = overridden.length > 0 ? `Own price in its place on ${lineWord(overridden)} ${lineNumbers(overridden)}, see below.` : ''
  return [missing, replaced].filter(Boolean).join(' ')
}

function ownPrices(draft: SheetDraft, lines: readonly WorkbookLine[], firstRow: number, layout: EstimateLayout): void {
  const overridden = lines.filter(({ line }) => line.override !== null)
  if (overridden.length === 0) return
  draft.set(firstRow, 1, text('Prices set for one line, in place of the book’s', 'heading'))
  draft.setRow(firstRow + 1, 1, headCells(OWN_HEADS, [5, 6, 7, 8, 9, 10]))
  overridden.forEach((workbookLine, index) => {
    // The estimate sheet leaves the cells of a line without figures blank.
    const { line, number: lineNumber, bookPriceE4, figures } = workbookLine
    const price = line.override?.price
    if (!price) return
    const cells = layout.priceCells(lineNumber)
    draft.setRow(firstRow + 2 + index, 1, [
      number(lineNumber, 'count'),
      text(line.description),
      text(basisWords(line.basis)),
      text(line.unit),
      ...(figures === null
        ? unitPriceCells(price)
        : [
            live(cells.low, unitDollars(price.low), 'unit-price'),
            live(cells.likely, unitDollars(price.likely), 'unit-price'),
            live(cells.high, unitDollars(price.high), 'unit-price'),
          ]),
      ...(bookPriceE4 ? unitPriceCells(bookPriceE4) : [text('none'), text('none'), text('none')]),
      text(line.override?.reason ?? ''),
    ])
  })
}

function unitPriceCells({ low, likely, high }: LowLikelyHigh): WorkbookCell[] {
  return [low, likely, high].map((priceE4) => number(unitDollars(priceE4), 'unit-price'))
}

function headCells(heads: readonly string[], rightColumns: readonly number[]): WorkbookCell[] {
  return heads.map((head, index) => text(head, rightColumns.includes(index + 1) ? 'head-right' : 'head'))
}

function lineWord(lines: readonly WorkbookLine[]): string {
  return lines.length === 1 ? 'line' : 'lines'
}

function lineNumbers(lines: readonly WorkbookLine[]): string {
  return lines.map(({ number: lineNumber }) => lineNumber).join(', ')
}
