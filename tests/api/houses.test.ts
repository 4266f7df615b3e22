import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { estimates } from '../../server/db/schema/estimates.ts'
import { estimateWholeSchema, type EstimateWhole } from '../../shared/schemas/estimate.ts'
import type { AddedHouse } from '../../shared/schemas/house.ts'
import { auditOf } from '../support/auditOf.ts'
import { addHouse, keyedHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addPriceBook } from '../support/addPriceBook.ts'
import { keyedPriceItem } from '../support/keyedPriceItem.ts'
import { addRoom } from '../support/addRoom.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { heardEvents } from '../support/heardEvents.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
})

async function wholeOf(estimateId: string): Promise<EstimateWhole> {
  const answer = await estimator.agent.get(`/api/estimates/${estimateId}`)
  return estimateWholeSchema.parse(answer.body)
}

describe('GET /api/houses', () => {
  it('lists houses with the figures of their working estimates, the last worked on first', async () => {
    const first = addHouse(app, { name: 'First' })
    app.advance(1000)
    const second = addHouse(app, { name: 'Second' })
    app.advance(1000)
    addRoom(app, first.house.id)
    addLine(app, first.estimateId)
    addLine(app, first.estimateId, { quantity: 'nonsense' })

    const answer = await estimator.agent.get('/api/houses')

    expect(answer.body).toMatchObject([
      { id: first.house.id, estimateId: first.estimateId, roomCount: 1, lineCount: 2, errorCount: 1 },
      { id: second.house.id, roomCount: 0, lineCount: 0, errorCount: 0, totalCents: { low: 0, likely: 0, high: 0 } },
    ])
    const { estimate } = await wholeOf(first.estimateId)
    expect(answer.body[0].totalCents).toEqual(estimate.totals.totalCents)
    expect(answer.body[0].totalCents.likely).toBeGreaterThan(0)
  })

  it('gives an owner the houses that are shared with them alone', async () => {
    const shared = addHouse(app, { name: 'Shared' })
    addHouse(app, { name: 'Secret' })
    shareHouse(app, shared.house.id, estimator.user, owner.user)
    const answer = await owner.agent.get('/api/houses')
    expect(answer.body.map(({ name }: { name: string }) => name)).toEqual(['Shared'])
  })
})

describe('POST /api/houses', () => {
  it('adds the house with a working estimate at the newest published prices and the tax of its region', async () => {
    addPriceBook(app.db)
    addPriceBook(app.db, { regions: [], items: [keyedPriceItem({ name: 'Newer' })] })
    const heard = heardEvents(app, 'admin')

    const answer = await estimator.agent.post('/api/houses').send(keyedHouse({ regionKey: 'dear' }))

    expect(answer.status).toBe(201)
    expect(answer.headers.etag).toBe('"1"')
    const { house, estimateId } = answer.body as AddedHouse
    expect(house).toMatchObject({ ...keyedHouse({ regionKey: 'dear' }), version: 1 })
    const { estimate } = await wholeOf(estimateId)
    expect(estimate).toMatchObject({ houseId: house.id, version: 1, priceBookVersion: 2, regionKey: 'dear', errorCount: 0 })
    expect(estimate.settings.salesTax).toEqual({ rule: 'whole-contract', percent: 5 })
    expect(auditOf(app.db, 'house', house.id)).toMatchObject([{ action: 'add', actorId: estimator.user.id, before: null, after: house }])
    expect(heard).toEqual([
      { type: 'estimate', id: estimateId, version: 1 },
      { type: 'house', id: house.id, version: 1 },
    ])
  })

  it('adds one house for a repeat with the same Idempotency-Key, and tells of it once', async () => {
    addPriceBook(app.db)
    const heard = heardEvents(app, 'admin')
    const send = () => estimator.agent.post('/api/houses').set('Idempotency-Key', 'k1').send(keyedHouse())
    const first = await send()
    const again = await send()
    expect(again.body).toEqual(first.body)
    expect(again.headers.etag).toBe('"1"')
    expect((await estimator.agent.get('/api/houses')).body).toHaveLength(1)
    expect(heard).toHaveLength(2)
  })

  it.each<[string, Record<string, unknown>, string]>([
    ['an unknown region', { regionKey: 'nowhere' }, 'regionKey'],
    ['an empty name', { name: '  ' }, 'name'],
    ['a year before houses', { yearBuilt: 1200 }, 'yearBuilt'],
    ['storeys by thirds', { storeys: 1.3 }, 'storeys'],
    ['a roof steeper than a wall', { roof: [{ kind: 'gable', rise: 30 }] }, 'roof[0].rise'],
    [
      'a roof that covers more than the house',
      {
        roof: [
          { kind: 'gable', rise: 6, sharePercent: 80 },
          { kind: 'flat', rise: 0, sharePercent: 30 },
        ],
      },
      'roof',
    ],
    ['a length below zero', { wallHeightIn: -1 }, 'wallHeightIn'],
    ['a footprint without width', { footprint: { kind: 'rectangle', lengthIn: 10 } }, 'footprint.widthIn'],
    [
      'a cut larger than the house',
      { footprint: { kind: 'ell', lengthIn: 10, widthIn: 10, cutLengthIn: 20, cutWidthIn: 5 } },
      'footprint.cutLengthIn',
    ],
    ['a field that there is not', { garage: true }, 'garage'],
  ])('refuses %s at its field', async (_, fields, path) => {
    addPriceBook(app.db)
    const answer = await estimator.agent.post('/api/houses').send({ ...keyedHouse(), ...fields })
    expect(answer.status).toBe(422)
    expect(answer.body.errors.map((error: { path: string }) => error.path)).toContain(path)
  })

  it('refuses with 409 while no price book is published', async () => {
    const answer = await estimator.agent.post('/api/houses').send(keyedHouse())
    expect(answer.body).toMatchObject({ status: 409, code: 'no-price-book' })
  })

  it('is not for an owner', async () => {
    expect((await owner.agent.post('/api/houses').send(keyedHouse())).status).toBe(403)
  })
})

