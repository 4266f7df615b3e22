import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core'

/** Tokens that were followed once: a link from a mail works a single time. */
export const spentTokens = sqliteTable(
  'spent_tokens',
  {
    /** SHA-256 of the token's `jti`. */
    idHash: text('id_hash').primaryKey(),
    spentAt: text('spent_at').notNull(),
    /** When the token would end by itself and the row may go. */
    expiresAt: text('expires_at').notNull(),
  },
  (table) => [index('spent_tokens_expires').on(table.expiresAt)],
)
