import { z } from 'zod'
import { NAME_MAX, nameSchema, noteSchema } from '../../schemas/common.ts'
import {
  DEDUCTION_KINDS,
  OPENING_COUNT_MAX,
  OPENING_KINDS,
  ROOM_OPENINGS_MAX,
  ROOM_USES,
  type Deduction,
  type Opening,
  type RoomFields,
  type RoomUse,
} from '../../schemas/room.ts'
import { lengthField } from './documentFields.ts'
import { documentKey } from './documentKey.ts'
import { ceilingDocument, shapeDocument } from './shapeDocument.ts'

/** A room of a document: what a person keys of it, and its key there. */
export type KeyedRoom = RoomFields & { key: string }

const count = z.int().min(1).max(OPENING_COUNT_MAX).default(1)

const openingDocument = z
  .strictObject({
    kind: z.enum(OPENING_KINDS),
    width: lengthField,
    height: lengthField,
    count,
    fromWalls: z.boolean().default(true),
    fromBase: z.boolean().default(true),
  })
  .transform(({ width, height, ...rest }): Opening => ({ ...rest, widthIn: width, heightIn: height }))

const deductionDocument = z
  .strictObject({
    kind: z.enum(DEDUCTION_KINDS),
    width: lengthField,
    height: lengthField,
    depth: lengthField,
    count,
    fromWalls: z.boolean().default(true),
    fromFloor: z.boolean().default(false),
    fromBase: z.boolean().default(true),
  })
  .transform(({ width, height, depth, ...rest }): Deduction => ({ ...rest, widthIn: width, heightIn: height, depthIn: depth }))

/** Other programs call a room what they will: a use that isn't known here is another kind of room, not a wrong document. */
const useField = z
  .string()
  .max(NAME_MAX)
  .default('other')
  .transform((use): RoomUse => ROOM_USES.find((known) => known === use.trim().toLowerCase()) ?? 'other')

export const roomDocument = z
  .strictObject({
    key: documentKey,
    name: nameSchema,
    use: useField,
    shape: shapeDocument,
    ceiling: ceilingDocument.nullish(),
    openings: z.array(openingDocument).max(ROOM_OPENINGS_MAX).default([]),
    deductions: z.array(deductionDocument).max(ROOM_OPENINGS_MAX).default([]),
    note: noteSchema.default(''),
  })
  .transform(({ ceiling, ...rest }): KeyedRoom => ({ ...rest, ceiling: ceiling ?? null }))
