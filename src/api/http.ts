import { ProblemError, unreachable } from './ProblemError.ts'

export { ProblemError } from './ProblemError.ts'

export interface RequestOptions {
  query?: Record<string, string | number | boolean | null | undefined>
  /** Version that the write was made against; sent as `If-Match: "3"`. */
  ifMatch?: number
  /** The same key on a repeat makes the server answer with what it did the first time. A POST gets a fresh one unless told. */
  idempotencyKey?: string
  /** TanStack Query hands one over; an aborted request throws an AbortError. */
  signal?: AbortSignal
  /** Lets a save that is under way outlive its page. */
  keepalive?: boolean
  /** A 401 is an answer here and not the end of a session: at the sign-in itself. */
  isSignIn?: boolean
}

type Method = 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE'

/** The API below `/api`: JSON in and out, a `ProblemError` for each refusal. */
export const http = {
  get: <T>(path: string, options?: RequestOptions) => send<T>('GET', path, undefined, options),
  post: <T>(path: string, body?: unknown, options: RequestOptions = {}) =>
    send<T>('POST', path, body, { idempotencyKey: newIdempotencyKey(), ...options }),
  patch: <T>(path: string, body: unknown, options?: RequestOptions) => send<T>('PATCH', path, body, options),
  put: <T>(path: string, body: unknown, options?: RequestOptions) => send<T>('PUT', path, body, options),
  delete: <T = void>(path: string, options?: RequestOptions) => send<T>('DELETE', path, undefined, options),
  download,
}

type SignedOutListener = () => void
let tellSignedOut: SignedOutListener = () => {}

/** Registers who is told when the server no longer knows the session. */
export function onSignedOut(listener: SignedOutListener): void {
  tellSignedOut = listener
}

/** A key for one intended write, to be kept for its repeats. */
export function newIdempotencyKey(): string {
  // randomUUID needs a secure context, and the app may be tried out over plain http in a house's own network.
  const bytes = crypto.getRandomValues(new Uint8Array(16))
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')
}

async function send<T>(method: Method, path: string, body: unknown, options: RequestOptions = {}): Promise<T> {
  const answer = await request(method, path, body, options)
  const text = await answer.text()
  return (text === '' ? undefined : JSON.parse(text)) as T
}

/** A file that the server makes: its content and the name it should be saved under. */
async function download(path: string, options: RequestOptions = {}): Promise<{ content: Blob; fileName: string }> {
  const answer = await request('GET', path, undefined, options)
  const content = await answer.blob()
  return { content, fileName: fileNameOf(answer.headers.get('content-disposition')) ?? 'download' }
}

async function request(method: Method, path: string, body: unknown, options: RequestOptions): Promise<Response> {
  const answer = await fetch(addressOf(path, options.query), {
    method,
    headers: headersOf(body, options),
    body: body === undefined ? null : JSON.stringify(body),
    credentials: 'same-origin',
    signal: options.signal ?? null,
    keepalive: options.keepalive ?? false,
  }).catch((error: unknown) => {
    if (error instanceof DOMException && error.name === 'AbortError') throw error
    throw unreachable()
  })
  if (answer.ok) return answer
  if (answer.status === 401 && !options.isSignIn) tellSignedOut()
  throw await problemOf(answer)
}

function addressOf(path: string, query: RequestOptions['query']): string {
  const given = Object.entries(query ?? {}).filter(([, value]) => value !== undefined && value !== null && value !== '')
  const search = new URLSearchParams(given.map(([name, value]) => [name, String(value)])).toString()
  return `/api${path}${search ? `?${search}` : ''}`
}

function headersOf(body: unknown, { ifMatch, idempotencyKey }: RequestOptions): Record<string, string> {
  return {
    Accept: 'application/json',
    ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
    ...(ifMatch === undefined ? {} : { 'If-Match': `"${ifMatch}"` }),
    ...(idempotencyKey === undefined ? {} : { 'Idempotency-Key': idempotencyKey }),
  }
}

async function problemOf(answer: Response): Promise<ProblemError> {
  const retryAfter = Number(answer.headers.get('retry-after'))
  const problem: unknown = await answer.json().catch(() => null)
  if (isProblem(problem)) return new ProblemError(problem, retryAfter > 0 ? retryAfter : null)
  // A proxy in between answers with a page of its own.
  if (answer.status >= 502 && answer.status <= 504) return unreachable()
  return new ProblemError({ status: answer.status, code: 'unknown', detail: `The server answered with ${answer.status} and no words.` })
}

function isProblem(value: unknown): value is ConstructorParameters<typeof ProblemError>[0] {
  return typeof value === 'object' && value !== null && 'code' in value && 'detail' in value && 'status' in value
}

function fileNameOf(disposition: string | null): string | null {
  if (!disposition) return null
  const encoded = /filename\*=UTF-8''([^;]+)/i.exec(disposition)?.[1]
  if (encoded) return decodeURIComponent(encoded)
  return /filename="?([^";]+)"?/i.exec(disposition)?.[1] ?? null
}
