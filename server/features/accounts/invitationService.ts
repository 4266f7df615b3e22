import type { CurrentUser, Invitation, Person } from '../../../shared/schemas/account.ts'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Transaction } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { AppError, conflict } from '../../errors/AppError.ts'
import type { MailSender } from '../../mail/mailSender.ts'
import type { EventHub } from '../events/eventHub.ts'
import { findFirm } from '../firm/firmRepository.ts'
import { invitationMail } from './invitationMail.ts'
import { linkEnded, type LinkTokens } from './linkTokens.ts'
import type { PasswordHasher } from './passwordHasher.ts'
import { refuseGuessable } from './passwordRules.ts'
import { findPerson, findPersonByEmail, findPersonWithHash, insertPerson, noteSignIn, updatePerson } from './personRepository.ts'
import type { ActiveSession, SessionService } from './sessionService.ts'

interface InvitationParts {
  db: Database
  clock: Clock
  config: AppConfig
  mail: MailSender
  events: EventHub
  sessions: SessionService
  hasher: PasswordHasher
  links: LinkTokens
}

/** Invitations by mail: sent by an admin, followed once by the person, who sets a password and is signed in by it. */
export function createInvitationService({ db, clock, config, mail, events, sessions, hasher, links }: InvitationParts) {
  return {
    /** Invites somebody, or once more somebody who hasn't answered yet. Throws 409 for who has an account already. */
    async invite(actor: CurrentUser, invitation: Invitation): Promise<Person> {
      const person = inWriteTransaction(db, (tx) => keepInvited(tx, actor, invitation))
      events.publish({ type: 'people', id: person.id, version: person.version })
      const token = await links.issue('invitation', person.id, null)
      const firmName = config.firmName ?? findFirm(db)?.name ?? 'Quoinbook'
      await deliver(invitationMail({ person, invitedBy: actor.name, firmName, link: `${config.appUrl}/accept-invitation?token=${token}` }))
      return person
    },

    /** Follows an invitation: sets name and password, and gives the id of a new session. One that the browser still held ends. */
    async accept(
      token: string,
      { name, newPassword }: { name: string; newPassword: string },
      earlierSession: ActiveSession | null,
    ): Promise<{ user: CurrentUser; sessionToken: string }> {
      const link = await links.read('invitation', token)
      const invited = findPerson(db, link.userId)
      if (invited?.status !== 'invited') throw linkEnded()
      refuseGuessable(newPassword, { email: invited.email, name })
      const passwordHash = await hasher.hash(newPassword)
      const accepted = inWriteTransaction(db, (tx) => {
        const before = findPersonWithHash(tx, link.userId)
        if (before?.person.status !== 'invited') throw linkEnded()
        links.spend(tx, link, before.passwordHash)
        const at = clock()
        updatePerson(tx, link.userId, { name, passwordHash, status: 'active' }, at.toISOString())
        noteSignIn(tx, link.userId, at.toISOString())
        const after = findPerson(tx, link.userId) ?? before.person
        recordAudit(tx, { actorId: link.userId, what: 'person', id: link.userId, action: 'accept', before: before.person, after, at })
        return { person: after, sessionToken: sessions.begin(tx, link.userId) }
      })
      if (earlierSession) sessions.end(earlierSession)
      const { id, email, role, version } = accepted.person
      events.publish({ type: 'people', id, version })
      return { user: { id, email, name, role }, sessionToken: accepted.sessionToken }
    },
  }

  function keepInvited(tx: Transaction, actor: CurrentUser, { email, name, role }: Invitation): Person {
    const known = findPersonByEmail(tx, email)
    if (known && known.person.status !== 'invited') throw alreadyHere(known.person)
    const at = clock()
    const id = known?.person.id ?? newId()
    if (known) updatePerson(tx, id, { name, role }, at.toISOString())
    else insertPerson(tx, { id, email, name, role, status: 'invited', passwordHash: null, at: at.toISOString() })
    const person = findPerson(tx, id)
    if (!person) throw new Error('The person just written is not there.')
    recordAudit(tx, { actorId: actor.id, what: 'person', id, action: 'invite', before: known?.person ?? null, after: person, at })
    return person
  }

  async function deliver(message: Parameters<MailSender['send']>[0]): Promise<void> {
    try {
      await mail.send(message)
    } catch (cause) {
      const detail = 'The person is on the list, but the mail could not be sent. Check the mail server, then invite once more.'
      throw Object.assign(new AppError({ status: 503, code: 'mail-not-sent', detail }), { cause })
    }
  }
}

function alreadyHere({ name, email, status }: Person): AppError {
  const words =
    status === 'deactivated'
      ? `${name} (${email}) was deactivated. Take the account back under People instead of inviting anew.`
      : `${name} (${email}) has an account already.`
  return conflict('already-here', words)
}
