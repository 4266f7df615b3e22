import type { z } from 'zod'
import type {
  CurrentUser,
  invitationAcceptSchema,
  passwordChangeSchema,
  passwordResetRequestSchema,
  passwordResetSchema,
  signInSchema,
} from '../../shared/schemas/account.ts'
import { http, ProblemError } from './http.ts'

/** Who is signed in, or `null`. */
export async function readCurrentUser(): Promise<CurrentUser | null> {
  try {
    return await http.get<CurrentUser>('/sessions/current', { isSignIn: true })
  } catch (error) {
    if (error instanceof ProblemError && error.status === 401) return null
    throw error
  }
}

export function signIn(credentials: z.infer<typeof signInSchema>): Promise<CurrentUser> {
  return http.post<CurrentUser>('/sessions', credentials, { isSignIn: true })
}

export function signOut(): Promise<void> {
  return http.delete('/sessions/current', { isSignIn: true })
}

/** Ends every session of the account, this one too. */
export function signOutEverywhere(): Promise<void> {
  return http.delete('/sessions', { isSignIn: true })
}

/** Throws a `ProblemError` that names `currentPassword` when it is wrong. The account's other sessions end. */
export function changePassword(change: z.infer<typeof passwordChangeSchema>): Promise<void> {
  return http.put('/account/password', change, { isSignIn: true })
}

/** Answers the same whether or not the account exists. */
export function requestPasswordReset(body: z.infer<typeof passwordResetRequestSchema>): Promise<void> {
  return http.post('/password-resets', body, { isSignIn: true })
}

export function resetPassword(body: z.infer<typeof passwordResetSchema>): Promise<void> {
  return http.post('/password-resets/redeem', body, { isSignIn: true })
}

/** Follows an invitation: the account becomes active and is signed in. */
export function acceptInvitation(body: z.infer<typeof invitationAcceptSchema>): Promise<CurrentUser> {
  return http.post<CurrentUser>('/invitations/accept', body, { isSignIn: true })
}
