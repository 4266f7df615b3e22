import type { Database } from '../../server/db/client.ts'
import { loadPriceBook, type PriceBookContent } from '../../server/features/price-book/loadPriceBook.ts'
import type { Region } from '../../shared/schemas/priceItem.ts'
import { keyedPriceItem } from './keyedPriceItem.ts'
import { TEST_NOW } from './steppingClock.ts'

/** Where base prices hold as they stand. */
export const PLAIN_REGION: Region = {
  key: 'plain',
  name: 'Plain',
  materialsFactor: 1,
  laborFactor: 1,
  salesTaxRule: 'materials',
  salesTaxPercent: 8,
}
/** Where materials cost half as much again and labor twice as much. */
export const DEAR_REGION: Region = {
  key: 'dear',
  name: 'Dear',
  materialsFactor: 1.5,
  laborFactor: 2,
  salesTaxRule: 'whole-contract',
  salesTaxPercent: 5,
}

/** A door sold by the piece, hired alone. */
export const DOOR_ITEM = keyedPriceItem({
  key: 'inside-door/test-door',
  name: 'Test door',
  system: 'inside-doors',
  trade: 'carpentry',
  unit: 'each',
  uniformat: 'C1020',
  materials: null,
  installed: { low: 2_500_000, likely: 3_000_000, high: 4_000_000 },
  wastePercent: 0,
  packageSize: null,
  packageName: '',
  minimumChargeCents: 10_000,
  hoursPerUnit: 0,
  roomFormula: 'doors',
  houseFormula: null,
  note: 'Hung in the old frame.',
})

/** Publishes the next version of a small price book. Gives its number. */
export function addPriceBook(db: Database, content: Partial<PriceBookContent> = {}): number {
  return loadPriceBook(db, {
    regions: [PLAIN_REGION, DEAR_REGION],
    items: [keyedPriceItem(), DOOR_ITEM],
    note: 'Test prices',
    effectiveDate: '2026-01-15',
    publishedBy: 'Test keeper',
    at: TEST_NOW,
    ...content,
  })
}
