import { beforeEach, describe, expect, it } from 'vitest'
import { computeEstimate, toEstimateInput } from '../../shared/engine/index.ts'
import type { EstimateWhole, Line, SavedLine } from '../../shared/schemas/estimate.ts'
import { auditOf } from '../support/auditOf.ts'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addPriceBook, DOOR_ITEM } from '../support/addPriceBook.ts'
import { keyedPriceItem } from '../support/keyedPriceItem.ts'
import { addRoom } from '../support/addRoom.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { heardEvents } from '../support/heardEvents.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn
let houseId: string
let estimateId: string
let linesPath: string

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
  const added = addHouse(app)
  houseId = added.house.id
  estimateId = added.estimateId
  linesPath = `/api/estimates/${estimateId}/lines`
})

const whole = async () => (await estimator.agent.get(`/api/estimates/${estimateId}`)).body as EstimateWhole
const add = (fields: object) => estimator.agent.post(linesPath).send(fields)
const change = (line: Pick<Line, 'id' | 'version'>, fields: object) =>
  estimator.agent.patch(`${linesPath}/${line.id}`).set('If-Match', `"${line.version}"`).send(fields)
const OVERRIDE = { price: { low: 10_000, likely: 20_000, high: 30_000 }, reason: 'A bid by phone' }

