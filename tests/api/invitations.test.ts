import { beforeEach, describe, expect, it } from 'vitest'
import { auditOf } from '../support/auditOf.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { buildUser } from '../support/buildUser.ts'
import { heardEvents } from '../support/heardEvents.ts'
import { mailTo, tokenIn } from '../support/sentMail.ts'

const DAY_MS = 86_400_000
const PASSWORD = 'four slow copper pipes'
const INVITATION = { email: 'sela@test.example', name: 'Sela Marrow', role: 'estimator' }

let app: TestApp
let admin: SignedIn

beforeEach(() => {
  app = buildTestApp()
  admin = app.signInAs('admin')
})

function invite(invitation: object = INVITATION) {
  return admin.agent.post('/api/invitations').send(invitation)
}

function accept(token: string, body: object = {}) {
  return app
    .anonymous()
    .post('/api/invitations/accept')
    .send({ token, name: 'Sela Marrow', newPassword: PASSWORD, ...body })
}

describe('POST /api/invitations', () => {
  it('puts the person on the list as invited and mails a link to the app', async () => {
    const answer = await invite()
    expect(answer.status).toBe(201)
    expect(answer.body).toMatchObject({ ...INVITATION, status: 'invited', version: 1, lastSignInAt: null })
    const message = await mailTo(app.sentMail, INVITATION.email)
    expect(message.subject).toContain('invites you to Quoinbook')
    expect(message.text).toContain(`Hello Sela Marrow`)
    expect(message.text).toContain(admin.user.name)
    expect(message.text).toContain('http://quoinbook.example/accept-invitation?token=')
  })

  it('leaves an audit row and tells open screens of admins', async () => {
    const heard = heardEvents(app, 'admin')
    const heardByEstimator = heardEvents(app, 'estimator')
    const { body } = await invite()
    expect(auditOf(app.db, 'person', body.id)).toMatchObject([
      { actorId: admin.user.id, action: 'invite', before: null, after: { email: INVITATION.email } },
    ])
    expect(heard).toEqual([{ type: 'people', id: body.id, version: 1 }])
    expect(heardByEstimator).toEqual([])
  })

  it('may be repeated while it is open, with another name or role; one person stays one person', async () => {
    const first = await invite()
    const again = await invite({ ...INVITATION, role: 'owner' })
    expect(again.status).toBe(201)
    expect(again.body).toMatchObject({ id: first.body.id, role: 'owner', version: 2 })
    expect(app.sentMail).toHaveLength(2)
  })

  it('refuses with 409 who has an account, and says so; a deactivated one is to be taken back instead', async () => {
    const active = buildUser(app.db)
    const deactivated = buildUser(app.db, { status: 'deactivated' })
    const toActive = await invite({ ...INVITATION, email: active.email.toUpperCase() })
    expect([toActive.status, toActive.body.code]).toEqual([409, 'already-here'])
    expect(toActive.body.detail).toContain('has an account already')
    expect((await invite({ ...INVITATION, email: deactivated.email })).body.detail).toContain('Take the account back')
    expect(app.sentMail).toEqual([])
  })

  it('names each bad field', async () => {
    const answer = await invite({ email: 'nobody', name: ' ', role: 'emperor' })
    expect(answer.status).toBe(422)
    expect(answer.body.errors).toEqual([
      { path: 'email', code: 'invalid-format', message: 'is not an e-mail address' },
      { path: 'name', code: 'too-small', message: 'is empty' },
      { path: 'role', code: 'invalid-value', message: 'must be one of admin, estimator, owner' },
    ])
  })

  it('keeps the person when the mail can not be sent, and says how to go on', async () => {
    app = buildTestApp({}, { mail: { send: () => Promise.reject(new Error('no mail server')) } })
    admin = app.signInAs('admin')
    const answer = await invite()
    expect([answer.status, answer.body.code]).toEqual([503, 'mail-not-sent'])
    expect(answer.body.detail).toContain('invite once more')
    expect((await admin.agent.get('/api/people')).body).toHaveLength(2)
  })

  it('writes a name that looks like a mail header into the text alone', async () => {
    await invite({ ...INVITATION, name: 'Sela\r\nBcc: everybody@test.example' })
    const message = await mailTo(app.sentMail, INVITATION.email)
    expect(message.to).toBe(INVITATION.email)
    expect(message.subject).not.toContain('Bcc')
  })
})

describe('POST /api/invitations/accept', () => {
  async function invitedToken(): Promise<string> {
    await invite()
    return tokenIn(await mailTo(app.sentMail, INVITATION.email))
  }

  it('sets name and password, signs in, and makes the person active', async () => {
    const answer = await accept(await invitedToken(), { name: 'Sela M.' })
    expect(answer.status).toBe(200)
    expect(answer.body).toMatchObject({ email: INVITATION.email, name: 'Sela M.', role: 'estimator' })
    const cookie = String(answer.headers['set-cookie']).split(';')[0] ?? ''
    expect((await app.anonymous().get('/api/sessions/current').set('Cookie', cookie)).body.name).toBe('Sela M.')
    const people = (await admin.agent.get('/api/people')).body as { email: string; status: string }[]
    expect(people.find(({ email }) => email === INVITATION.email)).toMatchObject({
      status: 'active',
      lastSignInAt: app.clock().toISOString(),
    })
    expect((await app.anonymous().post('/api/sessions').send({ email: INVITATION.email, password: PASSWORD })).status).toBe(201)
  })

  it('ends the session of whoever followed it in the same browser, and no other', async () => {
    const token = await invitedToken()
    const cookie = app.cookieOf(admin.user)
    await app.anonymous().post('/api/invitations/accept').set('Cookie', cookie).send({ token, name: 'Sela Marrow', newPassword: PASSWORD })
    expect((await app.anonymous().get('/api/sessions/current').set('Cookie', cookie)).status).toBe(401)
    expect((await admin.agent.get('/api/sessions/current')).body.id).toBe(admin.user.id)
  })

  it('gives the role that the admin chose last, not the one of the older mail', async () => {
    const token = await invitedToken()
    await invite({ ...INVITATION, role: 'owner' })
    expect((await accept(token)).body.role).toBe('owner')
  })

  it('works once, for seven days', async () => {
    const token = await invitedToken()
    app.advance(7 * DAY_MS - 1000)
    expect((await accept(token)).status).toBe(200)
    const again = await accept(token)
    expect([again.status, again.body.code]).toEqual([422, 'link-ended'])
  })

  it('has ended after seven days; a new invitation helps', async () => {
    const token = await invitedToken()
    app.advance(7 * DAY_MS + 1000)
    expect((await accept(token)).body.code).toBe('link-ended')
    admin = { user: admin.user, agent: app.agentOf(admin.user) }
    expect((await accept(await invitedToken())).status).toBe(200)
  })

  it('does not work for somebody who was deactivated before following it', async () => {
    const token = await invitedToken()
    const { body: people } = await admin.agent.get('/api/people')
    const { id, version } = (people as { id: string; email: string; version: number }[]).find(
      ({ email }) => email === INVITATION.email,
    ) ?? { id: '', version: 0 }
    await admin.agent.patch(`/api/people/${id}`).set('If-Match', `"${version}"`).send({ active: false })
    expect((await accept(token)).body.code).toBe('link-ended')
  })

  it('refuses a password that is too easy and leaves the invitation open', async () => {
    const token = await invitedToken()
    expect((await accept(token, { newPassword: 'sela marrow 1' })).body.errors).toMatchObject([{ path: 'newPassword', code: 'guessable' }])
    expect((await accept(token)).status).toBe(200)
  })
})
