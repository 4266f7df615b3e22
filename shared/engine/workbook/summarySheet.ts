import type { EstimateResults } from '../../schemas/results.ts'
import { setBreakdowns } from './summaryBreakdowns.ts'
import { SUMMARY_COLUMN, SUMMARY_WIDTHS } from './summaryColumns.ts'
import { setFacts } from './summaryFacts.ts'
import type { SummaryParts } from './summaryParts.ts'
import { setTotals } from './summaryTotals.ts'
import { live, SheetDraft, text } from './sheetDraft.ts'
import { SHEET_TITLES } from './sheetTitles.ts'
import { DOTTED, ribbonFormula, ribbonText } from './rangeRibbon.ts'
import type { NamedCell, WorkbookSheet } from './workbookModel.ts'

const BIG_RIBBON_CHARS = 132
const ENDS = ['low', 'likely', 'high'] as const

/** What the owner and the lender read first: whose house, what range, how it is made up. */
export function summarySheet(parts: SummaryParts): { sheet: WorkbookSheet; names: NamedCell[] } {
  const { whole, results, context } = parts
  const draft = new SheetDraft(SHEET_TITLES.summary)
  draft.set(1, 1, text(context.firm.isDemo ? `${context.firm.name} · demonstration, all invented` : context.firm.name, 'firm'))
  draft.set(2, 1, text(whole.house.name, 'title'))
  draft.set(3, 1, text(whole.house.address, 'subtitle'))
  const rangeRow = setFacts(draft, 5, parts) + 2
  setRange(draft, rangeRow, results)
  const totalsEnd = setTotals(draft, rangeRow + 5, parts)
  const end = setBreakdowns(draft, totalsEnd + 2, parts)
  draft.set(end + 1, 1, text('Assumptions and cautions stand on the last sheet.', 'small'))
  const sheet = draft.finish({
    widths: SUMMARY_WIDTHS,
    frozen: { rows: 0, columns: 0 },
    print: { orientation: 'portrait', titleRows: null },
  })
  return { sheet, names: draft.names }
}

function setRange(draft: SheetDraft, row: number, { totals }: EstimateResults): void {
  const { label, low } = SUMMARY_COLUMN
  draft.setRow(row, label, [text('What the work comes to', 'heading'), text('', 'heading'), text('', 'heading')])
  draft.setRow(row, low, [
    text('Low', 'heading-right'),
    text('Likely', 'heading-right'),
    text('High', 'heading-right'),
    text('', 'heading'),
  ])
  draft.set(row + 1, label, text('Total', 'range-label'))
  draft.setRow(
    row + 1,
    low,
    ENDS.map((end) => live(`total_${end}`, totals.totalCents[end] / 100, 'range-money')),
  )
  const { low: least, likely, high } = totals.totalCents
  draft.set(
    row + 2,
    label,
    live(
      ribbonFormula({ low: 'total_low', likely: 'total_likely', high: 'total_high', most: 'total_high' }, BIG_RIBBON_CHARS, DOTTED),
      ribbonText({ low: least / 100, likely: likely / 100, high: high / 100 }, high / 100, BIG_RIBBON_CHARS, DOTTED),
      'ribbon',
    ),
  )
  draft.set(
    row + 3,
    label,
    text('The ribbon starts at $0. A total adds up the lows and the highs of all lines, so most jobs end well inside it.', 'small'),
  )
}
