import { afterEach, describe, expect, it, vi } from 'vitest'
import type { Role } from '../../shared/schemas/account.ts'
import App from '../../src/App.vue'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, stubApi } from '../support/stubApi.ts'

const FIRM = { name: 'Alder & Finch House Advisers', isDemo: true, hasOutbox: true, demoAccounts: [] }
const HOUSE = {
  id: 'h1',
  name: '14 Lantern Street',
  address: '14 Lantern Street, Merrow Harbor',
  kind: 'detached',
  yearBuilt: 1926,
  footprint: null,
  wallHeightIn: null,
  roof: [],
}
const SUMMARY = { id: 'h1', roomCount: 12, lineCount: 96, errorCount: 2, estimateId: 'e1' }

afterEach(() => vi.unstubAllGlobals())

async function openShell(role: Role, firm: object = FIRM) {
  stubApi({ 'GET /firm': firm, 'GET /houses': [] })
  const { wrapper } = await mountInApp(App, { role, at: '/account' })
  return wrapper
}

describe('TheAppShell', () => {
  it.each([
    ['admin', ['Houses', 'Price book', 'People', 'Outbox']],
    ['estimator', ['Houses', 'Price book']],
    ['owner', ['Houses']],
  ] as const)('leads the %s where they may go', async (role, titles) => {
    const wrapper = await openShell(role)
    expect(wrapper.findAll('nav.wide a').map((link) => link.text())).toEqual(titles)
  })

  it('has no outbox where mail leaves by itself', async () => {
    const wrapper = await openShell('admin', { ...FIRM, hasOutbox: false })
    expect(wrapper.get('nav.wide').text()).not.toContain('Outbox')
  })

  it('says that a demo is one, and nothing of it elsewhere', async () => {
    expect((await openShell('admin')).text()).toContain('everything here is invented')
    expect((await openShell('admin', { ...FIRM, isDemo: false })).text()).not.toContain('invented')
  })

  it('has its landmarks, and a way past the bar as the first stop of the keyboard', async () => {
    const wrapper = await openShell('admin')
    expect(wrapper.findAll('main')).toHaveLength(1)
    const first = wrapper.get('a[href], button')
    expect(first.text()).toBe('Skip to the page')
    expect(wrapper.find(first.attributes('href')!).element.tagName).toBe('MAIN')
  })
})

describe('TheHouseFrame', () => {
  async function openFrame(role: Role, answers: Record<string, unknown> = {}) {
    stubApi({ 'GET /firm': FIRM, 'GET /houses/h1': HOUSE, 'GET /houses': [SUMMARY], ...answers })
    const { wrapper } = await mountInApp(App, {
      role,
      at: role === 'owner' ? '/houses/h1/summary' : '/houses/h1/details',
      leaveOut: ['HouseDetailsView', 'SummaryView'],
    })
    return wrapper
  }

  it('names the house and says each of its facts once', async () => {
    const wrapper = await openFrame('estimator')
    expect(wrapper.get('.house-head .words').text()).toBe('14 Lantern Street Merrow Harbor · detached house, built 1926')
  })

  it('stacks the stages in the order of the work and says where each stands', async () => {
    const wrapper = await openFrame('estimator')
    const stages = wrapper.findAll('.corner-rail a').map((stage) =>
      stage
        .findAll('span')
        .map((part) => part.text())
        .join(', '),
    )
    expect(stages).toEqual([
      'Details, to measure, not begun',
      'Rooms, 12 rooms, done',
      'Estimate, 2 errors, under way',
      'Summary, 2 left out, under way',
    ])
    expect(wrapper.findAll('.corner-rail a').map((link) => link.attributes('href'))).toEqual([
      '/houses/h1/details',
      '/houses/h1/rooms',
      '/houses/h1/estimate',
      '/houses/h1/summary',
    ])
  })

  it('marks the page that one is on', async () => {
    const wrapper = await openFrame('estimator')
    expect(wrapper.get('.corner-rail [aria-current=page]').text()).toContain('Details')
  })

  it('shows an owner the summary alone, without a rail and without a way to share', async () => {
    const wrapper = await openFrame('owner')
    expect(wrapper.find('.corner-rail').exists()).toBe(false)
    expect(wrapper.text()).not.toContain('Share')
  })

  it('says that a house is not there, and leads back to those that are', async () => {
    const wrapper = await openFrame('estimator', {
      'GET /houses/h1': problemAnswer(404, 'not-found', 'There is no such house, or it isn’t shared with you.'),
    })
    expect(wrapper.get('h1').text()).toBe('No such house')
    expect(wrapper.find('.corner-rail').exists()).toBe(false)
    expect(wrapper.get('.empty a').attributes('href')).toBe('/')
  })
})
