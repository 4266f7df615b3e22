import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { HouseShare } from '../../../shared/schemas/sharing.ts'
import type { Clock } from '../../config/clock.ts'
import { afterCommit, inWriteTransaction, type Database, type Queryable } from '../../db/client.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { invalid, notFound } from '../../errors/AppError.ts'
import type { EventHub } from '../events/eventHub.ts'
import { openHouse } from '../houses/houseAccess.ts'
import * as repository from './shareRepository.ts'

export type ShareService = ReturnType<typeof createShareService>

/** Opens houses to owners, and closes them again. */
export function createShareService({ db, clock, events }: { db: Database; clock: Clock; events: EventHub }) {
  function audit(
    tx: Queryable,
    user: CurrentUser,
    houseId: string,
    action: string,
    before: HouseShare | null,
    after: HouseShare | null,
  ): void {
    recordAudit(tx, { actorId: user.id, what: 'house', id: houseId, action, before, after, at: clock() })
    const { version } = openHouse(tx, user, houseId)
    afterCommit(db, () => events.publish({ type: 'house', id: houseId, version, houseId }))
  }

  return {
    list(user: CurrentUser, houseId: string): HouseShare[] {
      openHouse(db, user, houseId)
      return repository.findShares(db, houseId)
    },

    /** Opens a house to an owner; one who has it already keeps it. Throws 422 for anybody who is no active owner. */
    share(user: CurrentUser, houseId: string, ownerId: string): HouseShare {
      return inWriteTransaction(db, (tx) => {
        openHouse(tx, user, houseId)
        const existing = repository.findShare(tx, houseId, ownerId)
        if (existing) return existing
        if (!repository.isActiveOwner(tx, ownerId)) {
          throw invalid([{ path: 'userId', code: 'not-an-owner', message: 'is not an active owner; invite them as an owner first' }])
        }
        repository.insertShare(tx, { houseId, userId: ownerId, sharedById: user.id, sharedAt: clock().toISOString() })
        const share = shareOf(tx, houseId, ownerId)
        audit(tx, user, houseId, 'share', null, share)
        return share
      })
    },

    unshare(user: CurrentUser, houseId: string, ownerId: string): void {
      inWriteTransaction(db, (tx) => {
        openHouse(tx, user, houseId)
        const share = shareOf(tx, houseId, ownerId)
        repository.deleteShare(tx, houseId, ownerId)
        audit(tx, user, houseId, 'unshare', share, null)
      })
    },
  }
}

function shareOf(tx: Queryable, houseId: string, ownerId: string): HouseShare {
  const share = repository.findShare(tx, houseId, ownerId)
  if (!share) throw notFound('share of this house')
  return share
}
