import { describe, expect, it } from 'vitest'
import type { Response } from 'supertest'
import { addHouse, shareHouse } from '../support/addHouse.ts'
import { addLine } from '../support/addLine.ts'
import { addRoom } from '../support/addRoom.ts'
import { buildTestApp, type TestApp } from '../support/buildTestApp.ts'
import { recalculateWorkbook } from '../support/recalculateWorkbook.ts'

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

/** Keeps the body as the bytes that were sent. */
function asBytes(response: Response, done: (error: Error | null, body: Buffer) => void): void {
  const chunks: Buffer[] = []
  response.on('data', (chunk: Buffer) => chunks.push(chunk))
  response.on('end', () => done(null, Buffer.concat(chunks)))
}

function aHouse(app: TestApp, name = '3 Sample Row') {
  const { house, estimateId } = addHouse(app, { name })
  const room = addRoom(app, house.id)
  addLine(app, estimateId, { roomId: room.id, quantity: 'floor_area' })
  return { house, estimateId, path: `/api/estimates/${estimateId}/workbook` }
}

describe('GET /api/estimates/:id/workbook', () => {
  it('answers with a workbook that comes to the estimate’s own totals', async () => {
    const app = buildTestApp()
    const { agent } = app.signInAs('estimator', { name: 'Tess Maker' })
    const { path, estimateId } = aHouse(app)
    const whole = await agent.get(`/api/estimates/${estimateId}`).expect(200)
    const answer = await agent
      .get(path)
      .buffer(true)
      .parse(asBytes as never)
      .expect(200)
    expect(answer.headers['content-type']).toBe(XLSX)
    expect(answer.headers['content-disposition']).toBe('attachment; filename="3 Sample Row, estimate.xlsx"')
    expect(answer.headers['x-content-type-options']).toBe('nosniff')
    expect(answer.headers.etag).toBe(whole.headers.etag)
    const workbook = await recalculateWorkbook(answer.body as Buffer)
    expect(workbook.named('total_likely')).toBe(whole.body.estimate.totals.totalCents.likely / 100)
    expect(workbook.cached('Summary', 'F6')).toBe('Tess Maker')
    workbook.destroy()
  })

  it('gives the same bytes while nothing changes', async () => {
    const app = buildTestApp()
    const { agent } = app.signInAs('estimator')
    const { path } = aHouse(app)
    const [first, second] = [
      await agent
        .get(path)
        .buffer(true)
        .parse(asBytes as never),
      await agent
        .get(path)
        .buffer(true)
        .parse(asBytes as never),
    ]
    expect((first.body as Buffer).equals(second.body as Buffer)).toBe(true)
  })

  it.each([
    [
      'Küche/Bad 「窓」 "x"',
      `attachment; filename="K?che Bad ??? x, estimate.xlsx"; filename*=UTF-8''K%C3%BCche%20Bad%20%E3%80%8C%E7%AA%93%E3%80%8D%20x%2C%20estimate.xlsx`,
    ],
    ['../..\\..', 'attachment; filename="House, estimate.xlsx"'],
    ['=cmd|calc', 'attachment; filename="=cmd calc, estimate.xlsx"'],
  ])('names the file of %s so that any system takes it (RFC 6266, RFC 5987)', async (name, disposition) => {
    const app = buildTestApp()
    const { agent } = app.signInAs('estimator')
    const answer = await agent.get(aHouse(app, name).path).expect(200)
    expect(answer.headers['content-disposition']).toBe(disposition)
  })

  describe('when an owner asks', () => {
    it('gives it where the house is shared with them, prepared for them by who shared it', async () => {
      const app = buildTestApp()
      const sharer = app.signInAs('estimator', { name: 'Tess Maker' })
      const owner = app.signInAs('owner', { name: 'Olive Buyer' })
      const { house, path } = aHouse(app)
      shareHouse(app, house.id, sharer.user, owner.user)
      const answer = await owner.agent
        .get(path)
        .buffer(true)
        .parse(asBytes as never)
        .expect(200)
      const workbook = await recalculateWorkbook(answer.body as Buffer)
      expect(workbook.cached('Summary', 'F5')).toBe('Olive Buyer')
      expect(workbook.cached('Summary', 'F6')).toBe('Tess Maker')
      workbook.destroy()
    })

    it('answers 404 for a house that isn’t, as though there were none', async () => {
      const app = buildTestApp()
      const { agent } = app.signInAs('owner')
      const { path } = aHouse(app)
      const closed = await agent.get(path).expect(404)
      const missing = await agent.get('/api/estimates/no-such-estimate/workbook').expect(404)
      expect(closed.body.detail).toBe(missing.body.detail)
    })
  })

  it('is for those who are signed in', async () => {
    const app = buildTestApp()
    await app.anonymous().get(aHouse(app).path).expect(401)
  })

  it('makes several at once', async () => {
    const app = buildTestApp()
    const { agent } = app.signInAs('estimator')
    const { path } = aHouse(app)
    const answers = await Promise.all(Array.from({ length: 5 }, () => agent.get(path)))
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 200, 200])
  })
})
