import type { RequestHandler } from 'express'
import { currentUserSchema, signInSchema } from '../../../shared/schemas/account.ts'
import { unauthenticated } from '../../errors/AppError.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { clearSessionCookie, setSessionCookie } from '../../http/sessionCookie.ts'
import type { AccountServices } from './accountServices.ts'
import { SESSION_MAX_MS, type SessionService } from './sessionService.ts'

interface SessionServices {
  accounts: AccountServices
  sessions: SessionService
  /** The stricter limit of calls that a guesser would make. */
  accountLimit: RequestHandler
}

export function sessionOperations({ accounts, sessions, accountLimit }: SessionServices): Operation[] {
  return [
    operation(
      {
        id: 'signIn',
        method: 'post',
        path: '/sessions',
        action: 'public',
        summary: 'Sign in. Sets the session cookie.',
        guards: [accountLimit],
        body: signInSchema,
        response: currentUserSchema,
        status: 201,
      },
      async ({ body, req, res }) => {
        const attempt = { ...body, address: req.ip ?? '', earlierSession: req.activeSession }
        const { user, sessionToken } = await accounts.signIns.signIn(attempt)
        setSessionCookie(res, sessionToken, SESSION_MAX_MS)
        return user
      },
    ),
    operation(
      {
        id: 'readCurrentUser',
        method: 'get',
        path: '/sessions/current',
        action: 'account.self',
        summary: 'Who is signed in; 401 when nobody is.',
        response: currentUserSchema,
      },
      ({ user }) => user,
    ),
    operation(
      { id: 'signOut', method: 'delete', path: '/sessions/current', action: 'account.self', summary: 'Sign out here.', status: 204 },
      ({ req, res }) => {
        if (!req.activeSession) throw unauthenticated()
        sessions.end(req.activeSession)
        clearSessionCookie(res)
      },
    ),
    operation(
      {
        id: 'signOutEverywhere',
        method: 'delete',
        path: '/sessions',
        action: 'account.self',
        summary: 'Sign out on every device.',
        status: 204,
      },
      ({ user, res }) => {
        sessions.endEverySessionOf(user.id)
        clearSessionCookie(res)
      },
    ),
  ]
}
