import type { Database } from '../../server/db/client.ts'

/** How SQLite goes about each query that runs during `work`, as EXPLAIN QUERY PLAN tells it; those about a table alone. */
export async function queryPlans({ $client: connection }: Database, table: string, work: () => unknown): Promise<string[]> {
  const asked: string[] = []
  const prepare = connection.prepare.bind(connection)
  connection.prepare = ((source: string) => {
    asked.push(source)
    return prepare(source)
  }) as typeof connection.prepare
  try {
    await work()
  } finally {
    connection.prepare = prepare as typeof connection.prepare
  }
  return asked
    .filter((source) => /^\s*(select|update)/i.test(source) && source.includes(table))
    .flatMap((source) => {
      const unbound = Array.from({ length: source.split('?').length - 1 }, () => 1)
      return (prepare(`EXPLAIN QUERY PLAN ${source}`).all(...unbound) as { detail: string }[]).map(({ detail }) => detail)
    })
}
