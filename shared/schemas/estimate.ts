import { z } from 'zod'
import {
  amountCentsSchema,
  amountRangeSchema,
  idSchema,
  keySchema,
  nameSchema,
  noteSchema,
  percentSchema,
  unitPriceRangeSchema,
  versionSchema,
} from './common.ts'
import { houseSchema } from './house.ts'
import { formulaTextSchema } from './priceItem.ts'
import { roomSchema } from './room.ts'

export const BASES = ['own-hands', 'hired'] as const
export const EVIDENCE_MARKS = ['seen', 'measured', 'tested', 'bid'] as const
export const SALES_TAX_RULES = ['none', 'materials', 'whole-contract'] as const
/** More lines than a large house needs, and what the engine is measured at. */
export const LINES_MAX = 10_000
/** Longest reason for an own price, in characters. */
export const REASON_MAX = 500

export const basisSchema = z.enum(BASES)
export const evidenceSchema = z.enum(EVIDENCE_MARKS)

export const contingencySchema = z.discriminatedUnion('method', [
  z.strictObject({ method: z.literal('percent'), percent: percentSchema }),
  z.strictObject({ method: z.literal('fixed'), amountCents: amountCentsSchema }),
])

const evidenceFactorSchema = z.strictObject({
  /** Factor on the distances low to likely and likely to high. */
  spread: z.number().min(0).max(10),
  /** Spread of the quantity, percent either way. */
  quantityPercent: percentSchema,
})

export const estimateSettingsSchema = z.strictObject({
  overheadAndProfitPercent: percentSchema,
  salesTax: z.strictObject({ rule: z.enum(SALES_TAX_RULES), percent: percentSchema }),
  permitsCents: amountCentsSchema,
  contingency: contingencySchema,
  ends: z.enum(['one-in-ten', 'limits']),
  evidence: z.strictObject({
    seen: evidenceFactorSchema,
    measured: evidenceFactorSchema,
    tested: evidenceFactorSchema,
    bid: evidenceFactorSchema,
  }),
  correlation: z.strictObject({ overall: z.number().min(0).max(1), withinTrade: z.number().min(0).max(1) }),
  draws: z.int().min(1000).max(1_000_000),
})

/** A price that a person set in place of the book's, and why. */
export const priceOverrideSchema = z.strictObject({
  price: unitPriceRangeSchema,
  reason: z.string().trim().min(1, 'say why').max(REASON_MAX),
})

/** What a person keys of a line. The book's side of it is filled in by the server from `itemKey`. */
export const lineFieldsSchema = z.strictObject({
  /** `null`: the house as a whole. */
  roomId: idSchema.nullable(),
  /** `null`: a line of the estimator's own, whose price is the override. */
  itemKey: keySchema.nullable(),
  system: keySchema,
  trade: keySchema,
  description: nameSchema,
  unit: z.string().min(1).max(20),
  /** A formula over the measures; a plain number is one too. */
  quantity: formulaTextSchema,
  wastePercent: percentSchema,
  packageSize: z.number().positive().max(100_000).nullable(),
  basis: basisSchema,
  override: priceOverrideSchema.nullable(),
  minimumChargeCents: amountCentsSchema,
  hoursPerUnit: z.number().min(0).max(1000),
  evidence: evidenceSchema,
  note: noteSchema,
})

/** A new line: all that is left out comes along with the item. */
export const newLineSchema = lineFieldsSchema.partial().extend({
  roomId: idSchema.nullable(),
  /** Put it below this line; left out, at the end. */
  afterLineId: idSchema.nullable().optional(),
})
export const linePatchSchema = lineFieldsSchema.partial()

export const lineSchema = lineFieldsSchema.extend({
  id: idSchema,
  estimateId: idSchema,
  position: z.int(),
  version: versionSchema,
  /** Regional prices at the pinned version of the book, ten-thousandths of a dollar; `null`: the book has none. */
  book: z.object({ materials: unitPriceRangeSchema.nullable(), installed: unitPriceRangeSchema.nullable() }),
})

export const totalsSchema = z.object({
  directCents: amountRangeSchema,
  overheadAndProfitCents: amountRangeSchema,
  salesTaxCents: amountRangeSchema,
  permitsCents: amountRangeSchema,
  contingencyCents: amountRangeSchema,
  totalCents: amountRangeSchema,
})

export const estimateSchema = z.object({
  id: idSchema,
  houseId: idSchema,
  name: nameSchema,
  version: versionSchema,
  priceBookVersion: versionSchema,
  regionKey: keySchema,
  settings: estimateSettingsSchema,
  /** Kept as the estimate document has them, so that an import loses nothing. */
  unknowns: z.array(z.unknown()),
  inspections: z.array(z.unknown()),
  /** The server's answer, kept at the last write. */
  totals: totalsSchema,
  errorCount: z.int(),
})
export const estimatePatchSchema = z.strictObject({ name: nameSchema.optional(), settings: estimateSettingsSchema.partial().optional() })

/** What a write to a line answers: the line as kept, and what the whole comes to with it. */
export const savedLineSchema = z.object({ line: lineSchema, totals: totalsSchema, estimateVersion: versionSchema })
export const orderedLinesSchema = z.object({
  lines: z.array(z.object({ id: idSchema, position: z.int() })),
  totals: totalsSchema,
  estimateVersion: versionSchema,
})

/** Everything that the estimate page and the engine need, in one read. */
export const estimateWholeSchema = z.object({
  estimate: estimateSchema,
  house: houseSchema,
  rooms: z.array(roomSchema),
  lines: z.array(lineSchema),
})

export type Basis = z.infer<typeof basisSchema>
export type Evidence = z.infer<typeof evidenceSchema>
export type Contingency = z.infer<typeof contingencySchema>
export type EstimateSettings = z.infer<typeof estimateSettingsSchema>
export type PriceOverride = z.infer<typeof priceOverrideSchema>
export type LineFields = z.infer<typeof lineFieldsSchema>
export type NewLine = z.infer<typeof newLineSchema>
export type LinePatch = z.infer<typeof linePatchSchema>
export type Line = z.infer<typeof lineSchema>
export type SavedLine = z.infer<typeof savedLineSchema>
export type OrderedLines = z.infer<typeof orderedLinesSchema>
export type Totals = z.infer<typeof totalsSchema>
export type Estimate = z.infer<typeof estimateSchema>
export type EstimatePatch = z.infer<typeof estimatePatchSchema>
export type EstimateWhole = z.infer<typeof estimateWholeSchema>
