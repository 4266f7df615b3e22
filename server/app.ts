import express, { type Express } from 'express'
import type { Logger } from 'pino'
import type { AppConfig } from './config/appConfig.ts'
import type { Clock } from './config/clock.ts'
import type { Database } from './db/client.ts'
import { createSessionService } from './features/accounts/sessionService.ts'
import { createEventHub, type EventHub } from './features/events/eventHub.ts'
import { eventOperations } from './features/events/eventRoutes.ts'
import { firmOperations } from './features/firm/firmRoutes.ts'
import { healthOperations } from './features/health/healthRoutes.ts'
import { apiRouter } from './http/apiRouter.ts'
import type { Operation } from './http/operation.ts'
import type { MailSender } from './mail/mailSender.ts'
import { errorHandler } from './middleware/errorHandler.ts'
import { createIdempotency } from './middleware/idempotency.ts'
import { requestLog } from './middleware/requestLog.ts'
import { sameOrigin } from './middleware/sameOrigin.ts'
import { session } from './middleware/session.ts'

export interface AppParts {
  db: Database
  clock: Clock
  mail: MailSender
  config: AppConfig
  logger: Logger
}

export interface BuiltApp {
  app: Express
  /** Every call of the API: the tests walk through them and the description is made of them. */
  operations: Operation[]
  events: EventHub
}

/** Puts the app together; `index.ts` lets it listen, tests call it in their own process. */
export function buildApp({ db, clock, mail, config, logger }: AppParts): BuiltApp {
  const events = createEventHub()
  const sessions = createSessionService({ db, clock, onEnd: (end) => events.endSession(end) })
  const services = { db, clock, mail, config, events, sessions }

  const operations = [...healthOperations(services), ...firmOperations(services), ...eventOperations(services)]

  const app = express()
  app.disable('x-powered-by')
  app.set('etag', false)
  app.set('query parser', 'simple')
  app.set('trust proxy', config.trustProxy)
  app.use(requestLog(logger))
  app.use(
    '/api',
    sameOrigin(config.appUrl),
    session(sessions),
    apiRouter(operations, { idempotency: createIdempotency({ db, clock }), checkAnswers: config.checkAnswers }),
  )
  app.use(errorHandler)
  return { app, operations, events }
}
