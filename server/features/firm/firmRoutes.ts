import { firmSchema } from '../../../shared/schemas/account.ts'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Database } from '../../db/client.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { findFirm } from './firmRepository.ts'

/** What anyone may read before signing in. */
export function firmOperations({ db, config }: { db: Database; config: AppConfig }): Operation[] {
  return [
    operation(
      {
        id: 'readFirm',
        method: 'get',
        path: '/firm',
        action: 'public',
        summary: 'The firm whose Quoinbook this is; in a demo, its sign-ins.',
        response: firmSchema,
      },
      () => {
        const firm = findFirm(db)
        const isDemo = firm?.isDemo ?? false
        return {
          name: config.firmName ?? firm?.name ?? 'Quoinbook',
          isDemo,
          hasOutbox: config.hasOutbox,
          demoAccounts: isDemo ? config.demoAccounts : [],
        }
      },
    ),
  ]
}
