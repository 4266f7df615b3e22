import { and, eq, lt, ne, or, sql } from 'drizzle-orm'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { prepared } from '../../db/prepared.ts'
import { sessions } from '../../db/schema/sessions.ts'
import { users } from '../../db/schema/users.ts'

export interface SessionRecord {
  idHash: string
  createdAt: string
  lastSeenAt: string
  user: CurrentUser
}

export function insertSession(db: Queryable, session: { idHash: string; userId: string; at: string }): void {
  db.insert(sessions).values({ idHash: session.idHash, userId: session.userId, createdAt: session.at, lastSeenAt: session.at }).run()
}

/** Asked at every request, so it is prepared once. */
const sessionByHash = prepared((db) =>
  db
    .select({
      idHash: sessions.idHash,
      createdAt: sessions.createdAt,
      lastSeenAt: sessions.lastSeenAt,
      user: { id: users.id, email: users.email, name: users.name, role: users.role },
    })
    .from(sessions)
    .innerJoin(users, eq(users.id, sessions.userId))
    .where(and(eq(sessions.idHash, sql.placeholder('idHash')), eq(users.status, 'active')))
    .prepare(),
)

/** The session and its person; `null` when there is none or the person is not active. */
export function findSession(db: Database, idHash: string): SessionRecord | null {
  return sessionByHash(db).get({ idHash }) ?? null
}

export function touchSession(db: Queryable, idHash: string, at: string): void {
  db.update(sessions).set({ lastSeenAt: at }).where(eq(sessions.idHash, idHash)).run()
}

export function deleteSession(db: Queryable, idHash: string): void {
  db.delete(sessions).where(eq(sessions.idHash, idHash)).run()
}

/** Deletes all sessions of a person, but for one that may stay. */
export function deleteSessionsOf(db: Queryable, userId: string, exceptIdHash: string | null): void {
  const isTheirs = eq(sessions.userId, userId)
  db.delete(sessions)
    .where(exceptIdHash === null ? isTheirs : and(isTheirs, ne(sessions.idHash, exceptIdHash)))
    .run()
}

/** Deletes sessions that began or were last used before the given times. */
export function deleteEndedSessions(db: Queryable, limits: { createdBefore: string; seenBefore: string }): void {
  db.delete(sessions)
    .where(or(lt(sessions.createdAt, limits.createdBefore), lt(sessions.lastSeenAt, limits.seenBefore)))
    .run()
}
