import { z } from 'zod'
import { amountRangeSchema } from './common.ts'
import { totalsSchema } from './estimate.ts'

const measuresSchema = z.record(z.string(), z.number())

/** One thing that kept a figure from being computed: where (`lines[3].quantity`), a stable code, and words to act on. */
export const resultErrorSchema = z.object({ path: z.string(), code: z.string(), message: z.string() })

export const lineResultSchema = z.object({
  key: z.string(),
  /** What the formula gave, before waste and packages. */
  measured: z.number(),
  /** As priced: with waste, in whole packages, to 2 decimals. */
  quantity: z.number(),
  amountCents: amountRangeSchema,
  /** Own-hands hours, to 2 decimals; 0 for hired work. */
  hours: z.number(),
})

/** The results form of the estimate document. Measures that can't be had are left out. */
export const estimateResultsSchema = z.object({
  engine: z.string(),
  house: measuresSchema,
  rooms: z.record(z.string(), measuresSchema),
  lines: z.array(lineResultSchema),
  totals: totalsSchema,
  errors: z.array(resultErrorSchema),
})

export type ResultError = z.infer<typeof resultErrorSchema>
export type LineResult = z.infer<typeof lineResultSchema>
export type EstimateResults = z.infer<typeof estimateResultsSchema>
