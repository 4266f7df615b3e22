import { flushPromises, type VueWrapper } from '@vue/test-utils'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { PriceBookVersion, PriceRegion } from '../../shared/schemas/priceItem.ts'
import PriceBookView from '../../src/views/PriceBookView.vue'
import { buildPriceItem } from '../support/buildPriceItem.ts'
import { mountInApp } from '../support/mountInApp.ts'
import { problemAnswer, StubAnswer, stubApi } from '../support/stubApi.ts'

const plank = buildPriceItem()
const paint = buildPriceItem({ key: 'walls/paint', name: 'Wall paint', system: 'walls', trade: 'painting', note: '' })
const published: PriceBookVersion = {
  version: 1,
  status: 'published',
  note: 'First book',
  effectiveDate: '2026-05-01',
  publishedAt: '2026-05-04T08:30:00.000Z',
  publishedBy: 'Maren Alder',
  itemCount: 2,
  changeCount: 2,
}
const draft: PriceBookVersion = {
  ...published,
  version: 2,
  status: 'draft',
  note: '',
  effectiveDate: null,
  publishedAt: null,
  publishedBy: null,
  changeCount: 1,
}
const harbor: PriceRegion = {
  key: 'merrow-harbor',
  name: 'Merrow Harbor',
  materialsFactor: 1.06,
  laborFactor: 1.18,
  salesTaxRule: 'materials',
  salesTaxPercent: 6.25,
  rowVersion: 1,
}

/** A window as narrow as a phone: the items are cards, and one that is opened takes the page. */
beforeEach(() => {
  vi.spyOn(window, 'matchMedia').mockImplementation(
    (query) =>
      ({
        matches: query.includes('max-width'),
        media: query,
        addEventListener() {},
        removeEventListener() {},
      }) as unknown as MediaQueryList,
  )
  window.scrollTo = () => {}
})

function bookAnswers(versions: PriceBookVersion[]) {
  const ofVersion = ({ version }: PriceBookVersion) => ({
    [`GET /price-book/versions/${version}/items`]: [plank, paint],
    [`GET /price-book/versions/${version}/items?region=merrow-harbor`]: [{ ...plank, isRegionsOwn: true }, paint],
    [`GET /price-book/versions/${version}/regions`]: [harbor],
  })
  return Object.assign({ 'GET /price-book/versions': versions }, ...versions.map(ofVersion)) as Record<string, unknown>
}
async function open(role: 'admin' | 'estimator', versions: PriceBookVersion[], answers: Record<string, unknown> = {}, at = '/price-book') {
  const api = stubApi({ ...bookAnswers(versions), ...answers })
  const mounted = await mountInApp(PriceBookView, { role, at })
  await flushPromises()
  return { ...mounted, api }
}
function button(wrapper: VueWrapper, name: string): HTMLButtonElement {
  const found = [...document.querySelectorAll('button')].filter(
    (one) => one.textContent?.trim() === name || one.getAttribute('aria-label') === name,
  )
  const last = found.at(-1)
  if (!last) throw new Error(`There is no button ${name} in ${wrapper.text()}`)
  return last
}
async function press(wrapper: VueWrapper, name: string): Promise<void> {
  button(wrapper, name).click()
  await flushPromises()
}
function field(label: string): HTMLInputElement {
  const found = [...document.querySelectorAll('label')].find((one) => one.textContent?.trim().replace(/\s*optional$/, '') === label)
  const input = document.getElementById(found?.getAttribute('for') ?? '')
  if (!(input instanceof HTMLElement)) throw new Error(`There is no field ${label}`)
  return input as HTMLInputElement
}
async function key(label: string, text: string): Promise<void> {
  const input = field(label)
  input.value = text
  input.dispatchEvent(new Event('input', { bubbles: true }))
  await flushPromises()
}
function names(wrapper: VueWrapper): string[] {
  return wrapper.findAll('.cards .card strong').map((name) => name.text())
}

