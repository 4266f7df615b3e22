import { z } from 'zod'
import { outboxMessageSchema } from '../../../shared/schemas/account.ts'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Database } from '../../db/client.ts'
import { notFound } from '../../errors/AppError.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { listOutboxMessages } from './outboxRepository.ts'

/** Mail that stays in the app while no mail server is set. With one there is no outbox, and nobody reads others' mail. */
export function outboxOperations({ db, config }: { db: Database; config: AppConfig }): Operation[] {
  return [
    operation(
      {
        id: 'listOutbox',
        method: 'get',
        path: '/outbox',
        action: 'outbox.read',
        summary: 'Mail that was written while no mail server is set, newest first; 404 when one is.',
        response: z.array(outboxMessageSchema),
      },
      () => {
        if (!config.hasOutbox) throw notFound('outbox')
        return listOutboxMessages(db)
      },
    ),
  ]
}
