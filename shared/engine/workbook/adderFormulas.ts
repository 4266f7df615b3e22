import type { EstimateSettings } from '../../schemas/estimate.ts'
import { percentFormula } from './moneyFormulas.ts'
import { taxRuleWords } from './settingsWords.ts'

type End = 'low' | 'likely' | 'high'

/*
 * The adders over named cells, in the order that CALCULATION gives them. The names are the contract with whoever reads the workbook by program:
 * overhead_percent, tax_rule, tax_percent, permits_amount, contingency_percent or contingency_amount go in; direct_low … total_high come out.
 */

/** Overhead and profit on hired work. */
export function overheadFormula(end: End): string {
  return percentFormula(`hired_${end}`, 'overhead_percent')
}

/** Sales tax by the rule that `tax_rule` names. */
export function taxFormula(end: End): string {
  const materials = `IF(tax_rule="${taxRuleWords('none')}",0,own_hands_${end})`
  const contract = `IF(tax_rule="${taxRuleWords('whole-contract')}",hired_${end}+overhead_${end},0)`
  return percentFormula(`(${materials}+${contract})`, 'tax_percent')
}

/** Contingency: a percentage of everything before it, or a fixed sum. */
export function contingencyFormula(method: EstimateSettings['contingency']['method'], end: End): string {
  if (method === 'fixed') return 'contingency_amount'
  return percentFormula(`(direct_${end}+overhead_${end}+tax_${end}+permits_${end})`, 'contingency_percent')
}

/** Everything together. */
export function totalFormula(end: End): string {
  return `ROUND(direct_${end}+overhead_${end}+tax_${end}+permits_${end}+contingency_${end},2)`
}
