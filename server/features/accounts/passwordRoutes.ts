import type { RequestHandler } from 'express'
import { passwordChangeSchema, passwordResetRequestSchema, passwordResetSchema } from '../../../shared/schemas/account.ts'
import { unauthenticated } from '../../errors/AppError.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { AccountServices } from './accountServices.ts'

export function passwordOperations({ accounts, accountLimit }: { accounts: AccountServices; accountLimit: RequestHandler }): Operation[] {
  return [
    operation(
      {
        id: 'changePassword',
        method: 'put',
        path: '/account/password',
        action: 'account.self',
        summary: 'Change the own password. Ends the other sessions.',
        guards: [accountLimit],
        body: passwordChangeSchema,
        status: 204,
      },
      async ({ body, req }) => {
        if (!req.activeSession) throw unauthenticated()
        await accounts.passwords.change(req.activeSession, req.ip ?? '', body)
      },
    ),
    operation(
      {
        id: 'requestPasswordReset',
        method: 'post',
        path: '/password-resets',
        action: 'public',
        summary: 'Ask for a link to set a new password. Answers the same whether or not there is such an account.',
        guards: [accountLimit],
        body: passwordResetRequestSchema,
        status: 202,
      },
      ({ body }) => {
        accounts.passwords.requestReset(body.email)
      },
    ),
    operation(
      {
        id: 'resetPassword',
        method: 'post',
        path: '/password-resets/redeem',
        action: 'public',
        summary: 'Set a new password by the link of a mail. Ends all sessions.',
        guards: [accountLimit],
        body: passwordResetSchema,
        status: 204,
      },
      async ({ body }) => {
        await accounts.passwords.reset(body.token, body.newPassword)
      },
    ),
  ]
}
