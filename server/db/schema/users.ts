import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { ROLES } from '../../../shared/schemas/account.ts'

export const users = sqliteTable(
  'users',
  {
    id: text('id').primaryKey(),
    /** Lower case: one address, one person. */
    email: text('email').notNull().unique(),
    name: text('name').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    status: text('status', { enum: ['invited', 'active', 'deactivated'] }).notNull(),
    /** bcrypt; `null` until an invitation is followed. */
    passwordHash: text('password_hash'),
    version: integer('version').notNull().default(1),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
    lastSignInAt: text('last_sign_in_at'),
  },
  // The last active admin is counted, and the owners are listed, by role and status.
  (table) => [index('users_role_status').on(table.role, table.status)],
)
