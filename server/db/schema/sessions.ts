import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { users } from './users.ts'

export const sessions = sqliteTable(
  'sessions',
  {
    /** SHA-256 of the id in the cookie: the file alone signs nobody in. */
    idHash: text('id_hash').primaryKey(),
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    createdAt: text('created_at').notNull(),
    lastSeenAt: text('last_seen_at').notNull(),
  },
  // Ended together when a person is deactivated or changes the password; swept by age.
  (table) => [index('sessions_user').on(table.userId), index('sessions_created').on(table.createdAt)],
)
