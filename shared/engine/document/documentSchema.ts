import { z } from 'zod'
import { nameSchema, versionSchema } from '../../schemas/common.ts'
import { LINES_MAX } from '../../schemas/estimate.ts'
import { defaultSettings } from '../estimate/defaultSettings.ts'
import { houseDocument } from './houseDocument.ts'
import { lineDocument } from './lineDocument.ts'
import { roomDocument } from './roomDocument.ts'
import { settingsDocument } from './settingsDocument.ts'
import { inspectionDocument, unknownDocument } from './unknownDocument.ts'

export const DOCUMENT_FORMAT = 'quoinbook.estimate'
export const DOCUMENT_VERSION = 1

const ROOMS_MAX = 250
const UNKNOWNS_MAX = 500

/** An estimate document read: lengths in inches, money in whole cents and ten-thousandths of a dollar, defaults filled in. */
export const documentSchema = z.strictObject({
  format: exactly(DOCUMENT_FORMAT),
  version: exactly(DOCUMENT_VERSION),
  name: nameSchema.optional(),
  priceBookVersion: versionSchema.optional(),
  house: houseDocument,
  rooms: z.array(roomDocument).max(ROOMS_MAX).default([]),
  lines: z.array(lineDocument).max(LINES_MAX).default([]),
  unknowns: z.array(unknownDocument).max(UNKNOWNS_MAX).default([]),
  inspections: z.array(inspectionDocument).max(UNKNOWNS_MAX).default([]),
  settings: settingsDocument.default(defaultSettings),
})

function exactly<T extends string | number>(value: T) {
  return z.literal(value, {
    error: ({ input }) => (input === undefined ? 'is missing' : `must be ${JSON.stringify(value)}; nothing else is read here`),
  })
}

export type KeyedEstimate = z.output<typeof documentSchema>
