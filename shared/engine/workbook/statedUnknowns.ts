import { z } from 'zod'

/*
 * Unknowns and inspections are kept as the estimate document has them, and not reckoned with yet. What can be read of one is stated;
 * what can't is left to the document.
 */
const unknownSchema = z.object({
  key: z.string().optional(),
  description: z.string(),
  chance: z.number().optional(),
  cost: z.object({ low: z.coerce.string(), likely: z.coerce.string(), high: z.coerce.string() }).optional(),
})
const inspectionSchema = z.object({ description: z.string(), cost: z.coerce.string().optional(), settles: z.array(z.string()).optional() })

export interface Statement {
  description: string
  words: string
}

/** Each unknown in a sentence: "6 in 10 that it turns out so; then $2,500 to $9,000, likely $4,800." */
export function statedUnknowns(unknowns: readonly unknown[]): Statement[] {
  return readable(unknownSchema, unknowns).map(({ description, chance, cost }) => {
    const chanceWords = chance === undefined ? 'It may turn out so' : `${Math.round(chance * 100)} in 100 that it turns out so`
    const costWords = cost === undefined ? '' : `; then $${grouped(cost.low)} to $${grouped(cost.high)}, likely $${grouped(cost.likely)}`
    return { description, words: `${chanceWords}${costWords}.` }
  })
}

/** Each inspection, what it costs and which unknowns it would settle. */
export function statedInspections(inspections: readonly unknown[], unknowns: readonly unknown[]): Statement[] {
  const nameByKey = new Map(readable(unknownSchema, unknowns).map(({ key, description }) => [key, description]))
  return readable(inspectionSchema, inspections).map(({ description, cost, settles = [] }) => {
    const costWords = cost === undefined ? '' : `Costs $${grouped(cost)}. `
    const settled = settles.map((key) => nameByKey.get(key) ?? key)
    return { description, words: `${costWords}${settled.length > 0 ? `Would settle: ${settled.join('; ')}.` : ''}`.trim() }
  })
}

function readable<T>(schema: z.ZodType<T>, values: readonly unknown[]): T[] {
  return values.flatMap((value) => {
    const parsed = schema.safeParse(value)
    return parsed.success ? [parsed.data] : []
  })
}

/** `2500.00` → `2,500.00`: the decimal text as it was keyed, with commas. */
function grouped(decimal: string): string {
  const [whole = '', ...rest] = decimal.split('.')
  return [whole.replace(/\B(?=(?:\d{3})+$)/g, ','), ...rest].join('.')
}
