import { formatCents } from '../../../shared/engine/money/formatMoney.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'

/**
 * A total in plain words. The sum of all low figures is what it costs if every line goes well, which hardly ever happens, so it isn't called
 * a one-in-ten figure although each line's low is one.
 */
export function totalWords({ low, likely, high }: LowLikelyHigh): string {
  return (
    `Likely ${formatCents(likely)}. If everything goes well ${formatCents(low)}, the sum of all the low figures; ` +
    `if everything goes badly ${formatCents(high)}, the sum of all the high ones.`
  )
}

/** Why nobody should read the two ends as odds. */
export const RANGE_NOTE =
  'Some lines go well and others badly, so the real cost lies between the two ends much more often than at either. How likely each figure is takes a simulation, which is not part of this page.'
