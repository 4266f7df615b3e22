import { afterEach, describe, expect, it, vi } from 'vitest'
import { http, onSignedOut, ProblemError } from '../../src/api/http.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

afterEach(() => vi.unstubAllGlobals())

async function refusalOf(call: Promise<unknown>): Promise<ProblemError> {
  const error = await call.then(
    () => null,
    (thrown: unknown) => thrown,
  )
  if (!(error instanceof ProblemError)) throw new Error('The call was not refused with a problem')
  return error
}

describe('http', () => {
  it('sends the version that a write was made against as If-Match', async () => {
    const api = stubApi({ 'PATCH /houses/1': { id: '1' } })
    await http.patch('/houses/1', { name: 'x' }, { ifMatch: 3 })
    expect(api.calls[0]?.headers.get('if-match')).toBe('"3"')
    expect(api.calls[0]?.body).toEqual({ name: 'x' })
  })

  it('gives each POST an idempotency key of its own, and the same one to a repeat that names it', async () => {
    const api = stubApi({ 'POST /houses': {} })
    await http.post('/houses', {})
    await http.post('/houses', {})
    await http.post('/houses', {}, { idempotencyKey: 'again' })
    const keys = api.calls.map(({ headers }) => headers.get('idempotency-key'))
    expect(keys[0]).toMatch(/^[0-9a-f]{32}$/)
    expect(keys[1]).not.toBe(keys[0])
    expect(keys[2]).toBe('again')
  })

  it('leaves empty parts out of a query', async () => {
    const api = stubApi({ 'GET /items?search=pine%20%26%20oak': [], 'GET /items?search=pine+%26+oak': [] })
    await http.get('/items', { query: { search: 'pine & oak', system: '', region: undefined } })
    expect(api.calls[0]?.path).toMatch(/^\/items\?search=pine(\+|%20)%26(\+|%20)oak$/)
  })

  it('answers nothing for 204 and for an empty 202', async () => {
    stubApi({ 'DELETE /houses/1': new StubAnswer(204), 'POST /password-resets': new StubAnswer(202) })
    await expect(http.delete('/houses/1')).resolves.toBeUndefined()
    await expect(http.post('/password-resets', {})).resolves.toBeUndefined()
  })

  it('throws the problem of a refusal, with its fields', async () => {
    const errors = [{ path: 'name', code: 'too-small', message: 'is empty' }]
    stubApi({ 'POST /houses': problemAnswer(422, 'invalid', 'Some fields need another value.', { errors }) })
    const refusal = await refusalOf(http.post('/houses', {}))
    expect(refusal).toMatchObject({ status: 422, code: 'invalid', message: 'Some fields need another value.', errors })
  })

  it('hands over what stands now when a write is stale', async () => {
    stubApi({ 'PATCH /houses/1': problemAnswer(412, 'stale', 'Somebody changed this.', { current: { version: 4 } }) })
    const refusal = await refusalOf(http.patch('/houses/1', {}, { ifMatch: 3 }))
    expect(refusal.isStale).toBe(true)
    expect(refusal.current).toEqual({ version: 4 })
  })

  it('keeps how long to wait', async () => {
    stubApi({ 'POST /sessions': problemAnswer(429, 'too-many', 'Too many tries.', {}, { 'Retry-After': '40' }) })
    const refusal = await refusalOf(http.post('/sessions', {}, { isSignIn: true }))
    expect(refusal.retryAfterSeconds).toBe(40)
  })

  it.each([
    ['no answer comes', new TypeError('Failed to fetch')],
    ['a proxy answers in its own words', new StubAnswer(502, null)],
  ])('says that the server can’t be reached when %s', async (_situation, answer) => {
    stubApi({ 'GET /houses': answer })
    const refusal = await refusalOf(http.get('/houses'))
    expect(refusal.isUnreachable).toBe(true)
    expect(refusal.message).toContain('can’t be reached')
  })

  it('lets an aborted request be an abort and not a failure', async () => {
    stubApi({ 'GET /houses': new DOMException('aborted', 'AbortError') })
    await expect(http.get('/houses')).rejects.toThrow(DOMException)
  })

  describe('when the session has ended', () => {
    it('tells so, except at the sign-in itself', async () => {
      const tell = vi.fn()
      onSignedOut(tell)
      stubApi({
        'GET /houses': problemAnswer(401, 'signed-out', 'Sign in first.'),
        'POST /sessions': problemAnswer(401, 'wrong', 'Wrong password.'),
      })
      await refusalOf(http.post('/sessions', {}, { isSignIn: true }))
      expect(tell).not.toHaveBeenCalled()
      await refusalOf(http.get('/houses'))
      expect(tell).toHaveBeenCalledOnce()
    })
  })

  it('downloads a file under the name that the server gives it', async () => {
    stubApi({
      'GET /workbook': new StubAnswer(200, 'x', { 'Content-Disposition': "attachment; filename*=UTF-8''14%20Lantern%20Street.xlsx" }),
    })
    const { fileName, content } = await http.download('/workbook')
    expect(fileName).toBe('14 Lantern Street.xlsx')
    expect(content.size).toBeGreaterThan(0)
  })
})
