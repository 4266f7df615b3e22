import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'
import { tooMany } from '../errors/AppError.ts'

/** Lets one address send so many requests in a window, then answers 429 with `Retry-After`. */
export function limitByAddress({ limit, windowMs }: { limit: number; windowMs: number }): RequestHandler {
  return rateLimit({
    limit,
    windowMs,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // Whose word counts for the address is the operator's to say (TRUST_PROXY); a stray header is no reason to complain in the log.
    validate: { xForwardedForHeader: false, trustProxy: false },
    handler(_req, res, next) {
      const resetAt = res.req.rateLimit?.resetTime?.getTime() ?? Date.now() + windowMs
      next(tooMany('Too many requests came from your address. Wait a moment, then try again.', (resetAt - Date.now()) / 1000))
    },
  })
}

declare module 'express-serve-static-core' {
  interface Request {
    rateLimit?: { resetTime?: Date }
  }
}
