import type { RequestHandler } from 'express'
import { readSessionCookie } from '../http/sessionCookie.ts'
import type { ActiveSession, SessionService } from '../features/accounts/sessionService.ts'

declare module 'express-serve-static-core' {
  interface Request {
    /** Who is signed in, while the session lasts. */
    activeSession: ActiveSession | null
  }
}

/** Finds the session of each request by its cookie. */
export function session(sessions: SessionService): RequestHandler {
  return (req, _res, next) => {
    const token = readSessionCookie(req)
    req.activeSession = token === null ? null : sessions.find(token)
    next()
  }
}
