import type { PriceItem } from '../../../shared/schemas/priceItem.ts'
import type { Queryable } from '../../db/client.ts'
import { notFound, stale } from '../../errors/AppError.ts'
import * as items from './priceItemRepository.ts'
import { itemOfRow, type PriceItemRow } from './priceItemRow.ts'

/** An item by its key: the base row, or a region's own. */
export interface ItemAddress {
  key: string
  regionKey: string | null
}

/** The row that holds in the draft; `null` when there is none or the draft drops it. */
export function currentRow(tx: Queryable, draft: number, { key, regionKey }: ItemAddress): PriceItemRow | null {
  const { own, older } = items.findDraftRow(tx, draft, regionKey, key)
  if (own) return own.isDropped ? null : own
  return older
}

/** The row that a change was made against. Throws 404 when the draft has none, 412 with the item as it stands when somebody was quicker. */
export function rowAsRead(tx: Queryable, draft: number, address: ItemAddress, ifMatch: number): { row: PriceItemRow; before: PriceItem } {
  const row = currentRow(tx, draft, address)
  if (!row) throw notFound('price item')
  const before = itemOfRow(row)
  if (row.rowVersion !== ifMatch) throw stale(before)
  return { row, before }
}

/** The draft's own row is changed; an older one stays and gets a successor. */
export function saveInDraft(tx: Queryable, draft: number, row: PriceItemRow, columns: Partial<PriceItemRow>): void {
  const { id, ...rest } = row
  if (row.fromVersion === draft) items.updateItemRow(tx, id, columns)
  else items.insertItemRow(tx, { ...rest, ...columns, fromVersion: draft })
}

/** A row that only the draft has goes without a trace; an older one gets the draft's mark that it ends. */
export function dropInDraft(tx: Queryable, draft: number, row: PriceItemRow): void {
  const { older } = items.findDraftRow(tx, draft, row.regionKey, row.key)
  const isOfDraftAlone = older === null
  if (isOfDraftAlone) items.deleteItemRow(tx, row.id)
  else saveInDraft(tx, draft, row, { isDropped: true, rowVersion: row.rowVersion + 1 })
}
