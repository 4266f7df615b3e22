import type BetterSqlite3 from 'better-sqlite3'
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3'

/** The driver stays behind this file: all else speaks Drizzle. */
export type Database = BetterSQLite3Database<Record<string, never>> & { $client: BetterSqlite3.Database }
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]
/** What a repository takes: the database itself, or the transaction that a service has open. */
export type Queryable = Database | Transaction

/** Drizzle over an open SQLite connection. */
export function databaseOver(connection: BetterSqlite3.Database): Database {
  return drizzle(connection)
}

/**
 * Runs a write as one transaction, begun IMMEDIATE so that two writers never meet half-way.
 * The callback is synchronous: an async one would commit before its work was done.
 */
export function inWriteTransaction<T>(db: Database, write: (tx: Transaction) => T extends Promise<unknown> ? never : T): T {
  return db.transaction(write as (tx: Transaction) => T, { behavior: 'immediate' })
}
