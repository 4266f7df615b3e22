import { formatUnitPrice } from '../../../../shared/engine/index.ts'
import type { GridRow } from '../../../composables/estimateRows.ts'
import { bookPrice } from '../../../composables/keyedPrice.ts'
import { element, setText } from './element.ts'
import { RowCell } from './RowCell.ts'

/** The price that counts; where somebody set it, the book's own stands before it. */
export class PriceCell extends RowCell {
  private readonly book = element('span', 'book-price')
  private readonly price = element('span', 'price')

  constructor() {
    super()
    this.box.append(this.book, this.price)
  }

  protected className(): string {
    return 'price-cell'
  }

  protected show(row: GridRow): void {
    if (row.kind !== 'line') {
      setText(this.book, '')
      setText(this.price, '')
      return
    }
    const { override } = row.fields
    const price = row.figures.unitPriceE4
    const book = bookPrice(row)
    this.box.classList.toggle('is-own', override !== null)
    this.box.classList.toggle('has-error', price === null)
    setText(this.book, override !== null && book !== null ? `${formatUnitPrice(book.likely)} →` : '')
    setText(this.price, price === null ? 'no price' : formatUnitPrice(price.likely))
    this.box.title = row.wrong.override?.words ?? (override === null ? '' : `Own price in place of the book’s: ${override.reason}`)
  }
}
