import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { users } from './users.ts'

/** Answers already given to writes that a phone may repeat. */
export const idempotencyKeys = sqliteTable(
  'idempotency_keys',
  {
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    method: text('method').notNull(),
    path: text('path').notNull(),
    key: text('key').notNull(),
    bodyHash: text('body_hash').notNull(),
    /** `null` while the first call is still being worked on. */
    status: integer('status'),
    etag: text('etag'),
    answer: text('answer'),
    createdAt: text('created_at').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.method, table.path, table.key] }),
    index('idempotency_keys_created').on(table.createdAt),
  ],
)
