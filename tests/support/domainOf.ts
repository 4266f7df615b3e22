import { createDomainServices, type DomainServices } from '../../server/features/domainServices.ts'
import type { CurrentUser } from '../../shared/schemas/account.ts'
import type { TestApp } from './buildTestApp.ts'

/** Who builds what a test begins with. */
export const BUILDER: CurrentUser = { id: 'test-builder', email: 'builder@test.example', name: 'Test builder', role: 'admin' }

/** The services over a test app's database, to build what a test begins with by the app's own rules. */
export function domainOf({ db, clock, events }: Pick<TestApp, 'db' | 'clock' | 'events'>): DomainServices {
  return createDomainServices({ db, clock, events })
}
