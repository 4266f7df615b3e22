import { beforeEach, describe, expect, it } from 'vitest'
import { insertOutboxMessage } from '../../server/features/outbox/outboxRepository.ts'
import { createOutboxMailSender } from '../../server/mail/createMailSender.ts'
import type { MailSender } from '../../server/mail/mailSender.ts'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'
import { tokenIn } from '../support/sentMail.ts'

let app: TestApp
let sent: number

/** The real local transport, keeping into the app's own database. */
const outbox: MailSender = createOutboxMailSender((message) => {
  sent += 1
  insertOutboxMessage(app.db, { id: `message-${sent}`, ...message, sentAt: app.clock().toISOString() })
}, 'Quoinbook <quoinbook@test.example>')

beforeEach(() => {
  sent = 0
  app = buildTestApp({}, { mail: outbox })
})

describe('GET /api/outbox', () => {
  it('shows the admin the mail that was written, newest first, as nodemailer built it', async () => {
    const { agent } = app.signInAs('admin')
    await agent.post('/api/invitations').send({ email: 'first@test.example', name: 'Sela Marrow', role: 'owner' })
    await agent.post('/api/invitations').send({ email: 'second@test.example', name: 'Zoë Ōake', role: 'owner' })
    const { body } = await agent.get('/api/outbox')
    expect(body).toMatchObject([{ to: 'second@test.example' }, { to: 'first@test.example', sentAt: app.clock().toISOString() }])
    expect(body[0].text).toContain('Hello Zoë Ōake')
  })

  it('holds links that work: an invitation can be followed from it', async () => {
    const { agent } = app.signInAs('admin')
    await agent.post('/api/invitations').send({ email: 'first@test.example', name: 'Sela Marrow', role: 'owner' })
    const [message] = (await agent.get('/api/outbox')).body
    const accepted = await app
      .anonymous()
      .post('/api/invitations/accept')
      .send({ token: tokenIn(message), name: 'Sela', newPassword: 'four slow copper pipes' })
    expect(accepted.status).toBe(200)
  })

  it('keeps the newest 500', () => {
    for (let number = 1; number <= 503; number += 1)
      insertOutboxMessage(app.db, { id: `${number}`, to: 'a', subject: '', text: '', sentAt: app.clock().toISOString() })
    const kept = app.db.$client.prepare('SELECT count(*), min(CAST(id AS INTEGER)) AS oldest FROM outbox_messages').get()
    expect(kept).toEqual({ 'count(*)': 500, oldest: 4 })
  })

  describe('when a mail server is set', () => {
    it('is not there, for the admin neither: nobody reads the mail of others', async () => {
      app = buildTestApp({ hasOutbox: false })
      expect((await app.signInAs('admin').agent.get('/api/outbox')).status).toBe(404)
    })
  })
})
