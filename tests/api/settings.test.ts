import { mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { readEnv } from '../../server/config/env.ts'
import { sessionSecretOf } from '../../server/config/sessionSecret.ts'
import { StartRefusal } from '../../server/config/StartRefusal.ts'
import { welcomeText } from '../../server/config/welcome.ts'

describe('the settings', () => {
  it('need nothing: one address of this machine, its data beside it, mail in the app', () => {
    expect(readEnv({})).toMatchObject({
      isProduction: false,
      port: 4400,
      host: '127.0.0.1',
      dataDir: './data',
      appUrl: 'http://127.0.0.1:4400',
      smtpUrl: null,
      trustProxy: false,
    })
  })

  it('take what the environment says; set to nothing counts as not set', () => {
    const env = readEnv({
      PORT: '5000',
      HOST: '',
      APP_URL: 'https://estimates.firm.example/',
      TRUST_PROXY: '1',
      SMTP_URL: 'smtp://mail.firm.example',
    })
    expect(env).toMatchObject({
      port: 5000,
      host: '127.0.0.1',
      appUrl: 'https://estimates.firm.example',
      trustProxy: 1,
      smtpUrl: 'smtp://mail.firm.example',
    })
  })

  it('give an address that opens on this machine when the app listens everywhere', () => {
    expect(readEnv({ HOST: '0.0.0.0' }).appUrl).toBe('http://localhost:4400')
    expect(readEnv({ HOST: '::1', PORT: '5000' }).appUrl).toBe('http://[::1]:5000')
  })

  it('that can not be taken are all named', () => {
    const variables = { PORT: 'abc', APP_URL: 'estimates', SMTP_URL: 'https://mail', SESSION_SECRET: 'short', LOG_LEVEL: 'loud' }
    expect(() => readEnv(variables)).toThrow(StartRefusal)
    for (const name of Object.keys(variables)) expect(() => readEnv(variables)).toThrow(name)
  })
})

describe('the secret that links are signed with', () => {
  let dataDir: string
  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'quoinbook-secret-'))
  })
  afterEach(() => rmSync(dataDir, { recursive: true }))

  it('must be given in production; the refusal says how to make one', () => {
    expect(() => sessionSecretOf(readEnv({ NODE_ENV: 'production', DATA_DIR: dataDir }))).toThrow(
      /SESSION_SECRET must be set[\s\S]*randomBytes\(32\)/,
    )
  })

  it('is made once elsewhere, and kept beside the data for this user alone', () => {
    const env = readEnv({ DATA_DIR: dataDir })
    const secret = sessionSecretOf(env)
    expect(secret).toHaveLength(43)
    expect(sessionSecretOf(env)).toBe(secret)
    const file = join(dataDir, 'session-secret')
    expect(readFileSync(file, 'utf8')).toBe(secret)
    expect(statSync(file).mode & 0o077).toBe(0)
  })

  it('is the given one when there is one', () => {
    const SESSION_SECRET = 'a given secret of at least thirty-two characters'
    expect(sessionSecretOf(readEnv({ SESSION_SECRET, NODE_ENV: 'production' }))).toBe(SESSION_SECRET)
  })
})

describe('what the terminal shows at the start', () => {
  const url = 'http://127.0.0.1:4400'

  it('is one address and the sign-ins of the demo', () => {
    const account = { email: 'admin@demo.example', password: 'a public password', role: 'admin' as const, name: 'Demo' }
    const text = welcomeText({ url, demoAccounts: [account], hasPeople: true })
    expect(text.match(/http:/g)).toHaveLength(1)
    expect(text).toContain('admin  admin@demo.example  a public password')
  })

  it('is how to make the first admin where nobody can sign in yet', () => {
    expect(welcomeText({ url, demoAccounts: [], hasPeople: false })).toContain('npm run create-admin')
    expect(welcomeText({ url, demoAccounts: [], hasPeople: true })).not.toContain('create-admin')
  })
})
