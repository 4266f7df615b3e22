import type { Clock } from '../../config/clock.ts'
import { StartRefusal } from '../../config/StartRefusal.ts'
import { inWriteTransaction, type Database } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { findPerson, findPersonByEmail, insertPerson } from './personRepository.ts'

/**
 * Makes an admin from the server's side; with `passwordHash` null one who is still to follow an invitation.
 * Throws a `StartRefusal` when the address has an account already. Gives the id.
 */
export function createAdmin(db: Database, clock: Clock, admin: { email: string; name: string; passwordHash: string | null }): string {
  return inWriteTransaction(db, (tx) => {
    const known = findPersonByEmail(tx, admin.email)
    if (known)
      throw new StartRefusal(
        `${admin.email} has an account already (${known.person.role}, ${known.person.status}). Choose another address.`,
      )
    const id = newId()
    const at = clock()
    insertPerson(tx, { id, ...admin, role: 'admin', status: admin.passwordHash === null ? 'invited' : 'active', at: at.toISOString() })
    recordAudit(tx, { actorId: null, what: 'person', id, action: 'create-admin', before: null, after: findPerson(tx, id), at })
    return id
  })
}
