import { beforeEach, describe, expect, it } from 'vitest'
import exampleEstimate from '../../seed/exampleEstimate.json' with { type: 'json' }
import { computeEstimate, readEstimateDocument } from '../../shared/engine/index.ts'
import type { EstimateResults } from '../../shared/schemas/results.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'

let app: TestApp
let estimator: SignedIn

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
})

const compute = (document: object) => estimator.agent.post('/api/compute').send(document)

/** The line of the document's description: 125 sq ft of plank in boxes of 22.5, with 10 % waste, by own hands at $3.00. */
const PLANK = {
  key: 'plank',
  room: 'bed-1',
  system: 'floors',
  trade: 'flooring',
  description: 'Vinyl plank, floating',
  unit: 'sf',
  quantity: 'floor_area',
  wastePercent: 10,
  packageSize: '22.5',
  basis: 'own-hands',
  unitPrice: { low: '2.40', likely: '3.00', high: '3.90' },
  minimumCharge: '0',
  hoursPerUnit: 0.045,
  evidence: 'measured',
}
const DOCUMENT = {
  format: 'quoinbook.estimate',
  version: 1,
  house: { name: 'Bare' },
  rooms: [{ key: 'bed-1', name: 'Front bedroom', shape: { kind: 'rectangle', length: '12\' 6"', width: "10'" } }],
  lines: [PLANK],
}

describe('POST /api/compute', () => {
  it('answers with the results of the document', async () => {
    const answer = await compute(DOCUMENT)
    expect(answer.status).toBe(200)
    const results = answer.body as EstimateResults
    expect(results.lines).toEqual([
      { key: 'plank', measured: 125, quantity: 157.5, amountCents: { low: 37_800, likely: 47_250, high: 61_425 }, hours: 7.09 },
    ])
    expect(results.errors).toEqual([])
    expect(results.totals.directCents).toEqual({ low: 37_800, likely: 47_250, high: 61_425 })
  })

  it('gives what the engine gives for the example', async () => {
    const read = readEstimateDocument(exampleEstimate)
    if (!read.ok) return expect.fail(JSON.stringify(read.errors))
    const answer = await compute(exampleEstimate)
    expect(answer.body).toEqual(JSON.parse(JSON.stringify(computeEstimate(read.input))))
  })

  it('names a line that can’t be computed and leaves it out', async () => {
    const answer = await compute({ ...DOCUMENT, lines: [PLANK, { ...PLANK, key: 'bad', quantity: 'perimeter' }] })
    expect(answer.status).toBe(200)
    expect(answer.body.errors).toMatchObject([{ path: 'lines[1].quantity', code: 'unit-mismatch' }])
    expect(answer.body.totals.directCents.likely).toBe(47_250)
  })

  it.each<[string, object, string]>([
    ['an unknown field', { ...DOCUMENT, extra: 1 }, 'extra'],
    ['a missing house', { ...DOCUMENT, house: undefined }, 'house'],
    [
      'walls that cross',
      {
        ...DOCUMENT,
        rooms: [
          {
            ...DOCUMENT.rooms[0],
            shape: {
              kind: 'polygon',
              corners: [
                ['0', '0'],
                ["10'", "10'"],
                ["10'", '0'],
                ['0', "10'"],
              ],
            },
          },
        ],
      },
      'rooms[0].shape.corners',
    ],
    ['a percentage above the whole', { ...DOCUMENT, settings: { overheadAndProfitPercent: 101 } }, 'settings.overheadAndProfitPercent'],
  ])('refuses %s with 422 at its path', async (_, document, path) => {
    const answer = await compute(document)
    expect(answer.status).toBe(422)
    expect(answer.headers['content-type']).toMatch(/application\/problem\+json/)
    expect(answer.body.errors[0].path.startsWith(path)).toBe(true)
  })

  it('refuses a field named __proto__ by its name, like every other that it does not know', async () => {
    const text = JSON.stringify(DOCUMENT).replace('{', '{"__proto__":{"isAdmin":true},')
    const answer = await estimator.agent.post('/api/compute').set('Content-Type', 'application/json').send(text)
    expect(answer.status).toBe(422)
    expect(answer.body.errors).toEqual([{ path: '__proto__', code: 'unknown-field', message: 'is not a known field' }])
  })

  it.each([[[]], ['text'], [[DOCUMENT]]])('refuses %j, which is no object', async (body) => {
    const answer = await estimator.agent.post('/api/compute').set('Content-Type', 'application/json').send(JSON.stringify(body))
    expect(answer.status).toBeGreaterThanOrEqual(400)
    expect(answer.status).toBeLessThan(500)
  })

  it('keeps nothing', async () => {
    await compute(DOCUMENT)
    expect((await estimator.agent.get('/api/houses')).body).toEqual([])
  })

  it('is for who may exchange estimates', async () => {
    expect((await app.anonymous().post('/api/compute').send(DOCUMENT)).status).toBe(401)
    expect((await app.signInAs('owner').agent.post('/api/compute').send(DOCUMENT)).status).toBe(403)
    expect((await app.signInAs('admin').agent.post('/api/compute').send(DOCUMENT)).status).toBe(200)
  })
})
