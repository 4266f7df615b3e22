import { gzipSync } from 'node:zlib'
import request from 'supertest'
import { beforeEach, describe, expect, it } from 'vitest'
import type { AppParts } from '../../server/app.ts'
import type { Problem } from '../../shared/schemas/problem.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { listenTo } from '../support/listenTo.ts'

let app: TestApp
let admin: SignedIn

beforeEach(() => {
  app = buildTestApp()
  admin = app.signInAs('admin')
})

const INVITATION = { email: 'new@test.example', name: 'New', role: 'owner' }

describe('a refusal', () => {
  it('is problem details: status, a code for programs, words for people and the id of the request', async () => {
    const answer = await app.anonymous().get('/api/people')
    expect(answer.status).toBe(401)
    expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8')
    expect(answer.body).toEqual({
      type: 'about:blank',
      title: 'Unauthorized',
      status: 401,
      detail: 'Sign in to go on.',
      code: 'unauthenticated',
      requestId: answer.headers['x-request-id'],
    })
  })

  it('of something that broke says nothing of the inside, and is no 500 for the next request', async () => {
    const broken: AppParts['hasher'] = {
      hash: () => Promise.reject(new Error('boom at /srv/secret')),
      matches: () => Promise.reject(new Error('boom at /srv/secret')),
    }
    app = buildTestApp({}, { hasher: broken })
    const answer = await app.anonymous().post('/api/sessions').send({ email: 'a@test.example', password: 'x' })
    expect(answer.status).toBe(500)
    expect(answer.body).toMatchObject({ code: 'internal', title: 'Internal Server Error' })
    expect(answer.text).not.toMatch(/boom|srv|\.ts|at /)
    expect((await app.anonymous().get('/api/health')).status).toBe(200)
  })
})

describe('an address', () => {
  it('that the API does not have is 404, as a problem', async () => {
    for (const path of ['/api/nothing', '/api', '/api/people/a/b']) {
      const answer = await admin.agent.get(path)
      expect([path, answer.status, answer.body.code]).toEqual([path, 404, 'not-found'])
    }
  })

  it('that takes other methods is 405 and names them', async () => {
    const answer = await admin.agent.put('/api/people').send({})
    expect([answer.status, answer.headers.allow, answer.body.code]).toEqual([405, 'GET', 'method-not-allowed'])
    expect((await admin.agent.patch('/api/sessions').send({})).headers.allow).toBe('POST, DELETE')
  })

  it('that can not be decoded is 400', async () => {
    const answer = await admin.agent.get('/api/people/%E0%A4%A')
    expect([answer.status, answer.body.code]).toEqual([400, 'bad-request'])
  })
})

describe('a body', () => {
  function post(body: string | Buffer, type = 'application/json') {
    return admin.agent.post('/api/invitations').set('Content-Type', type).send(body)
  }

  it('that is not well-formed JSON is 400', async () => {
    for (const body of ['{"email":', '{email:1}', "{'email':1}", '"text"', '12', 'null', '{"a":1}{"b":2}', '\u0000']) {
      const answer = await post(body)
      expect([body, answer.status, answer.body.code]).toEqual([body, 400, 'malformed-json'])
    }
  })

  it('that is missing is 400', async () => {
    const answer = await admin.agent.post('/api/invitations')
    expect([answer.status, answer.body.code]).toEqual([400, 'body-missing'])
  })

  it('of another content type is 415', async () => {
    for (const type of [
      'text/plain',
      'application/x-www-form-urlencoded',
      'multipart/form-data; boundary=x',
      'application/xml',
      'text/json',
    ]) {
      const answer = await post(JSON.stringify(INVITATION), type)
      expect([type, answer.status, answer.body.code]).toEqual([type, 415, 'content-type'])
    }
  })

  it('in an unknown character set or encoding is 415', async () => {
    expect((await post(JSON.stringify(INVITATION), 'application/json; charset=iso-8859-1')).status).toBe(415)
    expect((await post(JSON.stringify(INVITATION)).set('Content-Encoding', 'squeezed')).status).toBe(415)
  })

  describe('of 50 MB', () => {
    const FIFTY_MB = Buffer.alloc(50_000_000, 0x20)

    /** Sent as bytes: the test agent would make JSON of a buffer. */
    async function sendBytes(content: Buffer, headers: Record<string, string>) {
      const { url, close } = await listenTo(app)
      const answer = await fetch(`${url}/api/invitations`, {
        method: 'POST',
        body: new Uint8Array(content),
        headers: { 'Content-Type': 'application/json', ...headers },
      })
      const problem = (await answer.json()) as Problem
      await close()
      return problem
    }

    it('is 413 from somebody signed in, and the app goes on', async () => {
      const problem = await sendBytes(FIFTY_MB, { Cookie: app.cookieOf(admin.user) })
      expect(problem).toMatchObject({ status: 413, code: 'body-too-large', detail: expect.stringContaining('1 MB') })
      expect((await admin.agent.get('/api/people')).status).toBe(200)
    })

    it('is 401 from nobody: who sends it is asked before it is read', async () => {
      expect((await sendBytes(FIFTY_MB, {})).status).toBe(401)
    })

    it('is 413 also when it was compressed to a twentieth of a megabyte', async () => {
      const headers = { Cookie: app.cookieOf(admin.user), 'Content-Encoding': 'gzip' }
      expect((await sendBytes(gzipSync(FIFTY_MB), headers)).code).toBe('body-too-large')
    })
  })

  describe('that nests a hundred thousand brackets', () => {
    const deep = `{"email":${'['.repeat(100_000)}${']'.repeat(100_000)}}`

    it('is refused without harm', async () => {
      const answer = await post(deep)
      expect([answer.status, answer.body.code]).toEqual([400, 'nested-too-deep'])
    })

    it('is refused with a key for repeats as well', async () => {
      const answer = await post(deep).set('Idempotency-Key', 'deep')
      expect([answer.status, answer.body.code]).toEqual([400, 'nested-too-deep'])
    })
  })

  it('can not reach into the object that it is parsed into', async () => {
    const answer = await post('{"email":"new@test.example","name":"New","role":"owner","__proto__":{"isAdmin":true},"constructor":1}')
    expect(answer.status).toBe(422)
    expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined()
  })

  it('with fields that are wrong in many ways names each of them', async () => {
    const answer = await post(JSON.stringify({ email: 7, name: 'x'.repeat(121), role: null, more: 1 }))
    expect(answer.status).toBe(422)
    expect(answer.body.detail).toBe('4 fields need another look.')
    expect(answer.body.errors).toEqual([
      { path: 'email', code: 'invalid-type', message: 'must be text' },
      { path: 'name', code: 'too-big', message: 'is longer than 120 characters' },
      { path: 'role', code: 'invalid-value', message: 'must be one of admin, estimator, owner' },
      { path: 'more', code: 'unknown-field', message: 'is not a known field' },
    ])
  })

  it('keeps text that begins with = as the text it is', async () => {
    const answer = await post(JSON.stringify({ ...INVITATION, name: '=HYPERLINK("x")' }))
    expect([answer.status, answer.body.name]).toEqual([201, '=HYPERLINK("x")'])
  })
})

