import type { EstimateWhole } from '../../schemas/estimate.ts'
import type { EstimateResults } from '../../schemas/results.ts'
import type { EstimateLayout } from './estimateLayout.ts'
import type { WorkbookContext } from './workbookContext.ts'
import type { WorkbookLine } from './workbookLines.ts'

/** What each part of the summary sheet is made from. */
export interface SummaryParts {
  whole: EstimateWhole
  results: EstimateResults
  lines: readonly WorkbookLine[]
  layout: EstimateLayout
  context: WorkbookContext
}
