import { z } from 'zod'
import { keySchema, nameSchema, noteSchema } from '../../schemas/common.ts'
import { HOUSE_KINDS, houseFieldsSchema, STOREYS_MAX, YEAR_BUILT_MAX, YEAR_BUILT_MIN, type HouseFields } from '../../schemas/house.ts'
import { roofShares } from '../takeoff/roofShares.ts'
import { lengthField, lengthOrZeroField } from './documentFields.ts'
import { shapeDocument } from './shapeDocument.ts'

/** What a document says of a house; the region may be left out. */
export type KeyedHouse = Omit<HouseFields, 'regionKey'> & { regionKey: string | null }

const OVERHANG_MAX_IN = 120

export const houseDocument = z
  .strictObject({
    name: nameSchema,
    address: z.string().trim().max(200).default(''),
    region: keySchema.nullish(),
    yearBuilt: z.int().min(YEAR_BUILT_MIN).max(YEAR_BUILT_MAX).nullish(),
    storeys: z.number().min(1).max(STOREYS_MAX).multipleOf(0.5).default(1),
    kind: z.enum(HOUSE_KINDS).default('other'),
    footprint: shapeDocument.nullish(),
    wallHeight: lengthField.nullish(),
    overhang: lengthOrZeroField.nullish(),
    roof: houseFieldsSchema.shape.roof.default([]),
    note: noteSchema.default(''),
  })
  .superRefine(({ roof, overhang }, context) => {
    if (roof.length > 0 && roofShares(roof) === null) {
      context.addIssue({
        code: 'custom',
        path: ['roof'],
        message: 'the shares of its groups must come to 100 percent',
        params: { code: 'bad-shares' },
      })
    }
    if ((overhang ?? 0) > OVERHANG_MAX_IN) {
      context.addIssue({ code: 'custom', path: ['overhang'], message: 'must be at most 10 feet', params: { code: 'too-big' } })
    }
  })
  .transform(({ name, address, region, yearBuilt, storeys, kind, footprint, wallHeight, overhang, roof, note }): KeyedHouse => ({
    name,
    address,
    regionKey: region ?? null,
    yearBuilt: yearBuilt ?? null,
    storeys,
    kind,
    footprint: footprint ?? null,
    wallHeightIn: wallHeight ?? null,
    overhangIn: overhang ?? null,
    roof,
    note,
  }))
