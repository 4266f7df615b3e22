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

/** Where there is no tax there is no percentage to give. */
const salesTaxDocument = z
  .strictObject({ rule: fields.salesTax.shape.rule, percent: percentSchema.optional() })
  .superRefine(({ rule, percent }, context) => {
    if (rule !== 'none' && percent === undefined)
      context.addIssue({ code: 'custom', path: ['percent'], message: 'is missing', params: { code: 'invalid-type' } })
  })
  .transform(({ rule, percent }): EstimateSettings['salesTax'] => ({ rule, percent: percent ?? 0 }))

const { seen, measured, tested, bid } = fields.evidence.shape
const evidenceDocument = z
  .strictObject({ seen: seen.partial(), measured: measured.partial(), tested: tested.partial(), bid: bid.partial() })
  .partial()

/** The settings of a document over the firm's defaults: whatever is left out takes theirs. */
export const settingsDocument = z
  .strictObject({
    overheadAndProfitPercent: fields.overheadAndProfitPercent.optional(),
    salesTax: salesTaxDocument.optional(),
    permits: amountField.optional(),
    contingency: contingencyDocument.optional(),
    ends: fields.ends.optional(),
    evidence: evidenceDocument.optional(),
    correlation: fields.correlation.partial().optional(),
    draws: fields.draws.optional(),
  })
  .transform(({ overheadAndProfitPercent, salesTax, permits, contingency, ends, evidence, correlation, draws }): EstimateSettings => ({
    overheadAndProfitPercent: overheadAndProfitPercent ?? defaultSettings.overheadAndProfitPercent,
    salesTax: salesTax ?? defaultSettings.salesTax,
    permitsCents: permits ?? defaultSettings.permitsCents,
    contingency: contingencyOf(contingency),
    ends: ends ?? defaultSettings.ends,
    evidence: evidenceOf(evidence),
    correlation: { ...defaultSettings.correlation, ...correlation },
    draws: draws ?? defaultSettings.draws,
  }))

function evidenceOf(keyed: z.output<typeof evidenceDocument> = {}): EstimateSettings['evidence'] {
  const { evidence } = defaultSettings
  return {
    seen: { ...evidence.seen, ...keyed.seen },
    measured: { ...evidence.measured, ...keyed.measured },
    tested: { ...evidence.tested, ...keyed.tested },
    bid: { ...evidence.bid, ...keyed.bid },
  }
}

function contingencyOf(keyed: z.output<typeof contingencyDocument> | undefined): EstimateSettings['contingency'] {
  if (keyed?.method === 'percent') return keyed
  return keyed?.method === 'fixed' ? { method: 'fixed', amountCents: keyed.amount } : defaultSettings.contingency
}
