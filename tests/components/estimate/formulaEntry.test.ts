import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import type { LineFigures } from '../../../shared/engine/index.ts'
import FormulaEntry from '../../../src/components/estimate/FormulaEntry.vue'

const figures: LineFigures = {
  measured: 125,
  quantity: 157.5,
  amountCents: { low: 0, likely: 0, high: 0 },
  hours: 0,
  error: null,
  unitPriceE4: null,
  formulaDimension: 'area',
}
const unknown = { code: 'unknown-name', message: '`flo` is not a measure.', at: [0, 3] as const }

function open(text: string, own: Partial<LineFigures> = {}) {
  const props = { label: 'Quantity', scope: 'room' as const, unit: 'sf', figures: { ...figures, ...own }, modelValue: text }
  const wrapper = mount(FormulaEntry, { props, attachTo: document.body })
  const input = wrapper.get<HTMLInputElement>('input')
  const type = async (typed: string) => {
    await input.setValue(typed)
    await wrapper.setProps({ modelValue: typed })
    await nextTick()
  }
  const options = () => wrapper.findAll('[role=option]').map((option) => option.get('code').text())
  return { wrapper, input, type, options }
}

describe('FormulaEntry', () => {
  it('shows the live answer with its unit', () => {
    expect(open('floor_area').wrapper.get('.answer').text()).toBe('= 125 measured, 157.5 sf priced')
    expect(open('157.5', { measured: 157.5 }).wrapper.get('.answer').text()).toBe('157.5 sf')
  })

  it('says what is wrong and marks the spot', () => {
    const { wrapper, input } = open('flo * 2', { error: unknown })
    expect(wrapper.get('mark').text()).toBe('flo')
    expect(wrapper.get('.answer').text()).toContain('`flo` is not a measure.')
    expect(input.attributes('aria-invalid')).toBe('true')
    expect(wrapper.get(`#${input.attributes('aria-describedby')}`).text()).toContain('is not a measure')
  })

  it('completes the name under the caret and holds its tongue while it is being typed', async () => {
    const { wrapper, input, type, options } = open('', { error: unknown })
    await type('flo')
    expect(options()[0]).toBe('floor_area')
    expect(wrapper.find('mark').exists()).toBe(false)
    await input.trigger('keydown', { key: 'Tab' })
    expect(wrapper.emitted('typed')?.at(-1)).toEqual(['floor_area'])
    expect(input.element.value).toBe('floor_area')
    expect(options()).toEqual([])
  })

  it('walks the list with arrows and takes the marked name with Enter; without a mark Enter is the cell’s', async () => {
    const { wrapper, input, type, options } = open('')
    let passedOn = 0
    document.body.addEventListener('keydown', () => (passedOn += 1))
    await type('wall')
    await input.trigger('keydown', { key: 'Enter' })
    expect(passedOn).toBe(1)
    await input.trigger('keydown', { key: 'ArrowDown' })
    await input.trigger('keydown', { key: 'ArrowDown' })
    const [, second] = options()
    expect(wrapper.get('[aria-selected=true] code').text()).toBe(second)
    await input.trigger('keydown', { key: 'Enter' })
    expect(input.element.value).toBe(second)
    expect(passedOn).toBe(1)
  })
})
