import { and, asc, eq } from 'drizzle-orm'
import type { HouseShare } from '../../../shared/schemas/sharing.ts'
import type { Queryable } from '../../db/client.ts'
import { houseShares } from '../../db/schema/houseShares.ts'
import { users } from '../../db/schema/users.ts'

const columns = { userId: users.id, name: users.name, email: users.email, sharedAt: houseShares.sharedAt }

/** The owners that a house is shared with, by name. */
export function findShares(db: Queryable, houseId: string): HouseShare[] {
  return db
    .select(columns)
    .from(houseShares)
    .innerJoin(users, eq(users.id, houseShares.userId))
    .where(eq(houseShares.houseId, houseId))
    .orderBy(asc(users.name), asc(users.email))
    .all()
}

export function findShare(db: Queryable, houseId: string, userId: string): HouseShare | null {
  const row = db
    .select(columns)
    .from(houseShares)
    .innerJoin(users, eq(users.id, houseShares.userId))
    .where(and(eq(houseShares.houseId, houseId), eq(houseShares.userId, userId)))
    .get()
  return row ?? null
}

/** Who opened the house to this owner; `null` when that person's account is gone. */
export function findSharer(db: Queryable, houseId: string, userId: string): { name: string; email: string } | null {
  const row = db
    .select({ name: users.name, email: users.email })
    .from(houseShares)
    .innerJoin(users, eq(users.id, houseShares.sharedById))
    .where(and(eq(houseShares.houseId, houseId), eq(houseShares.userId, userId)))
    .get()
  return row ?? null
}

/** Whether this person can be shared with: an owner whose account is active. */
export function isActiveOwner(db: Queryable, userId: string): boolean {
  const row = db
    .select({ id: users.id })
    .from(users)
    .where(and(eq(users.id, userId), eq(users.role, 'owner'), eq(users.status, 'active')))
    .get()
  return row !== undefined
}

export function insertShare(db: Queryable, share: { houseId: string; userId: string; sharedById: string; sharedAt: string }): void {
  db.insert(houseShares).values(share).run()
}

export function deleteShare(db: Queryable, houseId: string, userId: string): void {
  db.delete(houseShares)
    .where(and(eq(houseShares.houseId, houseId), eq(houseShares.userId, userId)))
    .run()
}
