import type { ErrorRequestHandler } from 'express'
import { asAppError, PROBLEM_MEDIA_TYPE, problemOf } from '../http/problem.ts'

/** The one place where errors become answers. Bugs are logged whole; the asker reads a neutral sentence and the request id. */
export const errorHandler: ErrorRequestHandler = (error: unknown, req, res, next) => {
  const refusal = asAppError(error)
  if (refusal.status >= 500) req.log.error({ err: error }, 'request failed')
  if (res.headersSent) {
    // Half an answer is out: all that is left is to break off, so that nobody takes it for a whole one.
    next(error)
    return
  }
  for (const [name, value] of Object.entries(refusal.headers)) res.setHeader(name, value)
  res
    .status(refusal.status)
    .type(PROBLEM_MEDIA_TYPE)
    .send(JSON.stringify(problemOf(refusal, String(req.id))))
}
