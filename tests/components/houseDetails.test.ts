import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { House } from '../../shared/schemas/house.ts'
import { queryClient } from '../../src/api/queryClient.ts'
import HouseDetailsForm from '../../src/components/house/HouseDetailsForm.vue'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, stubApi, type ApiCall } from '../support/stubApi.ts'

function buildHouse(overrides: Partial<House> = {}): House {
  return {
    id: 'h1',
    name: '14 Lantern Street',
    address: '',
    regionKey: 'merrow-harbor',
    yearBuilt: 1926,
    storeys: 1,
    kind: 'detached',
    footprint: null,
    wallHeightIn: null,
    overhangIn: null,
    roof: [],
    note: '',
    version: 3,
    createdAt: '2026-01-01T00:00:00.000Z',
    updatedAt: '2026-01-01T00:00:00.000Z',
    ...overrides,
  }
}
const REGION = { key: 'merrow-harbor', name: 'Merrow Harbor' }
const BASICS = {
  'GET /price-book/versions': [{ version: 1, status: 'published' }],
  'GET /price-book/versions/1/regions': [REGION],
  'GET /houses/h1/rooms': [],
  'GET /houses': [],
}

beforeEach(() => {
  localStorage.clear()
  vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] })
})
afterEach(() => {
  vi.useRealTimers()
  vi.unstubAllGlobals()
})

/** A server that takes each change and counts the version up. */
function saving(start: House) {
  let now = start
  return ({ body }: ApiCall) => (now = { ...now, ...(body as Partial<House>), version: now.version + 1 })
}

async function openDetails(house = buildHouse(), answers: Record<string, unknown> = {}) {
  const api = stubApi({ ...BASICS, 'PATCH /houses/h1': saving(house), ...answers })
  const { wrapper } = await mountInApp(HouseDetailsForm, { role: 'estimator', props: { house } })
  function field(label: string) {
    const found = wrapper.findAll('label').find((candidate) => candidate.text().startsWith(label))
    if (!found) throw new Error(`There is no field called "${label}"`)
    return wrapper.get(`[id="${found.attributes('for')}"]`)
  }
  async function rest() {
    await vi.advanceTimersByTimeAsync(1_000)
    await flushPromises()
  }
  return { api, wrapper, field, rest }
}

