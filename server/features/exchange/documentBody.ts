import { z } from 'zod'

/** Twice what an estimate of 10,000 lines with notes comes to, in bytes. */
export const DOCUMENT_BODY_LIMIT = 10_000_000

/** The engine reads the document and names each bad field; the border sees no more than that it is an object. */
export const documentBodySchema = z
  .record(z.string(), z.unknown())
  .describe('An estimate document, format `quoinbook.estimate` version 1. Unknown fields are refused by name.')
