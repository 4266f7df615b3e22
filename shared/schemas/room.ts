import { z } from 'zod'
import { idSchema, lengthInSchema, LENGTH_MAX_IN, nameSchema, noteSchema, versionSchema } from './common.ts'

export const ROOM_CORNERS_MAX = 60
export const ROOM_OPENINGS_MAX = 60
export const OPENING_COUNT_MAX = 200

/** A point of a plan, `[x, y]` in inches. */
export const cornerSchema = z.tuple([z.number().min(-LENGTH_MAX_IN).max(LENGTH_MAX_IN), z.number().min(-LENGTH_MAX_IN).max(LENGTH_MAX_IN)])

export const rectangleShapeSchema = z.strictObject({
  kind: z.literal('rectangle'),
  lengthIn: lengthInSchema,
  widthIn: lengthInSchema,
})
/** A rectangle with one corner cut out. */
export const ellShapeSchema = z.strictObject({
  kind: z.literal('ell'),
  lengthIn: lengthInSchema,
  widthIn: lengthInSchema,
  cutLengthIn: lengthInSchema,
  cutWidthIn: lengthInSchema,
})
/** Corners in order, closed by itself. Whether walls cross is the engine's to say (`checkShape`). */
export const polygonShapeSchema = z.strictObject({
  kind: z.literal('polygon'),
  corners: z.array(cornerSchema).min(3, 'needs at least three corners').max(ROOM_CORNERS_MAX),
})
export const shapeSchema = z.discriminatedUnion('kind', [rectangleShapeSchema, ellShapeSchema, polygonShapeSchema])

export const ceilingSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('flat'), heightIn: lengthInSchema }),
  z.strictObject({ kind: z.literal('sloped'), lowIn: lengthInSchema, highIn: lengthInSchema }),
])

export const OPENING_KINDS = ['door', 'window', 'cased'] as const
export const openingSchema = z.strictObject({
  kind: z.enum(OPENING_KINDS),
  widthIn: lengthInSchema,
  heightIn: lengthInSchema,
  count: z.int().min(1).max(OPENING_COUNT_MAX),
  /** Off: the opening stays in `opening_area` but is not taken from `wall_area`. */
  fromWalls: z.boolean().default(true),
  /** Off: a door or cased opening is not taken from `base_length`. Windows never are. */
  fromBase: z.boolean().default(true),
})

export const DEDUCTION_KINDS = ['cabinets', 'tub', 'other'] as const
/** What covers wall or floor so that it isn't painted, floored or trimmed. */
export const deductionSchema = z.strictObject({
  kind: z.enum(DEDUCTION_KINDS),
  /** Along the wall. */
  widthIn: lengthInSchema,
  heightIn: lengthInSchema,
  /** Out from the wall. */
  depthIn: lengthInSchema,
  count: z.int().min(1).max(OPENING_COUNT_MAX),
  fromWalls: z.boolean().default(true),
  fromFloor: z.boolean().default(false),
  fromBase: z.boolean().default(true),
})

export const ROOM_USES = [
  'sleeping',
  'living',
  'dining',
  'kitchen',
  'bath',
  'hall',
  'laundry',
  'storage',
  'cellar',
  'attic',
  'other',
] as const

/** What a person keys of a room. */
export const roomFieldsSchema = z.strictObject({
  name: nameSchema,
  use: z.enum(ROOM_USES),
  shape: shapeSchema,
  /** `null` while no ceiling height is keyed: the measures that need it are then errors, never zero. */
  ceiling: ceilingSchema.nullable(),
  openings: z.array(openingSchema).max(ROOM_OPENINGS_MAX),
  deductions: z.array(deductionSchema).max(ROOM_OPENINGS_MAX),
  note: noteSchema,
})
/** A new room. Below the named room; left out, at the end. */
export const newRoomSchema = roomFieldsSchema.extend({ afterRoomId: idSchema.nullable().optional() })
export const roomPatchSchema = roomFieldsSchema.partial()
export const roomSchema = roomFieldsSchema.extend({
  id: idSchema,
  houseId: idSchema,
  position: z.int(),
  version: versionSchema,
})
/** Its lines are removed with a room; restoring the room brings them back. */
export const removedRoomSchema = z.object({ room: roomSchema, removedLineIds: z.array(idSchema) })

export type Corner = z.infer<typeof cornerSchema>
export type Shape = z.infer<typeof shapeSchema>
export type Ceiling = z.infer<typeof ceilingSchema>
export type Opening = z.infer<typeof openingSchema>
export type Deduction = z.infer<typeof deductionSchema>
export type RoomUse = (typeof ROOM_USES)[number]
export type RoomFields = z.infer<typeof roomFieldsSchema>
export type NewRoom = z.infer<typeof newRoomSchema>
export type RoomPatch = z.infer<typeof roomPatchSchema>
export type Room = z.infer<typeof roomSchema>
export type RemovedRoom = z.infer<typeof removedRoomSchema>
