import type { EstimateSettings } from '../../schemas/estimate.ts'

const TAX_RULE_WORDS: Record<EstimateSettings['salesTax']['rule'], string> = {
  none: 'none',
  materials: 'materials',
  'whole-contract': 'whole contract',
}

/** How the sheets write a sales-tax rule; the tax formula looks for these words. */
export function taxRuleWords(rule: EstimateSettings['salesTax']['rule']): string {
  return TAX_RULE_WORDS[rule]
}

export const TAX_RULE_CHOICES = Object.values(TAX_RULE_WORDS)

/** What the ends of a range mean in this estimate. */
export function endsText(ends: EstimateSettings['ends']): string {
  return ends === 'one-in-ten'
    ? 'Low: one in ten pays less. High: one in ten pays more. Likely: the figure that comes up most often.'
    : 'Low and high are the least and the most that the work can cost. Likely: the figure that comes up most often.'
}

/** What the sales tax is taken on, by the region's rule. */
export function taxText({ rule, percent }: EstimateSettings['salesTax']): string {
  switch (rule) {
    case 'none':
      return 'No sales tax is added: the region taxes neither materials bought for own hands nor hired work, or its prices hold the tax already.'
    case 'materials':
      return `Sales tax of ${percent} % is taken on the materials bought for own hands. Hired prices hold their tax already.`
    case 'whole-contract':
      return `Sales tax of ${percent} % is taken on the materials bought for own hands and on hired work with its overhead and profit.`
  }
}

/** How the contingency is reckoned. */
export function contingencyText(contingency: EstimateSettings['contingency']): string {
  return contingency.method === 'percent'
    ? `Contingency is ${contingency.percent} % of everything before it. It is for what the walk-through could not see, not for wishes.`
    : 'Contingency is a fixed sum, the same at low, likely and high. It is for what the walk-through could not see, not for wishes.'
}
