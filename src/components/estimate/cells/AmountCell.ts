import type { GridRow } from '../../../composables/estimateRows.ts'
import { setText } from './element.ts'
import { amountText } from './figures.ts'
import { RowCell } from './RowCell.ts'

/** The likely amount of a line, or of its group at the group's foot. */
export class AmountCell extends RowCell {
  protected className(): string {
    return 'amount-cell'
  }

  protected show(row: GridRow): void {
    const isLeftOut = row.kind === 'line' && row.figures.error !== null
    this.box.classList.toggle('has-error', isLeftOut)
    setText(this.box, isLeftOut ? 'left out' : amountOf(row))
  }
}

function amountOf(row: GridRow): string {
  if (row.kind === 'line') return amountText(row.figures.amountCents.likely)
  return row.groupKey === undefined ? '' : amountText(row.amountCents.likely)
}
