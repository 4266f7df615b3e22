import { fileURLToPath } from 'node:url'
import { readMigrationFiles, type MigrationMeta } from 'drizzle-orm/migrator'
import type { Database } from './client.ts'

const MIGRATIONS_FOLDER = fileURLToPath(new URL('../../drizzle', import.meta.url))

/** Drizzle's own table, so that its tools can read which migrations a file has. */
const CREATE_LEDGER =
  'CREATE TABLE IF NOT EXISTS __drizzle_migrations (id INTEGER PRIMARY KEY AUTOINCREMENT, hash TEXT NOT NULL, created_at NUMERIC)'

/** The migrations that this file has not had yet, oldest first. */
export function pendingMigrations(db: Database): MigrationMeta[] {
  db.$client.exec(CREATE_LEDGER)
  const newest = db.$client.prepare('SELECT max(created_at) FROM __drizzle_migrations').pluck().get() as number | null
  return readMigrationFiles({ migrationsFolder: MIGRATIONS_FOLDER }).filter((migration) => migration.folderMillis > (newest ?? 0))
}

/**
 * Brings the file up to date; each migration is one transaction, all or nothing.
 * Foreign keys rest meanwhile, because SQLite alters a table by rebuilding it, and are checked before each commit.
 */
export function migrate(db: Database): void {
  const pending = pendingMigrations(db)
  if (pending.length === 0) return
  const connection = db.$client
  connection.pragma('foreign_keys = OFF')
  try {
    for (const migration of pending) connection.transaction(() => apply(db, migration)).immediate()
  } finally {
    connection.pragma('foreign_keys = ON')
  }
}

function apply(db: Database, migration: MigrationMeta): void {
  const connection = db.$client
  for (const statement of migration.sql) connection.exec(statement)
  const orphans = connection.pragma('foreign_key_check') as unknown[]
  if (orphans.length > 0) throw new Error(`A migration would leave ${orphans.length} rows that point at nothing; it was not applied.`)
  connection.prepare('INSERT INTO __drizzle_migrations (hash, created_at) VALUES (?, ?)').run(migration.hash, migration.folderMillis)
}
