import { ProblemError } from '../api/ProblemError.ts'

/** The one place that turns what was thrown into words for a person. */
export function useErrorMessage() {
  return errorMessage
}

function errorMessage(error: unknown): string {
  if (!(error instanceof ProblemError)) return 'Something went wrong on this page. Load it again; what was saved is kept.'
  if (error.status === 429 && error.retryAfterSeconds !== null) return `${error.message} ${waitWords(error.retryAfterSeconds)}`
  if (error.status >= 500 && error.requestId) return `${error.message} Its reference is ${error.requestId}.`
  return error.message
}

function waitWords(seconds: number): string {
  if (seconds < 90) return `Try again in ${seconds} seconds.`
  return `Try again in ${Math.ceil(seconds / 60)} minutes.`
}
