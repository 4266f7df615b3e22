import type { Role } from '../shared/schemas/account.ts'

export interface DemoAccount {
  email: string
  password: string
  role: Role
  name: string
}

/** One password for all of the demo: it guards nothing, and it is printed where the demo starts. */
export const DEMO_PASSWORD = 'slate-lime-and-oak'

/** The three people that the demo is tried as. All invented. */
export const demoAccounts: readonly DemoAccount[] = [
  { email: 'admin@alderfinch.example', password: DEMO_PASSWORD, role: 'admin', name: 'Maren Alder' },
  { email: 'estimator@alderfinch.example', password: DEMO_PASSWORD, role: 'estimator', name: 'Tobias Finch' },
  { email: 'owner@alderfinch.example', password: DEMO_PASSWORD, role: 'owner', name: 'Ilse Varden' },
]
