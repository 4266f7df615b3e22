import type { Database, Transaction } from '../../server/db/client.ts'
import { positionAt } from '../../server/db/positions.ts'
import { addEmptyEstimate } from '../../server/features/estimates/addEmptyEstimate.ts'
import { createEstimateKeeper } from '../../server/features/estimates/estimateKeeper.ts'
import type { EstimateHead } from '../../server/features/estimates/estimateRepository.ts'
import { createLineMaker } from '../../server/features/estimates/lineMaker.ts'
import { insertLine } from '../../server/features/estimates/lineRepository.ts'
import { salesTaxOf } from '../../server/features/estimates/salesTaxOf.ts'
import { createEventHub } from '../../server/features/events/eventHub.ts'
import { insertHouse } from '../../server/features/houses/houseRepository.ts'
import { createPriceBookService } from '../../server/features/price-book/priceBookService.ts'
import { insertRoom } from '../../server/features/rooms/roomRepository.ts'
import { insertShare } from '../../server/features/sharing/shareRepository.ts'
import { defaultSettings } from '../../shared/engine/index.ts'
import { demoEstimator, demoOwner } from '../demoPeople.ts'
import type { DemoHouse } from './demoHouse.ts'
import { regions } from '../priceBook/regions.ts'

/** Writes demo houses by the server's own ways, so that their lines and totals are what the app would have made of the same entries. */
export function createHouseSeeder(db: Database, priceBookVersion: number) {
  const maker = createLineMaker({ priceBook: createPriceBookService({ db }) })

  return function addDemoHouse(tx: Transaction, demoHouse: DemoHouse): void {
    const at = `${demoHouse.walkedOn}T15:00:00.000Z`
    const houseId = demoHouse.key
    insertHouse(tx, { ...demoHouse.house, id: houseId, version: 1, createdAt: at, updatedAt: at })
    addRooms(tx, demoHouse, at)
    const head = addEstimate(tx, demoHouse, at, priceBookVersion)
    addLines(tx, demoHouse, head, at)
    const keeper = createEstimateKeeper({ db, clock: () => new Date(at), events: createEventHub() })
    keeper.refresh(head)
    if (demoHouse.isShared) insertShare(tx, { houseId, userId: demoOwner.id, sharedById: demoEstimator.id, sharedAt: at })
  }

  function addLines(tx: Transaction, demoHouse: DemoHouse, head: EstimateHead, at: string): void {
    demoHouse.lines.forEach(({ roomKey, quantity, ownWork, ...keyed }, index) => {
      const made = maker.make(tx, head, {
        ...keyed,
        ...ownWork,
        roomId: roomKey === null ? null : roomIdOf(demoHouse, roomKey),
        ...(quantity === null ? {} : { quantity }),
      })
      insertLine(
        db,
        { ...made, id: `${demoHouse.key}-line-${index + 1}`, estimateId: head.id, position: positionAt(index), version: 1 },
        at,
      )
    })
  }
}

function addRooms(tx: Transaction, demoHouse: DemoHouse, at: string): void {
  demoHouse.rooms.forEach(({ key, ...fields }, index) => {
    insertRoom(tx, { ...fields, id: roomIdOf(demoHouse, key), houseId: demoHouse.key, position: positionAt(index), version: 1 }, at)
  })
}

function addEstimate(
  tx: Transaction,
  { key, house, settings, unknowns, inspections }: DemoHouse,
  at: string,
  priceBookVersion: number,
): EstimateHead {
  const region = regions.find((known) => known.key === house.regionKey)
  if (!region) throw new Error(`Demo house ${key}: no region ${house.regionKey}`)
  const id = addEmptyEstimate(tx, {
    id: `${key}-estimate`,
    houseId: key,
    regionKey: region.key,
    priceBookVersion,
    settings: { ...defaultSettings, salesTax: salesTaxOf(region), ...settings },
    unknowns,
    inspections,
    at,
  })
  return { id, houseId: key, version: 0, priceBookVersion, regionKey: region.key }
}

function roomIdOf({ key }: DemoHouse, roomKey: string): string {
  return `${key}-${roomKey}`
}