describe('POST /api/estimates/:id/lines', () => {
  it('fills the line from its item and answers with the new totals', async () => {
    const room = addRoom(app, houseId)
    const heard = heardEvents(app, 'admin')

    const answer = await add({ roomId: room.id, itemKey: 'floor/test-plank' })

    expect(answer.status).toBe(201)
    expect(answer.headers.etag).toBe('"1"')
    const { line, totals, estimateVersion } = answer.body as SavedLine
    const item = keyedPriceItem()
    expect(line).toMatchObject({
      estimateId,
      roomId: room.id,
      itemKey: item.key,
      system: item.system,
      trade: item.trade,
      description: item.name,
      unit: item.unit,
      quantity: 'floor_area',
      wastePercent: item.wastePercent,
      packageSize: item.packageSize,
      basis: 'hired',
      override: null,
      minimumChargeCents: item.minimumChargeCents,
      hoursPerUnit: item.hoursPerUnit,
      evidence: 'seen',
      note: '',
      version: 1,
      book: { materials: item.materials, installed: item.installed },
    })
    // 12 × 10 ft and 10 % waste are 132 sq ft at $5.00.
    expect(totals.directCents.likely).toBe(66_000)
    const after = await whole()
    expect(after.lines).toEqual([line])
    expect(after.estimate).toMatchObject({ version: estimateVersion, totals, errorCount: 0 })
    expect(auditOf(app.db, 'line', line.id)).toMatchObject([{ action: 'add', actorId: estimator.user.id, before: null, after: line }])
    expect(heard).toEqual([{ type: 'estimate', id: estimateId, version: estimateVersion }])
  })

  it("takes the formula for the house, else one, and own hands where nobody is hired for the item's work", async () => {
    addPriceBook(app.db, { regions: [], items: [keyedPriceItem({ key: 'floor/own', installed: null })] })
    const newer = addHouse(app, { name: 'Newer' })
    const addToNewer = (itemKey: string) => estimator.agent.post(`/api/estimates/${newer.estimateId}/lines`).send({ roomId: null, itemKey })
    const plank = await addToNewer('floor/own')
    expect(plank.body.line).toMatchObject({ quantity: 'sum_floor_area', basis: 'own-hands', book: { installed: null } })
    const door = await addToNewer(DOOR_ITEM.key)
    expect(door.body.line).toMatchObject({ quantity: '1', basis: 'hired' })
  })

  it('keeps what is keyed over what comes along', async () => {
    const answer = await add({
      roomId: null,
      itemKey: 'floor/test-plank',
      quantity: '40',
      basis: 'own-hands',
      evidence: 'measured',
      note: 'By the stair',
      description: 'Plank, wide',
    })
    expect(answer.body.line).toMatchObject({
      quantity: '40',
      basis: 'own-hands',
      evidence: 'measured',
      note: 'By the stair',
      description: 'Plank, wide',
    })
    // 40 sq ft and 10 % waste are 44, in boxes of 20 three: 60 sq ft at $2.00.
    expect(answer.body.totals.directCents.likely).toBe(12_000)
  })

  it("reads the region's own prices at the pinned version, whatever is published since", async () => {
    const dear = addHouse(app, { regionKey: 'dear' })
    addPriceBook(app.db, {
      regions: [],
      items: [],
      regionItems: [{ regionKey: 'dear', item: keyedPriceItem({ installed: { low: 1, likely: 2, high: 3 } }) }],
    })
    expect(addLine(app, dear.estimateId).book.materials?.likely).toBe(30_000)
    expect(addLine(app, addHouse(app, { regionKey: 'dear' }).estimateId).book.installed?.likely).toBe(2)
  })

  it('takes a line of one’s own with description, unit and a price that has its reason', async () => {
    const answer = await add({ roomId: null, description: 'Move the piano', unit: 'EA', override: OVERRIDE })
    expect(answer.status).toBe(201)
    expect(answer.body.line).toMatchObject({
      itemKey: null,
      unit: 'each',
      quantity: '1',
      book: { materials: null, installed: null },
      override: OVERRIDE,
    })
    expect(answer.body.totals.directCents.likely).toBe(200)
  })

  it('adds below another line, again and again where there is no gap left', async () => {
    const first = addLine(app, estimateId, { description: 'First' })
    addLine(app, estimateId, { description: 'Last' })
    for (let nth = 1; nth <= 14; nth += 1)
      await add({ roomId: null, itemKey: 'floor/test-plank', description: `Copy ${nth}`, afterLineId: first.id })
    const { lines } = await whole()
    expect(lines.map(({ description }) => description)).toEqual([
      'First',
      ...Array.from({ length: 14 }, (_, index) => `Copy ${14 - index}`),
      'Last',
    ])
    expect(lines[0]).toMatchObject({ id: first.id, version: 1 })
  })

  it('adds one line for a repeat with the same Idempotency-Key, and refuses the key for another body', async () => {
    const send = (quantity: string) =>
      estimator.agent.post(linesPath).set('Idempotency-Key', 'l1').send({ roomId: null, itemKey: 'floor/test-plank', quantity })
    const first = await send('1')
    const again = await send('1')
    expect([again.status, again.body, again.headers.etag]).toEqual([201, first.body, '"1"'])
    expect((await whole()).lines).toHaveLength(1)
    expect((await send('2')).body).toMatchObject({ status: 422, code: 'idempotency-key-reused' })
  })

  it.each([
    ['a formula that names nothing', 'flor_area'],
    ['a division by zero', '1 / 0'],
    ['another kind of measure', 'perimeter'],
    ['no formula at all', "12' 6"],
    ['a call out of the list', 'import(1)'],
    ['a way into the program', 'cellsByName.constructor'],
    ['a hundred brackets', `${'('.repeat(100)}1${')'.repeat(100)}`],
    ['a spreadsheet formula', '=1+1'],
  ])('saves a line with %s as typed, marked and left out of the totals', async (_, quantity) => {
    const room = addRoom(app, houseId)
    const answer = await add({ roomId: room.id, itemKey: 'floor/test-plank', quantity })
    expect(answer.status).toBe(201)
    expect(answer.body.line.quantity).toBe(quantity)
    expect(answer.body.totals.directCents).toEqual({ low: 0, likely: 0, high: 0 })
    expect((await whole()).estimate.errorCount).toBe(1)
  })

  it.each<[string, object, string]>([
    ['a room of another house', { roomId: 'ROOM_OF_ANOTHER' }, 'roomId'],
    ['an unknown item', { itemKey: 'floor/none' }, 'itemKey'],
    ['a price below zero', { override: { price: { low: -1, likely: 2, high: 3 }, reason: 'x' } }, 'override.price.low'],
    ['a price with a fifth decimal', { override: { price: { low: 1, likely: 2.5, high: 3 }, reason: 'x' } }, 'override.price.likely'],
    ['a price out of order', { override: { price: { low: 9, likely: 2, high: 3 }, reason: 'x' } }, 'override.price'],
    ['a price without a reason', { override: { price: { low: 1, likely: 2, high: 3 }, reason: ' ' } }, 'override.reason'],
    ['a formula of 501 characters', { quantity: '1'.repeat(501) }, 'quantity'],
    ['an empty formula', { quantity: '  ' }, 'quantity'],
    ['a number for a formula', { quantity: 5 }, 'quantity'],
    ['waste above the whole', { wastePercent: 100.5 }, 'wastePercent'],
    ['a package of nothing', { packageSize: 0 }, 'packageSize'],
    ['an unknown unit', { unit: 'furlong' }, 'unit'],
    ['an unknown system', { system: 'moat' }, 'system'],
    ['an unknown trade', { trade: 'alchemy' }, 'trade'],
    ['an unknown evidence', { evidence: 'dreamt' }, 'evidence'],
    ['a line to stand below that there is not', { afterLineId: 'none' }, 'afterLineId'],
    ['a field that there is not', { colour: 'red' }, 'colour'],
    ['a line of one’s own without a price', { itemKey: null, description: 'x', unit: 'each' }, 'override'],
    ['a line of one’s own without a name', { itemKey: null, unit: 'each', override: OVERRIDE }, 'description'],
  ])('refuses %s at its field', async (_, fields, field) => {
    const other = addHouse(app, { name: 'Other' })
    const roomOfAnother = addRoom(app, other.house.id)
    const body = { roomId: null, itemKey: 'floor/test-plank', ...fields }
    const answer = await add(body.roomId === 'ROOM_OF_ANOTHER' ? { ...body, roomId: roomOfAnother.id } : body)
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toBe(field)
    expect((await whole()).lines).toEqual([])
  })

  it('asks for the room, or null for the house', async () => {
    expect((await add({ itemKey: 'floor/test-plank' })).body).toMatchObject({
      status: 422,
      errors: [{ path: 'roomId', message: 'is missing' }],
    })
  })

  it('is not for an owner, nor for an estimate that there is not', async () => {
    shareHouse(app, houseId, estimator.user, owner.user)
    expect((await owner.agent.post(linesPath).send({ roomId: null, itemKey: 'floor/test-plank' })).status).toBe(403)
    expect((await estimator.agent.post('/api/estimates/none/lines').send({ roomId: null, itemKey: 'floor/test-plank' })).status).toBe(404)
  })
})