describe('HouseDetailsForm', () => {
  it('saves what is keyed once the typing rests, against the version that it was read at', async () => {
    const { api, field, rest, wrapper } = await openDetails()
    await field('Name').setValue('14 Lantern')
    expect(wrapper.text()).toContain('Saving…')
    await rest()
    const [call] = api.callsTo('PATCH /houses/h1')
    expect(call?.body).toEqual({ name: '14 Lantern' })
    expect(call?.headers.get('if-match')).toBe('"3"')
    expect(wrapper.text()).toContain('Saved')
    expect(queryClient.getQueryData<House>(['house', 'h1'])?.version).toBe(4)
  })

  it('names the field that the server refuses, and keeps what was typed', async () => {
    const errors = [{ path: 'name', code: 'too-small', message: 'is empty' }]
    const { field, rest, wrapper } = await openDetails(buildHouse(), { 'PATCH /houses/h1': problemAnswer(422, 'invalid', 'x', { errors }) })
    await field('Name').setValue(' ')
    await rest()
    expect(wrapper.text()).toContain('Name is empty.')
    expect(wrapper.text()).toContain('Not saved')
  })

  it('shows both values when somebody else changed the same field, and takes either', async () => {
    const theirs = buildHouse({ yearBuilt: 1931, version: 4 })
    const { api, field, rest, wrapper } = await openDetails(buildHouse(), {
      'PATCH /houses/h1': problemAnswer(412, 'stale', 'Somebody changed this.', { current: theirs }),
    })
    await field('Year built').setValue('1928')
    await rest()
    expect(wrapper.get('[role=alert]').text()).toContain('The year built was changed by somebody else meanwhile, to 1931. You keyed 1928.')
    api.answers['PATCH /houses/h1'] = saving(theirs)
    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Keep mine')!
      .trigger('click')
    await rest()
    const last = api.callsTo('PATCH /houses/h1').at(-1)
    expect(last?.body).toEqual({ yearBuilt: 1928 })
    expect(last?.headers.get('if-match')).toBe('"4"')
  })

  it('says what the age of the house has to be watched for', async () => {
    const { field, wrapper } = await openDetails(buildHouse({ yearBuilt: 2005 }))
    expect(wrapper.text()).not.toContain('Lead paint is presumed here')
    await field('Year built').setValue('1926')
    expect(wrapper.text()).toContain('Lead paint is presumed here')
  })

  it('keeps a year that is none out of what it saves', async () => {
    const { api, field, rest, wrapper } = await openDetails()
    await field('Year built').setValue('19x6')
    await rest()
    expect(wrapper.text()).toContain('Year built: 19x6 is not a year.')
    expect(api.callsTo('PATCH /houses/h1')).toHaveLength(0)
  })

  describe('outside measures', () => {
    it('are saved once the footprint has both its lengths, and measured as they are keyed', async () => {
      const { api, field, rest, wrapper } = await openDetails()
      expect(wrapper.find('.missing').exists()).toBe(true)
      await field('Footprint').setValue('rectangle')
      await field('Length').setValue('38')
      await rest()
      expect(api.callsTo('PATCH /houses/h1')).toHaveLength(0)
      await field('Width').setValue('28')
      await rest()
      expect(api.callsTo('PATCH /houses/h1')[0]?.body).toEqual({ footprint: { kind: 'rectangle', lengthIn: 456, widthIn: 336 } })
      expect(wrapper.get('.measures').text()).toContain('1,064.00 sq ft')
    })

    it('say at its field that a cut is larger than the house', async () => {
      const footprint = { kind: 'ell', lengthIn: 480, widthIn: 300, cutLengthIn: 120, cutWidthIn: 120 } as const
      const { field, wrapper } = await openDetails(buildHouse({ footprint }))
      await field('Cut length').setValue('50')
      expect(field('Cut length').attributes('aria-invalid')).toBe('true')
      expect(wrapper.find('figure').exists()).toBe(false)
    })

    it('keep an outline that came with an import', async () => {
      const footprint: House['footprint'] = {
        kind: 'polygon',
        corners: [
          [0, 0],
          [400, 0],
          [0, 300],
        ],
      }
      const { api, field, rest } = await openDetails(buildHouse({ footprint }))
      expect((field('Footprint').element as HTMLSelectElement).selectedOptions[0]?.text).toBe('Outline of 3 corners')
      await rest()
      expect(api.callsTo('PATCH /houses/h1')).toHaveLength(0)
    })

    it('take a roof in parts', async () => {
      const { api, field, rest, wrapper } = await openDetails()
      await wrapper
        .findAll('button')
        .find((button) => button.text() === 'Add the roof')!
        .trigger('click')
      await field('Pitch').setValue('8')
      await rest()
      expect(api.callsTo('PATCH /houses/h1').at(-1)?.body).toEqual({ roof: [{ kind: 'gable', rise: 8 }] })
      await wrapper.get('button[aria-label="Remove part 1 of the roof"]').trigger('click')
      await rest()
      expect(api.callsTo('PATCH /houses/h1').at(-1)?.body).toEqual({ roof: [] })
    })

    it('take an eave without an overhang', async () => {
      const { api, field, rest } = await openDetails()
      await field('Overhang').setValue('0')
      await rest()
      expect(api.callsTo('PATCH /houses/h1')[0]?.body).toEqual({ overhangIn: 0 })
    })
  })

  it('shows what somebody else saved where nothing of one’s own stands against it', async () => {
    const { wrapper, field } = await openDetails()
    await wrapper.setProps({ house: buildHouse({ name: 'Lantern House', version: 4 }) })
    expect((field('Name').element as HTMLInputElement).value).toBe('Lantern House')
  })

  it('takes up again what the end of the session left unsaved', async () => {
    const refusal = problemAnswer(401, 'signed-out', 'Sign in first.')
    const first = await openDetails(buildHouse(), { 'PATCH /houses/h1': refusal })
    await first.field('Note').setValue('Soft floor by the tub')
    await first.rest()
    first.wrapper.unmount()
    await flushPromises()

    const second = await openDetails(buildHouse({ version: 4, yearBuilt: 1925 }))
    await second.rest()
    expect((second.field('Note').element as HTMLTextAreaElement).value).toBe('Soft floor by the tub')
    expect(second.api.callsTo('PATCH /houses/h1').at(-1)?.body).toEqual({ note: 'Soft floor by the tub' })
    expect(localStorage).toHaveLength(0)
  })
})
