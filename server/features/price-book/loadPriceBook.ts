import type { PriceItemFields, Region } from '../../../shared/schemas/priceItem.ts'
import type { Queryable } from '../../db/client.ts'
import { findNewestVersion, insertDraft, markPublished } from './priceBookVersionRepository.ts'
import { endReplacedItems, insertItemRow } from './priceItemRepository.ts'
import { columnsOfItem } from './priceItemRow.ts'
import { endReplacedRegions, insertRegion } from './priceRegionRepository.ts'

export interface PriceBookContent {
  regions: readonly Region[]
  items: readonly PriceItemFields[]
  /** Rows that regions price themselves. */
  regionItems?: readonly { regionKey: string; item: PriceItemFields }[]
  note: string
  effectiveDate: string
  publishedBy: string
  at: string
}

/** Publishes all of a book's content as the next version, for a database that begins with one. Gives the version. */
export function loadPriceBook(
  tx: Queryable,
  { regions, items, regionItems = [], note, effectiveDate, publishedBy, at }: PriceBookContent,
): number {
  const version = (findNewestVersion(tx, 'any') ?? 0) + 1
  insertDraft(tx, version, at)
  for (const region of regions) insertRegion(tx, version, region, 1)
  for (const item of items) insertItemRow(tx, { ...columnsOfItem(item), regionKey: null, fromVersion: version, rowVersion: 1 })
  for (const { regionKey, item } of regionItems)
    insertItemRow(tx, { ...columnsOfItem(item), regionKey, fromVersion: version, rowVersion: 1 })
  endReplacedItems(tx, version)
  endReplacedRegions(tx, version)
  markPublished(tx, version, { note, effectiveDate, publishedAt: at, publishedBy })
  return version
}
