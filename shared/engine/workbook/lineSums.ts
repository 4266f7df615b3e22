import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { WorkbookLine } from './workbookLines.ts'

type Figures = Pick<WorkbookLine, 'figures'>

/** Amounts of the lines that count, in cents. */
export function sumOfCents(lines: readonly Figures[]): LowLikelyHigh {
  const sum = { low: 0, likely: 0, high: 0 }
  for (const { figures } of lines) {
    if (!figures) continue
    sum.low += figures.amountCents.low
    sum.likely += figures.amountCents.likely
    sum.high += figures.amountCents.high
  }
  return sum
}

/** Own-hands hours of the lines that count, each with two decimals. */
export function sumOfHours(lines: readonly Figures[]): number {
  return lines.reduce((sum, { figures }) => sum + Math.round((figures?.hours ?? 0) * 100), 0) / 100
}
