import { flushPromises, mount } from '@vue/test-utils'
import { describe, expect, it, vi } from 'vitest'
import { defineComponent, h } from 'vue'
import { z } from 'zod'
import { ProblemError } from '../../src/api/ProblemError.ts'
import { useForm } from '../../src/composables/useForm.ts'

const schema = z.strictObject({ name: z.string().trim().min(1, 'is empty'), rooms: z.array(z.object({ size: z.number().positive() })) })
type Values = z.infer<typeof schema>

function buildForm({ submit = vi.fn(async (_body: Values) => {}), initial = (): Values => ({ name: ' Hall ', rooms: [] }) } = {}) {
  return { form: useForm({ schema, initial, submit }), submit }
}
function refusal(errors: { path: string; code: string; message: string }[]): ProblemError {
  return new ProblemError({ status: 422, code: 'invalid', detail: 'Some fields need another value.', errors })
}

describe('useForm', () => {
  it('sends what the schema makes of the values', async () => {
    const { form, submit } = buildForm()
    await form.submit()
    expect(submit).toHaveBeenCalledWith({ name: 'Hall', rooms: [] })
    expect(form.problem).toBe('')
  })

  it('says what is wrong only once somebody has tried to send it, and follows the typing from then on', async () => {
    const { form, submit } = buildForm()
    form.values.name = ''
    await flushPromises()
    expect(form.errorOf('name')).toBe('')
    await form.submit()
    expect(form.errorOf('name')).toBe('is empty')
    expect(submit).not.toHaveBeenCalled()
    form.values.name = 'Bath'
    await flushPromises()
    expect(form.errorOf('name')).toBe('')
  })

  it('names a bad field deep in a list as the body addresses it', async () => {
    const { form } = buildForm({ initial: () => ({ name: 'Hall', rooms: [{ size: 1 }, { size: -1 }] }) })
    await form.submit()
    expect(form.errorOf('rooms[1].size')).not.toBe('')
    expect(form.errorOf('rooms[0].size')).toBe('')
  })

  it('shows what the server has against a field until that field changes', async () => {
    const submit = vi.fn(async (_body: Values) => {
      throw refusal([{ path: 'name', code: 'taken', message: 'is taken' }])
    })
    const { form } = buildForm({ submit })
    // As the template does.
    form.errorOf('name')
    await form.submit()
    expect(form.errorOf('name')).toBe('is taken')
    expect(form.problem).toBe('')
    form.values.rooms.push({ size: 1 })
    await flushPromises()
    expect(form.errorOf('name')).toBe('is taken')
    form.values.name = 'Bath'
    await flushPromises()
    expect(form.errorOf('name')).toBe('')
  })

  it('says in words what no field can show, and keeps what was typed', async () => {
    const submit = vi.fn(async (_body: Values) => {
      throw refusal([{ path: 'token', code: 'spent', message: 'was used before' }])
    })
    const { form } = buildForm({ submit })
    await form.submit()
    expect(form.problem).toBe('Some fields need another value.')
    expect(form.values.name).toBe(' Hall ')
  })

  it('waits while a control holds text that can’t be read', async () => {
    const { form, submit } = buildForm()
    form.hold('name', 'is no length')
    await form.submit()
    expect(submit).not.toHaveBeenCalled()
    form.hold('name', '')
    await form.submit()
    expect(submit).toHaveBeenCalledOnce()
  })

  it('sends once, however often it is pressed', async () => {
    let finish = () => {}
    const submit = vi.fn((_body: Values) => new Promise<void>((resolve) => (finish = resolve)))
    const { form } = buildForm({ submit })
    const first = form.submit()
    await form.submit()
    finish()
    await first
    expect(submit).toHaveBeenCalledOnce()
  })

  it('knows whether there is anything unsent', async () => {
    const { form } = buildForm()
    expect(form.isChanged).toBe(false)
    form.values.name = 'Bath'
    expect(form.isChanged).toBe(true)
    await form.submit()
    expect(form.isChanged).toBe(false)
  })

  it('puts the focus on the first field that is wrong', async () => {
    const page = defineComponent({
      setup() {
        const { form } = buildForm({ initial: () => ({ name: '', rooms: [] }) })
        return () =>
          h('form', { onSubmit: form.submit }, [h('input', { id: 'name', 'aria-invalid': form.errorOf('name') !== '' || undefined })])
      },
    })
    const wrapper = mount(page, { attachTo: document.body })
    await wrapper.find('form').trigger('submit')
    await flushPromises()
    expect(document.activeElement?.id).toBe('name')
  })
})
