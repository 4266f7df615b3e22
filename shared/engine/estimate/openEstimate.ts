import type { EstimateInput } from '../estimateInput.ts'
import { mathjsParse } from '../formula/mathjsParse.ts'
import { LiveEstimate } from './liveEstimate.ts'

/** An estimate compiled and computed, ready for edits one at a time. */
export function openEstimate(input: EstimateInput): LiveEstimate {
  return new LiveEstimate(input, mathjsParse)
}
