import type { GridRow } from '../../../composables/estimateRows.ts'
import { setText } from './element.ts'
import { hoursText } from './figures.ts'
import { RowCell } from './RowCell.ts'

/** Hours of one's own hands. */
export class HoursCell extends RowCell {
  protected className(): string {
    return 'hours-cell'
  }

  protected show(row: GridRow): void {
    setText(this.box, hoursText(row.kind === 'line' ? row.figures.hours : row.hours))
  }
}
