import type { LowLikelyHigh } from '../../../../shared/schemas/common.ts'
import type { GridRow } from '../../../composables/estimateRows.ts'
import { element } from './element.ts'
import { amountText } from './figures.ts'
import { RowCell } from './RowCell.ts'

/**
 * The range ribbon of a line: every ribbon of the column is drawn to twice its own likely amount, so that the ticks stand in one line and a wide ribbon
 * is an unsure figure, whatever the amount.
 */
export class RangeCell extends RowCell {
  private readonly rail = element('span', 'rail')
  private readonly toLikely = element('span', 'to-likely')
  private readonly toHigh = element('span', 'to-high')
  private readonly likely = element('span', 'likely')
  private shown = ''

  constructor() {
    super()
    this.box.append(this.rail, this.toLikely, this.toHigh, this.likely)
    this.box.setAttribute('role', 'img')
  }

  protected className(): string {
    return 'range-cell'
  }

  protected show(row: GridRow): void {
    const range = rangeOf(row)
    this.box.hidden = range === null
    if (range === null) return
    const { low, likely, high } = range
    const words = `${amountText(low)} to ${amountText(high)}, likely ${amountText(likely)}`
    if (words === this.shown) return
    this.shown = words
    this.box.title = words
    this.box.setAttribute('aria-label', words)
    const at = (cents: number) => Math.min(100, (cents / (likely * 2)) * 100)
    this.toLikely.style.cssText = `left:${at(low)}%;width:${50 - at(low)}%`
    this.toHigh.style.cssText = `left:50%;width:${at(high) - 50}%`
  }
}

function rangeOf(row: GridRow): LowLikelyHigh | null {
  const isShown = row.kind === 'line' ? row.figures.error === null : row.groupKey !== undefined
  return isShown && amounts(row).likely > 0 ? amounts(row) : null
}

function amounts(row: GridRow): LowLikelyHigh {
  return row.kind === 'line' ? row.figures.amountCents : row.amountCents
}
