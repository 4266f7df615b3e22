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

/** Which database a transaction is of. */
const owners = new WeakMap<Queryable, Database>()

/** The database behind a transaction, for statements that are prepared once for each: they run on its one connection, so inside what is open. */
export function databaseOf(queryable: Queryable): Database {
  return owners.get(queryable) ?? (queryable as Database)
}

/** What waits for the commit of a connection's outermost transaction. */
const waitingActions = new WeakMap<BetterSqlite3.Database, (() => void)[]>()

/**
 * Runs a write as one transaction, begun IMMEDIATE so that two writers never meet half-way. Inside another it is a part of that one.
 * The callback is synchronous: an async one would commit before its work was done.
 */
export function inWriteTransaction<T>(db: Database, write: (tx: Transaction) => T extends Promise<unknown> ? never : T): T {
  const owned = (tx: Transaction) => {
    owners.set(tx, db)
    return write(tx) as T
  }
  const run = () => db.transaction(owned, { behavior: 'immediate' })
  const isPartOfAnother = db.$client.inTransaction
  if (isPartOfAnother) return run()
  const actions: (() => void)[] = []
  waitingActions.set(db.$client, actions)
  let answer: T
  try {
    answer = run()
  } finally {
    waitingActions.delete(db.$client)
  }
  for (const action of actions) action()
  return answer
}

/** Runs an action once the write that is under way is committed, at once when there is none, and never when it was rolled back. */
export function afterCommit(db: Database, action: () => void): void {
  const actions = waitingActions.get(db.$client)
  if (actions) actions.push(action)
  else action()
}
