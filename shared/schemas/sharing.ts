import { z } from 'zod'
import { idSchema, isoTimeSchema } from './common.ts'

/** A house opened to one owner. */
export const houseShareSchema = z.object({ userId: idSchema, name: z.string(), email: z.string(), sharedAt: isoTimeSchema })
export const newHouseShareSchema = z.strictObject({ userId: idSchema })

export type HouseShare = z.infer<typeof houseShareSchema>