describe('PATCH /api/estimates/:id/lines/:lineId', () => {
  it('changes what is sent, leaves the rest and answers with the new totals', async () => {
    const line = addLine(app, estimateId)
    const neighbour = addLine(app, estimateId)
    const before = (await whole()).estimate

    const answer = await change(line, { quantity: '200', note: 'Measured twice', evidence: 'measured' })

    expect(answer.status).toBe(200)
    expect(answer.headers.etag).toBe('"2"')
    expect(answer.body.line).toEqual({ ...line, quantity: '200', note: 'Measured twice', evidence: 'measured', version: 2 })
    expect(answer.body.estimateVersion).toBe(before.version + 1)
    // 100 and 200 sq ft with 10 % waste at $5.00.
    expect(answer.body.totals.directCents.likely).toBe(55_000 + 110_000)
    const after = await whole()
    expect(after.lines).toEqual([answer.body.line, neighbour])
    expect(after.estimate).toMatchObject({ version: before.version + 1, totals: answer.body.totals })
    expect(auditOf(app.db, 'line', line.id).at(-1)).toMatchObject({ action: 'update', before: line, after: answer.body.line })
  })

  it('keeps both prices of the book when the basis changes', async () => {
    const line = addLine(app, estimateId)
    const answer = await change(line, { basis: 'own-hands' })
    expect(answer.body.line.book).toEqual(line.book)
    // 110 sq ft in boxes of 20 are 120 at $2.00.
    expect(answer.body.totals.directCents.likely).toBe(24_000)
  })

  it('fills the line anew with another item', async () => {
    const room = addRoom(app, houseId)
    const line = addLine(app, estimateId, { roomId: room.id, override: OVERRIDE, evidence: 'measured', note: 'Kept' })
    const answer = await change(line, { itemKey: DOOR_ITEM.key })
    expect(answer.body.line).toMatchObject({
      roomId: room.id,
      itemKey: DOOR_ITEM.key,
      description: DOOR_ITEM.name,
      system: DOOR_ITEM.system,
      unit: 'each',
      quantity: 'doors',
      override: null,
      book: { materials: null, installed: DOOR_ITEM.installed },
      evidence: 'measured',
      note: 'Kept',
    })
    const elsewhere = await change(answer.body.line, { itemKey: 'floor/test-plank', quantity: '7', roomId: null })
    expect(elsewhere.body.line).toMatchObject({ roomId: null, quantity: '7', unit: 'sf' })
  })

  it("takes the item's formula along between a room and the house while it is untouched", async () => {
    const room = addRoom(app, houseId)
    const added = await add({ roomId: room.id, itemKey: 'floor/test-plank' })
    const toHouse = await change(added.body.line, { roomId: null })
    expect(toHouse.body.line).toMatchObject({ roomId: null, quantity: 'sum_floor_area' })
    const touched = await change(toHouse.body.line, { quantity: 'sum_floor_area * 2' })
    const back = await change(touched.body.line, { roomId: room.id })
    expect(back.body.line).toMatchObject({ roomId: room.id, quantity: 'sum_floor_area * 2' })
  })

  it('takes an own price with its reason and lets it go again; the book stays beside it', async () => {
    const line = addLine(app, estimateId)
    const overridden = await change(line, { override: OVERRIDE })
    expect(overridden.body.totals.directCents.likely).toBe(25_000)
    expect(overridden.body.line.book).toEqual(line.book)
    const back = await change(overridden.body.line, { override: null })
    expect(back.body.totals.directCents.likely).toBe(55_000)
  })

  it('makes it a line of one’s own when its item is let go, which needs a price', async () => {
    const line = addLine(app, estimateId)
    expect((await change(line, { itemKey: null })).body).toMatchObject({ status: 422, errors: [{ path: 'override' }] })
    const answer = await change(line, { itemKey: null, override: OVERRIDE })
    expect(answer.body.line).toMatchObject({ itemKey: null, book: { materials: null, installed: null }, description: 'Test plank' })
  })

  it('answers 412 with the line as it stands when somebody was quicker, and keeps theirs', async () => {
    const line = addLine(app, estimateId)
    await change(line, { quantity: '1' })
    const answer = await change(line, { quantity: '2' })
    expect(answer.status).toBe(412)
    expect(answer.body.current).toEqual({ ...line, quantity: '1', version: 2 })
    expect((await whole()).lines[0]?.quantity).toBe('1')
  })

  it('needs If-Match, an estimator and a line of this very estimate', async () => {
    const line = addLine(app, estimateId)
    const other = addHouse(app, { name: 'Other' })
    shareHouse(app, houseId, estimator.user, owner.user)
    expect((await estimator.agent.patch(`${linesPath}/${line.id}`).send({ note: 'x' })).status).toBe(428)
    expect((await owner.agent.patch(`${linesPath}/${line.id}`).set('If-Match', '"1"').send({ note: 'x' })).status).toBe(403)
    for (const path of [
      `/api/estimates/${other.estimateId}/lines/${line.id}`,
      `/api/estimates/none/lines/${line.id}`,
      `${linesPath}/none`,
    ]) {
      expect([path, (await estimator.agent.patch(path).set('If-Match', '"1"').send({ note: 'x' })).status]).toEqual([path, 404])
    }
  })

  it.each<[string, object, string]>([
    ['an unknown room', { roomId: 'none' }, 'roomId'],
    ['an unknown item', { itemKey: 'floor/none' }, 'itemKey'],
    ['an unknown unit', { unit: 'furlong' }, 'unit'],
    ['a price below zero', { override: { price: { low: -1, likely: 2, high: 3 }, reason: 'x' } }, 'override.price.low'],
    ["the book's side of a line", { book: null }, 'book'],
  ])('refuses %s at its field', async (_, fields, field) => {
    const answer = await change(addLine(app, estimateId), fields)
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toBe(field)
  })
})

