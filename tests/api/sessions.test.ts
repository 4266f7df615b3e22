import { eq } from 'drizzle-orm'
import type { Response } from 'supertest'
import { beforeEach, describe, expect, it } from 'vitest'
import { sessions } from '../../server/db/schema/sessions.ts'
import { users } from '../../server/db/schema/users.ts'
import type { PasswordHasher } from '../../server/features/accounts/passwordHasher.ts'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'
import { buildUser, TEST_PASSWORD } from '../support/buildUser.ts'

const MINUTE_MS = 60_000
const HOUR_MS = 60 * MINUTE_MS
const DAY_MS = 24 * HOUR_MS

let app: TestApp

beforeEach(() => {
  app = buildTestApp()
})

function signIn(email: string, password = TEST_PASSWORD) {
  return app.anonymous().post('/api/sessions').send({ email, password })
}

function cookieOf(answer: Response): string {
  return String(answer.headers['set-cookie'])
}

describe('POST /api/sessions', () => {
  it('signs in with 201, says who it is and hands over a cookie that scripts and other sites never see', async () => {
    const user = buildUser(app.db, { role: 'estimator' })
    const answer = await signIn(user.email)
    expect(answer.status).toBe(201)
    expect(answer.body).toEqual({ id: user.id, email: user.email, name: user.name, role: 'estimator' })
    expect(cookieOf(answer)).toMatch(/^quoinbook_session=[\w-]{43}; Max-Age=1209600; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/)
  })

  it('takes the e-mail in any case and with blanks around it', async () => {
    const user = buildUser(app.db)
    expect((await signIn(`  ${user.email.toUpperCase()} `)).status).toBe(201)
  })

  it('notes when the person last signed in', async () => {
    const user = buildUser(app.db)
    await signIn(user.email)
    const row = app.db.select().from(users).where(eq(users.id, user.id)).get()
    expect(row?.lastSignInAt).toBe(app.clock().toISOString())
  })

  it('keeps the session id as a hash alone', async () => {
    const user = buildUser(app.db)
    const [, token = ''] = /quoinbook_session=([\w-]+)/.exec(cookieOf(await signIn(user.email))) ?? []
    const rows = app.db.select().from(sessions).all()
    expect(rows).toHaveLength(1)
    expect(JSON.stringify(rows)).not.toContain(token)
  })

  it('gives another id at each sign-in and ends the session that the browser still held', async () => {
    const { user, agent } = app.signInAs('estimator')
    const [before] = app.db.select().from(sessions).all()
    const answer = await agent.post('/api/sessions').send({ email: user.email, password: TEST_PASSWORD })
    expect(answer.status).toBe(201)
    const after = app.db.select().from(sessions).all()
    expect(after).toHaveLength(1)
    expect(after[0]?.idHash).not.toBe(before?.idHash)
  })

  describe('over https behind a trusted proxy', () => {
    it('marks the cookie Secure and prefixes its name, and reads it back by that name only', async () => {
      app = buildTestApp({ trustProxy: 1, appUrl: 'https://quoinbook.example' })
      const user = buildUser(app.db)
      const answer = await signIn(user.email).set('X-Forwarded-Proto', 'https')
      expect(cookieOf(answer)).toMatch(/^__Host-quoinbook_session=.*; Path=\/; .*HttpOnly; Secure; SameSite=Lax$/)
      const [pair = ''] = cookieOf(answer).split(';')
      const read = (cookie: string) => app.anonymous().get('/api/sessions/current').set('X-Forwarded-Proto', 'https').set('Cookie', cookie)
      expect((await read(pair)).status).toBe(200)
      expect((await read(pair.replace('__Host-', ''))).status).toBe(401)
    })
  })

  describe('of an app whose address is an https one', () => {
    it('marks the cookie Secure also where the proxy does not say so, and reads it back', async () => {
      app = buildTestApp({ appUrl: 'https://quoinbook.example' })
      const user = buildUser(app.db)
      const answer = await signIn(user.email)
      expect(cookieOf(answer)).toMatch(/^__Host-quoinbook_session=.*; Path=\/; .*HttpOnly; Secure; SameSite=Lax$/)
      const [pair = ''] = cookieOf(answer).split(';')
      expect((await app.anonymous().get('/api/sessions/current').set('Cookie', pair)).status).toBe(200)
    })
  })

  describe('when it fails', () => {
    it('reads the same for a wrong password, an unknown address, an open invitation and a deactivated account', async () => {
      const active = buildUser(app.db)
      const invited = buildUser(app.db, { status: 'invited' })
      const deactivated = buildUser(app.db, { status: 'deactivated' })
      const answers = [
        await signIn(active.email, 'some other words here'),
        await signIn('nobody@test.example'),
        await signIn(invited.email),
        await signIn(deactivated.email),
      ]
      for (const { status, body } of answers) {
        expect(status).toBe(401)
        expect({ ...body, requestId: '' }).toEqual({ ...answers[0]?.body, requestId: '' })
      }
      expect(answers[0]?.body).toMatchObject({ code: 'wrong-sign-in', detail: expect.stringContaining('set a new password') })
    })

    it('does the same work for an unknown address as for a known one', async () => {
      const checked: (string | null)[] = []
      const hasher: PasswordHasher = {
        hash: async () => 'hash',
        matches: async (_password, hash) => {
          checked.push(hash)
          return false
        },
      }
      app = buildTestApp({}, { hasher })
      const user = buildUser(app.db)
      await signIn(user.email)
      await signIn('nobody@test.example')
      expect(checked).toEqual([expect.any(String), null])
    })

    it('refuses a text that only begins with the password, where bcrypt would stop reading', async () => {
      const longest = `lantern quarry ropewalk gutter sill ${'xq7 vb2 kp9m '.repeat(3)}`.slice(0, 72)
      const { user, agent } = app.signInAs('estimator')
      await agent.put('/api/account/password').send({ currentPassword: TEST_PASSWORD, newPassword: longest })
      expect((await signIn(user.email, longest)).status).toBe(201)
      expect((await signIn(user.email, `${longest} and more`)).status).toBe(401)
    })

    it('names each field that is missing or of the wrong kind, with 422', async () => {
      const answer = await app.anonymous().post('/api/sessions').send({ email: 'not an address', passwort: 'x' })
      expect(answer.status).toBe(422)
      expect(answer.body.errors).toEqual([
        { path: 'email', code: 'invalid-format', message: 'is not an e-mail address' },
        { path: 'password', code: 'invalid-type', message: 'is missing' },
        { path: 'passwort', code: 'unknown-field', message: 'is not a known field' },
      ])
    })
  })

  describe('after wrong passwords', () => {
    async function fail(email: string, times: number) {
      for (let time = 0; time < times; time += 1) await signIn(email, 'some other words here')
    }

    it('lets five mistakes pass, then asks to wait a minute, the right password too', async () => {
      const user = buildUser(app.db)
      await fail(user.email, 5)
      const refused = await signIn(user.email)
      expect(refused.status).toBe(429)
      expect(refused.headers['retry-after']).toBe('60')
      expect(refused.body.detail).toBe('Too many wrong passwords. Try again in a minute.')
      app.advance(MINUTE_MS)
      expect((await signIn(user.email)).status).toBe(201)
    })

    it('lengthens the wait to a quarter of an hour and no more', async () => {
      const user = buildUser(app.db)
      await fail(user.email, 5)
      const waits: number[] = []
      for (let round = 0; round < 6; round += 1) {
        const seconds = Number((await signIn(user.email)).headers['retry-after'])
        waits.push(seconds / 60)
        app.advance(seconds * 1000)
        await fail(user.email, 1)
      }
      expect(waits).toEqual([1, 2, 4, 8, 15, 15])
    })

    it('counts tries that come all at once', async () => {
      const user = buildUser(app.db)
      const answers = await Promise.all(Array.from({ length: 20 }, () => signIn(user.email, 'some other words here')))
      expect(answers.filter(({ status }) => status === 401)).toHaveLength(5)
      expect(answers.filter(({ status }) => status === 429)).toHaveLength(15)
    })

    it('does not lock the person out at another address', async () => {
      app = buildTestApp({ trustProxy: 1 })
      const user = buildUser(app.db)
      const from = (address: string, password: string) => signIn(user.email, password).set('X-Forwarded-For', address)
      for (let time = 0; time < 8; time += 1) await from('192.0.2.1', 'some other words here')
      expect((await from('192.0.2.1', TEST_PASSWORD)).status).toBe(429)
      expect((await from('198.51.100.7', TEST_PASSWORD)).status).toBe(201)
    })

    it('asks everybody for a pause of half a minute when many addresses guess at one account', async () => {
      app = buildTestApp({ trustProxy: 1 })
      const user = buildUser(app.db)
      const from = (address: string, password: string) => signIn(user.email, password).set('X-Forwarded-For', address)
      for (let time = 0; time < 30; time += 1) await from(`192.0.2.${time}`, 'some other words here')
      const refused = await from('198.51.100.7', TEST_PASSWORD)
      expect([refused.status, refused.headers['retry-after']]).toEqual([429, '30'])
      app.advance(30_000)
      expect((await from('198.51.100.7', TEST_PASSWORD)).status).toBe(201)
    })

    it('does the same for an address that nobody has, so that locking tells nothing', async () => {
      await fail('nobody@test.example', 5)
      expect((await signIn('nobody@test.example')).status).toBe(429)
    })

    it('forgets them after a good sign-in', async () => {
      const user = buildUser(app.db)
      await fail(user.email, 4)
      expect((await signIn(user.email)).status).toBe(201)
      await fail(user.email, 4)
      expect((await signIn(user.email)).status).toBe(201)
    })
  })

  it('answers 429 with Retry-After when one address asks too often', async () => {
    app = buildTestApp({ limits: { apiPerMinute: 1000, accountsPerQuarterHour: 3 } })
    for (let time = 0; time < 3; time += 1) await signIn(`somebody-${time}@test.example`)
    const refused = await signIn('one-more@test.example')
    expect(refused.status).toBe(429)
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(800)
    expect(refused.headers['content-type']).toContain('application/problem+json')
    expect((await app.anonymous().get('/api/firm')).status).toBe(200)
  })
})

