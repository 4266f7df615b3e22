import { regionalPrice, type RegionalPrice } from '../../../shared/engine/index.ts'
import type { SystemKey } from '../../../shared/catalogue/houseSystems.ts'
import type { PriceBookVersion, PriceItem, PriceRegion } from '../../../shared/schemas/priceItem.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { conflict, notFound } from '../../errors/AppError.ts'
import { findNewestVersion, findVersionHead, findVersions } from './priceBookVersionRepository.ts'
import { findItem, findItems, type BookVersion } from './priceItemRepository.ts'
import { findRegion, findRegions } from './priceRegionRepository.ts'
import { searchWords } from './searchWords.ts'

export interface ItemSearch {
  search?: string | undefined
  system?: SystemKey | undefined
  region?: string | undefined
  limit?: number | undefined
}

/** An item with the prices of one region. */
export interface PricedItem {
  item: PriceItem
  prices: RegionalPrice
}

export type PriceBookService = ReturnType<typeof createPriceBookService>

/** Reads the price book: versions, their regions and their items, with the prices of a region. */
export function createPriceBookService({ db }: { db: Database }) {
  function bookOf(tx: Queryable, version: number): BookVersion {
    const head = findVersionHead(tx, version)
    if (!head) throw notFound('version of the price book')
    return { version, isDraft: head.status === 'draft' }
  }

  return {
    listVersions(): PriceBookVersion[] {
      return findVersions(db)
    },

    listRegions(version: number): PriceRegion[] {
      return findRegions(db, bookOf(db, version).version)
    },

    /** Items of a version, all of them or those that the words, the system and the limit leave; at the prices of a region when one is named. */
    searchItems(version: number, { search = '', system, region: regionKey, limit }: ItemSearch): PriceItem[] {
      const book = bookOf(db, version)
      const items = findItems(db, book, { regionKey: null, system, words: searchWords(search), limit })
      if (regionKey === undefined) return items
      const region = findRegion(db, version, regionKey)
      if (!region) throw notFound('region in this version')
      const ownRows = new Map(findItems(db, book, { regionKey }).map((item) => [item.key, { ...item, isRegionsOwn: true }]))
      return items.map((item) => ownRows.get(item.key) ?? { ...item, ...regionalPrice(item, region) })
    },

    /** The version that a new estimate is pinned to. Throws 409 while nothing is published. */
    newestPublished(tx: Queryable): number {
      const version = findNewestVersion(tx, 'published')
      if (version === null) throw conflict('no-price-book', 'There is no published price book yet. An admin publishes the first version.')
      return version
    },

    findVersionHead,
    findRegion,
    findRegions,

    /** An item with what the region pays: by its own row, else the base row by the region's factors. `null` when the version has none. */
    findPricedItem(tx: Queryable, version: number, region: PriceRegion, key: string): PricedItem | null {
      const book = bookOf(tx, version)
      const own = findItem(tx, book, region.key, key)
      if (own) return { item: own, prices: pricesOf(own) }
      const base = findItem(tx, book, null, key)
      return base && { item: base, prices: regionalPrice(base, region) }
    },
  }
}

/** A region's own row holds its prices as they stand. */
function pricesOf({ materials, installed, minimumChargeCents }: PriceItem): RegionalPrice {
  return { materials, installed, minimumChargeCents }
}
