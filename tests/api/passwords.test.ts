import { eq } from 'drizzle-orm'
import { SignJWT } from 'jose'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { spentTokens } from '../../server/db/schema/spentTokens.ts'
import { users } from '../../server/db/schema/users.ts'
import { auditOf } from '../support/auditOf.ts'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'
import { buildUser, TEST_PASSWORD } from '../support/buildUser.ts'
import { mailTo, tokenIn } from '../support/sentMail.ts'

const HOUR_MS = 3_600_000
const NEW_PASSWORD = 'four slow copper pipes'

let app: TestApp

beforeEach(() => {
  app = buildTestApp()
})

function signIn(email: string, password: string) {
  return app.anonymous().post('/api/sessions').send({ email, password })
}

describe('PUT /api/account/password', () => {
  function change(agent: ReturnType<TestApp['agentOf']>, newPassword: string, currentPassword = TEST_PASSWORD) {
    return agent.put('/api/account/password').send({ currentPassword, newPassword })
  }

  it('changes the password: the new one signs in, the old one no longer', async () => {
    const { agent, user } = app.signInAs('owner')
    expect((await change(agent, NEW_PASSWORD)).status).toBe(204)
    expect((await signIn(user.email, NEW_PASSWORD)).status).toBe(201)
    expect((await signIn(user.email, TEST_PASSWORD)).status).toBe(401)
  })

  it('ends the other sessions of the person and keeps the one it was asked in', async () => {
    const { agent, user } = app.signInAs('owner')
    const elsewhere = app.agentOf(user)
    await change(agent, NEW_PASSWORD)
    expect((await agent.get('/api/sessions/current')).status).toBe(200)
    expect((await elsewhere.get('/api/sessions/current')).status).toBe(401)
  })

  it('leaves an audit row that holds no hash', async () => {
    const { agent, user } = app.signInAs('owner')
    await change(agent, NEW_PASSWORD)
    expect(auditOf(app.db, 'person', user.id)).toMatchObject([{ actorId: user.id, action: 'change-password', before: null, after: null }])
  })

  it('refuses a wrong current password at its field, and counts it like a wrong sign-in', async () => {
    const { agent, user } = app.signInAs('owner')
    const refused = await change(agent, NEW_PASSWORD, 'not my password at all')
    expect(refused.status).toBe(422)
    expect(refused.body.errors).toEqual([{ path: 'currentPassword', code: 'wrong-password', message: 'is not your password' }])
    for (let time = 0; time < 4; time += 1) await change(agent, NEW_PASSWORD, 'not my password at all')
    expect((await change(agent, NEW_PASSWORD)).status).toBe(429)
    expect((await signIn(user.email, TEST_PASSWORD)).status).toBe(429)
  })

  it('refuses the password that one has already', async () => {
    const { agent } = app.signInAs('owner')
    expect((await change(agent, TEST_PASSWORD)).body.errors).toMatchObject([{ path: 'newPassword', code: 'same-password' }])
  })

  it.each([
    ['is shorter than twelve characters', 'xq7vb2kp9mw', 'needs at least 12 characters'],
    ['is longer than the 72 bytes that are read of it', 'ü'.repeat(37), 'is longer than 72 bytes'],
    ['is a common one with figures behind it', 'password1234', 'is too easy to guess'],
    ['is a common one with letters swapped for figures', 'P4ssw0rd!234', 'is too easy to guess'],
    ['is one key over and over', 'aaaaaaaaaaaaaa', 'is too easy to guess'],
    ['is a run of keys', 'qwertyuiop12', 'is too easy to guess'],
    ['counts up', '123456789012', 'is too easy to guess'],
    ['is the name of this program', 'quoinbook2026', 'is too easy to guess'],
    ['is the own e-mail address', 'brinley.oake@test.example', 'is too easy to guess'],
    ['is the own name', 'Brinley Oake 1', 'is too easy to guess'],
  ])('refuses a new password that %s', async (_what, newPassword, words) => {
    const { agent, user } = app.signInAs('owner', { email: 'brinley.oake@test.example', name: 'Brinley Oake' })
    const refused = await change(agent, newPassword)
    expect(refused.status).toBe(422)
    expect(refused.body.errors).toMatchObject([{ path: 'newPassword', message: expect.stringContaining(words) }])
    expect((await signIn(user.email, TEST_PASSWORD)).status).toBe(201)
  })

  it('takes plain words without figures or capitals: length is what counts', async () => {
    const { agent } = app.signInAs('owner')
    expect((await change(agent, 'lantern above the quarry')).status).toBe(204)
  })
})

describe('POST /api/password-resets', () => {
  function ask(email: string) {
    return app.anonymous().post('/api/password-resets').send({ email })
  }

  it('answers 202 and nothing else whether or not there is such an account', async () => {
    const user = buildUser(app.db)
    for (const email of [user.email, 'nobody@test.example']) {
      const answer = await ask(email)
      expect([answer.status, answer.text]).toEqual([202, ''])
    }
  })

  it('mails a link to the app, to an active account alone', async () => {
    const active = buildUser(app.db)
    const invited = buildUser(app.db, { status: 'invited' })
    const deactivated = buildUser(app.db, { status: 'deactivated' })
    for (const { email } of [invited, deactivated, active]) await ask(email)
    const message = await mailTo(app.sentMail, active.email)
    expect(message.text).toContain('http://quoinbook.example/reset-password?token=')
    expect(app.sentMail).toHaveLength(1)
  })

  it('sends one mail a minute, however often somebody asks', async () => {
    const user = buildUser(app.db)
    for (let time = 0; time < 3; time += 1) await ask(user.email)
    await mailTo(app.sentMail, user.email)
    expect(app.sentMail).toHaveLength(1)
    app.advance(60_000)
    await ask(user.email)
    await vi.waitFor(() => expect(app.sentMail).toHaveLength(2))
  })

  it('answers 202 also when the mail server is down', async () => {
    app = buildTestApp({}, { mail: { send: () => Promise.reject(new Error('no mail server')) } })
    expect((await ask(buildUser(app.db).email)).status).toBe(202)
    expect((await app.anonymous().get('/api/health')).status).toBe(200)
  })
})

