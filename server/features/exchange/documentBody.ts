import { z } from 'zod'
import { documentSchema } from '../../../shared/engine/document/documentSchema.ts'

/** Twice what an estimate of 10,000 lines with notes comes to, in bytes. */
export const DOCUMENT_BODY_LIMIT = 10_000_000

const description = z.toJSONSchema(documentSchema, { io: 'input', unrepresentable: 'any' })

/** The engine reads the document and names each bad field; the border sees no more than that it is an object, and describes it by the engine's own schema. */
export const documentBodySchema = z
  .custom<Record<string, unknown>>((value) => typeof value === 'object' && value !== null && !Array.isArray(value), 'must be an object')
  .meta({ ...description, description: 'An estimate document, format `quoinbook.estimate` version 1. Unknown fields are refused by name.' })
