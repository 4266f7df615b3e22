import type { PriceItem } from '../../../shared/schemas/priceItem.ts'
import { isSame } from '../../composables/mergeFields.ts'
import { changedFields } from './priceBookChanges.ts'
import { cellText, type CellField, type EndName, type RangeName } from './itemFields.ts'
import type { HeldEdits } from './rowEdits.ts'

/** A row of the grid. A new object stands for a row that looks different, so that the grid redraws that row alone. */
export interface GridRow {
  item: PriceItem
  held: HeldEdits
  /** The row in the version before: `null` where the draft adds it, `undefined` where there is nothing to compare with. */
  before: PriceItem | null | undefined
}

/** Makes rows and gives the same object again while nothing in it has changed. */
export function createRowMaker() {
  const made = new Map<string, GridRow>()
  return function rowOf(item: PriceItem, held: HeldEdits, before: GridRow['before']): GridRow {
    const known = made.get(item.key)
    if (known && known.item === item && known.held === held && known.before === before) return known
    const row = { item, held, before }
    made.set(item.key, row)
    return row
  }
}

/** What the grid is told to add, change and take away. */
export interface RowTransaction {
  add: GridRow[]
  update: GridRow[]
  remove: GridRow[]
}

/** The step from one list of rows to the next, compared by identity. */
export function rowTransaction(before: readonly GridRow[], after: readonly GridRow[]): RowTransaction {
  const old = new Map(before.map((row) => [row.item.key, row]))
  const add: GridRow[] = []
  const update: GridRow[] = []
  for (const row of after) {
    const known = old.get(row.item.key)
    if (!known) add.push(row)
    else if (known !== row) update.push(row)
    old.delete(row.item.key)
  }
  return { add, update, remove: [...old.values()] }
}

/** Whether the draft changes what stands in a cell. */
export function isCellChanged({ item, before }: GridRow, field: CellField): boolean {
  if (!before) return false
  const [name, end] = field.split('.') as [keyof PriceItem, EndName | undefined]
  if (end === undefined) return !isSame(item[name], before[name])
  return item[name as RangeName]?.[end] !== before[name as RangeName]?.[end]
}

/** Whether the draft adds an item or changes anything of it. */
export function isRowChanged({ item, before }: GridRow): boolean {
  if (before === undefined) return false
  return before === null || (before.rowVersion !== item.rowVersion && changedFields(before, item).length > 0)
}

/** What stands in a cell: what was keyed while it is held, else the figure. */
export function shownText({ item, held }: GridRow, field: CellField): string {
  return held[field]?.text ?? cellText(item, field)
}
