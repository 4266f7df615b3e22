import { z } from 'zod'
import {
  amountCentsSchema,
  isoDateSchema,
  keySchema,
  nameSchema,
  noteSchema,
  percentSchema,
  unitPriceRangeSchema,
  versionSchema,
} from './common.ts'
import { SYSTEM_KEYS } from '../catalogue/houseSystems.ts'
import { TRADE_KEYS } from '../catalogue/trades.ts'
import { UNIT_KEYS } from '../catalogue/units.ts'

export const FORMULA_MAX_CHARS = 500

export const formulaTextSchema = z
  .string()
  .trim()
  .min(1, 'is empty')
  .max(FORMULA_MAX_CHARS, `is longer than ${FORMULA_MAX_CHARS} characters`)

/** What the admin keys of an item. Unit prices are in ten-thousandths of a dollar. */
export const priceItemFieldsSchema = z
  .strictObject({
    key: keySchema,
    name: nameSchema,
    system: z.enum(SYSTEM_KEYS),
    trade: z.enum(TRADE_KEYS),
    unit: z.enum(UNIT_KEYS),
    /** UNIFORMAT II (ASTM E1557) level 3 code, as `C3020`. */
    uniformat: z.string().regex(/^[A-G]\d{2}(?:\d{2})?$/, 'is not a UNIFORMAT II code'),
    /** Own hands: materials alone. `null`: not work for own hands. */
    materials: unitPriceRangeSchema.nullable(),
    /** Hired: materials and labor. `null`: nobody is hired for it. */
    installed: unitPriceRangeSchema.nullable(),
    /** Part of the installed price that is labor, in percent. */
    laborSharePercent: percentSchema,
    wastePercent: percentSchema,
    /** What one package holds or covers, in the item's unit; `null` where it is sold loose. */
    packageSize: z.number().positive().max(100_000).nullable(),
    /** What the package is called: box, gallon, roll, sheet. */
    packageName: z.string().trim().max(40),
    /** Least that a hired trade comes for. */
    minimumChargeCents: amountCentsSchema,
    /** Own-hands hours for one unit. */
    hoursPerUnit: z.number().min(0).max(1000),
    /** Quantity formula that comes along when the line is for a room. */
    roomFormula: formulaTextSchema.nullable(),
    /** The same for the house as a whole. */
    houseFormula: formulaTextSchema.nullable(),
    priceDate: isoDateSchema,
    note: noteSchema,
  })
  .refine((item) => item.materials !== null || item.installed !== null, {
    path: ['installed'],
    message: 'give a materials price, an installed price or both',
  })

/** A change in a draft; the whole is checked again once it is merged. An item keeps its key. */
export const priceItemPatchSchema = z.strictObject(priceItemFieldsSchema.shape).omit({ key: true }).partial()

export const priceItemSchema = priceItemFieldsSchema.safeExtend({
  /** Version of this row, for If-Match while a draft is edited. */
  rowVersion: versionSchema,
  /** Read for a region: the prices are that region's own row, not the base row by its factors. */
  isRegionsOwn: z.boolean().optional(),
})

export const regionSchema = z.strictObject({
  key: keySchema,
  name: nameSchema,
  materialsFactor: z.number().min(0.2).max(5),
  laborFactor: z.number().min(0.2).max(5),
  salesTaxRule: z.enum(['none', 'materials', 'whole-contract']),
  salesTaxPercent: percentSchema,
})

/** A region as one version of the book has it, with the row's version for If-Match. */
export const priceRegionSchema = regionSchema.extend({ rowVersion: versionSchema })
export const regionPatchSchema = regionSchema.omit({ key: true }).partial()
export const publishSchema = z.strictObject({ note: noteSchema.trim().min(1, 'Say what changed.'), effectiveDate: isoDateSchema })

export const priceBookVersionSchema = z.object({
  version: versionSchema,
  status: z.enum(['draft', 'published']),
  note: noteSchema,
  effectiveDate: isoDateSchema.nullable(),
  publishedAt: z.string().nullable(),
  publishedBy: z.string().nullable(),
  itemCount: z.int(),
  /** For a draft: rows that differ from the version before. */
  changeCount: z.int(),
})

export type PriceItemFields = z.infer<typeof priceItemFieldsSchema>
export type PriceItem = z.infer<typeof priceItemSchema>
export type PriceItemPatch = z.infer<typeof priceItemPatchSchema>
export type PriceRegion = z.infer<typeof priceRegionSchema>
export type RegionPatch = z.infer<typeof regionPatchSchema>
export type Region = z.infer<typeof regionSchema>
export type PriceBookVersion = z.infer<typeof priceBookVersionSchema>
