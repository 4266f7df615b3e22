import { z } from 'zod'

/** Longest name, title or address line that a form takes, in characters. */
export const NAME_MAX = 120
/** Longest free note that a form takes, in characters. */
export const NOTE_MAX = 2000
/** Longest length that a building of this kind can have: half a mile, in inches. */
export const LENGTH_MAX_IN = 31_680
/** A line stays under one billion dollars, in cents. */
export const LINE_MAX_CENTS = 100_000_000_000
/** A unit price stays under one million dollars, in ten-thousandths of a dollar. */
export const UNIT_PRICE_MAX_E4 = 10_000_000_000

export const idSchema = z
  .string()
  .min(1)
  .max(64)
  .regex(/^[A-Za-z0-9_-]+$/, 'is not an id')
/** Plain lower-case words joined by hyphens, groups parted by a slash: `floor/plank-vinyl`. */
export const keySchema = z
  .string()
  .min(1)
  .max(80)
  .regex(/^[a-z0-9]+(?:[-/][a-z0-9]+)*$/, 'use lower-case words joined by hyphens')
export const nameSchema = z.string().trim().min(1, 'is empty').max(NAME_MAX)
export const noteSchema = z.string().max(NOTE_MAX)
export const versionSchema = z.int().min(1)
export const isoDateSchema = z.iso.date()
export const isoTimeSchema = z.iso.datetime()
/** A new order of rooms or lines: the id of each, once. */
export const orderSchema = z.strictObject({ ids: z.array(idSchema).max(10_000) })

/** A length in inches, exact to 1/64 in. */
export const lengthInSchema = z.number().positive('must be more than zero').max(LENGTH_MAX_IN)
export const amountCentsSchema = z.int().min(0, 'must not be negative').max(LINE_MAX_CENTS)
export const unitPriceE4Schema = z.int().min(0, 'must not be negative').max(UNIT_PRICE_MAX_E4)
export const percentSchema = z.number().min(0, 'must not be negative').max(100, 'must be at most 100')

/** Three figures of one thing, least to greatest: whole cents for amounts, ten-thousandths of a dollar for unit prices. */
export interface LowLikelyHigh {
  low: number
  likely: number
  high: number
}

function inOrder(range: LowLikelyHigh): boolean {
  return range.low <= range.likely && range.likely <= range.high
}
const ORDER_MESSAGE = 'low, likely and high must go up in that order'

export const unitPriceRangeSchema = z
  .strictObject({ low: unitPriceE4Schema, likely: unitPriceE4Schema, high: unitPriceE4Schema })
  .refine(inOrder, ORDER_MESSAGE)
/** Computed amounts: not bounded as entries are, because a total may pass the limit of a line. */
export const amountRangeSchema = z.object({ low: z.int(), likely: z.int(), high: z.int() })
