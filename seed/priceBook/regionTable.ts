import type { PriceItemFields } from '../../shared/schemas/priceItem.ts'
import { priceItems } from './priceItems.ts'
import { readPrice, readTable } from './textTable.ts'

/** A region's own prices of an item, taken as they stand: the region's factors are not applied to them. */
export interface RegionItem {
  regionKey: string
  item: PriceItemFields
}

const baseItemByKey = new Map(priceItems.map((item) => [item.key, item]))

/**
 * A region's own rows, as a table in the form of `priceTable` with the columns `key | own hands | hired` and the reason below each row.
 * All else of the item is the base row's.
 *
 * @throws Error that names a key which the base rows don't have.
 */
export function regionTable(regionKey: string, priceDate: string, table: string): RegionItem[] {
  return readTable(table).map(({ cell, notes }) => {
    const base = baseItemByKey.get(cell('key'))
    if (!base) throw new Error(`Region table row ${cell('key')}: no such item among the base rows`)
    const materials = readPrice(cell('own hands'))
    const installed = readPrice(cell('hired'))
    return { regionKey, item: { ...base, materials, installed, priceDate, note: [base.note, ...notes].join(' ') } }
  })
}