describe('a session', () => {
  it('says who is signed in', async () => {
    const { agent, user } = app.signInAs('owner')
    const answer = await agent.get('/api/sessions/current')
    expect([answer.status, answer.body]).toEqual([200, { id: user.id, email: user.email, name: user.name, role: 'owner' }])
  })

  it('is none without a cookie, with a made-up one and with an empty one', async () => {
    for (const cookie of ['', 'quoinbook_session=', `quoinbook_session=${'A'.repeat(43)}`, 'quoinbook_session=%00; other=1']) {
      expect((await app.anonymous().get('/api/sessions/current').set('Cookie', cookie)).status).toBe(401)
    }
  })

  it('lasts while it is used and ends after twelve hours without use', async () => {
    const { agent } = app.signInAs('estimator')
    for (let round = 0; round < 4; round += 1) {
      app.advance(11 * HOUR_MS)
      expect((await agent.get('/api/sessions/current')).status).toBe(200)
    }
    app.advance(12 * HOUR_MS + 1)
    expect((await agent.get('/api/sessions/current')).status).toBe(401)
  })

  it('ends after fourteen days however much it is used', async () => {
    const { agent } = app.signInAs('estimator')
    for (let halfDay = 0; halfDay < 28; halfDay += 1) {
      app.advance(DAY_MS / 2 - 1)
      expect((await agent.get('/api/sessions/current')).status).toBe(200)
    }
    app.advance(HOUR_MS)
    expect((await agent.get('/api/sessions/current')).status).toBe(401)
  })

  it('is swept from the file once it is over', async () => {
    app.signInAs('estimator')
    app.advance(15 * DAY_MS)
    app.signInAs('owner')
    expect(app.db.select().from(sessions).all()).toHaveLength(1)
  })
})

describe('DELETE /api/sessions/current', () => {
  it('signs out here, clears the cookie and leaves other devices signed in', async () => {
    const { agent, user } = app.signInAs('estimator')
    const elsewhere = app.agentOf(user)
    const answer = await agent.delete('/api/sessions/current')
    expect(answer.status).toBe(204)
    expect(cookieOf(answer)).toMatch(/^quoinbook_session=; Path=\/; Expires=Thu, 01 Jan 1970/)
    expect((await agent.get('/api/sessions/current')).status).toBe(401)
    expect((await elsewhere.get('/api/sessions/current')).status).toBe(200)
  })
})

describe('DELETE /api/sessions', () => {
  it('signs out on every device, and nobody else', async () => {
    const { agent, user } = app.signInAs('estimator')
    const elsewhere = app.agentOf(user)
    const neighbour = app.signInAs('estimator')
    expect((await agent.delete('/api/sessions')).status).toBe(204)
    expect((await elsewhere.get('/api/sessions/current')).status).toBe(401)
    expect((await neighbour.agent.get('/api/sessions/current')).status).toBe(200)
  })
})
