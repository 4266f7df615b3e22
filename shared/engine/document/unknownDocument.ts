import { z } from 'zod'
import { nameSchema } from '../../schemas/common.ts'
import { amountField, amountRangeField } from './documentFields.ts'
import { documentKey } from './documentKey.ts'

/** Something that may turn out to cost: kept with the estimate, and in no total. */
export const unknownDocument = z.strictObject({
  key: documentKey,
  description: nameSchema,
  system: documentKey,
  chance: z.number().min(0, 'must not be negative').max(1, 'must be at most 1'),
  cost: amountRangeField,
})

/** What would settle unknowns, and what it costs. */
export const inspectionDocument = z.strictObject({
  key: documentKey,
  description: nameSchema,
  cost: amountField,
  settles: z.array(documentKey).max(200),
})
