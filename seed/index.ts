import { systemClock, type Clock } from '../server/config/clock.ts'
import { inWriteTransaction, type Database, type Transaction } from '../server/db/client.ts'
import { recordAudit } from '../server/db/recordAudit.ts'
import { PASSWORD_COST } from '../server/features/accounts/passwordCost.ts'
import { createPasswordHasherHere } from '../server/features/accounts/passwordHasher.ts'
import { hasPeople, insertPerson } from '../server/features/accounts/personRepository.ts'
import { findFirm, saveFirm } from '../server/features/firm/firmRepository.ts'
import { loadPriceBook } from '../server/features/price-book/loadPriceBook.ts'
import { findNewestVersion } from '../server/features/price-book/priceBookVersionRepository.ts'
import { DEMO_PASSWORD } from './demoAccounts.ts'
import { demoAdmin, demoPeople } from './demoPeople.ts'
import { createHouseSeeder } from './houses/createHouseSeeder.ts'
import { demoHouses } from './houses/index.ts'
import { priceItems } from './priceBook/priceItems.ts'
import { regionItems } from './priceBook/regionItems.ts'
import { regions } from './priceBook/regions.ts'

export const DEMO_FIRM = 'Alder & Finch House Advisers'
const PEOPLE_SINCE = '2026-01-05T09:00:00.000Z'
const PRICE_BOOK = { effectiveDate: '2026-05-01', at: '2026-05-04T08:30:00.000Z' }

/** Whether the demo was written, or stood there already. */
export type SeedOutcome = 'seeded' | 'already-seeded'

export interface SeedOptions {
  /** For the audit rows; all else of the demo has dates of its own. */
  clock?: Clock
}

/**
 * Writes the demo into an empty database: firm, people, price book, three houses with their estimates, shares; all of it or nothing.
 * A database that holds the demo already stays as it is, with whatever was tried in it.
 *
 * @throws Error that names the database and what it holds, when it is neither empty nor a demo.
 */
export async function seedDemo(db: Database, { clock = systemClock }: SeedOptions = {}): Promise<SeedOutcome> {
  if (findFirm(db)?.isDemo === true) return 'already-seeded'
  refuseInUse(db)
  const passwordHash = await createPasswordHasherHere(PASSWORD_COST).hash(DEMO_PASSWORD)
  inWriteTransaction(db, (tx) => {
    refuseInUse(db)
    saveFirm(tx, { name: DEMO_FIRM, isDemo: true })
    addPeople(tx, passwordHash)
    const priceBookVersion = addPriceBook(tx)
    const addDemoHouse = createHouseSeeder(db, priceBookVersion)
    for (const demoHouse of demoHouses) addDemoHouse(tx, demoHouse)
    recordAudit(tx, {
      actorId: null,
      what: 'firm',
      id: DEMO_FIRM,
      action: 'seed-demo',
      before: null,
      after: { priceBookVersion },
      at: clock(),
    })
  })
  return 'seeded'
}

function refuseInUse(db: Database): void {
  const firm = findFirm(db)
  const holds = firm ? `the firm ${firm.name}` : hasPeople(db) ? 'accounts' : findNewestVersion(db, 'any') !== null ? 'a price book' : null
  if (holds !== null) {
    throw new Error(
      `The demo goes into an empty database or one that holds the demo already; ${db.$client.name} holds ${holds}. Nothing was written.`,
    )
  }
}

function addPeople(tx: Transaction, passwordHash: string): void {
  for (const person of demoPeople) insertPerson(tx, { ...person, status: 'active', passwordHash, at: PEOPLE_SINCE })
}

function addPriceBook(tx: Transaction): number {
  return loadPriceBook(tx, {
    regions,
    items: priceItems,
    regionItems,
    note: 'Demo: all invented. First book of Merrow County, from suppliers’ lists and bids of the spring.',
    publishedBy: demoAdmin.name,
    ...PRICE_BOOK,
  })
}
