import { beforeEach, describe, expect, it } from 'vitest'
import { estimateWholeSchema, type Estimate, type EstimateWhole } from '../../shared/schemas/estimate.ts'
import { auditOf } from '../support/auditOf.ts'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addRoom } from '../support/addRoom.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'
import { domainOf } from '../support/domainOf.ts'
import { queryPlans } from '../support/queryPlans.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn
let houseId: string
let estimateId: string
let path: string

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
  const added = addHouse(app)
  houseId = added.house.id
  estimateId = added.estimateId
  path = `/api/estimates/${estimateId}`
})

const read = async () => (await estimator.agent.get(path)).body as EstimateWhole
const patch = (body: object, version: number) => estimator.agent.patch(path).set('If-Match', `"${version}"`).send(body)

describe('GET /api/estimates/:id', () => {
  it('gives estimate, house, rooms and lines in one, just as they are described', async () => {
    const room = addRoom(app, houseId, {
      name: 'Room "one" – ½ é',
      ceiling: null,
      deductions: [{ kind: 'tub', widthIn: 60, heightIn: 20, depthIn: 30, count: 1, fromWalls: true, fromFloor: true, fromBase: false }],
    })
    const override = { price: { low: 1, likely: 2, high: 3 }, reason: "The seller's own" }
    const first = addLine(app, estimateId, { roomId: room.id, override, note: 'line one\nline two', wastePercent: 7.5 })
    const second = addLine(app, estimateId, { itemKey: 'inside-door/test-door' })

    const answer = await estimator.agent.get(path)

    expect(answer.status).toBe(200)
    expect(answer.headers['content-type']).toMatch(/application\/json/)
    const whole = estimateWholeSchema.parse(answer.body)
    expect(answer.headers.etag).toBe(`"${whole.estimate.version}"`)
    expect(whole.rooms).toEqual([room])
    expect(whole.lines).toEqual([first, second])
    expect(whole.house).toEqual((await estimator.agent.get(`/api/houses/${houseId}`)).body)
  })

  it('gives empty lists for a house that was just added', async () => {
    expect(await read()).toMatchObject({ rooms: [], lines: [], estimate: { unknowns: [], inspections: [], errorCount: 0 } })
  })

  it('is open to an owner of a shared house, and 404 to any other', async () => {
    expect((await owner.agent.get(path)).status).toBe(404)
    shareHouse(app, houseId, estimator.user, owner.user)
    expect((await owner.agent.get(path)).body).toEqual(await read())
    expect((await estimator.agent.get('/api/estimates/none')).status).toBe(404)
    expect((await app.anonymous().get(path)).status).toBe(401)
  })

  it('is read by indices alone', async () => {
    // Prepared once, when the services are put together.
    const plans = await queryPlans(app.db, '"estimates"', () => domainOf(app))
    expect(plans.filter((detail) => /^SCAN/.test(detail))).toEqual([])
    expect(plans).toContain('SEARCH l USING INDEX estimate_lines_estimate_position (estimate_id=? AND removed_at=?)')
    expect(plans).toContain('SEARCH r USING INDEX rooms_house_position (house_id=? AND removed_at=?)')
  })
})

describe('PATCH /api/estimates/:id', () => {
  it('merges the settings that are sent and computes anew', async () => {
    addLine(app, estimateId, { basis: 'hired' })
    const before = (await read()).estimate

    const answer = await patch(
      { name: 'First look', settings: { permitsCents: 45_000, contingency: { method: 'fixed', amountCents: 100_000 } } },
      before.version,
    )

    expect(answer.status).toBe(200)
    const after = answer.body as Estimate
    expect(after.name).toBe('First look')
    expect(after.settings).toEqual({ ...before.settings, permitsCents: 45_000, contingency: { method: 'fixed', amountCents: 100_000 } })
    expect(after.version).toBe(before.version + 1)
    expect(answer.headers.etag).toBe(`"${after.version}"`)
    expect(after.totals.permitsCents).toEqual({ low: 45_000, likely: 45_000, high: 45_000 })
    expect(after.totals.contingencyCents.likely).toBe(100_000)
    expect(after.totals.directCents).toEqual(before.totals.directCents)
    expect(await read()).toMatchObject({ estimate: after })
    expect(auditOf(app.db, 'estimate', estimateId).at(-1)).toMatchObject({
      action: 'update',
      before: { name: before.name },
      after: { name: 'First look' },
    })
  })

  it('answers 412 with the estimate as it stands when somebody was quicker', async () => {
    const { version } = (await read()).estimate
    await patch({ name: 'Quicker' }, version)
    const answer = await patch({ name: 'Slower' }, version)
    expect(answer.status).toBe(412)
    expect(answer.body.current).toMatchObject({ id: estimateId, name: 'Quicker', version: version + 1 })
  })

  it.each<[string, object, string]>([
    ['overhead above the whole', { settings: { overheadAndProfitPercent: 101 } }, 'settings.overheadAndProfitPercent'],
    ['permits below zero', { settings: { permitsCents: -1 } }, 'settings.permitsCents'],
    ['half a cent of permits', { settings: { permitsCents: 1.5 } }, 'settings.permitsCents'],
    ['an unknown tax rule', { settings: { salesTax: { rule: 'all', percent: 1 } } }, 'settings.salesTax.rule'],
    ['an unknown contingency', { settings: { contingency: { method: 'guess' } } }, 'settings.contingency.method'],
    ['an empty name', { name: '' }, 'name'],
    ['what only the server sets', { priceBookVersion: 2 }, 'priceBookVersion'],
  ])('refuses %s at its field', async (_, body, field) => {
    const answer = await patch(body, (await read()).estimate.version)
    expect(answer.status).toBe(422)
    expect(answer.body.errors[0].path).toBe(field)
  })

  it('needs If-Match, an estimator and an estimate', async () => {
    shareHouse(app, houseId, estimator.user, owner.user)
    expect((await estimator.agent.patch(path).send({ name: 'X' })).status).toBe(428)
    expect((await owner.agent.patch(path).set('If-Match', '"1"').send({ name: 'X' })).status).toBe(403)
    expect((await estimator.agent.patch('/api/estimates/none').set('If-Match', '"1"').send({ name: 'X' })).status).toBe(404)
  })
})
