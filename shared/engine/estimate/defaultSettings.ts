import type { EstimateSettings } from '../../schemas/estimate.ts'

/** What an estimate starts from, and what a document's settings leave out. */
export const defaultSettings: EstimateSettings = {
  overheadAndProfitPercent: 20,
  salesTax: { rule: 'none', percent: 0 },
  permitsCents: 0,
  contingency: { method: 'percent', percent: 10 },
  ends: 'one-in-ten',
  evidence: {
    seen: { spread: 1.5, quantityPercent: 12 },
    measured: { spread: 1, quantityPercent: 3 },
    tested: { spread: 0.7, quantityPercent: 3 },
    bid: { spread: 0.15, quantityPercent: 0 },
  },
  correlation: { overall: 0.25, withinTrade: 0.5 },
  draws: 10_000,
}
