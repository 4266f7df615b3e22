import { z } from 'zod'
import { amountRangeSchema, idSchema, isoTimeSchema, keySchema, lengthInSchema, nameSchema, noteSchema, versionSchema } from './common.ts'
import { shapeSchema } from './room.ts'

export const YEAR_BUILT_MIN = 1600
export const YEAR_BUILT_MAX = 2100
export const STOREYS_MAX = 5
/** Steeper than 24 in 12 is a wall in all but name; the trade's tables end there. */
export const ROOF_RISE_MAX = 24

export const HOUSE_KINDS = ['detached', 'semi-detached', 'row', 'split-level', 'manufactured', 'other'] as const
export const ROOF_KINDS = ['gable', 'hip', 'shed', 'flat'] as const

export const roofGroupSchema = z.strictObject({
  kind: z.enum(ROOF_KINDS),
  /** Inches of rise in 12 inches of run. */
  rise: z.number().min(0, 'must not be negative').max(ROOF_RISE_MAX, `must be at most ${ROOF_RISE_MAX} in 12`),
  /** Part of the plan that this group covers. Left out, groups share equally what the others leave. All together cover 100. */
  sharePercent: z.number().positive('must be more than zero').max(100, 'must be at most 100').optional(),
})

export const houseFieldsSchema = z.strictObject({
  name: nameSchema,
  address: z.string().trim().max(200),
  regionKey: keySchema,
  yearBuilt: z.int().min(YEAR_BUILT_MIN).max(YEAR_BUILT_MAX).nullable(),
  storeys: z.number().min(1).max(STOREYS_MAX).multipleOf(0.5),
  kind: z.enum(HOUSE_KINDS),
  /** Outside measures; each may wait, and what needs it is then an error in words. */
  footprint: shapeSchema.nullable(),
  wallHeightIn: lengthInSchema.nullable(),
  overhangIn: z.number().min(0).max(120).nullable(),
  roof: z.array(roofGroupSchema).max(8),
  note: noteSchema,
})
export const housePatchSchema = houseFieldsSchema.partial()
export const houseSchema = houseFieldsSchema.extend({
  id: idSchema,
  version: versionSchema,
  createdAt: isoTimeSchema,
  updatedAt: isoTimeSchema,
})

/** A house has its working estimate from the first moment. */
export const addedHouseSchema = z.object({ house: houseSchema, estimateId: idSchema })

/** A row of the house list: the house, its working estimate and the total kept with it. */
export const houseSummarySchema = z.object({
  id: idSchema,
  name: z.string(),
  address: z.string(),
  regionKey: keySchema,
  yearBuilt: z.int().nullable(),
  kind: z.enum(HOUSE_KINDS),
  estimateId: idSchema,
  roomCount: z.int(),
  lineCount: z.int(),
  /** Lines that hold an error and are left out of the total. */
  errorCount: z.int(),
  totalCents: amountRangeSchema,
  updatedAt: isoTimeSchema,
})

export type RoofGroup = z.infer<typeof roofGroupSchema>
export type HouseFields = z.infer<typeof houseFieldsSchema>
export type HousePatch = z.infer<typeof housePatchSchema>
export type House = z.infer<typeof houseSchema>
export type AddedHouse = z.infer<typeof addedHouseSchema>
export type HouseSummary = z.infer<typeof houseSummarySchema>
