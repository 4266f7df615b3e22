import { createHash, randomBytes } from 'node:crypto'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Clock } from '../../config/clock.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { deleteEndedSessions, deleteSession, deleteSessionsOf, findSession, insertSession, touchSession } from './sessionRepository.ts'

const HOUR_MS = 3_600_000
/** A session ends when it was not used for so long … */
const SESSION_IDLE_MS = 12 * HOUR_MS
/** … and at this age in any case. */
export const SESSION_MAX_MS = 14 * 24 * HOUR_MS
/** Use is noted no more often than this: a read needn't wait for a write to the disk. */
const TOUCH_EVERY_MS = 5 * 60_000

export interface ActiveSession {
  idHash: string
  user: CurrentUser
}

export interface SessionEnd {
  userId: string
  /** `null`: every session of the person, but for `exceptIdHash`. */
  idHash: string | null
  exceptIdHash: string | null
}

export type SessionService = ReturnType<typeof createSessionService>

/** Sessions live in the database, so that each can be ended from the server's side. */
export function createSessionService({ db, clock, onEnd }: { db: Database; clock: Clock; onEnd: (end: SessionEnd) => void }) {
  const ago = (ms: number) => new Date(clock().getTime() - ms).toISOString()

  return {
    /** Begins a session and gives the id for the cookie. It is kept as a hash alone. */
    begin(tx: Queryable, userId: string): string {
      const token = randomBytes(32).toString('base64url')
      deleteEndedSessions(tx, { createdBefore: ago(SESSION_MAX_MS), seenBefore: ago(SESSION_IDLE_MS) })
      insertSession(tx, { idHash: hashOf(token), userId, at: clock().toISOString() })
      return token
    },

    /** The session of an id from a cookie, while it lasts. */
    find(token: string): ActiveSession | null {
      return this.findByHash(hashOf(token), { isUse: true })
    },

    /** The same by its hash; a look that is no use (a heartbeat) doesn't keep it alive. */
    findByHash(idHash: string, { isUse }: { isUse: boolean }): ActiveSession | null {
      const session = findSession(db, idHash)
      if (!session) return null
      const isOver = session.createdAt < ago(SESSION_MAX_MS) || session.lastSeenAt < ago(SESSION_IDLE_MS)
      if (isOver) return null
      if (isUse && session.lastSeenAt < ago(TOUCH_EVERY_MS)) touchSession(db, idHash, clock().toISOString())
      return { idHash, user: session.user }
    },

    end(session: ActiveSession): void {
      deleteSession(db, session.idHash)
      onEnd({ userId: session.user.id, idHash: session.idHash, exceptIdHash: null })
    },

    /** Ends all sessions of a person, on every device. */
    endEverySessionOf(userId: string): void {
      deleteSessionsOf(db, userId, null)
      onEnd({ userId, idHash: null, exceptIdHash: null })
    },

    /** The same within a write, but for one that may stay. Their event streams close with them. */
    endAllOf(tx: Queryable, userId: string, exceptIdHash: string | null = null): void {
      deleteSessionsOf(tx, userId, exceptIdHash)
      onEnd({ userId, idHash: null, exceptIdHash })
    },
  }
}

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex')
}
