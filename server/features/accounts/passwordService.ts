import type { Logger } from 'pino'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Transaction } from '../../db/client.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { invalid, unauthenticated } from '../../errors/AppError.ts'
import type { MailSender } from '../../mail/mailSender.ts'
import { linkEnded, type LinkTokens } from './linkTokens.ts'
import type { PasswordHasher } from './passwordHasher.ts'
import { passwordResetMail } from './passwordResetMail.ts'
import { refuseGuessable } from './passwordRules.ts'
import { findPersonByEmail, findPersonWithHash, updatePerson, type PersonWithHash } from './personRepository.ts'
import type { ActiveSession, SessionService } from './sessionService.ts'
import type { SignInGuard } from './signInGuard.ts'

interface PasswordParts {
  db: Database
  clock: Clock
  config: AppConfig
  mail: MailSender
  logger: Logger
  sessions: SessionService
  hasher: PasswordHasher
  links: LinkTokens
  guard: SignInGuard
}

/** One person gets no more than one reset mail in this time, however often somebody asks. */
const RESET_MAIL_PAUSE_MS = 60_000

/** Passwords after the first: changed by who knows the old one, or reset by who reads the mail. */
export function createPasswordService({ db, clock, config, mail, logger, sessions, hasher, links, guard }: PasswordParts) {
  const lastMailAt = new Map<string, number>()

  return {
    /** Changes the own password and ends the other sessions. Wrong tries count as wrong sign-ins do. */
    async change(session: ActiveSession, address: string, passwords: { currentPassword: string; newPassword: string }): Promise<void> {
      const found = findPersonWithHash(db, session.user.id)
      if (!found) throw unauthenticated()
      const { person, passwordHash } = found
      guard.begin(person.email, address)
      const isTheirs = await hasher.matches(passwords.currentPassword, passwordHash)
      if (!isTheirs) throw invalid([{ path: 'currentPassword', code: 'wrong-password', message: 'is not your password' }])
      guard.succeed(person.email, address)
      if (passwords.newPassword === passwords.currentPassword) {
        throw invalid([{ path: 'newPassword', code: 'same-password', message: 'is the one that you have now' }])
      }
      refuseGuessable(passwords.newPassword, person)
      const newHash = await hasher.hash(passwords.newPassword)
      inWriteTransaction(db, (tx) => {
        keepPassword(tx, person.id, newHash, 'change-password')
        sessions.endAllOf(tx, person.id, session.idHash)
      })
    },

    /**
     * Sends a link to set a new password, if there is such an active account. Returns at once either way:
     * neither the answer nor its time tells whether the account exists.
     */
    requestReset(email: string): void {
      setImmediate(() => {
        sendReset(email).catch((error: unknown) => logger.error({ err: error }, 'a password reset mail was not sent'))
      })
    },

    /** Sets a new password by a link, once, and ends all sessions of the person. */
    async reset(token: string, newPassword: string): Promise<void> {
      const link = await links.read('password-reset', token)
      const found = findActive(findPersonWithHash(db, link.userId))
      refuseGuessable(newPassword, found.person)
      const newHash = await hasher.hash(newPassword)
      inWriteTransaction(db, (tx) => {
        const { person, passwordHash } = findActive(findPersonWithHash(tx, link.userId))
        links.spend(tx, link, passwordHash)
        keepPassword(tx, person.id, newHash, 'reset-password')
        sessions.endAllOf(tx, person.id)
      })
      guard.forget(found.person.email)
    },
  }

  async function sendReset(email: string): Promise<void> {
    const found = findPersonByEmail(db, email)
    if (found?.person.status !== 'active') return
    const now = clock().getTime()
    if (now - (lastMailAt.get(found.person.id) ?? -Infinity) < RESET_MAIL_PAUSE_MS) return
    lastMailAt.set(found.person.id, now)
    const token = await links.issue('password-reset', found.person.id, found.passwordHash)
    await mail.send(passwordResetMail({ person: found.person, link: `${config.appUrl}/reset-password?token=${token}` }))
  }

  function keepPassword(tx: Transaction, id: string, passwordHash: string, action: string): void {
    updatePerson(tx, id, { passwordHash }, clock().toISOString())
    // The row says that it happened; a hash has no place in a history.
    recordAudit(tx, { actorId: id, what: 'person', id, action, before: null, after: null, at: clock() })
  }
}

function findActive(found: PersonWithHash | null): PersonWithHash {
  if (found?.person.status !== 'active') throw linkEnded()
  return found
}
