import type { LineRow } from '../../../composables/lineRow.ts'
import type { GridRow } from '../../../composables/estimateRows.ts'
import { element, setText } from './element.ts'
import { quantityText } from './figures.ts'
import { RowCell } from './RowCell.ts'

const PLAIN_NUMBER = /^\d+(\.\d+)?$/

/** The formula as it was typed, what it measures where waste or packages add to that, and the quantity that is priced. */
export class QuantityCell extends RowCell {
  private readonly formula = element('code', 'formula')
  private readonly measured = element('span', 'measured')
  private readonly quantity = element('span', 'quantity')
  private readonly unit = element('span', 'unit')

  constructor() {
    super()
    this.box.append(this.formula, this.measured, this.quantity, this.unit)
  }

  protected className(): string {
    return 'quantity-cell'
  }

  protected show(row: GridRow): void {
    if (row.kind !== 'line') {
      this.say('', '', '', '')
      return
    }
    const { fields, figures, wrong } = row
    const problem = wrong.quantity?.words ?? figures.error?.message
    const typed = wrong.quantity?.text ?? fields.quantity
    this.box.classList.toggle('has-error', problem !== undefined)
    this.box.title = problem ?? spokenQuantity(row)
    if (problem !== undefined) this.say(typed, '', problem, '')
    else this.say(PLAIN_NUMBER.test(typed) ? '' : typed, measuredText(row), quantityText(figures.quantity), fields.unit)
  }

  private say(formula: string, measured: string, quantity: string, unit: string): void {
    setText(this.formula, formula)
    setText(this.measured, measured)
    setText(this.quantity, quantity)
    setText(this.unit, unit)
  }
}

function measuredText({ figures }: LineRow): string {
  const measured = quantityText(figures.measured)
  return measured === quantityText(figures.quantity) ? '' : `${measured} →`
}

function spokenQuantity({ fields, figures }: LineRow): string {
  const priced = `${quantityText(figures.quantity)} ${fields.unit}`
  return PLAIN_NUMBER.test(fields.quantity) ? priced : `${fields.quantity}: ${quantityText(figures.measured)} measured, ${priced} priced`
}
