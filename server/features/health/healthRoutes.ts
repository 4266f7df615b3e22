import { z } from 'zod'
import type { Database } from '../../db/client.ts'
import { operation, type Operation } from '../../http/operation.ts'

const healthSchema = z.object({ status: z.literal('ok') })

/** For the watcher of the process: whether it lives, and whether it can do its work. */
export function healthOperations({ db }: { db: Database }): Operation[] {
  return [
    operation(
      { id: 'readHealth', method: 'get', path: '/health', action: 'public', summary: 'Whether the process lives.', response: healthSchema },
      () => ({ status: 'ok' as const }),
    ),
    operation(
      {
        id: 'readReadiness',
        method: 'get',
        path: '/ready',
        action: 'public',
        summary: 'Whether the database answers, so that requests can be served.',
        response: healthSchema,
      },
      () => {
        db.$client.prepare('SELECT 1').get()
        return { status: 'ok' as const }
      },
    ),
  ]
}
