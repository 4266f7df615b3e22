import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { Basis } from '../../schemas/estimate.ts'
import { contingencyFormula, overheadFormula, taxFormula, totalFormula } from './adderFormulas.ts'
import { basisWords } from './basisWords.ts'
import { ESTIMATE_COLUMN } from './estimateLayout.ts'
import { sumOfCents } from './lineSums.ts'
import { sumWhereFormula } from './moneyFormulas.ts'
import { TAX_RULE_CHOICES, taxRuleWords } from './settingsWords.ts'
import { live, number, text, type SheetDraft } from './sheetDraft.ts'
import { SUMMARY_COLUMN as COLUMN } from './summaryColumns.ts'
import type { SummaryParts } from './summaryParts.ts'
import type { WorkbookCell } from './workbookModel.ts'

const ENDS = ['low', 'likely', 'high'] as const
type End = (typeof ENDS)[number]
const AMOUNT_COLUMN = { low: ESTIMATE_COLUMN.amountLow, likely: ESTIMATE_COLUMN.amountLikely, high: ESTIMATE_COLUMN.amountHigh }

/** One row of the table: what a person may set, what it is taken on, and three named amounts. */
interface TotalsRow {
  label: string
  /** Its amounts are named `name_low`, `name_likely`, `name_high`. */
  name: string
  setting?: { name: string; cell: WorkbookCell }
  takenOn?: WorkbookCell
  formula(end: End): string
  cents: LowLikelyHigh
}

/** The totals, line by line from direct cost to the whole, each formula over the names of those before it. Returns the last row. */
export function setTotals(draft: SheetDraft, firstRow: number, parts: SummaryParts): number {
  draft.setRow(firstRow, COLUMN.label, [
    text('How the total is made', 'head'),
    text('Setting', 'head-right'),
    text('Taken on', 'head'),
    text('Low', 'head-right'),
    text('Likely', 'head-right'),
    text('High', 'head-right'),
  ])
  const rows = totalsRows(parts)
  rows.forEach(({ label, name, setting, takenOn, formula, cents }, index) => {
    const row = firstRow + 1 + index
    const isSum = name === 'direct' || name === 'total'
    const blank = text('', isSum ? SUM_STYLE[name].label : 'text')
    draft.setRow(row, COLUMN.label, [text(label, isSum ? SUM_STYLE[name].label : 'label'), blank, takenOn ?? blank])
    if (setting) draft.setNamed(setting.name, row, COLUMN.setting, setting.cell)
    for (const end of ENDS) {
      draft.setNamed(`${name}_${end}`, row, COLUMN[end], live(formula(end), cents[end] / 100, isSum ? SUM_STYLE[name].money : 'money'))
    }
    if (name === 'tax') {
      draft.names.push({ name: 'tax_rule', sheet: draft.name, row, column: COLUMN.takenOn })
      draft.offer({ row, column: COLUMN.takenOn, choices: TAX_RULE_CHOICES, message: `Write one of: ${TAX_RULE_CHOICES.join(', ')}.` })
    }
  })
  return firstRow + rows.length
}

const SUM_STYLE = {
  direct: { label: 'foot-label', money: 'foot-money' },
  total: { label: 'total-label', money: 'total-money' },
} as const

function totalsRows({ whole: { estimate }, results: { totals }, lines, layout }: SummaryParts): TotalsRow[] {
  const { settings } = estimate
  const byBasis = (basis: Basis) => (end: End) =>
    sumWhereFormula(layout.range(AMOUNT_COLUMN[end]), [[layout.range(ESTIMATE_COLUMN.basis), `"${basisWords(basis)}"`]])
  return [
    {
      label: 'Materials for own hands',
      name: 'own_hands',
      formula: byBasis('own-hands'),
      cents: sumOfCents(lines.filter(({ line }) => line.basis === 'own-hands')),
    },
    {
      label: 'Hired work',
      name: 'hired',
      formula: byBasis('hired'),
      cents: sumOfCents(lines.filter(({ line }) => line.basis === 'hired')),
    },
    { label: 'Direct cost', name: 'direct', formula: (end) => layout.foot(AMOUNT_COLUMN[end]), cents: totals.directCents },
    {
      label: 'Overhead and profit, %',
      name: 'overhead',
      setting: { name: 'overhead_percent', cell: number(settings.overheadAndProfitPercent, 'input-percent') },
      takenOn: text('hired work'),
      formula: overheadFormula,
      cents: totals.overheadAndProfitCents,
    },
    {
      label: 'Sales tax, %',
      name: 'tax',
      setting: { name: 'tax_percent', cell: number(settings.salesTax.percent, 'input-percent') },
      takenOn: text(taxRuleWords(settings.salesTax.rule), 'input-text'),
      formula: taxFormula,
      cents: totals.salesTaxCents,
    },
    {
      label: 'Permits',
      name: 'permits',
      setting: { name: 'permits_amount', cell: number(settings.permitsCents / 100, 'input-money') },
      takenOn: text('fixed sum'),
      formula: () => 'permits_amount',
      cents: totals.permitsCents,
    },
    contingencyRow(settings.contingency, totals.contingencyCents),
    { label: 'Total', name: 'total', formula: totalFormula, cents: totals.totalCents },
  ]
}

function contingencyRow(contingency: SummaryParts['whole']['estimate']['settings']['contingency'], cents: LowLikelyHigh): TotalsRow {
  const row = { name: 'contingency', formula: (end: End) => contingencyFormula(contingency.method, end), cents }
  if (contingency.method === 'fixed') {
    const setting = { name: 'contingency_amount', cell: number(contingency.amountCents / 100, 'input-money') }
    return { ...row, label: 'Contingency', setting, takenOn: text('fixed sum') }
  }
  const setting = { name: 'contingency_percent', cell: number(contingency.percent, 'input-percent') }
  return { ...row, label: 'Contingency, %', setting, takenOn: text('everything above') }
}
