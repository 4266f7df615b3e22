import { z } from 'zod'
import { amountRangeSchema, idSchema, isoDateSchema, versionSchema } from './common.ts'
import { evidenceSchema, totalsSchema } from './estimate.ts'
import { HOUSE_KINDS } from './house.ts'

/** What one house system, room or trade comes to, before the adders. */
export const summaryPartSchema = z.object({
  /** Key of the system or trade, id of the room; `null`: the house as a whole. */
  key: z.string().nullable(),
  title: z.string(),
  amountCents: amountRangeSchema,
  /** Own-hands hours. */
  hours: z.number(),
  lineCount: z.int(),
})

/** How much of the likely amount rests on one kind of evidence. */
export const evidenceShareSchema = z.object({
  mark: evidenceSchema,
  likelyCents: z.int(),
  /** Of the likely direct amount, 0 to 100, to one decimal. */
  sharePercent: z.number(),
  lineCount: z.int(),
})

export const summaryCautionSchema = z.object({ key: z.string(), title: z.string(), text: z.string(), source: z.string() })

/** What nobody could see yet. It is in no total. */
export const summaryUnknownSchema = z.object({
  description: z.string(),
  /** Title of the house system. */
  systemTitle: z.string(),
  /** In 100, `null` where nobody has judged it. */
  chancePercent: z.number().nullable(),
  costCents: amountRangeSchema.nullable(),
})

/** What an owner reads of an estimate, in one answer. */
export const estimateSummarySchema = z.object({
  estimateId: idSchema,
  estimateVersion: versionSchema,
  house: z.object({
    id: idSchema,
    name: z.string(),
    address: z.string(),
    regionName: z.string(),
    yearBuilt: z.int().nullable(),
    storeys: z.number(),
    kind: z.enum(HOUSE_KINDS),
  }),
  priceBookVersion: versionSchema,
  priceBookDate: isoDateSchema.nullable(),
  totals: totalsSchema,
  /** In the order of the catalogue, of the rooms, of the trades; only what has lines. */
  bySystem: z.array(summaryPartSchema),
  byRoom: z.array(summaryPartSchema),
  byTrade: z.array(summaryPartSchema),
  /** The likely amount by who does the work. */
  ownHandsCents: amountRangeSchema,
  hiredCents: amountRangeSchema,
  ownHandsHours: z.number(),
  /** All four marks, also those without a line. */
  evidence: z.array(evidenceShareSchema),
  lineCount: z.int(),
  /** Lines that hold an error and are left out of every figure here. */
  errorCount: z.int(),
  unknowns: z.array(summaryUnknownSchema),
  cautions: z.array(summaryCautionSchema),
  /** Says that this is a working estimate and not an issued one. */
  notIssuedNotice: z.string(),
  /** Said on every document that leaves the firm. */
  notices: z.array(z.string()),
  /** For an owner: who opened the house to them. */
  sharedBy: z.object({ name: z.string(), email: z.string() }).nullable(),
})

export type SummaryPart = z.infer<typeof summaryPartSchema>
export type SummaryUnknown = z.infer<typeof summaryUnknownSchema>
export type EvidenceShare = z.infer<typeof evidenceShareSchema>
export type EstimateSummary = z.infer<typeof estimateSummarySchema>
