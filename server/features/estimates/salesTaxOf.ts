import type { EstimateSettings } from '../../../shared/schemas/estimate.ts'
import type { Region } from '../../../shared/schemas/priceItem.ts'

/** A region's sales tax, as the settings of an estimate have it. */
export function salesTaxOf({
  salesTaxRule,
  salesTaxPercent,
}: Pick<Region, 'salesTaxRule' | 'salesTaxPercent'>): EstimateSettings['salesTax'] {
  return { rule: salesTaxRule, percent: salesTaxPercent }
}
