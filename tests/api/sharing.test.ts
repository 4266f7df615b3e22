import { beforeEach, describe, expect, it } from 'vitest'
import { auditOf } from '../support/auditOf.ts'
import { addHouse } from '../support/addHouse.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { buildUser } from '../support/buildUser.ts'
import { heardEvents } from '../support/heardEvents.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn
let houseId: string
let sharesPath: string

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
  houseId = addHouse(app).house.id
  sharesPath = `/api/houses/${houseId}/shares`
})

const share = (userId: string) => estimator.agent.post(sharesPath).send({ userId })

describe('POST /api/houses/:id/shares', () => {
  it('opens the house to an owner, tells them and leaves an audit row', async () => {
    const heard = heardEvents(app, owner.user)
    const answer = await share(owner.user.id)
    expect(answer.status).toBe(201)
    expect(answer.body).toEqual({
      userId: owner.user.id,
      name: owner.user.name,
      email: owner.user.email,
      sharedAt: app.clock().toISOString(),
    })
    expect((await owner.agent.get(`/api/houses/${houseId}`)).status).toBe(200)
    expect((await estimator.agent.get(sharesPath)).body).toEqual([answer.body])
    expect(auditOf(app.db, 'house', houseId).at(-1)).toMatchObject({
      action: 'share',
      actorId: estimator.user.id,
      after: { userId: owner.user.id },
    })
    expect(heard).toEqual([{ type: 'house', id: houseId, version: 1 }])
  })

  it('keeps a share that there is', async () => {
    const first = await share(owner.user.id)
    app.advance(1000)
    expect((await share(owner.user.id)).body).toEqual(first.body)
    expect((await estimator.agent.get(sharesPath)).body).toHaveLength(1)
  })

  it('refuses anybody who is no active owner', async () => {
    const gone = buildUser(app.db, { role: 'owner', status: 'deactivated' })
    for (const userId of [estimator.user.id, gone.id, 'nobody']) {
      expect((await share(userId)).body).toMatchObject({ status: 422, errors: [{ path: 'userId', code: 'not-an-owner' }] })
    }
  })

  it('is not for an owner, nor for a house that there is not', async () => {
    await share(owner.user.id)
    expect((await owner.agent.post(sharesPath).send({ userId: owner.user.id })).status).toBe(403)
    expect((await owner.agent.get(sharesPath)).status).toBe(403)
    expect((await estimator.agent.post('/api/houses/none/shares').send({ userId: owner.user.id })).status).toBe(404)
    expect((await estimator.agent.get('/api/houses/none/shares')).status).toBe(404)
  })
})

describe('DELETE /api/houses/:id/shares/:userId', () => {
  it('closes the house to the owner and to nobody else', async () => {
    const other = app.signInAs('owner')
    await share(owner.user.id)
    await share(other.user.id)
    expect((await estimator.agent.delete(`${sharesPath}/${owner.user.id}`)).status).toBe(204)
    expect((await owner.agent.get(`/api/houses/${houseId}`)).status).toBe(404)
    expect((await other.agent.get(`/api/houses/${houseId}`)).status).toBe(200)
    expect(auditOf(app.db, 'house', houseId).at(-1)).toMatchObject({ action: 'unshare', before: { userId: owner.user.id }, after: null })
  })

  it('answers 404 when it is not shared with them', async () => {
    expect((await estimator.agent.delete(`${sharesPath}/${owner.user.id}`)).status).toBe(404)
  })
})

describe('live changes', () => {
  it('reach an owner of a shared house and no other', async () => {
    const stranger = app.signInAs('owner')
    await share(owner.user.id)
    const heard = heardEvents(app, owner.user)
    const overheard = heardEvents(app, stranger.user)
    await estimator.agent.patch(`/api/houses/${houseId}`).set('If-Match', '"1"').send({ note: 'New' })
    await estimator.agent.delete(`${sharesPath}/${owner.user.id}`)
    await estimator.agent.patch(`/api/houses/${houseId}`).set('If-Match', '"2"').send({ note: 'Newer' })
    expect(heard.map(({ type, version }) => [type, version])).toEqual([
      ['estimate', 2],
      ['house', 2],
    ])
    expect(overheard).toEqual([])
  })
})
