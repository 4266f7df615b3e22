import { mount } from '@vue/test-utils'
import { describe, expect, it, vi } from 'vitest'
import { nextTick } from 'vue'
import BaseMenu from '../../src/components/base/BaseMenu.vue'
import type { MenuEntry } from '../../src/components/base/menuEntry.ts'

function mountMenu(entries: MenuEntry[]) {
  const wrapper = mount(BaseMenu, { props: { label: 'More', icon: 'more', entries }, attachTo: document.body })
  return { wrapper, opener: wrapper.get('button') }
}
function focused(): string | undefined {
  return document.activeElement?.textContent?.trim() || document.activeElement?.getAttribute('aria-label') || undefined
}
function press(key: string) {
  document.activeElement?.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }))
  return nextTick()
}
const entry = (label: string, run = () => {}): MenuEntry => ({ label, run })

describe('BaseMenu', () => {
  it('opens on its first entry, and tells that it is open', async () => {
    const { opener } = mountMenu([entry('Export'), entry('Share')])
    expect(opener.attributes('aria-expanded')).toBe('false')
    await opener.trigger('click')
    await nextTick()
    expect(opener.attributes('aria-expanded')).toBe('true')
    expect(focused()).toBe('Export')
  })

  it('is walked with arrows, round its ends, past what can’t be done, and by first letters', async () => {
    const { opener } = mountMenu([
      entry('Export'),
      'line',
      { label: 'Undo', run: () => {}, isDisabled: true },
      entry('Share'),
      entry('Settings'),
    ])
    await opener.trigger('click')
    await nextTick()
    await press('ArrowDown')
    expect(focused()).toBe('Share')
    await press('End')
    expect(focused()).toBe('Settings')
    await press('ArrowDown')
    expect(focused()).toBe('Export')
    await press('ArrowUp')
    expect(focused()).toBe('Settings')
    await press('s')
    expect(focused()).toBe('Share')
    await press('Home')
    expect(focused()).toBe('Export')
  })

  it('does one thing, closes and gives the focus back', async () => {
    const run = vi.fn()
    const { wrapper, opener } = mountMenu([entry('Export', run)])
    await opener.trigger('click')
    await wrapper.get('[role=menuitem]').trigger('click')
    expect(run).toHaveBeenCalledOnce()
    expect(wrapper.find('[role=menu]').exists()).toBe(false)
    expect(focused()).toBe('More')
  })

  it('does nothing that can’t be done', async () => {
    const run = vi.fn()
    const { wrapper, opener } = mountMenu([{ label: 'Undo', run, isDisabled: true }])
    await opener.trigger('click')
    await wrapper.get('[role=menuitem]').trigger('click')
    expect(run).not.toHaveBeenCalled()
    expect(wrapper.find('[role=menu]').exists()).toBe(true)
  })

  it('closes with Escape, and when somebody presses elsewhere', async () => {
    const { wrapper, opener } = mountMenu([entry('Export')])
    await opener.trigger('click')
    await nextTick()
    await press('Escape')
    expect(wrapper.find('[role=menu]').exists()).toBe(false)
    expect(focused()).toBe('More')
    await opener.trigger('click')
    await vi.waitFor(() => {
      document.body.click()
      expect(wrapper.find('[role=menu]').exists()).toBe(false)
    })
  })
})
