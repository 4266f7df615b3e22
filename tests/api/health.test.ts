import { describe, expect, it } from 'vitest'
import { buildTestApp } from '../support/buildTestApp.ts'

describe('GET /api/health and /api/ready', () => {
  it('answers anybody that the process lives and the database is there', async () => {
    const { anonymous } = buildTestApp()
    for (const path of ['/api/health', '/api/ready']) {
      const answer = await anonymous().get(path)
      expect([path, answer.status, answer.body]).toEqual([path, 200, { status: 'ok' }])
    }
  })

  it('says that the process is not ready when the database is gone', async () => {
    const { anonymous, db } = buildTestApp()
    db.$client.close()
    expect((await anonymous().get('/api/ready')).status).toBe(500)
    expect((await anonymous().get('/api/health')).status).toBe(200)
  })
})
