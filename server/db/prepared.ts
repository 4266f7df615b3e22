import { sql, type SQL } from 'drizzle-orm'
import type { Database } from './client.ts'

/**
 * A query that is built and prepared once for each open database. For what runs at every save: building a query costs several times its run.
 * It runs on the database's one connection, so inside an open transaction it is a part of that.
 */
export function prepared<T>(build: (db: Database) => T): (db: Database) => T {
  const built = new WeakMap<Database, T>()
  return (db) => {
    const known = built.get(db)
    if (known !== undefined) return known
    const query = build(db)
    built.set(db, query)
    return query
  }
}

/** A placeholder of its own name for each column. It knows nothing of the column: JSON is to be handed over as text. */
export function placeholders<const Column extends string>(columns: readonly Column[]): Record<Column, SQL> {
  return Object.fromEntries(columns.map((column) => [column, sql`${sql.placeholder(column)}`])) as Record<Column, SQL>
}
