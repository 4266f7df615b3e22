import { ROLES, type Role } from '../../../shared/schemas/account.ts'

/** What each role may do, as a sentence. */
export const ROLE_WORDS: Record<Role, string> = {
  admin: 'An admin keeps the price book and the people, and estimates.',
  estimator: 'An estimator keys houses and rooms, and estimates.',
  owner: 'An owner reads the houses that are shared with them.',
}

export const ROLE_OPTIONS = ROLES.map((role) => ({ value: role, label: role.charAt(0).toUpperCase() + role.slice(1) }))
