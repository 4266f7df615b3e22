import type { LiveEstimate } from '../../../shared/engine/index.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import { EVIDENCE_MARKS, type Basis, type Line } from '../../../shared/schemas/estimate.ts'
import type { EvidenceShare } from '../../../shared/schemas/estimateSummary.ts'

/** How much of the likely direct amount rests on each mark of evidence. Lines with an error count for nothing. */
export function evidenceShares(live: LiveEstimate, lines: readonly Line[]): EvidenceShare[] {
  const priced = lines.filter(({ id }) => live.line(id).error === null)
  const likelyOf = (some: readonly Line[]) => some.reduce((sum, { id }) => sum + live.line(id).amountCents.likely, 0)
  const whole = likelyOf(priced)
  return EVIDENCE_MARKS.map((mark) => {
    const marked = priced.filter(({ evidence }) => evidence === mark)
    const likelyCents = likelyOf(marked)
    return { mark, likelyCents, sharePercent: whole === 0 ? 0 : Math.round((likelyCents / whole) * 1000) / 10, lineCount: marked.length }
  })
}

/** What own hands and what hired trades come to, before the adders. */
export function basisAmounts(live: LiveEstimate, lines: readonly Line[]): { ownHandsCents: LowLikelyHigh; hiredCents: LowLikelyHigh } {
  const sumOf = (wanted: Basis) =>
    lines
      .filter(({ id, basis }) => basis === wanted && live.line(id).error === null)
      .map(({ id }) => live.line(id).amountCents)
      .reduce((sum, { low, likely, high }) => ({ low: sum.low + low, likely: sum.likely + likely, high: sum.high + high }), {
        low: 0,
        likely: 0,
        high: 0,
      })
  return { ownHandsCents: sumOf('own-hands'), hiredCents: sumOf('hired') }
}