describe('DELETE /api/estimates/:id/lines/:lineId and its restore', () => {
  it('takes the line out of the totals and brings it back where it stood', async () => {
    const first = addLine(app, estimateId)
    const last = addLine(app, estimateId)
    const before = await whole()

    const removed = await estimator.agent.delete(`${linesPath}/${first.id}`).set('If-Match', '"1"')
    expect(removed.body).toMatchObject({ line: { id: first.id, version: 2 }, totals: { directCents: { likely: 55_000 } } })
    expect((await whole()).lines).toEqual([last])
    expect((await change({ id: first.id, version: 2 }, { note: 'x' })).status).toBe(404)

    const restored = await estimator.agent.post(`${linesPath}/${first.id}/restore`)
    expect(restored.body).toMatchObject({ line: { ...first, version: 3 }, totals: before.estimate.totals })
    expect((await whole()).lines).toEqual([{ ...first, version: 3 }, last])
    expect(auditOf(app.db, 'line', first.id).map(({ action }) => action)).toEqual(['add', 'remove', 'restore'])
  })

  it('needs the newest If-Match to remove and a removed line of this estimate to restore', async () => {
    const line = addLine(app, estimateId)
    const other = addHouse(app, { name: 'Other' })
    expect((await estimator.agent.delete(`${linesPath}/${line.id}`)).status).toBe(428)
    expect((await estimator.agent.delete(`${linesPath}/${line.id}`).set('If-Match', '"4"')).body).toMatchObject({
      status: 412,
      current: line,
    })
    expect((await estimator.agent.post(`${linesPath}/${line.id}/restore`)).body).toMatchObject({ status: 409, code: 'not-removed' })
    await estimator.agent.delete(`${linesPath}/${line.id}`).set('If-Match', '"1"')
    expect((await estimator.agent.post(`/api/estimates/${other.estimateId}/lines/${line.id}/restore`)).status).toBe(404)
  })

  it('does not bring a line back into a room that was removed', async () => {
    const room = addRoom(app, houseId)
    const line = addLine(app, estimateId, { roomId: room.id })
    await estimator.agent.delete(`${linesPath}/${line.id}`).set('If-Match', '"1"')
    await estimator.agent.delete(`/api/houses/${houseId}/rooms/${room.id}`).set('If-Match', '"1"')
    expect((await estimator.agent.post(`${linesPath}/${line.id}/restore`)).body).toMatchObject({ status: 409, code: 'room-removed' })
  })
})

