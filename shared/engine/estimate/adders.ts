import type { EstimateSettings } from '../../schemas/estimate.ts'
import { exactPercent, type Percent } from '../money/percentOf.ts'

/** What stands on top of the lines, its percentages read once for many totals. */
export interface Adders {
  overheadAndProfit: Percent
  salesTax: { rule: EstimateSettings['salesTax']['rule']; percent: Percent }
  permitsCents: number
  contingency: { method: 'percent'; percent: Percent } | { method: 'fixed'; amountCents: number }
}

export function addersOf({ overheadAndProfitPercent, salesTax, permitsCents, contingency }: EstimateSettings): Adders {
  return {
    overheadAndProfit: exactPercent(overheadAndProfitPercent),
    salesTax: { rule: salesTax.rule, percent: exactPercent(salesTax.percent) },
    permitsCents,
    contingency: contingency.method === 'fixed' ? contingency : { method: 'percent', percent: exactPercent(contingency.percent) },
  }
}
