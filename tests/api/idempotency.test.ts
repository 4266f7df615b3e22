import express from 'express'
import { pino } from 'pino'
import request, { type Response } from 'supertest'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import type { Database } from '../../server/db/client.ts'
import { migrate } from '../../server/db/migrate.ts'
import { openDatabase } from '../../server/db/openDatabase.ts'
import { outboxMessages } from '../../server/db/schema/outboxMessages.ts'
import { AppError, conflict } from '../../server/errors/AppError.ts'
import { apiRouter } from '../../server/http/apiRouter.ts'
import { setEtag } from '../../server/http/etag.ts'
import { operation } from '../../server/http/operation.ts'
import { errorHandler } from '../../server/middleware/errorHandler.ts'
import { createIdempotency } from '../../server/middleware/idempotency.ts'
import { requestLog } from '../../server/middleware/requestLog.ts'
import { buildUser, type TestUser } from '../support/buildUser.ts'
import { steppingClock } from '../support/steppingClock.ts'

const MINUTE_MS = 60_000
const DAY_MS = 24 * 60 * MINUTE_MS
const bodySchema = z.strictObject({ subject: z.string() })

let db: Database
let clock: ReturnType<typeof steppingClock>
let user: TestUser
/** Lets the slow call end. */
let release: () => void

beforeEach(() => {
  db = openDatabase(':memory:')
  migrate(db)
  clock = steppingClock()
  user = buildUser(db)
})

function addMessage(subject: string) {
  const id = `message-${db.select().from(outboxMessages).all().length + 1}`
  db.insert(outboxMessages).values({ id, to: user.email, subject, text: '', sentAt: clock.clock().toISOString() }).run()
  return { id, subject }
}

const messageSchema = z.object({ id: z.string(), subject: z.string() })
const common = { method: 'post', action: 'account.self', body: bodySchema, response: messageSchema, status: 201, summary: '' } as const

/** Three ways to add a thing: at once, in steps, and by a rule that refuses after it has written. */
const operations = [
  operation({ ...common, id: 'addAtOnce', path: '/at-once' }, ({ body, res }) => {
    setEtag(res, 1)
    return addMessage(body.subject)
  }),
  operation({ ...common, id: 'addInSteps', path: '/in-steps' }, async ({ body }) => {
    await new Promise<void>((resolve) => {
      release = resolve
    })
    if (body.subject === 'refuse') throw conflict('refused', 'No.')
    return addMessage(body.subject)
  }),
  operation({ ...common, id: 'addThenRefuse', path: '/then-refuse' }, ({ body }) => {
    addMessage(body.subject)
    throw new AppError({ status: 409, code: 'refused', detail: 'No.' })
  }),
]

function app(asker = user) {
  const server = express()
  server.use(requestLog(pino({ level: 'silent' })))
  server.use((req, _res, next) => {
    req.activeSession = { idHash: 'session', user: asker }
    next()
  })
  server.use('/api', apiRouter(operations, { idempotency: createIdempotency({ db, clock: clock.clock }), checkAnswers: true }))
  server.use(errorHandler)
  return server
}

function post(path: string, key: string | null, subject = 'first', asker = user) {
  const call = request(app(asker)).post(`/api${path}`)
  return (key === null ? call : call.set('Idempotency-Key', key)).send({ subject })
}

const messages = () => db.select().from(outboxMessages).all()

describe('a POST with an Idempotency-Key', () => {
  it('is carried out once; a repeat gets the same answer, status and ETag', async () => {
    const first = await post('/at-once', 'key-1')
    const again = await post('/at-once', 'key-1')
    expect([first.status, first.body, first.headers.etag]).toEqual([201, { id: 'message-1', subject: 'first' }, '"1"'])
    expect([again.status, again.body, again.headers.etag]).toEqual([first.status, first.body, first.headers.etag])
    expect(messages()).toHaveLength(1)
  })

  it('is another request with another key, another person, another address, or no key', async () => {
    const neighbour = buildUser(db)
    await post('/at-once', 'key-1')
    await post('/at-once', 'key-2')
    await post('/at-once', 'key-1', 'first', neighbour)
    await post('/at-once', null)
    await post('/at-once', null)
    await post('/at-once?again', 'key-1')
    expect(messages()).toHaveLength(5)
  })

  it('is refused with 422 when the key comes back with another body', async () => {
    await post('/at-once', 'key-1')
    const refused = await post('/at-once', 'key-1', 'second')
    expect([refused.status, refused.body.code]).toEqual([422, 'idempotency-key-reused'])
    expect(messages()).toHaveLength(1)
  })

  it('is forgotten after 24 hours', async () => {
    await post('/at-once', 'key-1')
    clock.advance(DAY_MS - 1)
    await post('/at-once', 'key-1')
    expect(messages()).toHaveLength(1)
    clock.advance(2)
    expect((await post('/at-once', 'key-1')).status).toBe(201)
    expect(messages()).toHaveLength(2)
  })

  it('may be tried again with the same key after a refusal, which leaves nothing written', async () => {
    expect((await post('/then-refuse', 'key-1')).status).toBe(409)
    expect((await post('/then-refuse', 'key-1')).status).toBe(409)
    expect(messages()).toEqual([])
  })

  it('needs a key of 1 to 200 visible characters', async () => {
    for (const key of ['with blank', 'x'.repeat(201), 'ü']) {
      const answer = await post('/at-once', key)
      expect([answer.status, answer.body.code]).toEqual([400, 'idempotency-key-malformed'])
    }
    expect(messages()).toEqual([])
  })

  describe('whose first try is still being worked on', () => {
    /** Sends, and waits until the handler has begun but not for its answer (boxed, or awaiting it here would wait for both). */
    async function begin(subject?: string): Promise<{ answer: Promise<Response> }> {
      const answer = post('/in-steps', 'key-1', subject).then((received) => received)
      const releaseBefore = release
      await vi.waitFor(() => expect(release).not.toBe(releaseBefore))
      return { answer }
    }

    it('is refused with 409, and answered as the first once that is done', async () => {
      const { answer } = await begin()
      const meanwhile = await post('/in-steps', 'key-1')
      expect([meanwhile.status, meanwhile.body.code]).toEqual([409, 'in-progress'])
      release()
      expect((await answer).status).toBe(201)
      expect((await post('/in-steps', 'key-1')).body).toEqual((await answer).body)
      expect(messages()).toHaveLength(1)
    })

    it('may be tried again when the first was refused', async () => {
      const { answer } = await begin('refuse')
      release()
      expect((await answer).status).toBe(409)
      const second = await begin('second')
      release()
      expect((await second.answer).status).toBe(201)
    })

    it('is taken for cut off by a crash after two minutes, and carried out', async () => {
      await begin()
      clock.advance(2 * MINUTE_MS + 1)
      const second = await begin()
      release()
      expect((await second.answer).status).toBe(201)
    })
  })
})
