import type { CellColumn } from '../../composables/lineCells.ts'
import type { LineRow } from '../../composables/lineRow.ts'

/** The cell that a line's error is about. */
export function columnOfError({ figures }: LineRow): CellColumn {
  return figures.unitPriceE4 === null ? 'price' : 'quantity'
}
