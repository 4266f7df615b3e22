import type { FieldProblem } from '../../shared/schemas/problem.ts'

interface AppErrorOptions {
  status: number
  /** Stable word for programs: `stale`, `not-found`. */
  code: string
  /** A sentence that a person can act on. */
  detail: string
  errors?: FieldProblem[]
  /** With 412: the resource as it stands now. */
  current?: unknown
  headers?: Record<string, string>
}

/** A refusal that was foreseen. Everything else that is thrown is a bug and answers 500 with a neutral sentence. */
export class AppError extends Error {
  readonly status: number
  readonly code: string
  readonly errors: FieldProblem[] | undefined
  readonly current: unknown
  readonly headers: Record<string, string>

  constructor({ status, code, detail, errors, current, headers = {} }: AppErrorOptions) {
    super(detail)
    this.name = 'AppError'
    this.status = status
    this.code = code
    this.errors = errors
    this.current = current
    this.headers = headers
  }
}

/** 404, also for what the asker may not know of. `noun` is a word a person reads: "house". */
export function notFound(noun: string): AppError {
  return new AppError({ status: 404, code: 'not-found', detail: `There is no such ${noun}, or it isn't open to you.` })
}

/** 409: a rule stands against it. */
export function conflict(code: string, detail: string): AppError {
  return new AppError({ status: 409, code, detail })
}

/** 412: somebody was quicker. `current` is the resource as it stands now, so that the client can merge. */
export function stale(current: unknown): AppError {
  return new AppError({
    status: 412,
    code: 'stale',
    detail: 'Somebody else changed this in the meantime. Your change was not saved; compare it with how it stands now.',
    current,
  })
}

/** 422: fields that can't be taken, each with its path in the body. */
export function invalid(errors: FieldProblem[]): AppError {
  const [first] = errors
  const detail = errors.length === 1 && first ? sentence(first) : `${errors.length} fields need another look.`
  return new AppError({ status: 422, code: 'invalid', detail, errors })
}

function sentence({ path, message }: FieldProblem): string {
  const words = path === '' ? `What was sent ${message}` : `${path}: ${message}`
  // The engine's messages are sentences of their own.
  return words.endsWith('.') ? words : `${words}.`
}

/** 401: nobody is signed in, or no longer. */
export function unauthenticated(detail = 'Sign in to go on.'): AppError {
  return new AppError({ status: 401, code: 'unauthenticated', detail })
}

/** 403: signed in, but the role may not do it. */
export function forbidden(detail = 'Your role may not do this. An admin can change roles under People.'): AppError {
  return new AppError({ status: 403, code: 'forbidden', detail })
}

/** 429 with `Retry-After` in whole seconds. */
export function tooMany(detail: string, retryAfterSeconds: number): AppError {
  return new AppError({
    status: 429,
    code: 'too-many-requests',
    detail,
    headers: { 'Retry-After': String(Math.max(1, Math.ceil(retryAfterSeconds))) },
  })
}
