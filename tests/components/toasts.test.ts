import { flushPromises, mount } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { ProblemError } from '../../src/api/ProblemError.ts'
import ToastHost from '../../src/components/base/ToastHost.vue'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'

const { offerUndo, say, sayProblem, toasts, dismiss } = useUndoToast()

beforeEach(() => vi.useFakeTimers())
afterEach(() => {
  for (const { id } of toasts.value) dismiss(id)
  vi.useRealTimers()
})

function mountHost() {
  return mount(ToastHost, { attachTo: document.body })
}

describe('ToastHost', () => {
  it('reads news out and lets them go after a while', async () => {
    const wrapper = mountHost()
    say('Saved')
    await flushPromises()
    expect(wrapper.get('[aria-live=polite]').text()).toContain('Saved')
    await vi.advanceTimersByTimeAsync(6_000)
    expect(wrapper.text()).toBe('')
  })

  it('gives back what was removed', async () => {
    const wrapper = mountHost()
    const undo = vi.fn(async () => {})
    offerUndo('Bedroom 2 removed', undo)
    await flushPromises()
    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Undo')!
      .trigger('click')
    expect(undo).toHaveBeenCalledOnce()
    expect(wrapper.text()).toBe('')
  })

  it('says why something could not be given back, and stays until it is dismissed', async () => {
    const wrapper = mountHost()
    offerUndo('Bedroom 2 removed', async () => {
      throw new ProblemError({ status: 409, code: 'conflict', detail: 'Its house is gone.' })
    })
    await flushPromises()
    await wrapper.get('button').trigger('click')
    await flushPromises()
    await vi.advanceTimersByTimeAsync(60_000)
    expect(wrapper.text()).toContain('Its house is gone.')
    await wrapper.get('button[aria-label=Dismiss]').trigger('click')
    expect(wrapper.text()).toBe('')
  })

  it('waits while somebody is on it', async () => {
    const wrapper = mountHost()
    offerUndo('Bedroom 2 removed', async () => {})
    await flushPromises()
    await wrapper.get('.toast').trigger('focusin')
    await vi.advanceTimersByTimeAsync(60_000)
    expect(wrapper.text()).toContain('Bedroom 2 removed')
    await wrapper.get('.toast').trigger('focusout')
    await vi.advanceTimersByTimeAsync(20_000)
    expect(wrapper.text()).toBe('')
  })

  it('shows the last three at most', async () => {
    const wrapper = mountHost()
    for (const text of ['one', 'two', 'three', 'four']) sayProblem(new ProblemError({ status: 500, code: 'x', detail: text }))
    await flushPromises()
    expect(wrapper.findAll('.toast').map((toast) => toast.get('.text').text())).toEqual(['two', 'three', 'four'])
  })
})
