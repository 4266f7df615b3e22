import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { users } from '../../server/db/schema/users.ts'
import { auditOf } from '../support/auditOf.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { buildUser, TEST_PASSWORD, type TestUser } from '../support/buildUser.ts'
import { heardEvents } from '../support/heardEvents.ts'

let app: TestApp
let admin: SignedIn

beforeEach(() => {
  app = buildTestApp()
  admin = app.signInAs('admin')
})

function change(user: Pick<TestUser, 'id'>, patch: object, version = 1) {
  return admin.agent.patch(`/api/people/${user.id}`).set('If-Match', `"${version}"`).send(patch)
}

describe('GET /api/people', () => {
  it('lists everybody by name, with role and status, and no hash', async () => {
    buildUser(app.db, { name: 'Zed', role: 'owner' })
    buildUser(app.db, { name: 'Abe', status: 'invited' })
    const { body } = await admin.agent.get('/api/people')
    expect(body).toMatchObject([
      { name: 'Abe', status: 'invited' },
      { name: admin.user.name },
      { name: 'Zed', role: 'owner', status: 'active' },
    ])
    expect(JSON.stringify(body)).not.toContain('$2')
  })
})

describe('GET /api/owners', () => {
  it('lists the active owners alone, for who shares a house', async () => {
    const owner = buildUser(app.db, { role: 'owner' })
    buildUser(app.db, { role: 'owner', status: 'invited' })
    buildUser(app.db, { role: 'owner', status: 'deactivated' })
    const { agent } = app.signInAs('estimator')
    expect((await agent.get('/api/owners')).body).toEqual([{ id: owner.id, name: owner.name, email: owner.email }])
  })
})

describe('PATCH /api/people/:id', () => {
  it('renames, and answers with the new version in the body and the ETag', async () => {
    const user = buildUser(app.db)
    const neighbour = buildUser(app.db)
    const answer = await change(user, { name: ' Ida Vale ' })
    expect([answer.status, answer.headers.etag]).toEqual([200, '"2"'])
    expect(answer.body).toMatchObject({ id: user.id, name: 'Ida Vale', role: user.role, status: 'active', version: 2 })
    expect(app.db.select().from(users).where(eq(users.id, neighbour.id)).get()).toMatchObject({ name: neighbour.name, version: 1 })
  })

  it('leaves the sessions of somebody who was only renamed', async () => {
    const { user, agent } = app.signInAs('estimator')
    await change(user, { name: 'Ida Vale' })
    expect((await agent.get('/api/sessions/current')).body.name).toBe('Ida Vale')
  })

  it('leaves an audit row with before and after, and tells the open screens of admins', async () => {
    const heard = heardEvents(app, 'admin')
    const user = buildUser(app.db, { role: 'owner' })
    await change(user, { role: 'estimator' })
    expect(auditOf(app.db, 'person', user.id)).toMatchObject([
      { actorId: admin.user.id, action: 'update', before: { role: 'owner', version: 1 }, after: { role: 'estimator', version: 2 } },
    ])
    expect(heard).toEqual([{ type: 'people', id: user.id, version: 2 }])
  })

  describe('when the role changes', () => {
    it('ends the sessions at once, so that the next sign-in begins with the new role', async () => {
      const { user, agent } = app.signInAs('owner')
      await change(user, { role: 'estimator' })
      expect((await agent.get('/api/sessions/current')).status).toBe(401)
      const again = await app.anonymous().post('/api/sessions').send({ email: user.email, password: TEST_PASSWORD })
      expect(again.body.role).toBe('estimator')
    })
  })

  describe('when somebody is deactivated', () => {
    it('ends their sessions at once: the open tab gets 401 on its next call, reading or writing', async () => {
      const { user, agent } = app.signInAs('admin')
      expect((await change(user, { active: false })).body.status).toBe('deactivated')
      expect((await agent.get('/api/people')).status).toBe(401)
      expect((await agent.post('/api/invitations').send({ email: 'x@test.example', name: 'X', role: 'admin' })).status).toBe(401)
      expect((await app.anonymous().post('/api/sessions').send({ email: user.email, password: TEST_PASSWORD })).status).toBe(401)
      expect(app.sentMail).toEqual([])
    })

    it('can be taken back, and signs in again with the same password', async () => {
      const user = buildUser(app.db, { status: 'deactivated' })
      expect((await change(user, { active: true })).body.status).toBe('active')
      expect((await app.anonymous().post('/api/sessions').send({ email: user.email, password: TEST_PASSWORD })).status).toBe(201)
    })

    it('goes back to being invited when the invitation was never followed', async () => {
      const user = buildUser(app.db, { status: 'invited' })
      await change(user, { active: false })
      expect((await change(user, { active: true }, 2)).body.status).toBe('invited')
    })
  })

  describe('when it would shut the firm out', () => {
    it("refuses with 409 to take the role from oneself or to deactivate oneself, and doesn't change anything", async () => {
      for (const patch of [{ role: 'owner' }, { active: false }]) {
        const refused = await change(admin.user, patch)
        expect([refused.status, refused.body.code]).toEqual([409, 'own-account'])
        expect(refused.body.detail).toContain('Ask another admin')
      }
      expect((await admin.agent.get('/api/sessions/current')).body.role).toBe('admin')
      expect(auditOf(app.db, 'person')).toEqual([])
    })

    it('lets one rename oneself', async () => {
      expect((await change(admin.user, { name: 'Ida Vale', role: 'admin', active: true })).status).toBe(200)
    })

    it('never leaves the firm without an active admin, also when two admins demote each other at once', async () => {
      const other = app.signInAs('admin')
      const answers = await Promise.all([
        change(other.user, { role: 'owner' }),
        other.agent.patch(`/api/people/${admin.user.id}`).set('If-Match', '"1"').send({ role: 'owner' }),
      ])
      expect(answers.filter(({ status }) => status === 200)).toHaveLength(1)
      const admins = app.db.select().from(users).where(eq(users.role, 'admin')).all()
      expect(admins).toHaveLength(1)
    })
  })

  describe('when it was changed in the meantime', () => {
    it('refuses with 412, gives how it stands now, and keeps what is there', async () => {
      const user = buildUser(app.db)
      await change(user, { name: 'First' })
      const refused = await change(user, { name: 'Second' })
      expect([refused.status, refused.body.code]).toEqual([412, 'stale'])
      expect(refused.body.current).toMatchObject({ id: user.id, name: 'First', version: 2 })
      expect(app.db.select().from(users).where(eq(users.id, user.id)).get()?.name).toBe('First')
    })
  })

  it('needs If-Match: 428 without it, 400 with what is no version', async () => {
    const user = buildUser(app.db)
    const path = `/api/people/${user.id}`
    expect((await admin.agent.patch(path).send({ name: 'X' })).status).toBe(428)
    for (const header of ['*', '"one"', '"1", "2"', 'W/"1"']) {
      expect([header, (await admin.agent.patch(path).set('If-Match', header).send({ name: 'X' })).status]).toEqual([header, 400])
    }
  })

  it('answers 404 for somebody who is not there and 422 for what is no id', async () => {
    expect((await change({ id: 'nobody' }, { name: 'X' })).status).toBe(404)
    expect((await change({ id: 'no%20id' }, { name: 'X' })).status).toBe(422)
  })

  it('refuses fields that are not for changing here', async () => {
    const refused = await change(buildUser(app.db), { email: 'other@test.example', passwordHash: 'x' })
    expect(refused.body.errors).toMatchObject([{ path: 'email' }, { path: 'passwordHash' }])
  })
})
