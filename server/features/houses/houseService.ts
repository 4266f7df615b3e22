import { checkShape, defaultSettings, roofShares } from '../../../shared/engine/index.ts'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Estimate } from '../../../shared/schemas/estimate.ts'
import type { AddedHouse, House, HouseFields, HousePatch, HouseSummary } from '../../../shared/schemas/house.ts'
import type { PriceRegion } from '../../../shared/schemas/priceItem.ts'
import type { Clock } from '../../config/clock.ts'
import { afterCommit, inWriteTransaction, type Database, type Queryable } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, invalid, notFound, stale } from '../../errors/AppError.ts'
import { addEmptyEstimate } from '../estimates/addEmptyEstimate.ts'
import type { EstimateKeeper } from '../estimates/estimateKeeper.ts'
import { findWorkingEstimate } from '../estimates/estimateRepository.ts'
import type { LineRepricer } from '../estimates/lineRepricer.ts'
import { salesTaxOf } from '../estimates/salesTaxOf.ts'
import type { EventHub } from '../events/eventHub.ts'
import type { PriceBookService } from '../price-book/priceBookService.ts'
import { openHouse } from './houseAccess.ts'
import { findHouseEvenRemoved, findHouseSummaries, insertHouse, markHouseRemoved, updateHouse } from './houseRepository.ts'

interface HouseParts {
  db: Database
  clock: Clock
  events: EventHub
  priceBook: PriceBookService
  keeper: EstimateKeeper
  repricer: LineRepricer
}

export type HouseService = ReturnType<typeof createHouseService>

export function createHouseService({ db, clock, events, priceBook, keeper, repricer }: HouseParts) {
  function audit(tx: Queryable, user: CurrentUser, id: string, action: string, before: House | null, after: House | null): void {
    recordAudit(tx, { actorId: user.id, what: 'house', id, action, before, after, at: clock() })
    const version = (after ?? before)?.version ?? 1
    afterCommit(db, () => events.publish({ type: 'house', id, version, houseId: id }))
  }

  function regionOf(tx: Queryable, version: number, regionKey: string): PriceRegion {
    const region = priceBook.findRegion(tx, version, regionKey)
    if (!region) {
      throw invalid([{ path: 'regionKey', code: 'unknown-region', message: `is not a region of version ${version} of the price book` }])
    }
    return region
  }

  function workingEstimateOf(tx: Queryable, houseId: string): Estimate {
    const estimate = findWorkingEstimate(tx, houseId)
    if (!estimate) throw notFound('estimate of this house')
    return estimate
  }

  return {
    list(user: CurrentUser): HouseSummary[] {
      return findHouseSummaries(db, user.role === 'owner' ? user.id : null)
    },

    read(user: CurrentUser, id: string): House {
      return openHouse(db, user, id)
    },

    /** Adds a house and its working estimate: at the newest prices, with the firm's settings and the region's sales tax. */
    add(user: CurrentUser, fields: HouseFields): AddedHouse {
      checkMeasures(fields)
      return inWriteTransaction(db, (tx) => {
        const priceBookVersion = priceBook.newestPublished(tx)
        const region = regionOf(tx, priceBookVersion, fields.regionKey)
        const at = clock().toISOString()
        const house: House = { ...fields, id: newId(), version: 1, createdAt: at, updatedAt: at }
        insertHouse(tx, house)
        const settings = { ...defaultSettings, salesTax: salesTaxOf(region) }
        const estimateId = addEmptyEstimate(tx, { houseId: house.id, regionKey: region.key, priceBookVersion, settings, at })
        keeper.refresh({ id: estimateId, houseId: house.id, version: 0, priceBookVersion, regionKey: region.key })
        audit(tx, user, house.id, 'add', null, house)
        return { house, estimateId }
      })
    },

    /** Changes a house. With another region its estimate is priced for that, at the version that it is pinned to. */
    update(user: CurrentUser, id: string, patch: HousePatch, ifMatch: number): House {
      checkMeasures(patch)
      return inWriteTransaction(db, (tx) => {
        const before = openHouse(tx, user, id)
        if (before.version !== ifMatch) throw stale(before)
        const after: House = { ...before, ...patch, version: before.version + 1, updatedAt: clock().toISOString() }
        updateHouse(tx, after)
        const estimate = workingEstimateOf(tx, id)
        const isMoved = after.regionKey !== before.regionKey
        if (isMoved) repricer.moveToRegion(tx, estimate, regionOf(tx, estimate.priceBookVersion, after.regionKey))
        keeper.refresh(estimate, isMoved ? undefined : (live) => live.setHouse(after))
        audit(tx, user, id, 'update', before, after)
        return after
      })
    },

    /** Marks a house as removed; `restore` takes the mark away. */
    remove(user: CurrentUser, id: string, ifMatch: number): void {
      inWriteTransaction(db, (tx) => {
        const before = openHouse(tx, user, id)
        if (before.version !== ifMatch) throw stale(before)
        const at = clock().toISOString()
        markHouseRemoved(tx, { id, version: before.version + 1, updatedAt: at }, at)
        audit(tx, user, id, 'remove', before, null)
      })
    },

    restore(user: CurrentUser, id: string): House {
      return inWriteTransaction(db, (tx) => {
        const found = findHouseEvenRemoved(tx, id)
        if (!found) throw notFound('house')
        if (found.removedAt === null) throw conflict('not-removed', 'The house was not removed, or somebody has restored it already.')
        const after: House = { ...found.house, version: found.house.version + 1, updatedAt: clock().toISOString() }
        markHouseRemoved(tx, after, null)
        audit(tx, user, id, 'restore', null, after)
        return after
      })
    },
  }
}

/** Measures that no house can have are refused at their place; those that are still to be taken may wait. */
function checkMeasures({ footprint, roof }: HousePatch): void {
  const problems = footprint ? checkShape(footprint).map((problem) => ({ ...problem, path: pathBelow('footprint', problem.path) })) : []
  const hasBadShares = roof !== undefined && roof.length > 0 && roofShares(roof) === null
  if (hasBadShares) problems.push({ path: 'roof', code: 'bad-shares', message: 'the shares of its groups must come to 100 percent' })
  if (problems.length > 0) throw invalid(problems)
}

function pathBelow(field: string, path: string): string {
  return path === '' ? field : `${field}.${path}`
}
