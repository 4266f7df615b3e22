import type { CurrentUser, Person, PersonPatch } from '../../../shared/schemas/account.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Transaction } from '../../db/client.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, notFound, stale } from '../../errors/AppError.ts'
import type { EventHub } from '../events/eventHub.ts'
import {
  findPersonWithHash,
  hasOtherActiveAdmin,
  listActiveOwners,
  listPeople,
  updatePerson,
  type PersonWithHash,
} from './personRepository.ts'
import type { SessionService } from './sessionService.ts'

interface PersonParts {
  db: Database
  clock: Clock
  events: EventHub
  sessions: SessionService
}

/** The people of the firm: read, renamed, given another role, deactivated and taken back. */
export function createPersonService({ db, clock, events, sessions }: PersonParts) {
  return {
    list: () => listPeople(db),
    listOwners: () => listActiveOwners(db),

    /** Changes a person. A new role and a deactivation end the person's sessions at once. */
    update(actor: CurrentUser, id: string, version: number, patch: PersonPatch): Person {
      const changed = inWriteTransaction(db, (tx) => {
        const before = findOrRefuse(tx, id)
        if (before.person.version !== version) throw stale(before.person)
        const fields = changedFields(before, patch)
        refuseLosingAccess(tx, actor, before.person, fields)
        updatePerson(tx, id, fields, clock().toISOString())
        const { person: after } = findOrRefuse(tx, id)
        recordAudit(tx, { actorId: actor.id, what: 'person', id, action: 'update', before: before.person, after, at: clock() })
        const losesSessions = after.role !== before.person.role || after.status !== before.person.status
        if (losesSessions) sessions.endAllOf(tx, id)
        return after
      })
      events.publish({ type: 'people', id, version: changed.version })
      return changed
    },
  }
}

function findOrRefuse(tx: Transaction, id: string): PersonWithHash {
  const found = findPersonWithHash(tx, id)
  if (!found) throw notFound('person')
  return found
}

/** A person who never followed the invitation goes back to being invited, not active. */
function changedFields({ person, passwordHash }: PersonWithHash, { name, role, active }: PersonPatch) {
  const statusWhenTakenBack: Person['status'] = passwordHash === null ? 'invited' : 'active'
  const isTakenBack = active === true && person.status === 'deactivated'
  return {
    name: name ?? person.name,
    role: role ?? person.role,
    status: active === false ? ('deactivated' as const) : isTakenBack ? statusWhenTakenBack : person.status,
  }
}

function refuseLosingAccess(tx: Transaction, actor: CurrentUser, before: Person, after: Pick<Person, 'role' | 'status'>): void {
  const losesAccess = after.role !== before.role || (after.status === 'deactivated' && before.status !== 'deactivated')
  if (!losesAccess) return
  if (before.id === actor.id) {
    throw conflict('own-account', "You can't change your own role or deactivate yourself. Ask another admin.")
  }
  const isActiveAdmin = before.role === 'admin' && before.status === 'active'
  if (isActiveAdmin && !hasOtherActiveAdmin(tx, before.id)) {
    throw conflict('last-admin', `${before.name} is the last active admin. Make somebody else an admin first.`)
  }
}
