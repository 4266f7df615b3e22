import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { mayRole, PERMISSIONS, type Action } from '../../shared/access/permissions.ts'
import { ROLES } from '../../shared/schemas/account.ts'
import type { Operation } from '../../server/http/operation.ts'
import { buildTestApp } from '../support/buildTestApp.ts'
import { buildUser } from '../support/buildUser.ts'
import { listenTo } from '../support/listenTo.ts'

/**
 * Every call of the API by everybody: the table of permissions is the expectation, and nobody is asked what they meant to allow.
 * What is looked for may not exist and bodies are empty; what counts is who gets past the door.
 */
const app = buildTestApp()
let server: Awaited<ReturnType<typeof listenTo>>

beforeAll(async () => {
  server = await listenTo(app)
})
afterAll(() => server.close())

/** The status that a person's call is answered with. A stream is left as soon as it has begun. */
async function call({ method, path, body }: Operation, cookie: string | null): Promise<number> {
  const address = path.replace(/[:*]\w+/g, 'nothing')
  const answer = await fetch(`${server.url}/api${address}`, {
    method: method.toUpperCase(),
    headers: { 'If-Match': '"1"', ...(body ? { 'Content-Type': 'application/json' } : {}), ...(cookie === null ? {} : { Cookie: cookie }) },
    ...(body ? { body: '{}' } : {}),
  })
  await answer.body?.cancel()
  return answer.status
}

describe.each(app.operations.map((operation) => ({ name: `${operation.method.toUpperCase()} /api${operation.path}`, operation })))(
  '$name',
  ({ operation }) => {
    const { action } = operation
    const isPublic = action === 'public'

    it(isPublic ? 'is open to anybody' : 'asks who it is: 401 for nobody', async () => {
      const status = await call(operation, null)
      if (isPublic) expect(status).not.toBe(401)
      else expect(status).toBe(401)
      expect(status).toBeLessThan(500)
    })

    it.each(ROLES)(`treats an active %s as the table says`, async (role) => {
      const user = buildUser(app.db, { role })
      const status = await call(operation, app.cookieOf(user))
      const isAllowed = isPublic || mayRole(role, action)
      if (isAllowed) expect([401, 403]).not.toContain(status)
      else expect(status).toBe(403)
      expect(status).toBeLessThan(500)
    })

    if (isPublic) return
    it.each(ROLES)('is closed to a deactivated %s whose tab is still open', async (role) => {
      const user = buildUser(app.db, { role, status: 'deactivated' })
      expect(await call(operation, app.cookieOf(user))).toBe(401)
    })
  },
)

describe('the table of permissions', () => {
  it('has no action that no call asks for', () => {
    const asked = new Set(app.operations.map(({ action }) => action))
    const unasked = (Object.keys(PERMISSIONS) as Action[]).filter((action) => !asked.has(action))
    expect(unasked).toEqual([])
  })

  it('lets an owner write nothing but their own account', () => {
    const writes = app.operations.filter(({ method, action }) => method !== 'get' && action !== 'public' && mayRole('owner', action))
    expect(writes.map(({ id }) => id).sort()).toEqual(['changePassword', 'signOut', 'signOutEverywhere'])
  })
})
