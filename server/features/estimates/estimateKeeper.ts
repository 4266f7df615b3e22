import { openEstimate, toEstimateInput, type LiveEstimate } from '../../../shared/engine/index.ts'
import type { EstimateWhole, Totals } from '../../../shared/schemas/estimate.ts'
import type { Clock } from '../../config/clock.ts'
import { afterCommit, type Database } from '../../db/client.ts'
import type { EventHub } from '../events/eventHub.ts'
import { updateTotals, type EstimateHead } from './estimateRepository.ts'
import { createLiveEstimateCache } from './liveEstimateCache.ts'
import { prepareEstimateWhole } from './estimateWholeQuery.ts'

export interface KeptTotals {
  totals: Totals
  estimateVersion: number
}

export type EstimateKeeper = ReturnType<typeof createEstimateKeeper>

/** Keeps each estimate's totals true to its rows: every write to a house, a room or a line ends with it. */
export function createEstimateKeeper({ db, clock, events }: { db: Database; clock: Clock; events: EventHub }) {
  const cache = createLiveEstimateCache()
  const readWholeText = prepareEstimateWhole(db)

  /** Everything of an estimate as it stands, the open transaction's own writes included. */
  function readWhole(estimateId: string): EstimateWhole {
    const text = readWholeText(estimateId)
    if (text === null) throw new Error(`There is no estimate ${estimateId} to compute.`)
    return JSON.parse(text) as EstimateWhole
  }

  return {
    readWholeText,
    readWhole,

    /**
     * Computes an estimate anew after a write and keeps version, totals and count of errors, in the write's transaction.
     * `change` does to a live estimate what the write did to the rows; left out, the estimate is opened from the rows again.
     * The open transaction must have written its rows already.
     */
    refresh({ id, houseId, version }: EstimateHead, change?: (live: LiveEstimate) => void): KeptTotals {
      const cached = cache.take(id, version)
      const live = cached && change ? cached : openEstimate(toEstimateInput(readWhole(id)))
      if (live === cached) change?.(live)
      const totals = live.totals()
      const estimateVersion = version + 1
      updateTotals(db, id, { version: estimateVersion, totals, errorCount: live.errors().length, updatedAt: clock().toISOString() })
      // Only what is committed may be built on: after a rollback the live estimate is simply gone.
      afterCommit(db, () => {
        cache.put(id, estimateVersion, live)
        events.publish({ type: 'estimate', id, version: estimateVersion, houseId })
      })
      return { totals, estimateVersion }
    },
  }
}
