import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { HouseSummary } from '../../shared/schemas/house.ts'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import HouseListView from '../../src/views/HouseListView.vue'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

function buildSummary(overrides: Partial<HouseSummary> = {}): HouseSummary {
  return {
    id: 'h1',
    name: '14 Lantern Street',
    address: '14 Lantern Street, Merrow Harbor',
    regionKey: 'merrow-harbor',
    yearBuilt: 1926,
    kind: 'detached',
    estimateId: 'e1',
    roomCount: 12,
    lineCount: 96,
    errorCount: 0,
    totalCents: { low: 6_120_000, likely: 7_530_000, high: 9_840_000 },
    updatedAt: '2026-03-04T10:00:00.000Z',
    ...overrides,
  }
}

/** Pages are loaded when they are opened, which takes a busy machine its time. */
const PATIENTLY = { timeout: 10_000 }

afterEach(() => vi.unstubAllGlobals())

async function openList(houses: HouseSummary[], role: 'estimator' | 'owner' = 'estimator') {
  const api = stubApi({ 'GET /houses': houses, 'GET /price-book/versions': [] })
  const mounted = await mountInApp(HouseListView, { role })
  return { api, ...mounted }
}

describe('HouseListView', () => {
  it('shows the total of each house and how sure it is', async () => {
    const { wrapper } = await openList([buildSummary()])
    const row = wrapper.get('tbody tr')
    expect(row.text()).toContain('$75,300')
    expect(row.text()).toContain('12 rooms, 96 lines')
    expect(row.get('[role=img]').attributes('aria-label')).toBe('$61,200 to $98,400, likely $75,300')
    expect(row.get('a').attributes('href')).toBe('/houses/h1')
  })

  it('says how many lines a total leaves out', async () => {
    const { wrapper } = await openList([buildSummary({ errorCount: 1 })])
    expect(wrapper.get('tbody tr').text()).toContain('1 line left out')
  })

  it('shows no dollars for a house without lines', async () => {
    const { wrapper } = await openList([buildSummary({ lineCount: 0, totalCents: { low: 0, likely: 0, high: 0 } })])
    expect(wrapper.get('tbody tr').text()).toContain('no lines yet')
    expect(wrapper.get('tbody tr').text()).not.toContain('$')
  })

  it('removes a house against the version that stands, and brings it back', async () => {
    const { api, wrapper } = await openList([buildSummary(), buildSummary({ id: 'h2', name: '5 Quarry Rise' })])
    Object.assign(api.answers, {
      'GET /houses/h1': { id: 'h1', version: 7 },
      'DELETE /houses/h1': new StubAnswer(204),
      'POST /houses/h1/restore': { id: 'h1', version: 9 },
    })
    await wrapper.get('button[aria-label="Remove 14 Lantern Street"]').trigger('click')
    await flushPromises()
    expect(api.callsTo('DELETE /houses/h1')[0]?.headers.get('if-match')).toBe('"7"')
    expect(wrapper.findAll('tbody th a').map((link) => link.text())).toEqual(['5 Quarry Rise'])

    const { toasts, runUndo } = useUndoToast()
    await runUndo(toasts.value.at(-1)!)
    await flushPromises()
    expect(api.callsTo('POST /houses/h1/restore')).toHaveLength(1)
    expect(wrapper.findAll('tbody tr')).toHaveLength(2)
  })

  it('finds a house among many', async () => {
    const { wrapper } = await openList([
      buildSummary({ id: 'x', name: '88 Ropewalk', yearBuilt: 1978 }),
      ...Array.from({ length: 9 }, (_, index) => buildSummary({ id: `h${index}`, name: `${index} Lantern Street` })),
    ])
    await wrapper.get('input[type=search]').setValue('rope 1978')
    expect(wrapper.findAll('tbody tr')).toHaveLength(1)
    await wrapper.get('input[type=search]').setValue('castle')
    expect(wrapper.text()).toContain('No house has “castle”')
  })

  it('offers the first step while there is no house', async () => {
    const { wrapper } = await openList([])
    expect(wrapper.text()).toContain('No house yet')
  })

  describe('for an owner', () => {
    it('can be read and not changed', async () => {
      const { wrapper } = await openList([buildSummary()], 'owner')
      expect(wrapper.text()).not.toContain('Add a house')
      expect(wrapper.text()).not.toContain('Import')
      expect(wrapper.find('tbody button').exists()).toBe(false)
    })

    it('says that nothing is shared yet', async () => {
      const { wrapper } = await openList([], 'owner')
      expect(wrapper.text()).toContain('No house is shared with you yet')
    })
  })

  describe('importing an estimate', () => {
    async function choose(wrapper: Awaited<ReturnType<typeof openList>>['wrapper'], text: string) {
      const input = wrapper.get<HTMLInputElement>('input[type=file]')
      const file = new File([text], 'estimate.json', { type: 'application/json' })
      Object.defineProperty(input.element, 'files', { value: [file], configurable: true })
      Object.defineProperty(input.element, 'value', { value: '', writable: true, configurable: true })
      await input.trigger('change')
      await vi.waitFor(() => expect(wrapper.get('.button').attributes('aria-busy')).toBeUndefined(), PATIENTLY)
      await flushPromises()
    }

    it('sends the document as it stands and opens the house', async () => {
      const { api, wrapper, router } = await openList([])
      api.answers['POST /houses/import'] = new StubAnswer(201, { house: { id: 'h9', name: 'Imported' }, estimateId: 'e9' })
      await choose(wrapper, '{"format":"x","rooms":[]}')
      expect(api.callsTo('POST /houses/import')[0]?.body).toEqual({ format: 'x', rooms: [] })
      await vi.waitFor(() => expect(router.currentRoute.value.path).toBe('/houses/h9/rooms'), PATIENTLY)
    })

    it('names each field that can’t be read', async () => {
      const { api, wrapper } = await openList([])
      api.answers['POST /houses/import'] = problemAnswer(422, 'invalid', 'Two fields can’t be read.', {
        errors: [{ path: 'rooms[0].shape', code: 'missing', message: 'is missing' }],
      })
      await choose(wrapper, '{}')
      const dialog = document.querySelector('[role=dialog]')
      expect(dialog?.textContent).toContain('estimate.json')
      expect(dialog?.textContent).toContain('rooms[0].shape is missing')
    })

    it('refuses what is no JSON without asking the server', async () => {
      const { api, wrapper } = await openList([])
      await choose(wrapper, 'PK-zip')
      expect(document.querySelector('[role=dialog]')?.textContent).toContain('isn’t JSON')
      expect(api.callsTo('POST /houses/import')).toHaveLength(0)
    })
  })
})
