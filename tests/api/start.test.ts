import { existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { systemClock } from '../../server/config/clock.ts'
import { openFirmFile } from '../../server/db/firmFile.ts'
import { closeDatabase } from '../../server/db/openDatabase.ts'
import { listPeople } from '../../server/features/accounts/personRepository.ts'
import { saveFirm } from '../../server/features/firm/firmRepository.ts'
import { auditOf } from '../support/auditOf.ts'
import { runProgram } from '../support/runProgram.ts'
import { startApp, type RunningApp } from '../support/startApp.ts'

// Each starts whole processes, several a test; a busy machine takes its time.
vi.setConfig({ testTimeout: 90_000, hookTimeout: 30_000 })

let dataDir: string
let env: Record<string, string>
let running: RunningApp | null

beforeEach(() => {
  dataDir = mkdtempSync(join(tmpdir(), 'quoinbook-start-'))
  env = { DATA_DIR: dataDir, NODE_ENV: 'production', SESSION_SECRET: 'a secret for the tests alone, long enough' }
  running = null
})
afterEach(async () => {
  await running?.stop()
  rmSync(dataDir, { recursive: true })
})

const start = async () => (running = await startApp(env))

describe('npm start in production', () => {
  it('refuses without SESSION_SECRET and says how to make one, in words and without a stack', async () => {
    const { code, err } = await runProgram('server/index.ts', [], { ...env, SESSION_SECRET: '' })
    expect(code).toBe(1)
    expect(err).toMatch(/SESSION_SECRET must be set[\s\S]*randomBytes/)
    expect(err).not.toContain('    at ')
    expect(readdirSync(dataDir)).toEqual([])
  })

  it('begins empty: no demo, nobody to sign in as', async () => {
    const { url } = await start()
    expect(await (await fetch(`${url}/api/firm`)).json()).toEqual({ name: 'Quoinbook', isDemo: false, hasOutbox: true, demoAccounts: [] })
  })

  it("refuses a demo's data, whose passwords everybody knows", async () => {
    const db = await openFirmFile(dataDir, systemClock)
    saveFirm(db, { name: 'Demo', isDemo: true })
    closeDatabase(db)
    const { code, err } = await runProgram('server/index.ts', [], env)
    expect(code).toBe(1)
    expect(err).toContain('passwords are public')
  })

  it('says which port is in use and how to choose another', async () => {
    const { url } = await start()
    const { port } = new URL(url)
    const second = await runProgram('server/index.ts', [], { ...env, PORT: port })
    expect(second.code).toBe(1)
    expect(second.err).toContain(`Port ${port} is in use`)
    expect((await fetch(`${url}/api/health`)).status).toBe(200)
  })

  it('stops in good order: open streams end, the log is brought into the file', async () => {
    await runProgram('server/commands/createAdmin.ts', ['ida@firm.example', 'Ida Vale'], env)
    await start()
    expect(readdirSync(dataDir)).toContain('quoinbook.sqlite-wal')
    await running?.stop()
    running = null
    expect(readdirSync(dataDir)).toEqual(['quoinbook.sqlite'])
  })
})

describe('npm run create-admin', () => {
  const createAdmin = (...args: string[]) => runProgram('server/commands/createAdmin.ts', args, env)

  it('makes an admin who can sign in with the password that it prints once', async () => {
    const { code, out } = await createAdmin('Ida@Firm.example', 'Ida Vale')
    expect(code).toBe(0)
    const [, password] = /shown this once:\s+(\S{20})/.exec(out) ?? []
    const { url } = await start()
    const body = JSON.stringify({ email: 'ida@firm.example', password })
    const answer = await fetch(`${url}/api/sessions`, { method: 'POST', headers: { 'Content-Type': 'application/json' }, body })
    expect([answer.status, await answer.json()]).toMatchObject([201, { name: 'Ida Vale', role: 'admin' }])
  })

  it('leaves an audit row, by nobody who is signed in', async () => {
    await createAdmin('ida@firm.example', 'Ida Vale')
    const db = await openFirmFile(dataDir, systemClock)
    expect(auditOf(db, 'person')).toMatchObject([
      { actorId: null, action: 'create-admin', after: { email: 'ida@firm.example', role: 'admin' } },
    ])
    closeDatabase(db)
  })

  it('prints a link instead when asked to, which sets a password and signs in', async () => {
    const { out } = await createAdmin('ida@firm.example', 'Ida Vale', '--invite')
    const [, token] = /accept-invitation\?token=(\S+)/.exec(out) ?? []
    const { url } = await start()
    const body = JSON.stringify({ token, name: 'Ida Vale', newPassword: 'four slow copper pipes' })
    const answer = await fetch(`${url}/api/invitations/accept`, { method: 'POST', headers: { 'Content-Type': 'application/json' }, body })
    expect(await answer.json()).toMatchObject({ email: 'ida@firm.example', role: 'admin' })
  })

  it('refuses in words an address that is taken or is none, and tells its use when it is given nothing', async () => {
    await createAdmin('ida@firm.example', 'Ida Vale')
    expect(await createAdmin('ida@firm.example', 'Ida Vale')).toMatchObject({
      code: 1,
      err: expect.stringContaining('has an account already'),
    })
    expect(await createAdmin('ida', 'Ida Vale')).toMatchObject({
      code: 1,
      err: expect.stringContaining('The e-mail is not an e-mail address.'),
    })
    expect(await createAdmin()).toMatchObject({ code: 1, err: expect.stringContaining('npm run create-admin -- EMAIL') })
    const db = await openFirmFile(dataDir, systemClock)
    expect(listPeople(db)).toHaveLength(1)
    closeDatabase(db)
  })
})

describe('npm run backup and npm run restore', () => {
  it('copy the data while the app runs, and put it back once it is stopped', async () => {
    await start()
    await runProgram('server/commands/createAdmin.ts', ['ida@firm.example', 'Ida Vale'], env)
    const backup = await runProgram('server/commands/backup.ts', [], env)
    const file = backup.out.trim()
    expect([backup.code, existsSync(file)]).toEqual([0, true])
    await runProgram('server/commands/createAdmin.ts', ['oda@firm.example', 'Oda Vale'], env)

    expect(await runProgram('server/commands/restore.ts', [file], env)).toMatchObject({
      code: 1,
      err: expect.stringContaining('still running'),
    })
    await running?.stop()
    running = null
    expect(await runProgram('server/commands/restore.ts', [file], env)).toMatchObject({
      code: 0,
      out: expect.stringContaining('is kept in'),
    })
    const db = await openFirmFile(dataDir, systemClock)
    expect(listPeople(db).map(({ email }) => email)).toEqual(['ida@firm.example'])
    closeDatabase(db)
  })

  it('say in words that there is nothing to back up, or no file named to restore', async () => {
    expect(await runProgram('server/commands/backup.ts', [], env)).toMatchObject({
      code: 1,
      err: expect.stringContaining('nothing to back up'),
    })
    expect(await runProgram('server/commands/restore.ts', [], env)).toMatchObject({
      code: 1,
      err: expect.stringContaining('Name the backup'),
    })
  })
})
