import { parseUnitPriceE4 } from '../../shared/engine/index.ts'
import { UNIT_PRICE_MAX_E4, type LowLikelyHigh } from '../../shared/schemas/common.ts'
import type { LineRow } from './lineRow.ts'

export type KeyedPrice = { ok: true; range: LowLikelyHigh } | { ok: false; words: string }

/** The book's price of a line for its basis, or `null` where the book has none. */
export function bookPrice({ fields, book }: Pick<LineRow, 'fields' | 'book'>): LowLikelyHigh | null {
  return fields.basis === 'own-hands' ? book.materials : book.installed
}

/**
 * A range around one pasted figure, in dollars: low and high stand as far from it, in proportion, as the book's do from the book's likely price; without a
 * book's price all three are the figure.
 */
export function keyedPrice(row: Pick<LineRow, 'fields' | 'book'>, dollars: number): KeyedPrice {
  const parsed = parseUnitPriceE4(String(dollars))
  if (!parsed.ok) return { ok: false, words: parsed.message }
  const likely = parsed.e4
  const book = bookPrice(row)
  const hasProportion = book !== null && book.likely > 0
  const range = hasProportion
    ? { low: Math.round((likely * book.low) / book.likely), likely, high: Math.round((likely * book.high) / book.likely) }
    : { low: likely, likely, high: likely }
  return range.high > UNIT_PRICE_MAX_E4 ? { ok: false, words: 'The price is too high to be kept.' } : { ok: true, range }
}
