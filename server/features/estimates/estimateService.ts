import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Estimate, EstimatePatch, EstimateWhole } from '../../../shared/schemas/estimate.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Queryable } from '../../db/client.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { notFound, stale } from '../../errors/AppError.ts'
import type { EstimateKeeper } from './estimateKeeper.ts'
import { findEstimate, updateEstimateFields } from './estimateRepository.ts'
import { openEstimateHead } from './openEstimateHead.ts'

export type EstimateService = ReturnType<typeof createEstimateService>

export function createEstimateService({ db, clock, keeper }: { db: Database; clock: Clock; keeper: EstimateKeeper }) {
  function estimateOf(tx: Queryable, id: string): Estimate {
    const estimate = findEstimate(tx, id)
    if (!estimate) throw notFound('estimate')
    return estimate
  }

  return {
    /** Estimate, house, rooms and lines in one, as JSON text that is sent as it stands. */
    readWholeText(user: CurrentUser, id: string): { text: string; version: number } {
      const { version } = openEstimateHead(db, user, id)
      const text = keeper.readWholeText(id)
      if (text === null) throw notFound('estimate')
      return { text, version }
    },

    /** The same as an object, for what is made of it: summary, document, workbook. */
    readWhole(user: CurrentUser, id: string): EstimateWhole {
      openEstimateHead(db, user, id)
      return keeper.readWhole(id)
    },

    /** Changes name and settings. Of the settings, what is left out stays as it is. */
    update(user: CurrentUser, id: string, { name, settings }: EstimatePatch, ifMatch: number): Estimate {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, id)
        const before = estimateOf(tx, id)
        if (before.version !== ifMatch) throw stale(before)
        const merged = { name: name ?? before.name, settings: { ...before.settings, ...settings } }
        updateEstimateFields(tx, id, merged)
        keeper.refresh(head, (live) => live.setSettings(merged.settings))
        const after = estimateOf(tx, id)
        recordAudit(tx, {
          actorId: user.id,
          what: 'estimate',
          id,
          action: 'update',
          before: settingsOf(before),
          after: settingsOf(after),
          at: clock(),
        })
        return after
      })
    },
  }
}

function settingsOf({ name, settings }: Estimate): Pick<Estimate, 'name' | 'settings'> {
  return { name, settings }
}
