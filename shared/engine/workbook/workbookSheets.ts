import type { EstimateWhole } from '../../schemas/estimate.ts'
import type { EstimateResults } from '../../schemas/results.ts'
import { toEstimateInput } from '../estimate/toEstimateInput.ts'
import { assumptionsSheet } from './assumptionsSheet.ts'
import { EstimateLayout } from './estimateLayout.ts'
import { estimateSheet } from './estimateSheet.ts'
import { measuredCells } from './measuredCells.ts'
import { pricesSheet } from './pricesSheet.ts'
import { roomsSheet } from './roomsSheet.ts'
import { summarySheet } from './summarySheet.ts'
import type { WorkbookContext } from './workbookContext.ts'
import { workbookLines } from './workbookLines.ts'
import type { WorkbookSheets } from './workbookModel.ts'

const NOT_MORE = 'Not an inspection, an appraisal or an offer of credit.'

/**
 * An estimate as the sheets of a workbook: values where something was keyed, formulas wherever a figure follows from others, each with its result of
 * now. The formulas come to the engine's own figures to the cent, and stay right when a quantity, a price or an adder is changed.
 */
export function workbookSheets(whole: EstimateWhole, results: EstimateResults, context: WorkbookContext): WorkbookSheets {
  const { house, rooms } = toEstimateInput(whole)
  const lines = workbookLines(whole, results)
  const layout = new EstimateLayout(lines.length)
  const measured = roomsSheet(house, rooms)
  const prices = pricesSheet(lines, context, layout)
  const summary = summarySheet({ whole, results, lines, layout, context })
  const estimate = estimateSheet({
    houseName: whole.house.name,
    lines,
    layout,
    prices,
    measuredCell: measuredCells(rooms),
    directCents: results.totals.directCents,
  })
  return {
    sheets: [summary.sheet, estimate, measured.sheet, prices.sheet, assumptionsSheet(whole, lines, context)],
    names: [...summary.names, ...measured.names],
    properties: { title: `${whole.house.name}, estimate`, creator: context.firm.name, madeAt: context.figuresAt },
    pageHead: whole.house.name,
    pageFoot: context.firm.isDemo ? `Demonstration, all invented. ${NOT_MORE}` : NOT_MORE,
  }
}
