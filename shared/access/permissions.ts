import type { Role } from '../schemas/account.ts'

/**
 * Who may do what, in one table. The routes guard with it, the screens hide with it and the tests walk through it.
 * An owner's `house.read` reaches only the houses shared with them.
 */
export const PERMISSIONS = {
  'house.read': ['admin', 'estimator', 'owner'],
  'house.write': ['admin', 'estimator'],
  'house.share': ['admin', 'estimator'],
  'room.write': ['admin', 'estimator'],
  'estimate.read': ['admin', 'estimator', 'owner'],
  'estimate.write': ['admin', 'estimator'],
  'estimate.exchange': ['admin', 'estimator'],
  'workbook.download': ['admin', 'estimator', 'owner'],
  'price-book.read': ['admin', 'estimator'],
  'price-book.write': ['admin'],
  'person.read': ['admin'],
  'person.write': ['admin'],
  'outbox.read': ['admin'],
  'account.self': ['admin', 'estimator', 'owner'],
} as const satisfies Record<string, readonly Role[]>

export type Action = keyof typeof PERMISSIONS

/** Whether a role may do an action. */
export function mayRole(role: Role, action: Action): boolean {
  return (PERMISSIONS[action] as readonly Role[]).includes(role)
}
