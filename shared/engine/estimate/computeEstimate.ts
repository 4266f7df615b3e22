import type { EstimateResults } from '../../schemas/results.ts'
import type { EstimateInput } from '../estimateInput.ts'
import { openEstimate } from './openEstimate.ts'

/** An estimate's figures, once: measures, lines, totals, and what could not be computed. */
export function computeEstimate(input: EstimateInput): EstimateResults {
  return openEstimate(input).results()
}
