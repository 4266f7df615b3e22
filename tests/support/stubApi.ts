import { vi } from 'vitest'

export interface ApiCall {
  method: string
  path: string
  body: unknown
  headers: Headers
}

type Answer = unknown | ((call: ApiCall) => unknown)

/** An answer of another status than 200, as a stub of `stubApi`. */
export class StubAnswer {
  constructor(
    readonly status: number,
    readonly body: unknown = null,
    readonly headers: Record<string, string> = {},
  ) {}
}

/** Problem details as the server sends them. */
export function problemAnswer(status: number, code: string, detail: string, more: Record<string, unknown> = {}, headers = {}): StubAnswer {
  return new StubAnswer(status, { type: 'about:blank', title: code, status, code, detail, ...more }, headers)
}

/**
 * Stands in for the server: answers by `'GET /houses'`, keeps every call. A call that has no answer is refused with 404,
 * as the server would.
 */
export function stubApi(answers: Record<string, Answer>): {
  calls: ApiCall[]
  callsTo(what: string): ApiCall[]
  answers: Record<string, Answer>
} {
  const calls: ApiCall[] = []
  vi.stubGlobal('fetch', async (address: string, { method = 'GET', body, headers }: RequestInit = {}) => {
    const path = address.replace(/^\/api/, '')
    const call = { method, path, body: body ? JSON.parse(String(body)) : undefined, headers: new Headers(headers) }
    calls.push(call)
    const key = `${method} ${path}`
    const given = key in answers ? answers[key] : problemAnswer(404, 'not-found', 'There is no such thing.')
    const answer = typeof given === 'function' ? (given as (call: ApiCall) => unknown)(call) : given
    if (answer instanceof Error || answer instanceof DOMException) throw answer
    if (answer instanceof StubAnswer) {
      return new Response(answer.body === null ? null : JSON.stringify(answer.body), { status: answer.status, headers: answer.headers })
    }
    return new Response(JSON.stringify(answer))
  })
  return { calls, callsTo: (what) => calls.filter(({ method, path }) => `${method} ${path}` === what), answers }
}
