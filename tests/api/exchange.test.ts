import { beforeEach, describe, expect, it } from 'vitest'
import exampleEstimate from '../../seed/exampleEstimate.json' with { type: 'json' }
import { computeEstimate, readEstimateDocument, toEstimateInput, type EstimateDocument } from '../../shared/engine/index.ts'
import { estimateWholeSchema, type EstimateWhole } from '../../shared/schemas/estimate.ts'
import type { AddedHouse } from '../../shared/schemas/house.ts'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addPriceBook, DOOR_ITEM, PLAIN_REGION } from '../support/addPriceBook.ts'
import { addRoom } from '../support/addRoom.ts'
import { auditOf } from '../support/auditOf.ts'
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

const OVERRIDE = { price: { low: 10_001, likely: 20_002, high: 30_003 }, reason: 'A bid by phone' }

/** An estimate with something of everything that a document can say. */
function buildEstimate(): AddedHouse {
  const added = addHouse(app, {
    name: '9 Long/Row: "East"',
    regionKey: 'dear',
    overhangIn: 0,
    note: 'Key under the mat.',
    roof: [{ kind: 'hip', rise: 5 }],
  })
  const ell = addRoom(app, added.house.id, {
    name: 'Parlor',
    use: 'living',
    shape: { kind: 'ell', lengthIn: 150.5, widthIn: 120.25, cutLengthIn: 30, cutWidthIn: 20 },
    ceiling: { kind: 'sloped', lowIn: 80, highIn: 100 },
    deductions: [{ kind: 'cabinets', widthIn: 60, heightIn: 36, depthIn: 24, count: 1, fromWalls: true, fromFloor: true, fromBase: true }],
    note: 'Damp at the chimney.',
  })
  const polygon = addRoom(app, added.house.id, {
    use: 'bath',
    shape: {
      kind: 'polygon',
      corners: [
        [0, 0],
        [100.015625, 0],
        [100, 80],
        [-5, 90],
      ],
    },
    ceiling: null,
    openings: [],
  })
  addLine(app, added.estimateId, { roomId: ell.id, quantity: 'floor_area', evidence: 'tested', note: 'As found' })
  addLine(app, added.estimateId, { roomId: polygon.id, quantity: 'floor_area', basis: 'own-hands', override: OVERRIDE })
  addLine(app, added.estimateId, { itemKey: DOOR_ITEM.key, quantity: '3' })
  addLine(app, added.estimateId, { itemKey: null, description: 'Move the piano', unit: 'each', override: OVERRIDE, wastePercent: 2.5 })
  addLine(app, added.estimateId, { quantity: 'no_such_measure' })
  return added
}

async function exportOf(estimateId: string): Promise<EstimateDocument> {
  const answer = await estimator.agent.get(`/api/estimates/${estimateId}/document`)
  expect(answer.status).toBe(200)
  return answer.body as EstimateDocument
}

const wholeOf = async (estimateId: string) => estimateWholeSchema.parse((await estimator.agent.get(`/api/estimates/${estimateId}`)).body)
const importOf = (document: unknown) => estimator.agent.post('/api/houses/import').send(document as object)

/** The document with keys by order: an import gives new ids. */
function withPlainKeys(document: EstimateDocument): EstimateDocument {
  const roomKeys = new Map(document.rooms.map(({ key }, index) => [key, `room ${index}`]))
  return {
    ...document,
    rooms: document.rooms.map((room, index) => ({ ...room, key: `room ${index}` })),
    lines: document.lines.map((line, index) => ({ ...line, key: `line ${index}`, room: line.room ? roomKeys.get(line.room) : line.room })),
  }
}

