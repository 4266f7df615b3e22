import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { Line } from '../../schemas/estimate.ts'

/** The unit price that counts: the line's own where it has one, else the book's for who does the work. `null`: there is none. */
export function effectivePrice({ basis, override, book }: Pick<Line, 'basis' | 'override' | 'book'>): LowLikelyHigh | null {
  if (override) return override.price
  return basis === 'own-hands' ? book.materials : book.installed
}
