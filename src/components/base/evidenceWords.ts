import type { Evidence } from '../../../shared/schemas/estimate.ts'

/** What each mark says about a figure. */
export const EVIDENCE_WORDS: Record<Evidence, string> = {
  seen: 'seen: judged by eye',
  measured: 'measured: keyed from a tape or a count',
  tested: 'tested: an inspection or a test has settled it',
  bid: 'bid: a contractor has named the price',
}
