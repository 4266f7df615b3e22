import { z } from 'zod'
import { percentSchema } from '../../schemas/common.ts'
import { estimateSettingsSchema, type EstimateSettings } from '../../schemas/estimate.ts'
import { defaultSettings } from '../estimate/defaultSettings.ts'
import { amountField } from './documentFields.ts'
import { noSuch } from './noSuch.ts'

const fields = estimateSettingsSchema.shape

const contingencyDocument = z.discriminatedUnion(
  'method',
  [
    z.strictObject({ method: z.literal('percent'), percent: percentSchema }),
    z.strictObject({ method: z.literal('fixed'), amount: amountField }),
    z.strictObject({ method: z.literal('careful-figure'), chance: z.number().min(0).max(1).optional() }).superRefine((_, context) => {
      const message = 'careful-figure needs simulated ranges, which this version does not compute; percent and fixed are available'
      context.addIssue({ code: 'custom', path: ['method'], message, params: { code: 'not-available' } })
    }),
  ],
  { error: noSuch('method', 'percent, fixed') },
)

/** The settings of a document over the firm's defaults: whatever is left out takes theirs. */
export const settingsDocument = z
  .strictObject({
    overheadAndProfitPercent: fields.overheadAndProfitPercent.optional(),
    salesTax: fields.salesTax.optional(),
    permits: amountField.optional(),
    contingency: contingencyDocument.optional(),
    ends: fields.ends.optional(),
    evidence: fields.evidence.partial().optional(),
    correlation: fields.correlation.partial().optional(),
    draws: fields.draws.optional(),
  })
  .transform(({ overheadAndProfitPercent, salesTax, permits, contingency, ends, evidence, correlation, draws }): EstimateSettings => ({
    overheadAndProfitPercent: overheadAndProfitPercent ?? defaultSettings.overheadAndProfitPercent,
    salesTax: salesTax ?? defaultSettings.salesTax,
    permitsCents: permits ?? defaultSettings.permitsCents,
    contingency: contingencyOf(contingency),
    ends: ends ?? defaultSettings.ends,
    evidence: { ...defaultSettings.evidence, ...evidence },
    correlation: { ...defaultSettings.correlation, ...correlation },
    draws: draws ?? defaultSettings.draws,
  }))

function contingencyOf(keyed: z.output<typeof contingencyDocument> | undefined): EstimateSettings['contingency'] {
  if (keyed?.method === 'percent') return keyed
  return keyed?.method === 'fixed' ? { method: 'fixed', amountCents: keyed.amount } : defaultSettings.contingency
}
