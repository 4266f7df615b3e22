import type { AddedHouse, HouseFields } from '../../shared/schemas/house.ts'
import { addPriceBook } from './addPriceBook.ts'
import type { TestApp } from './buildTestApp.ts'
import { BUILDER, domainOf } from './domainOf.ts'

/** What a person keys of a house of 40 by 25 feet. Name only the field that matters. */
export function keyedHouse(fields: Partial<HouseFields> = {}): HouseFields {
  return {
    name: '3 Sample Row',
    address: '3 Sample Row, Plainville',
    regionKey: 'plain',
    yearBuilt: 1931,
    storeys: 1,
    kind: 'detached',
    footprint: { kind: 'rectangle', lengthIn: 480, widthIn: 300 },
    wallHeightIn: 96,
    overhangIn: 12,
    roof: [{ kind: 'gable', rise: 6 }],
    note: '',
    ...fields,
  }
}

/** A house with its empty working estimate, at the newest price book; a small one is published where there is none. */
export function addHouse(app: TestApp, fields: Partial<HouseFields> = {}): AddedHouse {
  const domain = domainOf(app)
  const hasBook = domain.priceBook.listVersions().some(({ status }) => status === 'published')
  if (!hasBook) addPriceBook(app.db)
  return domain.houses.add(BUILDER, keyedHouse(fields))
}

/** Opens a house to an owner. */
export function shareHouse(app: TestApp, houseId: string, sharedBy: { id: string }, owner: { id: string }): void {
  domainOf(app).shares.share({ ...BUILDER, id: sharedBy.id }, houseId, owner.id)
}