describe('GET /api/houses/:id', () => {
  it('gives a house to those whom it is open to and 404 to others', async () => {
    const { house } = addHouse(app)
    const answer = await estimator.agent.get(`/api/houses/${house.id}`)
    expect(answer.body).toEqual(house)
    expect(answer.headers.etag).toBe('"1"')
    expect((await owner.agent.get(`/api/houses/${house.id}`)).status).toBe(404)
    shareHouse(app, house.id, estimator.user, owner.user)
    expect((await owner.agent.get(`/api/houses/${house.id}`)).body).toEqual(house)
    expect((await estimator.agent.get('/api/houses/none')).status).toBe(404)
    expect((await app.anonymous().get(`/api/houses/${house.id}`)).status).toBe(401)
  })
})

describe('PATCH /api/houses/:id', () => {
  it('changes what is sent, raises both versions and leaves the rest', async () => {
    const { house, estimateId } = addHouse(app)
    const heard = heardEvents(app, 'admin')
    const answer = await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ name: 'Renamed', yearBuilt: null })
    expect(answer.body).toMatchObject({ ...house, name: 'Renamed', yearBuilt: null, version: 2 })
    expect(answer.headers.etag).toBe('"2"')
    const whole = await wholeOf(estimateId)
    expect(whole.house.name).toBe('Renamed')
    expect(whole.estimate.version).toBe(2)
    expect(auditOf(app.db, 'house', house.id).at(-1)).toMatchObject({
      action: 'update',
      before: { name: house.name },
      after: { name: 'Renamed' },
    })
    expect(heard.map(({ type, version }) => [type, version])).toEqual([
      ['estimate', 2],
      ['house', 2],
    ])
  })

  it('computes lines over the house anew when its measures change', async () => {
    const { house, estimateId } = addHouse(app)
    addLine(app, estimateId, { quantity: 'footprint_area' })
    const before = (await wholeOf(estimateId)).estimate.totals.totalCents.likely
    await estimator.agent
      .patch(`/api/houses/${house.id}`)
      .set('If-Match', '"1"')
      .send({ footprint: { kind: 'rectangle', lengthIn: 960, widthIn: 300 } })
    const after = (await wholeOf(estimateId)).estimate.totals.totalCents.likely
    expect(after).toBe(before * 2)
    await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"2"').send({ footprint: null })
    const { estimate } = await wholeOf(estimateId)
    expect(estimate.errorCount).toBe(1)
    expect(estimate.totals.totalCents.likely).toBe(0)
  })

  describe('with another region', () => {
    it("reads the book's prices, the minimum charge and the tax of that region at the pinned version", async () => {
      const { house, estimateId } = addHouse(app)
      addLine(app, estimateId, { itemKey: 'inside-door/test-door', quantity: '1' })
      addPriceBook(app.db, { regions: [], items: [keyedPriceItem({ key: 'floor/newer' })] })

      const answer = await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ regionKey: 'dear' })

      expect(answer.status).toBe(200)
      const { estimate, lines } = await wholeOf(estimateId)
      expect(estimate).toMatchObject({
        regionKey: 'dear',
        priceBookVersion: 1,
        settings: { salesTax: { rule: 'whole-contract', percent: 5 } },
      })
      expect(lines[0]).toMatchObject({ version: 2, book: { materials: null, installed: { likely: 5_400_000 } } })
      expect(estimate.totals.directCents.likely).toBe(54_000)
    })

    it('leaves what a person set: own prices, an own minimum charge, an own tax and lines without an item', async () => {
      const { house, estimateId } = addHouse(app)
      const override = { price: { low: 1, likely: 2, high: 3 }, reason: 'A friend does it' }
      const overridden = addLine(app, estimateId, { override, minimumChargeCents: 123 })
      const own = addLine(app, estimateId, { itemKey: null, description: 'Odd job', unit: 'each', override })
      const { estimate } = await wholeOf(estimateId)
      await estimator.agent
        .patch(`/api/estimates/${estimateId}`)
        .set('If-Match', `"${estimate.version}"`)
        .send({ settings: { salesTax: { rule: 'materials', percent: 1 } } })

      await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ regionKey: 'dear' })

      const after = await wholeOf(estimateId)
      expect(after.estimate.settings.salesTax).toEqual({ rule: 'materials', percent: 1 })
      const lineOf = (id: string) => after.lines.find((line) => line.id === id)
      expect(lineOf(overridden.id)).toMatchObject({ override, minimumChargeCents: 123, book: { materials: { likely: 30_000 } } })
      expect(lineOf(own.id)).toEqual(own)
    })

    it('refuses a region that the pinned version does not have', async () => {
      const { house } = addHouse(app)
      const answer = await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ regionKey: 'nowhere' })
      expect(answer.body).toMatchObject({ status: 422, errors: [{ path: 'regionKey' }] })
    })
  })

  it('answers 412 with the house as it stands when somebody was quicker, and changes nothing', async () => {
    const { house } = addHouse(app)
    const send = (name: string) => estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ name })
    await send('Quicker')
    const answer = await send('Slower')
    expect(answer.status).toBe(412)
    expect(answer.body.current).toMatchObject({ id: house.id, name: 'Quicker', version: 2 })
    expect((await estimator.agent.get(`/api/houses/${house.id}`)).body.name).toBe('Quicker')
  })

  it('needs If-Match, an estimator and a house', async () => {
    const { house } = addHouse(app)
    shareHouse(app, house.id, estimator.user, owner.user)
    expect((await estimator.agent.patch(`/api/houses/${house.id}`).send({ name: 'X' })).status).toBe(428)
    expect((await owner.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ name: 'X' })).status).toBe(403)
    expect((await estimator.agent.patch('/api/houses/none').set('If-Match', '"1"').send({ name: 'X' })).status).toBe(404)
  })

  it('refuses a bad change at its field', async () => {
    const { house } = addHouse(app)
    const bowTie = {
      kind: 'polygon',
      corners: [
        [0, 0],
        [100, 100],
        [100, 0],
        [0, 100],
      ],
    }
    const answer = await estimator.agent.patch(`/api/houses/${house.id}`).set('If-Match', '"1"').send({ footprint: bowTie })
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toMatch(/^footprint\.corners/)
  })
})

