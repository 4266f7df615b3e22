import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import EstimateDesk from '../../../src/components/estimate/EstimateDesk.vue'
import { createEstimateModel, type EstimateModel } from '../../../src/composables/estimateModel.ts'
import { useUndoToast } from '../../../src/composables/useUndoToast.ts'
import type { Role } from '../../../shared/schemas/account.ts'
import { buildEstimateWhole, buildLines } from '../../support/buildEstimateWhole.ts'
import { buildPriceItem } from '../../support/buildPriceItem.ts'
import { fakeEstimateServer } from '../../support/fakeEstimateServer.ts'
import { mountInApp } from '../../support/mountInApp.ts'
import { stubApi } from '../../support/stubApi.ts'

let server: ReturnType<typeof fakeEstimateServer>
let model: EstimateModel

/** The estimate as a phone shows it. */
async function openOnPhone(role: Role = 'estimator') {
  const whole = buildEstimateWhole({
    lines: buildLines(
      { description: 'Floor', roomId: 'room-1', quantity: 'floor_area' },
      { description: 'Roof', system: 'roof', trade: 'roofing' },
    ),
  })
  server = fakeEstimateServer(whole)
  model = createEstimateModel(whole, { calls: server.calls, onBehind: () => {} })
  const mounted = await mountInApp(EstimateDesk, { role, props: { model } })
  await vi.dynamicImportSettled()
  return mounted.wrapper
}
const total = () => document.querySelector('.totals-bar .words strong')?.textContent
const dialog = () => document.querySelector<HTMLElement>('[role=dialog]')!
const field = <T extends HTMLElement>(selector: string) => dialog().querySelector<T>(selector)!
function key(input: HTMLInputElement | HTMLTextAreaElement, text: string): void {
  input.value = text
  input.dispatchEvent(new Event('input'))
}
async function press(name: string, within: ParentNode = document): Promise<void> {
  const button = [...within.querySelectorAll<HTMLElement>('button')].find((one) =>
    (one.getAttribute('aria-label') ?? one.textContent ?? '').includes(name),
  )
  if (!button) throw new Error(`There is no button ${name}.`)
  button.click()
  await flushPromises()
  await vi.dynamicImportSettled()
}

beforeEach(() => {
  vi.spyOn(window, 'matchMedia').mockImplementation(
    (media) =>
      ({ matches: media.includes('max-width'), media, addEventListener() {}, removeEventListener() {} }) as unknown as MediaQueryList,
  )
  stubApi({ 'GET /price-book/versions/1/items?region=merrow-valley': [buildPriceItem()], 'GET /price-book/versions/1/regions': [] })
})
afterEach(() => vi.restoreAllMocks())

describe('the estimate on a phone', () => {
  it('shows a card for each line under its group, and the total', async () => {
    const wrapper = await openOnPhone()
    expect(wrapper.findAll('h2 .title').map((title) => title.text())).toEqual(['Whole house', 'Front bedroom'])
    expect(wrapper.findAll('.card .description').map((text) => text.text())).toEqual(['Roof', 'Floor'])
    expect(total()).toBe('$675')
  })

  it('lets the total follow a line that is being changed, keeps it, and goes back when it is cancelled', async () => {
    await openOnPhone()
    await press('Roof')
    key(field<HTMLInputElement>('.formula-entry input'), '200')
    await flushPromises()
    expect(total()).toBe('$975')
    await press('Cancel', dialog())
    expect(total()).toBe('$675')
    await press('Roof')
    key(field<HTMLInputElement>('.formula-entry input'), '50')
    await flushPromises()
    dialog()
      .querySelector('form')
      ?.dispatchEvent(new Event('submit', { cancelable: true }))
    await flushPromises()
    expect(total()).toBe('$525')
    expect(server.line('line-2')?.quantity).toBe('50')
  })

  it('adds a line for an item that is found by the beginnings of its words', async () => {
    await openOnPhone()
    await press('Add a line to Front bedroom')
    key(field<HTMLInputElement>('[role=combobox]'), 'pla vin')
    await flushPromises()
    field<HTMLInputElement>('[role=combobox]').dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter' }))
    await flushPromises()
    expect(server.whole().lines.at(1)).toMatchObject({
      itemKey: 'floor/plank-vinyl',
      roomId: 'room-1',
      quantity: 'floor_area',
      basis: 'hired',
    })
  })

  it('removes a line and offers it back', async () => {
    await openOnPhone()
    await press('Roof')
    await press('Remove the line', dialog())
    expect(total()).toBe('$375')
    expect(server.whole().lines).toHaveLength(1)
    const { toasts, runUndo } = useUndoToast()
    const toast = toasts.value.at(-1)
    expect(toast?.text).toBe('“Roof” removed')
    await runUndo({ ...toast! })
    await flushPromises()
    expect(total()).toBe('$675')
    expect(server.whole().lines).toHaveLength(2)
  })

  it('offers nothing to change to somebody who may only read', async () => {
    const wrapper = await openOnPhone('owner')
    expect(wrapper.findAll('button').filter((button) => /Add|Remove/.test(button.text()))).toHaveLength(0)
    await press('Roof')
    expect(dialog().textContent).not.toContain('Keep the line')
    expect(field<HTMLFieldSetElement>('fieldset').disabled).toBe(true)
  })
})
