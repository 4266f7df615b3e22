import { and, asc, count, eq, ne, sql } from 'drizzle-orm'
import type { Person, Role } from '../../../shared/schemas/account.ts'
import type { Queryable } from '../../db/client.ts'
import { users } from '../../db/schema/users.ts'

/** What others may read of a person: all but the password's hash. */
const personColumns = {
  id: users.id,
  email: users.email,
  name: users.name,
  role: users.role,
  status: users.status,
  version: users.version,
  createdAt: users.createdAt,
  lastSignInAt: users.lastSignInAt,
}

/** As a person sorts names: capitals make no difference. */
const byName = sql`${users.name} collate nocase`

export interface PersonWithHash {
  person: Person
  passwordHash: string | null
}

export function listPeople(db: Queryable): Person[] {
  return db.select(personColumns).from(users).orderBy(byName, asc(users.email)).all()
}

/** Active owners, for choosing with whom a house is shared. */
export function listActiveOwners(db: Queryable): { id: string; name: string; email: string }[] {
  return db
    .select({ id: users.id, name: users.name, email: users.email })
    .from(users)
    .where(and(eq(users.role, 'owner'), eq(users.status, 'active')))
    .orderBy(byName)
    .all()
}

export function findPerson(db: Queryable, id: string): Person | null {
  return db.select(personColumns).from(users).where(eq(users.id, id)).get() ?? null
}

export function findPersonWithHash(db: Queryable, id: string): PersonWithHash | null {
  return withHash(db.select().from(users).where(eq(users.id, id)).get())
}

export function findPersonByEmail(db: Queryable, email: string): PersonWithHash | null {
  return withHash(db.select().from(users).where(eq(users.email, email)).get())
}

function withHash(row: typeof users.$inferSelect | undefined): PersonWithHash | null {
  if (!row) return null
  const { passwordHash, updatedAt: _updatedAt, ...person } = row
  return { person, passwordHash }
}

export function insertPerson(
  tx: Queryable,
  person: { id: string; email: string; name: string; role: Role; status: Person['status']; passwordHash: string | null; at: string },
): void {
  const { at, ...fields } = person
  tx.insert(users)
    .values({ ...fields, createdAt: at, updatedAt: at })
    .run()
}

/** Changes a person and counts the version up. */
export function updatePerson(
  tx: Queryable,
  id: string,
  fields: Partial<{ name: string; role: Role; status: Person['status']; passwordHash: string }>,
  at: string,
): void {
  tx.update(users)
    .set({ ...fields, updatedAt: at, version: sql`${users.version} + 1` })
    .where(eq(users.id, id))
    .run()
}

/** Signing in changes nothing that another screen could have edited: the version stays. */
export function noteSignIn(tx: Queryable, id: string, at: string): void {
  tx.update(users).set({ lastSignInAt: at }).where(eq(users.id, id)).run()
}

/** Whether there is an active admin besides this person. */
export function hasOtherActiveAdmin(db: Queryable, id: string): boolean {
  const row = db
    .select({ others: count() })
    .from(users)
    .where(and(eq(users.role, 'admin'), eq(users.status, 'active'), ne(users.id, id)))
    .get()
  return (row?.others ?? 0) > 0
}

/** Whether anybody has an account: an empty file is one that nobody uses yet. */
export function hasPeople(db: Queryable): boolean {
  return db.select({ id: users.id }).from(users).limit(1).get() !== undefined
}
