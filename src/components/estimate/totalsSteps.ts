import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import type { EstimateSettings, Totals } from '../../../shared/schemas/estimate.ts'

export interface TotalsStep {
  key: string
  title: string
  cents: LowLikelyHigh
}

/** From the direct cost to the total: what is added, in its order, with what it is taken by. */
export function totalsSteps(totals: Totals, settings: EstimateSettings): TotalsStep[] {
  const { overheadAndProfitPercent, salesTax, contingency } = settings
  return [
    { key: 'direct', title: 'Direct', cents: totals.directCents },
    { key: 'overhead', title: `Overhead, profit ${overheadAndProfitPercent}%`, cents: totals.overheadAndProfitCents },
    { key: 'tax', title: salesTax.rule === 'none' ? 'No sales tax' : `Sales tax ${salesTax.percent}%`, cents: totals.salesTaxCents },
    { key: 'permits', title: 'Permits', cents: totals.permitsCents },
    {
      key: 'contingency',
      title: contingency.method === 'percent' ? `Contingency ${contingency.percent}%` : 'Contingency',
      cents: totals.contingencyCents,
    },
  ]
}
