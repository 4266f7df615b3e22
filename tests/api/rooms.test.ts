import { beforeEach, describe, expect, it } from 'vitest'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import type { AddedHouse } from '../../shared/schemas/house.ts'
import type { Room } from '../../shared/schemas/room.ts'
import { auditOf } from '../support/auditOf.ts'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addRoom, keyedRoom } from '../support/addRoom.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { heardEvents } from '../support/heardEvents.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn
let house: AddedHouse['house']
let estimateId: string
let roomsPath: string

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
  ;({ house, estimateId } = addHouse(app))
  roomsPath = `/api/houses/${house.id}/rooms`
})

async function whole(): Promise<EstimateWhole> {
  return (await estimator.agent.get(`/api/estimates/${estimateId}`)).body as EstimateWhole
}
const directLikely = async () => (await whole()).estimate.totals.directCents.likely
const namesOf = (rooms: readonly Room[]) => rooms.map(({ name }) => name)

const BOW_TIE = {
  kind: 'polygon',
  corners: [
    [0, 0],
    [120, 120],
    [120, 0],
    [0, 120],
  ],
}

describe('GET /api/houses/:houseId/rooms', () => {
  it('gives the rooms in their order to those whom the house is open to', async () => {
    addRoom(app, house.id, { name: 'One' })
    addRoom(app, house.id, { name: 'Two' })
    expect(namesOf((await estimator.agent.get(roomsPath)).body)).toEqual(['One', 'Two'])
    expect((await owner.agent.get(roomsPath)).status).toBe(404)
    shareHouse(app, house.id, estimator.user, owner.user)
    expect(namesOf((await owner.agent.get(roomsPath)).body)).toEqual(['One', 'Two'])
  })
})

describe('POST /api/houses/:houseId/rooms', () => {
  it('adds a room at the end, raises the estimate and tells of it', async () => {
    addRoom(app, house.id, { name: 'One' })
    const heard = heardEvents(app, 'admin')
    const answer = await estimator.agent.post(roomsPath).send(keyedRoom({ name: 'Two' }))
    expect(answer.status).toBe(201)
    expect(answer.headers.etag).toBe('"1"')
    expect(answer.body).toMatchObject({ ...keyedRoom({ name: 'Two' }), houseId: house.id, version: 1 })
    const { rooms, estimate } = await whole()
    expect(namesOf(rooms)).toEqual(['One', 'Two'])
    expect(estimate.version).toBe(3)
    expect(auditOf(app.db, 'room', answer.body.id)).toMatchObject([{ action: 'add', actorId: estimator.user.id, after: answer.body }])
    expect(heard).toEqual([{ type: 'estimate', id: estimateId, version: 3 }])
  })

  it('adds it below another when told so, again and again where there is no gap left', async () => {
    const first = addRoom(app, house.id, { name: 'First' })
    addRoom(app, house.id, { name: 'Last' })
    for (let nth = 1; nth <= 14; nth += 1) {
      const answer = await estimator.agent.post(roomsPath).send({ ...keyedRoom({ name: `Copy ${nth}` }), afterRoomId: first.id })
      expect(answer.status).toBe(201)
    }
    const names = namesOf((await whole()).rooms)
    expect(names).toEqual(['First', ...Array.from({ length: 14 }, (_, index) => `Copy ${14 - index}`), 'Last'])
  })

  it('adds one room for a repeat with the same Idempotency-Key', async () => {
    const send = () => estimator.agent.post(roomsPath).set('Idempotency-Key', 'r1').send(keyedRoom())
    const first = await send()
    expect((await send()).body).toEqual(first.body)
    expect((await whole()).rooms).toHaveLength(1)
  })

  it.each<[string, Record<string, unknown>, RegExp]>([
    ['walls that cross', { shape: BOW_TIE }, /^shape\.corners/],
    [
      'a room without floor',
      {
        shape: {
          kind: 'polygon',
          corners: [
            [0, 0],
            [10, 0],
            [20, 0],
          ],
        },
      },
      /^shape/,
    ],
    [
      'a cut as large as the room',
      { shape: { kind: 'ell', lengthIn: 100, widthIn: 100, cutLengthIn: 100, cutWidthIn: 10 } },
      /^shape\.cut/,
    ],
    [
      'two corners',
      {
        shape: {
          kind: 'polygon',
          corners: [
            [0, 0],
            [10, 0],
          ],
        },
      },
      /^shape\.corners$/,
    ],
    ['a width of zero', { shape: { kind: 'rectangle', lengthIn: 100, widthIn: 0 } }, /^shape\.widthIn$/],
    ['a length past all houses', { shape: { kind: 'rectangle', lengthIn: 1e9, widthIn: 1 } }, /^shape\.lengthIn$/],
    ['an opening below zero', { openings: [{ kind: 'door', widthIn: -3, heightIn: 80, count: 1 }] }, /^openings\[0\]\.widthIn$/],
    ['half an opening', { openings: [{ kind: 'door', widthIn: 3, heightIn: 80, count: 0.5 }] }, /^openings\[0\]\.count$/],
    ['an unknown use', { use: 'ballroom' }, /^use$/],
    ['an empty name', { name: '' }, /^name$/],
    ['a room to stand below that there is not', { afterRoomId: 'none' }, /^afterRoomId$/],
  ])('refuses %s at its field', async (_, fields, path) => {
    const answer = await estimator.agent.post(roomsPath).send({ ...keyedRoom(), ...fields })
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toMatch(path)
    expect((await whole()).rooms).toEqual([])
  })

  it('is not for an owner, nor in a house that there is not', async () => {
    shareHouse(app, house.id, estimator.user, owner.user)
    expect((await owner.agent.post(roomsPath).send(keyedRoom())).status).toBe(403)
    expect((await estimator.agent.post('/api/houses/none/rooms').send(keyedRoom())).status).toBe(404)
  })
})