describe('POST /api/password-resets/redeem', () => {
  async function tokenFor(email: string): Promise<string> {
    await app.anonymous().post('/api/password-resets').send({ email })
    return tokenIn(await mailTo(app.sentMail, email))
  }

  function redeem(token: string, newPassword = NEW_PASSWORD) {
    return app.anonymous().post('/api/password-resets/redeem').send({ token, newPassword })
  }

  it('sets the new password and ends every session of the person', async () => {
    const { agent, user } = app.signInAs('owner')
    const token = await tokenFor(user.email)
    expect((await redeem(token)).status).toBe(204)
    expect((await agent.get('/api/sessions/current')).status).toBe(401)
    expect((await signIn(user.email, NEW_PASSWORD)).status).toBe(201)
    expect(auditOf(app.db, 'person', user.id)).toMatchObject([{ action: 'reset-password', before: null, after: null }])
  })

  it('opens an account again that wrong passwords had locked', async () => {
    const user = buildUser(app.db)
    for (let time = 0; time < 5; time += 1) await signIn(user.email, 'some other words here')
    expect((await signIn(user.email, TEST_PASSWORD)).status).toBe(429)
    await redeem(await tokenFor(user.email))
    expect((await signIn(user.email, NEW_PASSWORD)).status).toBe(201)
  })

  it('keeps no token in the file, only the mark that one was used', async () => {
    const user = buildUser(app.db)
    const token = await tokenFor(user.email)
    await redeem(token)
    const [spent] = app.db.select().from(spentTokens).all()
    expect(spent?.idHash).toMatch(/^[0-9a-f]{64}$/)
    expect(token).not.toContain(String(spent?.idHash))
  })

  async function expectLinkEnded(token: string, newPassword?: string) {
    const refused = await redeem(token, newPassword)
    expect(refused.status).toBe(422)
    expect(refused.body).toMatchObject({
      code: 'link-ended',
      detail: 'This link was used already or is too old. Ask for a new one.',
      errors: [{ path: 'token' }],
    })
  }

  it('works once', async () => {
    const user = buildUser(app.db)
    const token = await tokenFor(user.email)
    await redeem(token)
    await expectLinkEnded(token, 'five slow copper pipes')
    expect((await signIn(user.email, NEW_PASSWORD)).status).toBe(201)
  })

  it('works once also when two follow it at the same moment', async () => {
    const token = await tokenFor(buildUser(app.db).email)
    const answers = await Promise.all([redeem(token), redeem(token, 'five slow copper pipes')])
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 422])
  })

  it('works for an hour', async () => {
    const token = await tokenFor(buildUser(app.db).email)
    app.advance(HOUR_MS - 1000)
    expect((await redeem(token, 'password1234')).body.code).toBe('invalid')
    app.advance(2000)
    await expectLinkEnded(token)
  })

  it('ends when the password was changed in the meantime', async () => {
    const { agent, user } = app.signInAs('owner')
    const token = await tokenFor(user.email)
    await agent.put('/api/account/password').send({ currentPassword: TEST_PASSWORD, newPassword: 'five slow copper pipes' })
    await expectLinkEnded(token)
  })

  it('ends when the account was deactivated in the meantime', async () => {
    const user = buildUser(app.db)
    const token = await tokenFor(user.email)
    app.db.update(users).set({ status: 'deactivated' }).where(eq(users.id, user.id)).run()
    await expectLinkEnded(token)
  })

  it('can be tried again after a password that was too easy', async () => {
    const token = await tokenFor(buildUser(app.db).email)
    expect((await redeem(token, 'password1234')).body.errors).toMatchObject([{ path: 'newPassword', code: 'guessable' }])
    expect((await redeem(token)).status).toBe(204)
  })

  it('refuses a token that was signed for something else, by another key, or by none', async () => {
    const user = buildUser(app.db)
    const admin = app.signInAs('admin')
    await admin.agent.post('/api/invitations').send({ email: 'new@test.example', name: 'New', role: 'owner' })
    const invitation = tokenIn(await mailTo(app.sentMail, 'new@test.example'))
    const claims = new SignJWT({ pw: '' })
      .setProtectedHeader({ alg: 'HS256' })
      .setIssuer('quoinbook')
      .setAudience('password-reset')
      .setSubject(user.id)
    const forged = await claims
      .setJti('1')
      .setExpirationTime(new Date('2099-01-01'))
      .sign(new TextEncoder().encode(app.config.sessionSecret))
    const unsigned = `${Buffer.from('{"alg":"none"}').toString('base64url')}.${forged.split('.')[1]}.`
    for (const token of [invitation, forged, unsigned, 'nonsense']) await expectLinkEnded(token)
  })
})
