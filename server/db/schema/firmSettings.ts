import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'

/** One row: the firm whose file this is. */
export const firmSettings = sqliteTable('firm_settings', {
  id: integer('id').primaryKey(),
  name: text('name').notNull(),
  /** Set by the seed alone: this file holds invented data, and its sign-ins may be shown. */
  isDemo: integer('is_demo', { mode: 'boolean' }).notNull().default(false),
})