describe('PATCH /api/houses/:houseId/rooms/:roomId', () => {
  it('changes the room, and the lines that are measured by it follow at once', async () => {
    const room = addRoom(app, house.id)
    addLine(app, estimateId, { roomId: room.id, quantity: 'floor_area', wastePercent: 0 })
    const before = await directLikely()

    const answer = await estimator.agent
      .patch(`${roomsPath}/${room.id}`)
      .set('If-Match', '"1"')
      .send({ shape: { kind: 'rectangle', lengthIn: 288, widthIn: 120 } })

    expect(answer.body).toMatchObject({ id: room.id, name: room.name, version: 2 })
    expect(answer.headers.etag).toBe('"2"')
    expect(await directLikely()).toBe(before * 2)
    expect(auditOf(app.db, 'room', room.id).at(-1)).toMatchObject({ action: 'update', before: room, after: answer.body })
  })

  it('marks a line whose measure is no longer to be had, and leaves it out of the totals', async () => {
    const room = addRoom(app, house.id)
    addLine(app, estimateId, { roomId: room.id, quantity: 'wall_area', unit: 'sf' })
    await estimator.agent.patch(`${roomsPath}/${room.id}`).set('If-Match', '"1"').send({ ceiling: null })
    const { estimate } = await whole()
    expect(estimate.errorCount).toBe(1)
    expect(estimate.totals.directCents).toEqual({ low: 0, likely: 0, high: 0 })
  })

  it('answers 412 with the room as it stands when somebody was quicker', async () => {
    const room = addRoom(app, house.id)
    const send = (name: string) => estimator.agent.patch(`${roomsPath}/${room.id}`).set('If-Match', '"1"').send({ name })
    await send('Quicker')
    const answer = await send('Slower')
    expect(answer.status).toBe(412)
    expect(answer.body.current).toMatchObject({ id: room.id, name: 'Quicker', version: 2 })
    expect(namesOf((await whole()).rooms)).toEqual(['Quicker'])
  })

  it('needs If-Match and a room of this very house', async () => {
    const room = addRoom(app, house.id)
    const other = addHouse(app, { name: 'Other' })
    const patch = (houseId: string) => estimator.agent.patch(`/api/houses/${houseId}/rooms/${room.id}`)
    expect((await patch(house.id).send({ name: 'X' })).status).toBe(428)
    expect((await patch(other.house.id).set('If-Match', '"1"').send({ name: 'X' })).status).toBe(404)
    expect((await patch('none').set('If-Match', '"1"').send({ name: 'X' })).status).toBe(404)
  })

  it('refuses a bad shape at its field', async () => {
    const room = addRoom(app, house.id)
    const answer = await estimator.agent.patch(`${roomsPath}/${room.id}`).set('If-Match', '"1"').send({ shape: BOW_TIE })
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toMatch(/^shape\.corners/)
  })
})

