import { z } from 'zod'
import { keySchema, nameSchema, noteSchema, percentSchema, type LowLikelyHigh } from '../../schemas/common.ts'
import { basisSchema, evidenceSchema, REASON_MAX, type LineFields, type Line } from '../../schemas/estimate.ts'
import { amountField, decimalField, unitPriceRangeField } from './documentFields.ts'
import { documentKey } from './documentKey.ts'

/** A line of a document: what a person keys of it with the book's own prices, its key there and its room's. */
export type KeyedLine = Omit<LineFields, 'roomId'> & { key: string; roomKey: string | null; book: Line['book'] }

/** Said of a price that a document gives without the book's own. */
export const IMPORTED_PRICE_REASON = 'Price of the imported document'

const PACKAGE_MAX = 100_000
/** Far more than a formula may have: one that is too long is an error of its line, in words, and not of the document. */
const QUANTITY_TEXT_MAX = 100_000

const packageSize = decimalField.pipe(z.number().positive('must be more than zero').max(PACKAGE_MAX))

export const lineDocument = z
  .strictObject({
    key: documentKey,
    room: documentKey.nullish(),
    item: keySchema.nullish(),
    system: documentKey,
    trade: documentKey.default('general'),
    description: nameSchema,
    unit: z.string().trim().min(1, 'is empty').max(20),
    quantity: z.union([z.number(), z.string().max(QUANTITY_TEXT_MAX)], 'must be a number or a formula'),
    wastePercent: percentSchema.default(0),
    packageSize: packageSize.nullish(),
    basis: basisSchema,
    unitPrice: unitPriceRangeField.nullable(),
    priceReason: z.string().trim().min(1, 'is empty').max(REASON_MAX).optional(),
    bookPrice: z.strictObject({ materials: unitPriceRangeField.nullable(), installed: unitPriceRangeField.nullable() }).optional(),
    minimumCharge: amountField.optional(),
    hoursPerUnit: z.number().min(0, 'must not be negative').max(1000).default(0),
    evidence: evidenceSchema.default('seen'),
    note: noteSchema.default(''),
  })
  .transform(({ room, item, quantity, packageSize, unitPrice, priceReason, bookPrice, minimumCharge, ...rest }): KeyedLine => {
    const book = bookPrice ?? { materials: null, installed: null }
    const ofBook = rest.basis === 'own-hands' ? book.materials : book.installed
    const reason = priceReason ?? (isSamePrice(unitPrice, ofBook) ? null : IMPORTED_PRICE_REASON)
    return {
      ...rest,
      roomKey: room ?? null,
      itemKey: item ?? null,
      quantity: String(quantity),
      packageSize: packageSize ?? null,
      override: unitPrice && reason !== null ? { price: unitPrice, reason } : null,
      book,
      minimumChargeCents: minimumCharge ?? 0,
    }
  })

function isSamePrice(one: LowLikelyHigh | null, other: LowLikelyHigh | null): boolean {
  return one?.low === other?.low && one?.likely === other?.likely && one?.high === other?.high
}
