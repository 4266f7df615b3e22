import { readEstimateDocument, writeEstimateDocument, type EstimateDocument, type KeyedEstimate } from '../../../shared/engine/index.ts'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { AddedHouse, House } from '../../../shared/schemas/house.ts'
import { formulaTextSchema, type PriceRegion } from '../../../shared/schemas/priceItem.ts'
import type { Clock } from '../../config/clock.ts'
import { afterCommit, inWriteTransaction, type Database, type Queryable } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, invalid } from '../../errors/AppError.ts'
import { addEmptyEstimate } from '../estimates/addEmptyEstimate.ts'
import type { EstimateKeeper } from '../estimates/estimateKeeper.ts'
import type { EstimateService } from '../estimates/estimateService.ts'
import { insertLine } from '../estimates/lineRepository.ts'
import type { EventHub } from '../events/eventHub.ts'
import { insertHouse } from '../houses/houseRepository.ts'
import type { PriceBookService } from '../price-book/priceBookService.ts'
import { insertRoom } from '../rooms/roomRepository.ts'
import { lineRecords, roomRecords } from './keyedRecords.ts'

interface ExchangeParts {
  db: Database
  clock: Clock
  events: EventHub
  priceBook: PriceBookService
  keeper: EstimateKeeper
  estimates: EstimateService
}

export type ExchangeService = ReturnType<typeof createExchangeService>

/** Estimates out of the app and into it, as estimate documents. */
export function createExchangeService({ db, clock, events, priceBook, keeper, estimates }: ExchangeParts) {
  /** The version that a document names, when it is published here; else the newest. Its prices stand as the document has them in any case. */
  function pinnedVersion(tx: Queryable, named: number | undefined): number {
    const isPublishedHere = named !== undefined && priceBook.findVersionHead(tx, named)?.status === 'published'
    return isPublishedHere ? named : priceBook.newestPublished(tx)
  }

  /** The region that a document names, when the version has it; else the first. */
  function regionOf(tx: Queryable, version: number, named: string | null): PriceRegion {
    const regions = priceBook.findRegions(tx, version)
    const region = regions.find(({ key }) => key === named) ?? regions[0]
    if (!region) throw conflict('no-region', `Version ${version} of the price book has no region.`)
    return region
  }

  return {
    /** The document of an estimate and the name of its house. */
    exportDocument(user: CurrentUser, estimateId: string): { document: EstimateDocument; houseName: string; version: number } {
      const whole = estimates.readWhole(user, estimateId)
      return { document: writeEstimateDocument(whole), houseName: whole.house.name, version: whole.estimate.version }
    },

    /** Makes a house and its estimate of a document, all of it or nothing. Throws 422 with the paths of the document. */
    importDocument(user: CurrentUser, json: unknown): AddedHouse {
      const { document, keyed } = readOrRefuse(json)
      return inWriteTransaction(db, (tx) => {
        const priceBookVersion = pinnedVersion(tx, keyed.priceBookVersion)
        const region = regionOf(tx, priceBookVersion, keyed.house.regionKey)
        const at = clock().toISOString()
        const house: House = { ...keyed.house, regionKey: region.key, id: newId(), version: 1, createdAt: at, updatedAt: at }
        insertHouse(tx, house)
        const { records: rooms, idByKey } = roomRecords(keyed.rooms, house.id)
        for (const room of rooms) insertRoom(tx, room, at)
        // Unknowns and inspections are kept as they were written: nothing here reads them yet, and an export gives them back.
        const { unknowns, inspections } = document
        const { name, settings } = keyed
        const estimateId = addEmptyEstimate(tx, {
          houseId: house.id,
          name,
          regionKey: region.key,
          priceBookVersion,
          settings,
          unknowns,
          inspections,
          at,
        })
        for (const line of lineRecords(keyed.lines, estimateId, idByKey)) insertLine(db, line, at)
        keeper.refresh({ id: estimateId, houseId: house.id, version: 0, priceBookVersion, regionKey: region.key })
        const after = { house, roomCount: rooms.length, lineCount: keyed.lines.length }
        recordAudit(tx, { actorId: user.id, what: 'house', id: house.id, action: 'import', before: null, after, at: clock() })
        afterCommit(db, () => events.publish({ type: 'house', id: house.id, version: house.version, houseId: house.id }))
        return { house, estimateId }
      })
    },
  }
}

function readOrRefuse(json: unknown): { document: EstimateDocument; keyed: KeyedEstimate } {
  const read = readEstimateDocument(json)
  if (!read.ok) throw invalid(read.errors)
  refuseLongFormulas(read.keyed)
  return read
}

/** A formula that no line can hold; one that merely can't be computed comes in and is marked at its line. */
function refuseLongFormulas({ lines }: KeyedEstimate): void {
  const problems = lines.flatMap(({ quantity }, index) => {
    const checked = formulaTextSchema.safeParse(quantity)
    return checked.success
      ? []
      : [{ path: `lines[${index}].quantity`, code: 'bad-formula', message: checked.error.issues[0]?.message ?? 'is no formula' }]
  })
  if (problems.length > 0) throw invalid(problems)
}