describe('DELETE /api/houses/:houseId/rooms/:roomId and its restore', () => {
  it('takes the lines of the room along and brings back those and no others', async () => {
    const room = addRoom(app, house.id)
    const kept = addLine(app, estimateId)
    const inRoom = addLine(app, estimateId, { roomId: room.id })
    const removedBefore = addLine(app, estimateId, { roomId: room.id })
    await estimator.agent.delete(`/api/estimates/${estimateId}/lines/${removedBefore.id}`).set('If-Match', '"1"')
    const before = await whole()

    const removed = await estimator.agent.delete(`${roomsPath}/${room.id}`).set('If-Match', '"1"')

    expect(removed.body).toEqual({ room: { ...room, version: 2 }, removedLineIds: [inRoom.id] })
    const without = await whole()
    expect(without.rooms).toEqual([])
    expect(without.lines.map(({ id }) => id)).toEqual([kept.id])
    expect(without.estimate.totals.directCents.likely).toBeLessThan(before.estimate.totals.directCents.likely)

    const restored = await estimator.agent.post(`${roomsPath}/${room.id}/restore`)

    expect(restored.body).toEqual({ ...room, version: 3 })
    const after = await whole()
    expect(after.lines.map(({ id }) => id)).toEqual([kept.id, inRoom.id])
    expect(after.estimate.totals).toEqual(before.estimate.totals)
    expect(auditOf(app.db, 'room', room.id).map(({ action }) => action)).toEqual(['add', 'remove', 'restore'])
  })

  it('needs the newest If-Match to remove and a removed room to restore', async () => {
    const room = addRoom(app, house.id)
    expect((await estimator.agent.delete(`${roomsPath}/${room.id}`)).status).toBe(428)
    expect((await estimator.agent.delete(`${roomsPath}/${room.id}`).set('If-Match', '"5"')).body).toMatchObject({
      status: 412,
      current: room,
    })
    expect((await estimator.agent.post(`${roomsPath}/${room.id}/restore`)).body).toMatchObject({ status: 409, code: 'not-removed' })
    expect((await estimator.agent.post(`${roomsPath}/none/restore`)).status).toBe(404)
    const other = addHouse(app, { name: 'Other' })
    await estimator.agent.delete(`${roomsPath}/${room.id}`).set('If-Match', '"1"')
    expect((await estimator.agent.post(`/api/houses/${other.house.id}/rooms/${room.id}/restore`)).status).toBe(404)
  })
})

describe('PUT /api/houses/:houseId/rooms/order', () => {
  it('puts the rooms in the order of the ids and leaves their versions', async () => {
    const one = addRoom(app, house.id, { name: 'One' })
    const two = addRoom(app, house.id, { name: 'Two' })
    const three = addRoom(app, house.id, { name: 'Three' })
    const answer = await estimator.agent.put(`${roomsPath}/order`).send({ ids: [three.id, one.id, two.id] })
    expect(namesOf(answer.body)).toEqual(['Three', 'One', 'Two'])
    expect((await whole()).rooms.map(({ name, version }) => [name, version])).toEqual([
      ['Three', 1],
      ['One', 1],
      ['Two', 1],
    ])
  })

  it('refuses ids that are not those of the house: twice 422, missing or foreign 409', async () => {
    const one = addRoom(app, house.id)
    const two = addRoom(app, house.id)
    const put = (ids: unknown) => estimator.agent.put(`${roomsPath}/order`).send({ ids })
    expect((await put([one.id, one.id])).body).toMatchObject({ status: 422, errors: [{ path: 'ids[1]' }] })
    expect((await put([one.id])).body).toMatchObject({ status: 409, code: 'rooms-changed' })
    expect((await put([one.id, two.id, 'foreign'])).status).toBe(409)
    expect((await put('all')).body).toMatchObject({ status: 422, errors: [{ path: 'ids' }] })
  })
})
