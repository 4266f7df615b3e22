import type { Role } from '../shared/schemas/account.ts'
import { demoAccounts, type DemoAccount } from './demoAccounts.ts'

export interface DemoPerson {
  id: string
  email: string
  role: Role
  name: string
}

export const demoAdmin = personOf('admin')
export const demoEstimator = personOf('estimator')
export const demoOwner = personOf('owner')

/** Everybody in the demo: the three that it is tried as, and two more so that lists have somebody to tell apart. All invented. */
export const demoPeople: readonly DemoPerson[] = [
  demoAdmin,
  demoEstimator,
  demoOwner,
  { id: 'demo-second-estimator', email: 'second.estimator@alderfinch.example', role: 'estimator', name: 'Odile Brandt' },
  { id: 'demo-second-owner', email: 'second.owner@alderfinch.example', role: 'owner', name: 'Pell Ostrander' },
]

function personOf(role: Role): DemoPerson {
  const { email, name } = demoAccounts.find((account) => account.role === role) as DemoAccount
  return { id: `demo-${role}`, email, role, name }
}