describe('a write from another site', () => {
  const signOut = () => admin.agent.delete('/api/sessions/current')

  it('is refused with 403 when the browser says so', async () => {
    for (const [name, value] of [
      ['Sec-Fetch-Site', 'cross-site'],
      ['Sec-Fetch-Site', 'same-site'],
      ['Origin', 'https://elsewhere.example'],
      ['Origin', 'null'],
    ] as const) {
      expect([name, value, (await signOut().set(name, value)).status]).toEqual([name, value, 403])
    }
    expect((await admin.agent.get('/api/sessions/current')).status).toBe(200)
  })

  it('is let through from our own pages, and from a program that is no browser', async () => {
    for (const headers of [
      { 'Sec-Fetch-Site': 'same-origin', Origin: 'http://quoinbook.example' },
      { Origin: 'http://quoinbook.example' },
      {},
    ] as Record<string, string>[]) {
      const { agent } = app.signInAs('owner')
      expect((await agent.delete('/api/sessions/current').set(headers)).status).toBe(204)
    }
  })

  it('is no matter for reads: a link from elsewhere opens', async () => {
    expect((await admin.agent.get('/api/firm').set('Sec-Fetch-Site', 'cross-site')).status).toBe(200)
  })
})

describe('every answer', () => {
  it('forbids the browser what our pages never do', async () => {
    const { headers } = await app.anonymous().get('/api/firm')
    expect(headers['content-security-policy']).toBe(
      "default-src 'self';base-uri 'self';form-action 'self';object-src 'none';script-src-attr 'none';style-src 'self' 'unsafe-inline';" +
        "img-src 'self' blob: data:;font-src 'self' data:;worker-src 'self' blob:;frame-ancestors 'none'",
    )
    expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'x-frame-options': 'DENY', 'referrer-policy': 'same-origin' })
    expect(headers).not.toHaveProperty('x-powered-by')
    expect(headers).not.toHaveProperty('strict-transport-security')
  })

  it('promises https where the app is reached by https', async () => {
    const { headers } = await buildTestApp({ appUrl: 'https://quoinbook.example' }).anonymous().get('/api/firm')
    expect(headers['strict-transport-security']).toContain('max-age=')
  })

  it('is kept by no shared cache, and compressed when it is worth it', async () => {
    const small = await admin.agent.get('/api/sessions/current')
    expect(small.headers['cache-control']).toBe('private, no-cache')
    expect(small.headers['content-encoding']).toBeUndefined()
    const large = await admin.agent.get('/api/openapi.json').set('Accept-Encoding', 'gzip')
    expect(large.headers['content-encoding']).toBe('gzip')
  })
})

describe('requests from one address', () => {
  it('are refused with 429 and Retry-After past the limit, and counted apart from another address', async () => {
    app = buildTestApp({ trustProxy: 1, limits: { apiPerMinute: 3, accountsPerQuarterHour: 1000 } })
    const from = (address: string) => request(app.app).get('/api/health').set('X-Forwarded-For', address)
    for (let time = 0; time < 3; time += 1) expect((await from('192.0.2.1')).status).toBe(200)
    const refused = await from('192.0.2.1')
    expect([refused.status, refused.body.code]).toEqual([429, 'too-many-requests'])
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    expect((await from('192.0.2.2')).status).toBe(200)
  })

  it('are counted by the address itself when no proxy is trusted, whatever the header claims', async () => {
    app = buildTestApp({ limits: { apiPerMinute: 2, accountsPerQuarterHour: 1000 } })
    const from = (address: string) => request(app.app).get('/api/health').set('X-Forwarded-For', address)
    await from('192.0.2.1')
    await from('192.0.2.2')
    expect((await from('192.0.2.3')).status).toBe(429)
  })
})
