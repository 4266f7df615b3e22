import type { RequestHandler } from 'express'
import { mayRole } from '../../shared/access/permissions.ts'
import { forbidden, unauthenticated } from '../errors/AppError.ts'
import type { Access } from '../http/operation.ts'

/** Lets a request through when its person may do the action: 401 when nobody is signed in, 403 when the role may not. */
export function requireAccess(access: Access): RequestHandler {
  return (req, _res, next) => {
    if (access === 'public') return next()
    const user = req.activeSession?.user
    if (!user) return next(unauthenticated())
    if (!mayRole(user.role, access)) return next(forbidden())
    next()
  }
}