describe('GET /api/estimates/:id/document', () => {
  it('gives the estimate as a file that the engine reads to the same totals', async () => {
    const { estimateId } = buildEstimate()
    const answer = await estimator.agent.get(`/api/estimates/${estimateId}/document`)
    expect(answer.headers['content-type']).toMatch(/^application\/json/)
    expect(answer.headers['content-disposition']).toBe('attachment; filename="9 Long Row East, estimate.json"')
    const { estimate } = await wholeOf(estimateId)
    expect(answer.headers.etag).toBe(`"${estimate.version}"`)
    const read = readEstimateDocument(answer.body)
    if (!read.ok) return expect.fail(JSON.stringify(read.errors))
    expect(computeEstimate(read.input).totals).toEqual(estimate.totals)
  })

  it('is not for an owner, and 404 for what there is not', async () => {
    const { house, estimateId } = buildEstimate()
    shareHouse(app, house.id, estimator.user, owner.user)
    expect((await owner.agent.get(`/api/estimates/${estimateId}/document`)).status).toBe(403)
    expect((await estimator.agent.get('/api/estimates/none/document')).status).toBe(404)
  })
})

describe('POST /api/houses/import', () => {
  it('makes of an exported document an estimate that exports the same, with totals equal to the cent', async () => {
    const original = buildEstimate()
    const exported = await exportOf(original.estimateId)
    const heard = heardEvents(app, 'admin')

    const answer = await importOf(exported)

    expect(answer.status).toBe(201)
    expect(answer.headers.etag).toBe('"1"')
    const { house, estimateId } = answer.body as AddedHouse
    expect(house.id).not.toBe(original.house.id)
    const [before, after] = [await wholeOf(original.estimateId), await wholeOf(estimateId)]
    expect(after.estimate.totals).toEqual(before.estimate.totals)
    expect(after.estimate.totals.totalCents.likely).toBeGreaterThan(0)
    expect(after.estimate).toMatchObject({ version: 1, errorCount: 1, regionKey: 'dear', priceBookVersion: 1 })
    expect(withPlainKeys(await exportOf(estimateId))).toEqual(withPlainKeys(exported))
    expect(auditOf(app.db, 'house', house.id)).toMatchObject([
      { action: 'import', actorId: estimator.user.id, after: { roomCount: 2, lineCount: 5 } },
    ])
    expect(heard).toEqual([
      { type: 'estimate', id: estimateId, version: 1 },
      { type: 'house', id: house.id, version: 1 },
    ])
  })

  it('takes the example of the document as other programs write it, unknowns and inspections too', async () => {
    addPriceBook(app.db)
    const answer = await importOf(exampleEstimate)
    expect(answer.status).toBe(201)
    const { estimateId } = answer.body as AddedHouse
    const whole = await wholeOf(estimateId)
    const read = readEstimateDocument(exampleEstimate)
    if (!read.ok) return expect.fail(JSON.stringify(read.errors))
    expect(whole.estimate.totals).toEqual(computeEstimate(read.input).totals)
    expect(whole.estimate.regionKey).toBe(PLAIN_REGION.key)
    const exported = await exportOf(estimateId)
    expect([exported.unknowns, exported.inspections]).toEqual([exampleEstimate.unknowns, exampleEstimate.inspections])
  })

  it('fills what is left out, and pins to the newest book where the named one is not here', async () => {
    addPriceBook(app.db)
    const answer = await importOf({
      format: 'quoinbook.estimate',
      version: 1,
      priceBookVersion: 77,
      house: { name: 'Bare', region: 'elsewhere' },
      rooms: [],
      lines: [],
    })
    const whole = await wholeOf(answer.body.estimateId)
    expect(whole).toMatchObject({
      house: { name: 'Bare', kind: 'other', footprint: null },
      estimate: { priceBookVersion: 1, regionKey: PLAIN_REGION.key, name: 'Working estimate' },
    })
  })

  it('keeps a line of an unknown system or unit, marks what can’t be computed, and lets it be worked on', async () => {
    addPriceBook(app.db)
    const price = { low: '1', likely: '2', high: '3' }
    const line = { description: 'Odd', quantity: 1, basis: 'hired', unitPrice: price }
    const answer = await importOf({
      format: 'quoinbook.estimate',
      version: 1,
      house: { name: 'Odd' },
      rooms: [],
      lines: [
        { ...line, key: 'a', system: 'moat', unit: 'SQ FT' },
        { ...line, key: 'b', system: 'floors', unit: 'furlong' },
      ],
    })
    const { estimateId } = answer.body as AddedHouse
    const whole = await wholeOf(estimateId)
    expect(whole.lines.map(({ system, unit }) => [system, unit])).toEqual([
      ['moat', 'sf'],
      ['floors', 'furlong'],
    ])
    expect(whole.estimate.totals).toEqual(computeEstimate(toEstimateInput(whole)).totals)
    const [odd] = whole.lines as [EstimateWhole['lines'][number]]
    const patched = await estimator.agent
      .patch(`/api/estimates/${estimateId}/lines/${odd.id}`)
      .set('If-Match', '"1"')
      .send({ note: 'Looked at' })
    expect(patched.body.line).toMatchObject({ note: 'Looked at', system: 'moat' })
    const summary = await estimator.agent.get(`/api/estimates/${estimateId}/summary`)
    expect(summary.body.bySystem).toContainEqual(expect.objectContaining({ key: 'moat', title: 'moat' }))
  })

  const sound = { format: 'quoinbook.estimate', version: 1, house: { name: 'Sound' }, rooms: [], lines: [] }
  const room = { key: 'a', name: 'A', shape: { kind: 'rectangle', length: "12'", width: "10'" } }
  const line = {
    key: 'l',
    system: 'floors',
    description: 'L',
    unit: 'sf',
    quantity: '1',
    basis: 'hired',
    unitPrice: { low: '1', likely: '2', high: '3' },
  }

  it.each<[string, object, string]>([
    ['another format', { format: 'other' }, 'format'],
    ['a version to come', { version: 2 }, 'version'],
    ['a house without a name', { house: {} }, 'house.name'],
    ['a field that there is not', { house: { name: 'x', pool: true } }, 'house.pool'],
    [
      'a length in no notation',
      { rooms: [{ ...room, shape: { kind: 'rectangle', length: "12'' 6", width: "10'" } }] },
      'rooms[0].shape.length',
    ],
    ['a price of -1', { lines: [{ ...line, unitPrice: { low: '-1', likely: '2', high: '3' } }] }, 'lines[0].unitPrice.low'],
    [
      'a price with five decimals',
      { lines: [{ ...line, unitPrice: { low: '1.00001', likely: '2', high: '3' } }] },
      'lines[0].unitPrice.low',
    ],
    ['a line in a room that there is not', { lines: [{ ...line, room: 'none' }] }, 'lines[0].room'],
    ['two rooms of one key', { rooms: [room, room] }, 'rooms[1].key'],
    ['a formula of 501 characters', { lines: [line, { ...line, key: 'm', quantity: '1'.repeat(501) }] }, 'lines[1].quantity'],
  ])('refuses %s at its path and leaves nothing behind', async (_, fields, path) => {
    addPriceBook(app.db)
    const answer = await importOf({ ...sound, ...fields })
    expect(answer.status).toBe(422)
    expect(answer.body.errors.map((error: { path: string }) => error.path)).toContain(path)
    expect((await estimator.agent.get('/api/houses')).body).toEqual([])
  })

  it('makes one house of a repeat with the same Idempotency-Key', async () => {
    addPriceBook(app.db)
    const send = () => importOf(sound).set('Idempotency-Key', 'i1')
    const first = await send()
    expect((await send()).body).toEqual(first.body)
    expect((await estimator.agent.get('/api/houses')).body).toHaveLength(1)
  })

  it('refuses what is no object, what is too large, no price book, and owners', async () => {
    expect((await importOf(sound)).body).toMatchObject({ status: 409, code: 'no-price-book' })
    expect((await importOf([sound])).status).toBe(422)
    expect(
      (
        await estimator.agent
          .post('/api/houses/import')
          .set('Content-Type', 'application/json')
          .send(`{"a":"${'x'.repeat(11_000_000)}"}`)
      ).status,
    ).toBe(413)
    expect((await owner.agent.post('/api/houses/import').send(sound)).status).toBe(403)
  })
})