describe('PUT /api/estimates/:id/lines/order', () => {
  it('puts the lines in the order of the ids and leaves figures and versions', async () => {
    const one = addLine(app, estimateId)
    const two = addLine(app, estimateId)
    const before = await whole()
    const answer = await estimator.agent.put(`${linesPath}/order`).send({ ids: [two.id, one.id] })
    expect(answer.status).toBe(200)
    expect(answer.body).toMatchObject({ totals: before.estimate.totals, estimateVersion: before.estimate.version + 1 })
    const { lines } = await whole()
    expect(lines.map(({ id, position, version }) => ({ id, position, version }))).toEqual([
      { ...answer.body.lines[0], version: 1 },
      { ...answer.body.lines[1], version: 1 },
    ])
    expect(lines.map(({ id }) => id)).toEqual([two.id, one.id])
  })

  it('refuses ids that are not those of the estimate: twice 422, missing or foreign 409', async () => {
    const one = addLine(app, estimateId)
    const two = addLine(app, estimateId)
    const put = (ids: unknown) => estimator.agent.put(`${linesPath}/order`).send({ ids })
    expect((await put([one.id, one.id])).body).toMatchObject({ status: 422, errors: [{ path: 'ids[1]' }] })
    expect((await put([one.id])).body).toMatchObject({ status: 409, code: 'lines-changed' })
    expect((await put([one.id, two.id, 'foreign'])).status).toBe(409)
  })
})

describe('the totals kept with an estimate', () => {
  it('are what the engine computes from the rows, after any run of writes', async () => {
    const room = addRoom(app, houseId)
    const lines: Line[] = []
    for (let nth = 0; nth < 6; nth += 1) {
      const answer = await add({ roomId: nth % 2 === 0 ? room.id : null, itemKey: 'floor/test-plank', quantity: `${nth} + 3` })
      lines.push(answer.body.line)
    }
    const [a, b, c, d] = lines as [Line, Line, Line, Line]
    await change(a, { quantity: 'floor_area / 3', basis: 'own-hands' })
    await change(b, { quantity: 'nonsense' })
    await estimator.agent.delete(`${linesPath}/${c.id}`).set('If-Match', '"1"')
    await estimator.agent
      .patch(`/api/houses/${houseId}/rooms/${room.id}`)
      .set('If-Match', '"1"')
      .send({ shape: { kind: 'rectangle', lengthIn: 151, widthIn: 133 } })
    await change(d, { override: OVERRIDE })
    await estimator.agent.post(`${linesPath}/${c.id}/restore`)
    await change({ id: c.id, version: 3 }, { wastePercent: 33 })

    const after = await whole()

    const fresh = computeEstimate(toEstimateInput(after))
    expect(after.estimate.totals).toEqual(fresh.totals)
    expect(after.estimate.errorCount).toBe(1)
    expect(after.estimate.totals.directCents.likely).toBeGreaterThan(0)
  })

  it('are those of the rows when another process wrote in between', async () => {
    const line = addLine(app, estimateId)
    await change(line, { quantity: '1' })
    // Services of their own, as a second process has them: what this one keeps in memory is stale after it.
    addLine(app, estimateId, { quantity: '50' })
    const answer = await change({ id: line.id, version: 2 }, { quantity: '2' })
    const after = await whole()
    expect(answer.body.totals).toEqual(computeEstimate(toEstimateInput(after)).totals)
  })
})
