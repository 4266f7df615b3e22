import { desc, notInArray, sql } from 'drizzle-orm'
import type { OutboxMessage } from '../../../shared/schemas/account.ts'
import type { Queryable } from '../../db/client.ts'
import { outboxMessages } from '../../db/schema/outboxMessages.ts'

/** More than anybody scrolls through; older ones go. */
const KEPT_MESSAGES = 500

/** Messages of the same moment stand in the order they were written. */
const newestFirst = [desc(outboxMessages.sentAt), desc(sql`rowid`)]

export function insertOutboxMessage(db: Queryable, message: OutboxMessage): void {
  db.insert(outboxMessages).values(message).run()
  const newest = db
    .select({ id: outboxMessages.id })
    .from(outboxMessages)
    .orderBy(...newestFirst)
    .limit(KEPT_MESSAGES)
  db.delete(outboxMessages).where(notInArray(outboxMessages.id, newest)).run()
}

/** Newest first. */
export function listOutboxMessages(db: Queryable): OutboxMessage[] {
  return db
    .select()
    .from(outboxMessages)
    .orderBy(...newestFirst)
    .all()
}
