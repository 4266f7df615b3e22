import { STATUS_CODES } from 'node:http'
import type { Problem } from '../../shared/schemas/problem.ts'
import { AppError } from '../errors/AppError.ts'

export const PROBLEM_MEDIA_TYPE = 'application/problem+json'

/** Problem details (RFC 9457) of a refusal. */
export function problemOf(error: AppError, requestId: string): Problem {
  const { status, code, errors, current } = error
  return {
    type: 'about:blank',
    title: STATUS_CODES[status] ?? 'Refused',
    status,
    detail: error.message,
    code,
    ...(errors ? { errors } : {}),
    ...(current === undefined ? {} : { current }),
    requestId,
  }
}

/** The refusal that an error stands for; what was not foreseen becomes a 500 that tells nothing of the inside. */
export function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error
  if (isBusyDatabase(error)) {
    return new AppError({
      status: 503,
      code: 'busy',
      detail: 'The database is busy with another write. Try again in a moment.',
      headers: { 'Retry-After': '1' },
    })
  }
  if (isClientError(error)) return new AppError({ status: error.status, code: 'bad-request', detail: 'The request could not be read.' })
  return new AppError({
    status: 500,
    code: 'internal',
    detail: 'Something went wrong on our side. Nothing was saved. If it happens again, tell your admin the request id.',
  })
}

function isBusyDatabase(error: unknown): boolean {
  return error instanceof Error && 'code' in error && String(error.code).startsWith('SQLITE_BUSY')
}

/** Express and its parsers mark bad requests (an address that can't be decoded, say) by a status below 500. */
function isClientError(error: unknown): error is Error & { status: number } {
  return error instanceof Error && 'status' in error && typeof error.status === 'number' && error.status >= 400 && error.status < 500
}
