import express, { type Express } from 'express'
import type { Logger } from 'pino'
import packageInfo from '../package.json' with { type: 'json' }
import type { AppConfig } from './config/appConfig.ts'
import type { Clock } from './config/clock.ts'
import type { Database } from './db/client.ts'
import { createAccountServices } from './features/accounts/accountServices.ts'
import type { PasswordHasher } from './features/accounts/passwordHasher.ts'
import { passwordOperations } from './features/accounts/passwordRoutes.ts'
import { personOperations } from './features/accounts/personRoutes.ts'
import { sessionOperations } from './features/accounts/sessionRoutes.ts'
import { createSessionService } from './features/accounts/sessionService.ts'
import { createEventHub, type EventHub } from './features/events/eventHub.ts'
import { computeOperations } from './features/compute/computeRoutes.ts'
import { createDomainServices } from './features/domainServices.ts'
import { estimateOperations } from './features/estimates/estimateRoutes.ts'
import { lineOperations } from './features/estimates/lineRoutes.ts'
import { eventOperations } from './features/events/eventRoutes.ts'
import { exchangeOperations } from './features/exchange/exchangeRoutes.ts'
import { firmOperations } from './features/firm/firmRoutes.ts'
import { healthOperations } from './features/health/healthRoutes.ts'
import { openApiOperations } from './features/health/openApiRoutes.ts'
import { mayHearOfChange } from './features/houses/houseAccess.ts'
import { houseOperations } from './features/houses/houseRoutes.ts'
import { outboxOperations } from './features/outbox/outboxRoutes.ts'
import { priceBookOperations } from './features/price-book/priceBookRoutes.ts'
import { roomOperations } from './features/rooms/roomRoutes.ts'
import { shareOperations } from './features/sharing/shareRoutes.ts'
import { summaryOperations } from './features/summary/summaryRoutes.ts'
import { workbookOperations } from './features/workbook/workbookRoutes.ts'
import { createWorkbookService } from './features/workbook/workbookService.ts'
import { apiRouter } from './http/apiRouter.ts'
import type { Operation } from './http/operation.ts'
import { REACHED_BY_HTTPS } from './http/sessionCookie.ts'
import type { MailSender } from './mail/mailSender.ts'
import { compressResponses } from './middleware/compressResponses.ts'
import { errorHandler } from './middleware/errorHandler.ts'
import { createIdempotency } from './middleware/idempotency.ts'
import { limitByAddress } from './middleware/rateLimit.ts'
import { requestLog } from './middleware/requestLog.ts'
import { sameOrigin } from './middleware/sameOrigin.ts'
import { securityHeaders } from './middleware/securityHeaders.ts'
import { serveClient } from './middleware/serveClient.ts'
import { session } from './middleware/session.ts'
import type { MakeWorkbook } from './workers/workbookThread.ts'

const MINUTE_MS = 60_000

export interface AppParts {
  db: Database
  clock: Clock
  mail: MailSender
  hasher: PasswordHasher
  makeWorkbook: MakeWorkbook
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
export function buildApp(parts: AppParts): BuiltApp {
  const { db, clock, config, logger } = parts
  const events = createEventHub()
  const sessions = createSessionService({ db, clock, onEnd: (end) => events.endSession(end) })
  const accounts = createAccountServices({ ...parts, events, sessions })
  const accountLimit = limitByAddress({ limit: config.limits.accountsPerQuarterHour, windowMs: 15 * MINUTE_MS })
  events.filterBy(mayHearOfChange(db))
  const domain = createDomainServices({ db, clock, events })
  const workbooks = createWorkbookService({ ...parts, ...domain })
  const services = { ...parts, ...domain, events, sessions, accounts, accountLimit, workbooks }

  const described = [
    ...healthOperations(services),
    ...firmOperations(services),
    ...sessionOperations(services),
    ...passwordOperations(services),
    ...personOperations(services),
    ...outboxOperations(services),
    ...priceBookOperations(services),
    ...houseOperations(services),
    ...roomOperations(services),
    ...shareOperations(services),
    ...estimateOperations(services),
    ...lineOperations(services),
    ...summaryOperations(services),
    ...exchangeOperations(services),
    ...workbookOperations(services),
    ...computeOperations(),
    ...eventOperations(services),
  ]
  const operations = [...described, ...openApiOperations(described, packageInfo.version)]

  const app = express()
  app.disable('x-powered-by')
  app.set('etag', false)
  app.set('query parser', 'simple')
  app.set('trust proxy', config.trustProxy)
  const isHttps = config.appUrl.startsWith('https:')
  app.set(REACHED_BY_HTTPS, isHttps)
  app.use(requestLog(logger))
  app.use(securityHeaders({ isHttps }))
  app.use(compressResponses())
  app.use(
    '/api',
    limitByAddress({ limit: config.limits.apiPerMinute, windowMs: MINUTE_MS }),
    sameOrigin(config.appUrl),
    session(sessions),
    apiRouter(operations, { idempotency: createIdempotency({ db, clock }), checkAnswers: config.checkAnswers }),
  )
  if (config.clientFolder !== null) app.use(serveClient(config.clientFolder))
  app.use(errorHandler)
  return { app, operations, events }
}
