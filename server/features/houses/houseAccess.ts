import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { House } from '../../../shared/schemas/house.ts'
import { mayRole } from '../../../shared/access/permissions.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { notFound } from '../../errors/AppError.ts'
import type { MayHear } from '../events/eventHub.ts'
import { findHouse, isSharedWith } from './houseRepository.ts'

/** An owner knows the houses that are shared with them, everybody else knows all. */
export function isOpenTo(db: Queryable, user: CurrentUser, houseId: string): boolean {
  return user.role !== 'owner' || isSharedWith(db, houseId, user.id)
}

/** The house, when there is one and it is open to the person; 404 otherwise, which tells nothing of the two apart. */
export function openHouse(db: Queryable, user: CurrentUser, houseId: string): House {
  const house = isOpenTo(db, user, houseId) ? findHouse(db, houseId) : null
  if (!house) throw notFound('house')
  return house
}

/** Who hears of a change: whoever may read what has changed. */
export function mayHearOfChange(db: Database): MayHear {
  return (user, { type, houseId }) => {
    if (type === 'price-book') return mayRole(user.role, 'price-book.read')
    if (type === 'people') return mayRole(user.role, 'person.read')
    return houseId !== undefined && isOpenTo(db, user, houseId)
  }
}
