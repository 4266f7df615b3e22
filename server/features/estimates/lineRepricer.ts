import type { Estimate, Line } from '../../../shared/schemas/estimate.ts'
import type { PriceRegion } from '../../../shared/schemas/priceItem.ts'
import type { Clock } from '../../config/clock.ts'
import type { Database, Queryable } from '../../db/client.ts'
import type { PriceBookService, PricedItem } from '../price-book/priceBookService.ts'
import { salesTaxOf } from './salesTaxOf.ts'
import { updateEstimateFields } from './estimateRepository.ts'
import { findLines, updateLine } from './lineRepository.ts'

export type LineRepricer = ReturnType<typeof createLineRepricer>

/** Reads the book's side of an estimate's lines again, at the version that it is pinned to. */
export function createLineRepricer({ db, clock, priceBook }: { db: Database; clock: Clock; priceBook: PriceBookService }) {
  return {
    /**
     * Prices an estimate for another region. What a person set stays: own prices, a minimum charge or a sales tax other than the old region's.
     * The caller refreshes the totals.
     */
    moveToRegion(tx: Queryable, estimate: Estimate, region: PriceRegion): void {
      const { id, priceBookVersion: version, settings } = estimate
      const oldRegion = priceBook.findRegion(tx, version, estimate.regionKey)
      const hasRegionsTax = oldRegion !== null && isSameTax(settings.salesTax, salesTaxOf(oldRegion))
      updateEstimateFields(tx, id, {
        regionKey: region.key,
        settings: hasRegionsTax ? { ...settings, salesTax: salesTaxOf(region) } : settings,
      })
      const at = clock().toISOString()
      for (const line of findLines(tx, id)) {
        if (line.itemKey === null) continue
        const priced = priceBook.findPricedItem(tx, version, region, line.itemKey)
        const before = oldRegion && priceBook.findPricedItem(tx, version, oldRegion, line.itemKey)
        if (priced) updateLine(db, repriced(line, before, priced), at)
      }
    },
  }
}

function repriced(line: Line, before: PricedItem | null, { prices }: PricedItem): Line {
  const hasBooksMinimum = line.minimumChargeCents === before?.prices.minimumChargeCents
  return {
    ...line,
    version: line.version + 1,
    book: { materials: prices.materials, installed: prices.installed },
    minimumChargeCents: hasBooksMinimum ? prices.minimumChargeCents : line.minimumChargeCents,
  }
}

function isSameTax(a: Estimate['settings']['salesTax'], b: Estimate['settings']['salesTax']): boolean {
  return a.rule === b.rule && a.percent === b.percent
}
