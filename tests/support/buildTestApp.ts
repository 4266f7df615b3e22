import { pino } from 'pino'
import request from 'supertest'
import { buildApp, type AppParts } from '../../server/app.ts'
import type { AppConfig } from '../../server/config/appConfig.ts'
import { migrate } from '../../server/db/migrate.ts'
import { openDatabase } from '../../server/db/openDatabase.ts'
import { startWorkbookThread } from '../../server/workers/workbookThread.ts'
import { createPasswordHasherHere } from '../../server/features/accounts/passwordHasher.ts'
import { createSessionService } from '../../server/features/accounts/sessionService.ts'
import type { MailMessage } from '../../server/mail/mailSender.ts'
import type { Role } from '../../shared/schemas/account.ts'
import { buildUser, type TestUser } from './buildUser.ts'
import { steppingClock } from './steppingClock.ts'

const TEST_CONFIG: AppConfig = {
  firmName: null,
  appUrl: 'http://quoinbook.example',
  sessionSecret: 'a secret that only the tests know, long enough to sign with',
  trustProxy: false,
  hasOutbox: true,
  limits: { apiPerMinute: 100_000, accountsPerQuarterHour: 100_000 },
  checkAnswers: true,
  clientFolder: null,
  demoAccounts: [],
}

/** The least cost that bcrypt takes: the tests are about what happens around a hash. */
const hasher = createPasswordHasherHere(4)
/** Starts with the first workbook that a test asks for. */
const { makeWorkbook } = startWorkbookThread()

export type TestApp = ReturnType<typeof buildTestApp>
export type SignedIn = { user: TestUser; agent: ReturnType<typeof request.agent> }

/**
 * The whole app over a fresh database in memory, in the test's own process: migrated, a clock that the test sets,
 * mail kept in a list, every answer checked against its description.
 */
export function buildTestApp(overrides: Partial<AppConfig> = {}, otherParts: Partial<AppParts> = {}) {
  const db = openDatabase(':memory:')
  migrate(db)
  const { clock, advance } = steppingClock()
  const sentMail: MailMessage[] = []
  const mail = {
    async send(message: MailMessage) {
      sentMail.push(message)
    },
  }
  const config = { ...TEST_CONFIG, ...overrides }
  const { app, operations, events } = buildApp({
    db,
    clock,
    mail,
    hasher,
    makeWorkbook,
    config,
    logger: pino({ level: 'silent' }),
    ...otherParts,
  })
  const sessions = createSessionService({ db, clock, onEnd: (end) => events.endSession(end) })

  /** The cookie of a new session of this person. */
  function cookieOf(user: Pick<TestUser, 'id'>): string {
    return `quoinbook_session=${sessions.begin(db, user.id)}`
  }

  /** An agent that holds a session of this person. */
  function agentOf(user: TestUser): SignedIn['agent'] {
    return request.agent(app).set('Cookie', cookieOf(user)) as SignedIn['agent']
  }

  return {
    app,
    db,
    config,
    operations,
    events,
    clock,
    /** Lets so many milliseconds pass. */
    advance,
    /** Mail in the order it was sent. */
    sentMail,
    agentOf,
    cookieOf,
    /** A new person of the role, signed in. */
    signInAs(role: Role, fields: Partial<TestUser> = {}): SignedIn {
      const user = buildUser(db, { ...fields, role })
      return { user, agent: agentOf(user) }
    },
    /** Nobody's agent. */
    anonymous: () => request.agent(app),
  }
}
