import { mount } from '@vue/test-utils'
import { describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import LengthField from '../../src/components/base/LengthField.vue'
import MoneyField from '../../src/components/base/MoneyField.vue'
import PasswordField from '../../src/components/base/PasswordField.vue'
import PercentField from '../../src/components/base/PercentField.vue'
import SelectField from '../../src/components/base/SelectField.vue'
import TextField from '../../src/components/base/TextField.vue'

type Mounted = ReturnType<typeof mount>

function inputOf(wrapper: Mounted): HTMLInputElement {
  return wrapper.get('input').element
}
async function type(wrapper: Mounted, text: string): Promise<void> {
  await wrapper.get('input').setValue(text)
}
function lastOf(wrapper: Mounted, event: string): unknown {
  return wrapper.emitted(event)?.at(-1)?.[0]
}
/** What a screen reader says of a control beside its name. */
function descriptionOf(wrapper: Mounted): string {
  const ids = inputOf(wrapper).getAttribute('aria-describedby')?.split(' ') ?? []
  return ids.map((id) => wrapper.find(`[id="${id}"]`).text()).join(' ')
}

describe('a field', () => {
  it('ties label, hint and error to its control', () => {
    const wrapper = mount(TextField, { props: { modelValue: '', label: 'Name', hint: 'Street and number do.', error: 'is empty' } })
    expect(wrapper.get('label').attributes('for')).toBe(inputOf(wrapper).id)
    expect(descriptionOf(wrapper)).toBe('Street and number do. Name is empty.')
    expect(inputOf(wrapper).getAttribute('aria-invalid')).toBe('true')
  })

  it('is not invalid without an error', () => {
    const wrapper = mount(TextField, { props: { modelValue: '', label: 'Name' } })
    expect(inputOf(wrapper).hasAttribute('aria-invalid')).toBe(false)
  })

  it('keeps the label for a screen reader where a table says it to the eye', () => {
    const wrapper = mount(TextField, { props: { modelValue: '', label: 'Name', isLabelHidden: true } })
    expect(wrapper.get('label').classes()).toContain('visually-hidden')
  })
})

describe('SelectField', () => {
  it('gives the value of an option and not its text, also where that is a number or nothing', async () => {
    const options = [
      { value: null, label: 'None' },
      { value: 2, label: 'Two' },
    ]
    const wrapper = mount(SelectField<number | null>, { props: { modelValue: null, label: 'Count', options } })
    await wrapper.get('select').setValue(2)
    expect(lastOf(wrapper, 'update:modelValue')).toBe(2)
  })
})

describe('PasswordField', () => {
  it('can be shown and says that it is', async () => {
    const wrapper = mount(PasswordField, { props: { modelValue: 'secret', label: 'Password', autocomplete: 'current-password' } })
    expect(inputOf(wrapper).type).toBe('password')
    await wrapper.get('button').trigger('click')
    expect(inputOf(wrapper).type).toBe('text')
    expect(wrapper.get('button').attributes('aria-pressed')).toBe('true')
  })
})

describe('LengthField', () => {
  function mountLength(props: Record<string, unknown> = {}) {
    return mount(LengthField, { props: { modelValue: null, label: 'Width', ...props }, attachTo: document.body })
  }

  it('shows its inches as the trade writes them', () => {
    expect(inputOf(mountLength({ modelValue: 150.5 })).value).toBe(`12' 6 1/2"`)
  })

  it.each([
    ['12-6', 150, `12' 6"`],
    ['12.5', 150, `12' 6"`],
    ['3.81 m', 150, `12' 6"`],
  ])('takes %s and echoes what it understood', async (text, inches, echo) => {
    const wrapper = mountLength()
    await wrapper.get('input').trigger('focus')
    await type(wrapper, text)
    expect(lastOf(wrapper, 'update:modelValue')).toBe(inches)
    expect(wrapper.get('output').text()).toBe(`= ${echo}`)
  })

  it('says nothing twice', async () => {
    const wrapper = mountLength()
    await type(wrapper, `12' 6"`)
    expect(wrapper.get('output').text()).toBe('')
  })

  it('keeps text that is no length, says what is wrong, and leaves the length as it was', async () => {
    const wrapper = mountLength({ modelValue: 100 })
    await wrapper.get('input').trigger('focus')
    await type(wrapper, `12'' 6`)
    await wrapper.get('input').trigger('blur')
    expect(inputOf(wrapper).value).toBe(`12'' 6`)
    expect(wrapper.text()).toContain(`Width: 12'' 6 has two inch marks. Write 12' 6"`)
    expect(lastOf(wrapper, 'update:problem')).toContain('two inch marks')
    expect(wrapper.emitted('update:modelValue')).toBeUndefined()
  })

  it('gives nothing, and not zero, when it is emptied', async () => {
    const wrapper = mountLength({ modelValue: 100 })
    await type(wrapper, '')
    expect(lastOf(wrapper, 'update:modelValue')).toBe(null)
  })

  it('takes zero only where a length of nothing counts', async () => {
    const strict = mountLength()
    await type(strict, '0')
    expect(strict.emitted('update:modelValue')).toBeUndefined()
    const lenient = mountLength({ mayBeZero: true })
    await type(lenient, '0"')
    expect(lastOf(lenient, 'update:modelValue')).toBe(0)
  })

  it('never overwrites what somebody is typing with a value from elsewhere', async () => {
    const wrapper = mountLength({ modelValue: 100 })
    await wrapper.get('input').trigger('focus')
    await type(wrapper, '9')
    await wrapper.setProps({ modelValue: 240 })
    expect(inputOf(wrapper).value).toBe('9')
  })

  it('follows a value from elsewhere while nobody types', async () => {
    const wrapper = mountLength({ modelValue: 100 })
    await wrapper.setProps({ modelValue: 240 })
    await nextTick()
    expect(inputOf(wrapper).value).toBe(`20' 0"`)
  })

  it('puts a mark that a phone lacks where the caret stands', async () => {
    const wrapper = mountLength()
    await wrapper.get('input').trigger('focus')
    await type(wrapper, '126')
    inputOf(wrapper).setSelectionRange(2, 2)
    await wrapper.get(`button[aria-label="'"]`).trigger('click')
    expect(inputOf(wrapper).value).toBe(`12'6`)
    expect(lastOf(wrapper, 'update:modelValue')).toBe(150)
  })
})

describe('MoneyField', () => {
  it('gives whole cents and shows them with their cents', async () => {
    const wrapper = mount(MoneyField, { props: { modelValue: 125_050, label: 'Permits' } })
    expect(inputOf(wrapper).value).toBe('1,250.50')
    await type(wrapper, '$2,000')
    expect(lastOf(wrapper, 'update:modelValue')).toBe(200_000)
  })

  it('gives ten-thousandths for a unit price', async () => {
    const wrapper = mount(MoneyField, { props: { modelValue: null, label: 'Price', isUnitPrice: true } })
    await type(wrapper, '0.1525')
    expect(lastOf(wrapper, 'update:modelValue')).toBe(1525)
  })

  it.each(['-1', '1.123456', 'ten'])('refuses %s in words and keeps it', async (text) => {
    const wrapper = mount(MoneyField, { props: { modelValue: 100, label: 'Price', isUnitPrice: true } })
    await type(wrapper, text)
    expect(inputOf(wrapper).value).toBe(text)
    expect(lastOf(wrapper, 'update:problem')).not.toBe('')
    expect(wrapper.emitted('update:modelValue')).toBeUndefined()
  })
})

describe('PercentField', () => {
  it.each([
    ['8', 8],
    ['8.25 %', 8.25],
    ['8,25', 8.25],
    ['0', 0],
  ])('takes %s', async (text, percent) => {
    const wrapper = mount(PercentField, { props: { modelValue: 5, label: 'Tax' } })
    await type(wrapper, text)
    expect(lastOf(wrapper, 'update:modelValue')).toBe(percent)
  })

  it.each(['-1', '101', 'much', '1e1'])('refuses %s', async (text) => {
    const wrapper = mount(PercentField, { props: { modelValue: 5, label: 'Tax' } })
    await type(wrapper, text)
    expect(wrapper.emitted('update:modelValue')).toBeUndefined()
    expect(inputOf(wrapper).getAttribute('aria-invalid')).toBe('true')
  })
})
