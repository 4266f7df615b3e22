import { sql } from 'drizzle-orm'
import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'

export const priceBookVersions = sqliteTable(
  'price_book_versions',
  {
    version: integer('version').primaryKey(),
    status: text('status', { enum: ['draft', 'published'] }).notNull(),
    note: text('note').notNull(),
    /** The day that its prices are meant for. */
    effectiveDate: text('effective_date'),
    createdAt: text('created_at').notNull(),
    publishedAt: text('published_at'),
    /** The name as it was on that day: it outlives the account. */
    publishedBy: text('published_by'),
  },
  // One draft at a time; a published version is never a draft again (a trigger sees to that).
  (table) => [
    uniqueIndex('price_book_versions_one_draft')
      .on(table.status)
      .where(sql`${table.status} = 'draft'`),
  ],
)
