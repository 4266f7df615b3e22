import type { LineRow } from './lineRow.ts'

export interface SelectionSum {
  count: number
  sumCents: number
  /** To the cent, half away from zero. */
  averageCents: number
}

/** Sum, average and count of the likely amounts of lines; lines that the totals leave out count for nothing. */
export function selectionSum(rows: readonly LineRow[]): SelectionSum {
  const counted = rows.filter(({ figures }) => figures.error === null)
  const sumCents = counted.reduce((sum, { figures }) => sum + figures.amountCents.likely, 0)
  return { count: rows.length, sumCents, averageCents: counted.length === 0 ? 0 : Math.round(sumCents / counted.length) }
}
