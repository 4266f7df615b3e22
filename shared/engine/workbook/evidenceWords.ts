import type { Evidence } from '../../schemas/estimate.ts'

const WORDS: Record<Evidence, string> = { seen: '○ seen', measured: '◐ measured', tested: '● tested', bid: '■ bid' }

/** How the sheets write an evidence mark: its shape first, as on the screen, so that it reads in grey. */
export function evidenceWords(evidence: Evidence): string {
  return WORDS[evidence]
}
