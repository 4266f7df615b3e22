import type { CurrentUser } from '../../../shared/schemas/account.ts'
import {
  priceItemFieldsSchema,
  type PriceBookVersion,
  type PriceItem,
  type PriceItemFields,
  type PriceItemPatch,
  type PriceRegion,
  type RegionPatch,
} from '../../../shared/schemas/priceItem.ts'
import type { Clock } from '../../config/clock.ts'
import { afterCommit, inWriteTransaction, type Database, type Queryable, type Transaction } from '../../db/client.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, notFound, stale } from '../../errors/AppError.ts'
import { parseInput } from '../../http/parseInput.ts'
import type { EventHub } from '../events/eventHub.ts'
import { checkDraftItem } from './checkDraftItem.ts'
import { currentRow, dropInDraft, rowAsRead, saveInDraft, type ItemAddress } from './draftRows.ts'
import * as versions from './priceBookVersionRepository.ts'
import * as items from './priceItemRepository.ts'
import { columnsOfItem } from './priceItemRow.ts'
import * as regions from './priceRegionRepository.ts'

export type DraftService = ReturnType<typeof createDraftService>

/** The one draft of the price book: begun, edited, then published or dropped. Published rows are never touched by it. */
export function createDraftService({ db, clock, events }: { db: Database; clock: Clock; events: EventHub }) {
  /** Writes in the draft as one transaction. Throws 409 when there is no draft, or no longer. */
  function inDraft<T>(write: (tx: Transaction, draft: number) => T extends Promise<unknown> ? never : T): T {
    return inWriteTransaction<T>(db, (tx) => {
      const draft = versions.findDraftVersion(tx)
      if (draft === null) {
        throw conflict(
          'no-draft',
          'There is no draft of the price book: it was published or dropped, or nobody has started one. Start a draft to change prices.',
        )
      }
      announce(draft)
      return write(tx, draft)
    })
  }

  function announce(version: number): void {
    afterCommit(db, () => events.publish({ type: 'price-book', id: String(version), version }))
  }

  function audit(tx: Queryable, user: CurrentUser, what: string, id: string, action: string, before: unknown, after: unknown): void {
    recordAudit(tx, { actorId: user.id, what, id, action, before, after, at: clock() })
  }

  return {
    /** Begins the draft of the next version. Throws 409 when one is open. */
    start(user: CurrentUser): PriceBookVersion {
      return inWriteTransaction(db, (tx) => {
        const open = versions.findDraftVersion(tx)
        if (open !== null) throw conflict('draft-open', `Version ${open} is already open as a draft. Publish or drop it first.`)
        const version = (versions.findNewestVersion(tx, 'any') ?? 0) + 1
        versions.insertDraft(tx, version, clock().toISOString())
        audit(tx, user, 'price-book', String(version), 'start', null, null)
        announce(version)
        return versionOf(tx, version)
      })
    },

    /** Throws the draft away with all that was changed in it. */
    drop(user: CurrentUser): void {
      inDraft((tx, draft) => {
        const before = versionOf(tx, draft)
        items.deleteItemsOfDraft(tx, draft)
        regions.deleteRegionsOfDraft(tx, draft)
        versions.deleteVersion(tx, draft)
        audit(tx, user, 'price-book', String(draft), 'drop', before, null)
      })
    },

    /** Makes the draft the newest version. Throws 409 when it differs in nothing from the version before. */
    publish(user: CurrentUser, { note, effectiveDate }: { note: string; effectiveDate: string }): PriceBookVersion {
      return inDraft((tx, draft) => {
        const isEmpty = versionOf(tx, draft).changeCount === 0
        if (isEmpty) throw conflict('empty-draft', 'The draft changes nothing. Change a price in it, or drop it.')
        items.endReplacedItems(tx, draft)
        regions.endReplacedRegions(tx, draft)
        versions.markPublished(tx, draft, { note, effectiveDate, publishedAt: clock().toISOString(), publishedBy: user.name })
        const published = versionOf(tx, draft)
        audit(tx, user, 'price-book', String(draft), 'publish', null, published)
        return published
      })
    },

    addItem(user: CurrentUser, fields: PriceItemFields, regionKey: string | null): PriceItem {
      return inDraft((tx, draft) => {
        const address = { key: fields.key, regionKey }
        checkDraftItem(tx, draft, fields, regionKey)
        const { own, older } = items.findDraftRow(tx, draft, regionKey, fields.key)
        const isThere = own === null ? older !== null : !own.isDropped
        if (isThere) throw conflict('key-taken', `The draft already has an item ${fields.key}. Choose another key.`)
        const rowVersion = (own?.rowVersion ?? 0) + 1
        const columns = { ...columnsOfItem(fields), rowVersion, isDropped: false }
        if (own) items.updateItemRow(tx, own.id, columns)
        else items.insertItemRow(tx, { ...columns, regionKey, fromVersion: draft })
        audit(tx, user, 'price-item', auditIdOf(address), 'add', null, fields)
        return { ...fields, rowVersion }
      })
    },

    /** Changes an item in the draft alone; the published row stays as it is. Throws 412 when somebody was quicker. */
    updateItem(user: CurrentUser, address: ItemAddress, patch: PriceItemPatch, ifMatch: number): PriceItem {
      return inDraft((tx, draft) => {
        const { row, before } = rowAsRead(tx, draft, address, ifMatch)
        const { rowVersion: _, ...fieldsBefore } = before
        const fields = parseInput(priceItemFieldsSchema, { ...fieldsBefore, ...patch })
        checkDraftItem(tx, draft, fields, address.regionKey)
        const rowVersion = row.rowVersion + 1
        saveInDraft(tx, draft, row, { ...columnsOfItem(fields), rowVersion })
        audit(tx, user, 'price-item', auditIdOf(address), 'update', fieldsBefore, fields)
        return { ...fields, rowVersion }
      })
    },

    /** Ends an item with the draft, and with its base row the rows that regions have of it. */
    dropItem(user: CurrentUser, address: ItemAddress, ifMatch: number): void {
      inDraft((tx, draft) => {
        const { row, before } = rowAsRead(tx, draft, address, ifMatch)
        dropInDraft(tx, draft, row)
        const ownRegions = address.regionKey === null ? items.findRegionsOfItem(tx, draft, address.key) : []
        for (const regionKey of ownRegions) {
          const ofRegion = currentRow(tx, draft, { key: address.key, regionKey })
          if (ofRegion) dropInDraft(tx, draft, ofRegion)
        }
        audit(tx, user, 'price-item', auditIdOf(address), 'drop', before, null)
      })
    },

    updateRegion(user: CurrentUser, key: string, patch: RegionPatch, ifMatch: number): PriceRegion {
      return inDraft((tx, draft) => {
        const before = regions.findRegion(tx, draft, key)
        if (!before) throw notFound('region')
        if (before.rowVersion !== ifMatch) throw stale(before)
        const after = { ...before, ...patch, rowVersion: before.rowVersion + 1 }
        regions.saveDraftRegion(tx, draft, after)
        audit(tx, user, 'price-region', key, 'update', before, after)
        return after
      })
    },
  }
}

function versionOf(tx: Queryable, version: number): PriceBookVersion {
  const found = versions.findVersion(tx, version)
  if (!found) throw notFound('version of the price book')
  return found
}

function auditIdOf({ key, regionKey }: ItemAddress): string {
  return regionKey === null ? key : `${key} in ${regionKey}`
}
