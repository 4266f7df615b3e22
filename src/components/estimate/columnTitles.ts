import type { CellColumn } from '../../composables/lineCells.ts'

/** Titles of the columns, in the grid's head and where one chooses which are shown. */
export const COLUMN_TITLES: Record<CellColumn, string> = {
  evidence: 'Known',
  description: 'Description',
  room: 'Room',
  quantity: 'Quantity',
  basis: 'By',
  price: 'Unit price',
  amount: 'Likely',
  range: 'Low to high',
  hours: 'Hours',
  note: 'Note',
}
