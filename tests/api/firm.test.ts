import { describe, expect, it } from 'vitest'
import { saveFirm } from '../../server/features/firm/firmRepository.ts'
import { buildTestApp } from '../support/buildTestApp.ts'

const DEMO_ACCOUNTS = [{ email: 'admin@demo.example', password: 'a public password', role: 'admin' as const, name: 'Demo Admin' }]

describe('GET /api/firm', () => {
  it('tells anybody the name of the firm', async () => {
    const app = buildTestApp()
    saveFirm(app.db, { name: 'Vale House Advisers', isDemo: false })
    expect((await app.anonymous().get('/api/firm')).body).toEqual({
      name: 'Vale House Advisers',
      isDemo: false,
      hasOutbox: true,
      demoAccounts: [],
    })
  })

  it('gives the name of the environment first, and the name of the program when there is none', async () => {
    const named = buildTestApp({ firmName: 'Oake & Vale' })
    saveFirm(named.db, { name: 'Vale House Advisers', isDemo: false })
    expect((await named.anonymous().get('/api/firm')).body.name).toBe('Oake & Vale')
    expect((await buildTestApp().anonymous().get('/api/firm')).body.name).toBe('Quoinbook')
  })

  it('shows the sign-ins of the demo in a demo file', async () => {
    const app = buildTestApp({ demoAccounts: DEMO_ACCOUNTS })
    saveFirm(app.db, { name: 'Demo', isDemo: true })
    expect((await app.anonymous().get('/api/firm')).body).toMatchObject({ isDemo: true, demoAccounts: DEMO_ACCOUNTS })
  })

  it('shows none in any other file, even if it was handed some', async () => {
    const app = buildTestApp({ demoAccounts: DEMO_ACCOUNTS })
    saveFirm(app.db, { name: 'Vale House Advisers', isDemo: false })
    expect((await app.anonymous().get('/api/firm')).body.demoAccounts).toEqual([])
  })
})
