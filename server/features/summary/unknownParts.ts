import { z } from 'zod'
import { findHouseSystem } from '../../../shared/catalogue/houseSystems.ts'
import { parseCents } from '../../../shared/engine/index.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import type { SummaryUnknown } from '../../../shared/schemas/estimateSummary.ts'

/** An unknown as the estimate document has it: the estimate keeps it unread, so that nothing of it is lost. */
const documentUnknownSchema = z.object({
  description: z.string(),
  system: z.string().optional(),
  chance: z.number().min(0).max(1).optional(),
  cost: z.object({ low: z.string(), likely: z.string(), high: z.string() }).optional(),
})

/** The unknowns of an estimate in words for an owner. One that lacks even a description is left out. */
export function unknownParts(unknowns: readonly unknown[]): SummaryUnknown[] {
  return unknowns.flatMap((unknown) => {
    const read = documentUnknownSchema.safeParse(unknown)
    if (!read.success) return []
    const { description, system, chance, cost } = read.data
    return [
      {
        description,
        systemTitle: findHouseSystem(system ?? '')?.title ?? '',
        chancePercent: chance === undefined ? null : Math.round(chance * 100),
        costCents: cost ? costCents(cost) : null,
      },
    ]
  })
}

function costCents({ low, likely, high }: { low: string; likely: string; high: string }): LowLikelyHigh | null {
  const [least, usual, most] = [parseCents(low), parseCents(likely), parseCents(high)]
  return least.ok && usual.ok && most.ok ? { low: least.cents, likely: usual.cents, high: most.cents } : null
}