describe('the price book', () => {
  describe('for an estimator', () => {
    it('shows the newest published version, to read', async () => {
      const { wrapper } = await open('estimator', [draft, published])
      expect(names(wrapper)).toEqual(['Vinyl plank, floating', 'Wall paint'])
      expect(wrapper.text()).toContain('Version 1: First book')
      expect(wrapper.text()).not.toContain('Start version')
      expect(wrapper.text()).not.toContain('Drop the draft')
    })

    it('finds items as one types', async () => {
      const { wrapper } = await open('estimator', [published])
      await key('Search', 'pla vin')
      expect(names(wrapper)).toEqual(['Vinyl plank, floating'])
      expect(wrapper.text()).toContain('1 of 2 items')
      await key('Search', 'nothing like it')
      expect(wrapper.text()).toContain('No item holds all of these words')
    })

    it('opens an item with all its fields, and closes it by going back', async () => {
      const { wrapper, router } = await open('estimator', [published])
      await wrapper.find('.cards .card').trigger('click')
      await flushPromises()
      expect(router.currentRoute.value.query.item).toBe(plank.key)
      expect(wrapper.find('h1').text()).toBe('Vinyl plank, floating')
      expect(wrapper.text()).toContain('$4.80 / $5.80 / $7.25')
      expect(wrapper.text()).toContain('C3020')
      await press(wrapper, 'Back to the list')
      expect(wrapper.find('h1').text()).toBe('Price book')
      expect(document.activeElement?.getAttribute('data-key')).toBe(plank.key)
    })

    it('shows what a region pays', async () => {
      const { api, wrapper } = await open('estimator', [published])
      const region = field('Region')
      region.value = 'merrow-harbor'
      region.dispatchEvent(new Event('change', { bubbles: true }))
      await flushPromises()
      expect(api.callsTo('GET /price-book/versions/1/items?region=merrow-harbor')).toHaveLength(1)
      expect(names(wrapper)).toHaveLength(2)
    })
  })

  describe('for an admin', () => {
    it('starts a draft', async () => {
      const { api, wrapper } = await open('admin', [published], { 'POST /price-book/draft': new StubAnswer(201, draft) })
      Object.assign(api.answers, bookAnswers([draft, published]))
      await press(wrapper, 'Start version 2 as a draft')
      expect(wrapper.text()).toContain('Version 2 is a draft.')
    })

    it('says in words that somebody else has started one', async () => {
      const conflict = problemAnswer(409, 'draft-open', 'Version 2 is already open as a draft. Publish or drop it first.')
      const { api, wrapper } = await open('admin', [published], { 'POST /price-book/draft': conflict })
      Object.assign(api.answers, bookAnswers([draft, published]))
      await press(wrapper, 'Start version 2 as a draft')
      expect(wrapper.text()).toContain('Version 2 is a draft.')
    })

    it('saves what was changed in an item, against its version', async () => {
      const { api, wrapper } = await open('admin', [draft, published], {
        [`PATCH /price-book/draft/items/${plank.key}`]: ({ body }: { body: object }) => ({ ...plank, ...body, rowVersion: 2 }),
      })
      await wrapper.find('.cards .card').trigger('click')
      await flushPromises()
      await key('Waste', '12')
      await press(wrapper, 'Save in the draft')
      const [call] = api.callsTo(`PATCH /price-book/draft/items/${plank.key}`)
      expect(call?.body).toEqual({ wastePercent: 12 })
      expect(call?.headers.get('if-match')).toBe('"1"')
      expect(wrapper.text()).toContain('changed')
    })

    it('keeps a form open with what is wrong in it', async () => {
      const { api, wrapper } = await open('admin', [draft, published], {
        'POST /price-book/draft/items': problemAnswer(422, 'invalid', 'roomFormula: no measure', {
          errors: [{ path: 'roomFormula', code: 'unknown-name', message: '`floors` is not a measure' }],
        }),
      })
      await press(wrapper, 'Add an item')
      await press(wrapper, 'Add to the draft')
      expect(wrapper.text()).toContain('Name is empty.')
      expect(wrapper.text()).toContain('give a materials price, an installed price or both')
      await key('Name', 'Cork tile')
      await key('Key', 'floor/cork-tile')
      await key('UNIFORMAT II', 'C3020')
      const [low, likely, high] = [...document.querySelectorAll<HTMLInputElement>('fieldset:nth-of-type(2) input')]
      for (const [input, text] of [
        [low, '9'],
        [likely, '7'],
        [high, '12'],
      ] as const) {
        if (!input) throw new Error('There is no such field')
        input.value = text
        input.dispatchEvent(new Event('input', { bubbles: true }))
      }
      await key('Quantity in a room', 'floors')
      await press(wrapper, 'Add to the draft')
      expect(wrapper.text()).toContain('low, likely and high must go up in that order')
      if (low) low.value = '5'
      low?.dispatchEvent(new Event('input', { bubbles: true }))
      await press(wrapper, 'Add to the draft')
      expect(api.callsTo('POST /price-book/draft/items')[0]?.body).toMatchObject({
        key: 'floor/cork-tile',
        materials: null,
        installed: { low: 50_000, likely: 70_000, high: 120_000 },
      })
      expect(wrapper.text()).toContain('is not a measure')
      expect(field('Name').value).toBe('Cork tile')
    })

    it('asks with the name before an item is dropped', async () => {
      const { api, wrapper } = await open('admin', [draft, published], {
        [`DELETE /price-book/draft/items/${plank.key}`]: new StubAnswer(204),
      })
      await wrapper.find('.cards .card').trigger('click')
      await flushPromises()
      await press(wrapper, 'Drop the item')
      expect(document.body.textContent).toContain('Drop Vinyl plank, floating?')
      expect(api.callsTo(`DELETE /price-book/draft/items/${plank.key}`)).toHaveLength(0)
      await press(wrapper, 'Drop the item')
      expect(api.callsTo(`DELETE /price-book/draft/items/${plank.key}`)[0]?.headers.get('if-match')).toBe('"1"')
    })

    it('lists what the draft changes, with both figures', async () => {
      const answers = { 'GET /price-book/versions/2/items': [{ ...plank, wastePercent: 12, rowVersion: 2 }, paint] }
      const { wrapper } = await open('admin', [draft, published], answers)
      await press(wrapper, '1 change')
      await flushPromises()
      expect(document.body.textContent).toMatch(/What version 2 changes in version 1.*Vinyl plank, floating.*Waste.*10 %.*12 %/s)
    })

    it('publishes with a note and a day, and wants the note', async () => {
      const { api, wrapper } = await open('admin', [draft, published], {
        'POST /price-book/draft/publish': { ...draft, status: 'published', note: 'Dearer planks' },
      })
      await press(wrapper, 'Publish version 2')
      await press(wrapper, 'Publish version 2')
      expect(document.body.textContent).toContain('Say what changed.')
      const note = document.querySelector('textarea')
      if (!note) throw new Error('There is no field for a note')
      note.value = 'Dearer planks'
      note.dispatchEvent(new Event('input', { bubbles: true }))
      await flushPromises()
      Object.assign(api.answers, bookAnswers([{ ...published, version: 2 }, published]))
      await press(wrapper, 'Publish version 2')
      expect(api.callsTo('POST /price-book/draft/publish')[0]?.body).toMatchObject({
        note: 'Dearer planks',
        effectiveDate: expect.stringMatching(/^\d{4}-\d\d-\d\d$/),
      })
      expect(wrapper.text()).toContain('Start version 3 as a draft')
    })

    it('drops the draft only after asking with its number', async () => {
      const { api, wrapper } = await open('admin', [draft, published], { 'DELETE /price-book/draft': new StubAnswer(204) })
      await press(wrapper, 'Drop the draft')
      expect(document.body.textContent).toContain('Drop the draft of version 2?')
      Object.assign(api.answers, bookAnswers([published]))
      await press(wrapper, 'Drop version 2')
      expect(api.callsTo('DELETE /price-book/draft')).toHaveLength(1)
      expect(wrapper.text()).toContain('Start version 2 as a draft')
    })

    it('changes a region’s factors in the draft', async () => {
      const { api, wrapper } = await open('admin', [draft, published], {
        'PATCH /price-book/draft/regions/merrow-harbor': { ...harbor, laborFactor: 1.2, rowVersion: 2 },
      })
      await press(wrapper, 'Regions')
      await key('Labor factor', '1.2')
      await press(wrapper, 'Save Merrow Harbor')
      const [call] = api.callsTo('PATCH /price-book/draft/regions/merrow-harbor')
      expect(call?.body).toMatchObject({ laborFactor: 1.2, materialsFactor: 1.06 })
      expect(call?.headers.get('if-match')).toBe('"1"')
    })
  })

  it('says when the book can’t be read, and offers to try again', async () => {
    const { wrapper } = await open('estimator', [], { 'GET /price-book/versions': problemAnswer(403, 'forbidden', 'Not for you.') })
    expect(wrapper.text()).toContain('Not for you.')
    expect(wrapper.text()).toContain('Try again')
  })

  it('says what goes here when there is no version yet', async () => {
    const { wrapper } = await open('admin', [])
    expect(wrapper.text()).toContain('No price book yet')
    expect(wrapper.text()).toContain('Start version 1 as a draft')
  })
})
