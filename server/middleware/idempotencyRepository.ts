import { and, eq, lt } from 'drizzle-orm'
import type { Queryable } from '../db/client.ts'
import { idempotencyKeys } from '../db/schema/idempotencyKeys.ts'

/** What makes two requests the same try. */
export interface RepeatKey {
  userId: string
  method: string
  path: string
  key: string
}

export interface KeptAnswer {
  bodyHash: string
  /** `null` while the first call is still being worked on. */
  status: number | null
  etag: string | null
  answer: string | null
  createdAt: string
}

function isSameTry(key: RepeatKey) {
  return and(
    eq(idempotencyKeys.userId, key.userId),
    eq(idempotencyKeys.method, key.method),
    eq(idempotencyKeys.path, key.path),
    eq(idempotencyKeys.key, key.key),
  )
}

export function findKeptAnswer(db: Queryable, key: RepeatKey): KeptAnswer | null {
  return db.select().from(idempotencyKeys).where(isSameTry(key)).get() ?? null
}

export function insertTry(db: Queryable, key: RepeatKey, bodyHash: string, at: string): void {
  db.insert(idempotencyKeys)
    .values({ ...key, bodyHash, createdAt: at })
    .run()
}

export function keepAnswer(db: Queryable, key: RepeatKey, kept: { status: number; etag: string | null; answer: string }): void {
  db.update(idempotencyKeys).set(kept).where(isSameTry(key)).run()
}

export function deleteTry(db: Queryable, key: RepeatKey): void {
  db.delete(idempotencyKeys).where(isSameTry(key)).run()
}

export function deleteTriesBefore(db: Queryable, createdBefore: string): void {
  db.delete(idempotencyKeys).where(lt(idempotencyKeys.createdAt, createdBefore)).run()
}
