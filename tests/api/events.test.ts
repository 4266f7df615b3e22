import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'
import { buildUser, type TestUser } from '../support/buildUser.ts'
import { listenTo } from '../support/listenTo.ts'

let app: TestApp
let server: Awaited<ReturnType<typeof listenTo>>

beforeEach(async () => {
  app = buildTestApp()
  server = await listenTo(app)
})
afterEach(() => server.close())

interface Stream {
  status: number
  headers: Headers
  /** All that came until the stream ended. */
  rest(): Promise<string>
  /** What came next. */
  next(): Promise<string>
}

async function open(cookie: string): Promise<Stream> {
  const answer = await fetch(`${server.url}/api/events`, { headers: { Cookie: cookie, 'Accept-Encoding': 'gzip' } })
  const reader = answer.body?.getReader()
  const decoder = new TextDecoder()
  async function next() {
    const part = await reader?.read()
    return part?.done ? '' : decoder.decode(part?.value)
  }
  async function rest() {
    let text = ''
    for (let part = await next(); part !== ''; part = await next()) text += part
    return text
  }
  return { status: answer.status, headers: answer.headers, next, rest }
}

async function openAs(user: TestUser): Promise<Stream> {
  const stream = await open(app.cookieOf(user))
  expect(await stream.next()).toBe(': open\n\n')
  return stream
}

describe('GET /api/events', () => {
  it('is a stream of events that nobody keeps or compresses', async () => {
    const { status, headers } = await openAs(buildUser(app.db, { role: 'estimator' }))
    expect(status).toBe(200)
    expect(headers.get('content-type')).toBe('text/event-stream')
    expect(headers.get('cache-control')).toBe('no-store')
    expect(headers.get('content-encoding')).toBeNull()
  })

  it('tells what changed, and no more of it than where to read it', async () => {
    const stream = await openAs(buildUser(app.db, { role: 'estimator' }))
    app.events.publish({ type: 'price-book', id: 'draft', version: 3, houseId: 'unused' })
    expect(await stream.next()).toBe('data: {"type":"price-book","id":"draft","version":3}\n\n')
  })

  it('tells each reader only of what they may read', async () => {
    const admin = await openAs(buildUser(app.db, { role: 'admin' }))
    const owner = await openAs(buildUser(app.db, { role: 'owner' }))
    app.events.publish({ type: 'people', id: 'somebody', version: 2 })
    app.events.publish({ type: 'price-book', id: 'draft', version: 3 })
    app.events.publish({ type: 'house', id: 'not-theirs', version: 4, houseId: 'not-theirs' })
    app.events.closeAll()
    expect(await admin.rest()).toContain('somebody')
    expect(await owner.rest()).toBe('')
  })

  describe('ends at once', () => {
    it('when the reader signs out in that session, and leaves the others open', async () => {
      const user = buildUser(app.db)
      const cookie = app.cookieOf(user)
      const here = await open(cookie)
      await here.next()
      await openAs(user)
      await app.anonymous().delete('/api/sessions/current').set('Cookie', cookie)
      expect(await here.rest()).toBe('')
      expect(app.events.count()).toBe(1)
    })

    it('when the reader is deactivated', async () => {
      const admin = app.signInAs('admin')
      const user = buildUser(app.db, { role: 'estimator' })
      const stream = await openAs(user)
      await admin.agent.patch(`/api/people/${user.id}`).set('If-Match', '"1"').send({ active: false })
      expect(await stream.rest()).toBe('')
      expect(app.events.count()).toBe(0)
    })

    it('when the app stops', async () => {
      const stream = await openAs(buildUser(app.db))
      app.events.closeAll()
      expect(await stream.rest()).toBe('')
    })
  })

  it('is refused with 401 to nobody and with 429 to somebody with twenty streams open', async () => {
    expect((await open('')).status).toBe(401)
    const user = buildUser(app.db)
    for (let time = 0; time < 20; time += 1) await openAs(user)
    expect((await open(app.cookieOf(user))).status).toBe(429)
    expect((await open(app.cookieOf(buildUser(app.db)))).status).toBe(200)
  })
})
