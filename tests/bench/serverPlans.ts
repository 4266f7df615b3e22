import type { Line, SavedLine } from '../../shared/schemas/estimate.ts'
import type { LoadPlan } from './load.ts'

const CONNECTIONS = 4

interface Place {
  port: number
  headers?: Record<string, string>
}

/** The same read again and again. */
export function readPlan({ port, headers, path }: Place & { path: string }): LoadPlan {
  return { port, connections: CONNECTIONS, next: () => ({ method: 'GET', path, headers }) }
}

/** Saves of a quantity. Each connection saves a line of its own and names the version that it was answered with, so that none is stale. */
export function savePlan({
  port,
  headers,
  lines,
  pathOf,
}: Place & { lines: readonly Line[]; pathOf: (lineId: string) => string }): LoadPlan {
  const own = lines.slice(0, CONNECTIONS).map(({ id, version }) => ({ path: pathOf(id), version }))
  let count = 0
  return {
    port,
    connections: CONNECTIONS,
    next(connection) {
      count += 1
      const { path, version } = own[connection]!
      const body = JSON.stringify({ quantity: `floor_area + ${count % 50}` })
      return {
        method: 'PATCH',
        path,
        headers: {
          ...headers,
          'content-type': 'application/json',
          'content-length': Buffer.byteLength(body),
          'if-match': `"${version}"`,
        },
        body,
      }
    },
    onAnswer(connection, body) {
      own[connection]!.version = (JSON.parse(body.toString()) as SavedLine).line.version
    },
  }
}
