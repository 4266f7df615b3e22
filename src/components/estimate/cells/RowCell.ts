import type { ICellRendererComp, ICellRendererParams } from 'ag-grid-community'
import type { GridRow } from '../../../composables/estimateRows.ts'
import { element } from './element.ts'

export type GridCellParams = ICellRendererParams<GridRow>

/** A cell that draws itself once and then only changes what it says. */
export abstract class RowCell implements ICellRendererComp<GridRow> {
  protected readonly box = element('span', this.className())

  protected abstract className(): string
  /** Shows the row as it stands now; called first after `init`, then at each change. */
  protected abstract show(row: GridRow, params: GridCellParams): void

  init(params: GridCellParams): void {
    if (params.data) this.show(params.data, params)
  }

  refresh(params: GridCellParams): boolean {
    if (params.data) this.show(params.data, params)
    return true
  }

  getGui(): HTMLElement {
    return this.box
  }
}
