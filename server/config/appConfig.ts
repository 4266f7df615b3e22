import type { Firm } from '../../shared/schemas/account.ts'

/** What the app is told when it is put together; `env.ts` makes it from the environment, tests write it themselves. */
export interface AppConfig {
  /** The firm's name, where the environment gives one. */
  firmName: string | null
  /** Where people reach the app, without a slash at the end: links in mails begin with it. */
  appUrl: string
  /** Signs the links that leave by mail. */
  sessionSecret: string
  /** Express's `trust proxy`: whose word on the reader's address and https counts. */
  trustProxy: boolean | number | string
  /** Mail goes to the outbox that the admin reads in the app. */
  hasOutbox: boolean
  /** Requests that one address may send. */
  limits: {
    apiPerMinute: number
    /** Sign-in, resets and invitations: what a guesser would call. */
    accountsPerQuarterHour: number
  }
  checkAnswers: boolean
  /** The built client; `null`: the API alone. */
  clientFolder: string | null
  /** Sign-ins that a demo shows; kept apart from the file, which holds hashes only. */
  demoAccounts: Firm['demoAccounts']
}
