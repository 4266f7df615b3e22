import { beforeEach, describe, expect, it } from 'vitest'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import type { EstimateSummary } from '../../shared/schemas/estimateSummary.ts'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { DOOR_ITEM } from '../support/addPriceBook.ts'
import { addRoom } from '../support/addRoom.ts'
import { buildTestApp, type SignedIn, type TestApp } from '../support/buildTestApp.ts'

let app: TestApp
let estimator: SignedIn
let owner: SignedIn

beforeEach(() => {
  app = buildTestApp()
  estimator = app.signInAs('estimator')
  owner = app.signInAs('owner')
})

async function summaryOf(estimateId: string, agent = estimator.agent): Promise<EstimateSummary> {
  const answer = await agent.get(`/api/estimates/${estimateId}/summary`)
  expect(answer.status).toBe(200)
  return answer.body as EstimateSummary
}

/** $1,200 of plank in a room by own hands, measured; $300 of doors for the house, hired, seen; one line that can't be computed. */
function buildEstimate(): { houseId: string; estimateId: string; roomId: string } {
  const { house, estimateId } = addHouse(app)
  const room = addRoom(app, house.id, { name: 'Parlor' })
  addRoom(app, house.id, { name: 'Empty room' })
  addLine(app, estimateId, { roomId: room.id, quantity: '600', wastePercent: 0, basis: 'own-hands', evidence: 'measured' })
  addLine(app, estimateId, { itemKey: DOOR_ITEM.key, quantity: '1' })
  addLine(app, estimateId, { quantity: 'nonsense', evidence: 'bid' })
  return { houseId: house.id, estimateId, roomId: room.id }
}

describe('GET /api/estimates/:id/summary', () => {
  it('parts the direct amount by system, room and trade, each in its order', async () => {
    const { estimateId, roomId } = buildEstimate()
    const summary = await summaryOf(estimateId)
    const whole = (await estimator.agent.get(`/api/estimates/${estimateId}`)).body as EstimateWhole
    expect(summary.totals).toEqual(whole.estimate.totals)
    const partsOf = (parts: EstimateSummary['bySystem']) => parts.map(({ key, title, amountCents }) => [key, title, amountCents.likely])
    expect(partsOf(summary.bySystem)).toEqual([
      ['floors', 'Floors', 120_000],
      ['inside-doors', 'Inside doors and trim', 30_000],
    ])
    expect(partsOf(summary.byRoom)).toEqual([
      [null, 'House as a whole', 30_000],
      [roomId, 'Parlor', 120_000],
    ])
    expect(partsOf(summary.byTrade)).toEqual([
      ['carpentry', 'Carpentry', 30_000],
      ['flooring', 'Flooring', 120_000],
    ])
    expect(summary).toMatchObject({
      lineCount: 3,
      errorCount: 1,
      ownHandsHours: 30,
      ownHandsCents: { likely: 120_000 },
      hiredCents: { likely: 30_000 },
    })
  })

  it('says what the likely amount rests on', async () => {
    const { estimateId } = buildEstimate()
    expect((await summaryOf(estimateId)).evidence).toEqual([
      { mark: 'seen', likelyCents: 30_000, sharePercent: 20, lineCount: 1 },
      { mark: 'measured', likelyCents: 120_000, sharePercent: 80, lineCount: 1 },
      { mark: 'tested', likelyCents: 0, sharePercent: 0, lineCount: 0 },
      { mark: 'bid', likelyCents: 0, sharePercent: 0, lineCount: 0 },
    ])
  })

  it('states the house, the prices and that nothing is issued yet', async () => {
    const { estimateId } = buildEstimate()
    const summary = await summaryOf(estimateId)
    expect(summary).toMatchObject({
      house: { name: '3 Sample Row', regionName: 'Plain', yearBuilt: 1931 },
      priceBookVersion: 1,
      priceBookDate: '2026-01-15',
    })
    expect(summary.notIssuedNotice).toMatch(/not been issued/)
    expect(summary.notices.join(' ')).toMatch(/not an inspection, an appraisal or an offer of credit/)
  })

  it('brings the cautions that the lines and the age of the house call for', async () => {
    const old = addHouse(app, { yearBuilt: 1931 })
    addLine(app, old.estimateId)
    const recent = addHouse(app, { yearBuilt: 2015 })
    addLine(app, recent.estimateId)
    const keysOf = async (estimateId: string) => (await summaryOf(estimateId)).cautions.map(({ key }) => key)
    expect(await keysOf(old.estimateId)).toEqual(expect.arrayContaining(['suspect-materials', 'asbestos']))
    const ofRecent = await keysOf(recent.estimateId)
    expect(ofRecent).toContain('suspect-materials')
    expect(ofRecent).not.toContain('asbestos')
  })

  it('is empty, not broken, without lines', async () => {
    const { estimateId } = addHouse(app)
    expect(await summaryOf(estimateId)).toMatchObject({
      bySystem: [],
      byRoom: [],
      byTrade: [],
      lineCount: 0,
      totals: { totalCents: { likely: 0 } },
    })
  })

  it('tells an owner who shared the house, and knows nothing of a house that is not shared', async () => {
    const { houseId, estimateId } = buildEstimate()
    expect((await owner.agent.get(`/api/estimates/${estimateId}/summary`)).status).toBe(404)
    shareHouse(app, houseId, estimator.user, owner.user)
    expect((await summaryOf(estimateId, owner.agent)).sharedBy).toEqual({ name: estimator.user.name, email: estimator.user.email })
    expect((await summaryOf(estimateId)).sharedBy).toBeNull()
  })
})
