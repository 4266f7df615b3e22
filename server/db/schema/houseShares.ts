import { index, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { houses } from './houses.ts'
import { users } from './users.ts'

/** A house opened to an owner. */
export const houseShares = sqliteTable(
  'house_shares',
  {
    houseId: text('house_id')
      .notNull()
      .references(() => houses.id, { onDelete: 'cascade' }),
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    sharedById: text('shared_by_id').references(() => users.id, { onDelete: 'set null' }),
    sharedAt: text('shared_at').notNull(),
  },
  // The key answers "who reads this house"; the index "which houses may this owner read".
  (table) => [primaryKey({ columns: [table.houseId, table.userId] }), index('house_shares_user').on(table.userId, table.houseId)],
)
