import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core'

/** Mail that was written while no mail server is set: the admin reads it in the app. */
export const outboxMessages = sqliteTable(
  'outbox_messages',
  {
    id: text('id').primaryKey(),
    to: text('to').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    sentAt: text('sent_at').notNull(),
  },
  (table) => [index('outbox_messages_sent').on(table.sentAt)],
)
