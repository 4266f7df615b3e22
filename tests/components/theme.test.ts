import { mount } from '@vue/test-utils'
import { beforeEach, describe, expect, it } from 'vitest'
import ThemeSwitch from '../../src/components/layout/ThemeSwitch.vue'

beforeEach(() => localStorage.clear())

describe('ThemeSwitch', () => {
  it('shows the chosen theme at once, remembers it, and can follow the device again', async () => {
    const wrapper = mount(ThemeSwitch)
    await wrapper.get('input[value=dark]').setValue()
    expect(document.documentElement.dataset.theme).toBe('dark')
    expect(localStorage.getItem('quoinbook-theme')).toBe('dark')
    await wrapper.get('input[value=system]').setValue()
    expect(document.documentElement.dataset.theme).toBeUndefined()
  })
})
