import type { GroupRow } from '../../../composables/estimateRows.ts'
import { element, setText } from './element.ts'
import { amountText, hoursText } from './figures.ts'
import { RowCell, type GridCellParams } from './RowCell.ts'

/** The head of a group, over the whole width: its name, how many lines it has and what they come to. */
export class GroupHead extends RowCell {
  private readonly fold = element('span', 'fold')
  private readonly title = element('span', 'title')
  private readonly count = element('span', 'count')
  private readonly hours = element('span', 'hours')
  private readonly spread = element('span', 'spread')
  private readonly amount = element('span', 'amount')

  constructor() {
    super()
    this.box.append(this.fold, this.title, this.count, this.hours, this.spread, this.amount)
    this.box.setAttribute('role', 'gridcell')
  }

  protected className(): string {
    return 'group-head'
  }

  protected show(row: GroupRow, _params: GridCellParams): void {
    const { low, likely, high } = row.amountCents
    const hours = hoursText(row.hours)
    this.box.setAttribute('aria-expanded', String(!row.isCollapsed))
    this.box.classList.toggle('is-collapsed', row.isCollapsed)
    setText(this.title, row.title)
    setText(this.count, row.lineCount === 1 ? '1 line' : `${row.lineCount} lines`)
    setText(this.hours, hours === '' ? '' : `${hours} h own hands`)
    setText(this.spread, `${amountText(low)} – ${amountText(high)}`)
    setText(this.amount, amountText(likely))
  }
}
