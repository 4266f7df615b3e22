import type { Region } from '../../../shared/schemas/priceItem.ts'

export const TAX_RULE_OPTIONS: readonly { value: Region['salesTaxRule']; label: string }[] = [
  { value: 'none', label: 'nothing' },
  { value: 'materials', label: 'materials for own hands' },
  { value: 'whole-contract', label: 'the whole contract' },
]

/** What a region's sales tax is taken on, in words. */
export function taxRuleLabel(rule: Region['salesTaxRule']): string {
  return `taken on ${TAX_RULE_OPTIONS.find(({ value }) => value === rule)?.label ?? rule}`
}
