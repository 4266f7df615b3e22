import { fileURLToPath } from 'node:url'
import { pino } from 'pino'
import type { Firm } from '../shared/schemas/account.ts'
import { buildApp } from './app.ts'
import { systemClock } from './config/clock.ts'
import { readEnv, type Env } from './config/env.ts'
import { sessionSecretOf } from './config/sessionSecret.ts'
import { StartRefusal } from './config/StartRefusal.ts'
import { welcomeText } from './config/welcome.ts'
import type { Database } from './db/client.ts'
import { openFirmFile } from './db/firmFile.ts'
import { newId } from './db/newId.ts'
import { closeDatabase } from './db/openDatabase.ts'
import { PASSWORD_COST } from './features/accounts/passwordCost.ts'
import { hasPeople } from './features/accounts/personRepository.ts'
import { findFirm } from './features/firm/firmRepository.ts'
import { insertOutboxMessage } from './features/outbox/outboxRepository.ts'
import { listen } from './http/listen.ts'
import { stopGracefully } from './http/stopGracefully.ts'
import { createOutboxMailSender, createSmtpMailSender } from './mail/createMailSender.ts'
import type { MailSender } from './mail/mailSender.ts'
import { startHashingThread } from './workers/hashingThread.ts'
import { startWorkbookThread } from './workers/workbookThread.ts'

const CLIENT_FOLDER = fileURLToPath(new URL('../dist', import.meta.url))

try {
  await start(readEnv(process.env))
} catch (error) {
  if (!(error instanceof StartRefusal)) throw error
  process.stderr.write(`${error.message}\n`)
  process.exitCode = 1
}

async function start(env: Env): Promise<void> {
  const sessionSecret = sessionSecretOf(env)
  const db = await openFirmFile(env.dataDir, systemClock)
  if (!env.isProduction && !hasPeople(db)) await seed(db)
  const demoAccounts = await demoAccountsOf(db, env)
  const hasher = startHashingThread(PASSWORD_COST)
  const workbookThread = startWorkbookThread()
  const { app, events } = buildApp({
    db,
    clock: systemClock,
    mail: mailOf(env, db),
    hasher,
    makeWorkbook: workbookThread.makeWorkbook,
    config: { ...env, sessionSecret, hasOutbox: env.smtpUrl === null, checkAnswers: false, clientFolder: CLIENT_FOLDER, demoAccounts },
    logger: pino({ level: env.logLevel }),
  })

  const server = await listen(app, env)
  stopOnSignal(async () => {
    await stopGracefully(server, () => events.closeAll())
    await Promise.all([hasher.stop(), workbookThread.stop()])
    closeDatabase(db)
  })
  process.stdout.write(welcomeText({ url: env.appUrl, demoAccounts, hasPeople: hasPeople(db) }))
}

/** The first signal stops in good order; a second one, from somebody impatient, ends the process as usual. */
function stopOnSignal(stop: () => Promise<void>): void {
  let isStopping = false
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => {
      if (isStopping) return
      isStopping = true
      void stop()
    })
  }
}

/** Loaded only when it is needed: a firm's own app never reads the demo. */
async function seed(db: Database): Promise<void> {
  const { seedDemo } = await import('../seed/index.ts')
  await seedDemo(db, { clock: systemClock })
}

/** The sign-ins of a demo file. They are known to everybody, so in production such a file is refused. */
async function demoAccountsOf(db: Database, { isProduction }: Env): Promise<Firm['demoAccounts']> {
  const isDemo = findFirm(db)?.isDemo ?? false
  if (!isDemo) return []
  if (isProduction)
    throw new StartRefusal("This data is the demo's, whose passwords are public. In production set DATA_DIR to a folder of your own.")
  const { demoAccounts } = await import('../seed/demoAccounts.ts')
  return [...demoAccounts]
}

function mailOf({ smtpUrl, mailFrom }: Env, db: Database): MailSender {
  if (smtpUrl !== null) return createSmtpMailSender(smtpUrl, mailFrom)
  return createOutboxMailSender(
    (message) => insertOutboxMessage(db, { id: newId(), ...message, sentAt: systemClock().toISOString() }),
    mailFrom,
  )
}
