import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database } from '../../db/client.ts'
import { AppError } from '../../errors/AppError.ts'
import type { PasswordHasher } from './passwordHasher.ts'
import { findPersonByEmail, noteSignIn, type PersonWithHash } from './personRepository.ts'
import type { ActiveSession, SessionService } from './sessionService.ts'
import type { SignInGuard } from './signInGuard.ts'

interface SignInParts {
  db: Database
  clock: Clock
  sessions: SessionService
  hasher: PasswordHasher
  guard: SignInGuard
}

interface SignInAttempt {
  email: string
  password: string
  /** Where the request came from. */
  address: string
  /** A session that the browser still holds: it ends, so that nobody can have planted it. */
  earlierSession: ActiveSession | null
}

/** Signing in by e-mail and password. Every failure reads and lasts the same. */
export function createSignInService({ db, clock, sessions, hasher, guard }: SignInParts) {
  return {
    async signIn({ email, password, address, earlierSession }: SignInAttempt): Promise<{ user: CurrentUser; sessionToken: string }> {
      guard.begin(email, address)
      const found = findPersonByEmail(db, email)
      const isTheirs = await hasher.matches(password, hashOfActive(found))
      const person = isTheirs ? hasStayedActive(found) : null
      if (!person) throw wrongSignIn()
      guard.succeed(email, address)
      if (earlierSession) sessions.end(earlierSession)
      const sessionToken = inWriteTransaction(db, (tx) => {
        noteSignIn(tx, person.id, clock().toISOString())
        return sessions.begin(tx, person.id)
      })
      return { user: { id: person.id, email: person.email, name: person.name, role: person.role }, sessionToken }
    },
  }

  /** The check took a moment: look again, so that a deactivation in it counts. */
  function hasStayedActive(found: PersonWithHash | null) {
    const now = found && findPersonByEmail(db, found.person.email)
    const isUnchanged = now?.person.status === 'active' && now.passwordHash === found?.passwordHash
    return isUnchanged ? now.person : null
  }
}

function hashOfActive(found: PersonWithHash | null): string | null {
  return found?.person.status === 'active' ? found.passwordHash : null
}

function wrongSignIn(): AppError {
  return new AppError({
    status: 401,
    code: 'wrong-sign-in',
    detail: "That e-mail and password don't go together. Check both, or set a new password.",
  })
}
