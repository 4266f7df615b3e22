import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'

/** Who changed what, when, from what to what. Only ever added to; no foreign keys, so that it outlives what it tells of. */
export const auditEntries = sqliteTable(
  'audit_entries',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    at: text('at').notNull(),
    /** `null`: the app itself, or a command on the server. */
    actorId: text('actor_id'),
    what: text('what').notNull(),
    whatId: text('what_id').notNull(),
    action: text('action').notNull(),
    before: text('before', { mode: 'json' }),
    after: text('after', { mode: 'json' }),
  },
  // The history of one thing, newest last.
  (table) => [index('audit_entries_what').on(table.what, table.whatId, table.id)],
)