describe('DELETE /api/houses/:id and POST /api/houses/:id/restore', () => {
  it('hides a house from everybody and brings it back as it was', async () => {
    const { house, estimateId } = addHouse(app)
    addRoom(app, house.id)
    addLine(app, estimateId)
    shareHouse(app, house.id, estimator.user, owner.user)
    const before = await wholeOf(estimateId)

    expect((await estimator.agent.delete(`/api/houses/${house.id}`).set('If-Match', '"1"')).status).toBe(204)
    for (const path of [
      `/houses/${house.id}`,
      `/houses/${house.id}/rooms`,
      `/estimates/${estimateId}`,
      `/estimates/${estimateId}/summary`,
    ]) {
      expect([path, (await estimator.agent.get(`/api${path}`)).status]).toEqual([path, 404])
      expect([path, (await owner.agent.get(`/api${path}`)).status]).toEqual([path, 404])
    }
    expect((await estimator.agent.get('/api/houses')).body).toEqual([])

    const restored = await estimator.agent.post(`/api/houses/${house.id}/restore`)
    expect(restored.status).toBe(200)
    expect(restored.body).toMatchObject({ id: house.id, name: house.name, version: 3 })
    const after = await wholeOf(estimateId)
    expect([after.rooms, after.lines, after.estimate]).toEqual([before.rooms, before.lines, before.estimate])
    expect((await owner.agent.get('/api/houses')).body).toHaveLength(1)
    expect(auditOf(app.db, 'house', house.id).map(({ action }) => action)).toEqual(['add', 'share', 'remove', 'restore'])
  })

  it('needs the newest If-Match to remove and a removed house to restore', async () => {
    const { house } = addHouse(app)
    expect((await estimator.agent.delete(`/api/houses/${house.id}`)).status).toBe(428)
    expect((await estimator.agent.delete(`/api/houses/${house.id}`).set('If-Match', '"9"')).status).toBe(412)
    expect((await estimator.agent.post(`/api/houses/${house.id}/restore`)).body).toMatchObject({ status: 409, code: 'not-removed' })
    expect((await estimator.agent.post('/api/houses/none/restore')).status).toBe(404)
    expect((await owner.agent.post(`/api/houses/${house.id}/restore`)).status).toBe(403)
  })
})

describe('a write that fails half-way', () => {
  it('leaves nothing of itself: no row, no audit, no event', async () => {
    addPriceBook(app.db)
    const heard = heardEvents(app, 'admin')
    app.db.$client.exec("CREATE TRIGGER no_audit BEFORE INSERT ON audit_entries BEGIN SELECT raise(ABORT, 'disk full'); END")
    const answer = await estimator.agent.post('/api/houses').send(keyedHouse())
    expect(answer.status).toBe(500)
    expect(answer.body.detail).not.toMatch(/disk full/)
    app.db.$client.exec('DROP TRIGGER no_audit')
    expect((await estimator.agent.get('/api/houses')).body).toEqual([])
    expect(app.db.select().from(estimates).where(eq(estimates.priceBookVersion, 1)).all()).toEqual([])
    expect(heard).toEqual([])
  })
})
