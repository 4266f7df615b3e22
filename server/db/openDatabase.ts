import BetterSqlite3 from 'better-sqlite3'
import { databaseOver, type Database } from './client.ts'

/** How long a writer waits for another process's write, a backup for instance, before it gives up. */
const BUSY_TIMEOUT_MS = 5_000

/** Opens (or makes) the firm's file, `:memory:` in tests, with the settings that durability rests on. */
export function openDatabase(file: string): Database {
  const connection = new BetterSqlite3(file, { timeout: BUSY_TIMEOUT_MS })
  connection.pragma('journal_mode = WAL')
  // An acknowledged write survives a power cut: in WAL mode only FULL flushes the log at each commit.
  connection.pragma('synchronous = FULL')
  connection.pragma('foreign_keys = ON')
  return databaseOver(connection)
}

/** Brings the log into the file and closes it. */
export function closeDatabase(db: Database): void {
  db.$client.pragma('wal_checkpoint(TRUNCATE)')
  db.$client.close()
}
