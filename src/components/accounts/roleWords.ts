import { ROLES, type Role } from '../../../shared/schemas/account.ts'

const MAY: Record<Role, string> = {
  admin: 'keeps the price book and the people, and estimates',
  estimator: 'keys houses and rooms, and estimates',
  owner: 'reads the houses that are shared with them',
}

/** The roles for a list to choose from, with what each may do. */
export const ROLE_OPTIONS = ROLES.map((role) => ({ value: role, label: `${capitalized(role)}: ${MAY[role]}` }))
export const SHORT_ROLE_OPTIONS = ROLES.map((role) => ({ value: role, label: capitalized(role) }))

function capitalized(word: string): string {
  return word.charAt(0).toUpperCase() + word.slice(1)
}
