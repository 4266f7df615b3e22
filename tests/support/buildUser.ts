import { hashSync } from 'bcryptjs'
import type { Database } from '../../server/db/client.ts'
import { newId } from '../../server/db/newId.ts'
import { users } from '../../server/db/schema/users.ts'
import type { Role } from '../../shared/schemas/account.ts'
import { TEST_NOW } from './steppingClock.ts'

export const TEST_PASSWORD = 'seven quiet gutters'
const TEST_PASSWORD_HASH = hashSync(TEST_PASSWORD, 4)

export interface TestUser {
  id: string
  email: string
  name: string
  role: Role
  status: 'invited' | 'active' | 'deactivated'
  version: number
}

let built = 0

/** A person in the database, active and with `TEST_PASSWORD` unless told otherwise. Name only the field that matters. */
export function buildUser(db: Database, fields: Partial<TestUser> = {}): TestUser {
  built += 1
  const role = fields.role ?? 'estimator'
  const user: TestUser = {
    id: newId(),
    email: `${role}-${built}@test.example`,
    name: `${role} ${built}`,
    role,
    status: 'active',
    version: 1,
    ...fields,
  }
  const passwordHash = user.status === 'invited' ? null : TEST_PASSWORD_HASH
  db.insert(users)
    .values({ ...user, passwordHash, createdAt: TEST_NOW, updatedAt: TEST_NOW })
    .run()
  return user
}
