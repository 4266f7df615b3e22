import { z } from 'zod'
import { idSchema, isoTimeSchema, nameSchema, versionSchema } from './common.ts'

export const ROLES = ['admin', 'estimator', 'owner'] as const
export const PASSWORD_MIN_CHARS = 12
/** bcrypt reads 72 bytes and no more. */
export const PASSWORD_MAX_BYTES = 72

export const roleSchema = z.enum(ROLES)
export const emailSchema = z.string().trim().toLowerCase().max(254).pipe(z.email('is not an e-mail address'))

function byteLength(text: string): number {
  return new TextEncoder().encode(text).length
}
/** A new password. Common ones are refused by the server, which holds the list. */
export const newPasswordSchema = z
  .string()
  .min(PASSWORD_MIN_CHARS, `needs at least ${PASSWORD_MIN_CHARS} characters`)
  .refine((text) => byteLength(text) <= PASSWORD_MAX_BYTES, `is longer than ${PASSWORD_MAX_BYTES} bytes`)

export const signInSchema = z.strictObject({ email: emailSchema, password: z.string().min(1, 'is empty').max(200) })
export const passwordChangeSchema = z.strictObject({
  currentPassword: z.string().min(1, 'is empty').max(200),
  newPassword: newPasswordSchema,
})
export const passwordResetRequestSchema = z.strictObject({ email: emailSchema })
export const passwordResetSchema = z.strictObject({ token: z.string().min(1).max(2000), newPassword: newPasswordSchema })
export const invitationSchema = z.strictObject({ email: emailSchema, name: nameSchema, role: roleSchema })
export const invitationAcceptSchema = z.strictObject({
  token: z.string().min(1).max(2000),
  name: nameSchema,
  newPassword: newPasswordSchema,
})

export const personSchema = z.object({
  id: idSchema,
  email: z.string(),
  name: nameSchema,
  role: roleSchema,
  /** `invited` until the invitation is followed; `deactivated` accounts can't sign in and hold no session. */
  status: z.enum(['invited', 'active', 'deactivated']),
  version: versionSchema,
  createdAt: isoTimeSchema,
  lastSignInAt: isoTimeSchema.nullable(),
})
export const personPatchSchema = z.strictObject({
  name: nameSchema.optional(),
  role: roleSchema.optional(),
  active: z.boolean().optional(),
})

/** Who is signed in. */
export const currentUserSchema = z.object({ id: idSchema, email: z.string(), name: z.string(), role: roleSchema })

export const outboxMessageSchema = z.object({
  id: idSchema,
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  sentAt: isoTimeSchema,
})

/** What anyone may read before signing in. The demo accounts are there in a demo alone. */
export const firmSchema = z.object({
  name: z.string(),
  isDemo: z.boolean(),
  hasOutbox: z.boolean(),
  demoAccounts: z.array(z.object({ email: z.string(), password: z.string(), role: roleSchema, name: z.string() })),
})

export type Role = z.infer<typeof roleSchema>
export type CurrentUser = z.infer<typeof currentUserSchema>
export type Person = z.infer<typeof personSchema>
export type PersonPatch = z.infer<typeof personPatchSchema>
export type Invitation = z.infer<typeof invitationSchema>
export type OutboxMessage = z.infer<typeof outboxMessageSchema>
export type Firm = z.infer<typeof firmSchema>
