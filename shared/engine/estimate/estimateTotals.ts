import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { Totals } from '../../schemas/estimate.ts'
import { percentOf } from '../money/percentOf.ts'
import type { Adders } from './adders.ts'

/** Sums of the rounded lines, whole cents. */
export interface DirectSums {
  ownHandsCents: LowLikelyHigh
  hiredCents: LowLikelyHigh
}

type End = keyof LowLikelyHigh

/**
 * What comes on top of the lines, in this order: overhead and profit on hired work; sales tax on own-hands materials (`materials`), or on those, hired work and its overhead and profit
 * (`whole-contract`); permits; contingency, a percentage of everything before it or a fixed amount. Each percentage is taken on whole cents and rounded once, so each can be checked by hand.
 *
 * $1,000 own hands and $2,000 hired, 20 %, materials tax 8.25 %, permits $450, contingency 10 % → 3,000 + 400 + 82.50 + 450 + 393.25 = $4,325.75.
 */
export function estimateTotals({ ownHandsCents, hiredCents }: DirectSums, adders: Adders): Totals {
  const { overheadAndProfit, salesTax, permitsCents: permits, contingency } = adders
  const directCents = eachEnd((end) => ownHandsCents[end] + hiredCents[end])
  const overheadAndProfitCents = eachEnd((end) => percentOf(hiredCents[end], overheadAndProfit))
  const taxedCents = taxedBase(salesTax.rule, ownHandsCents, directCents, overheadAndProfitCents)
  const salesTaxCents = eachEnd((end) => percentOf(taxedCents[end], salesTax.percent))
  const permitsCents = eachEnd(() => permits)
  const beforeCents = eachEnd((end) => directCents[end] + overheadAndProfitCents[end] + salesTaxCents[end] + permits)
  const contingencyCents = eachEnd((end) =>
    contingency.method === 'fixed' ? contingency.amountCents : percentOf(beforeCents[end], contingency.percent),
  )
  const totalCents = eachEnd((end) => beforeCents[end] + contingencyCents[end])
  return { directCents, overheadAndProfitCents, salesTaxCents, permitsCents, contingencyCents, totalCents }
}

function taxedBase(
  rule: Adders['salesTax']['rule'],
  ownHands: LowLikelyHigh,
  direct: LowLikelyHigh,
  overheadAndProfit: LowLikelyHigh,
): LowLikelyHigh {
  if (rule === 'none') return eachEnd(() => 0)
  return rule === 'materials' ? ownHands : eachEnd((end) => direct[end] + overheadAndProfit[end])
}

function eachEnd(figure: (end: End) => number): LowLikelyHigh {
  return { low: figure('low'), likely: figure('likely'), high: figure('high') }
}
