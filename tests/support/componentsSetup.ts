import { config, enableAutoUnmount } from '@vue/test-utils'
import PrimeVue from 'primevue/config'
import { afterEach, beforeEach, vi, type MockInstance } from 'vitest'
import { loadOverlay } from '../../src/components/base/usePrimeOverlay.ts'

config.global.plugins.push([PrimeVue, { unstyled: true }])

// A dialog opens at once in the tests, as it does in the app when it has been opened before.
await Promise.all([loadOverlay('dialog', undefined), loadOverlay('drawer', undefined)])

// jsdom has no layout, so it has none of these; overlays ask for them.
window.matchMedia ??= (query: string) =>
  ({
    matches: false,
    media: query,
    addEventListener() {},
    removeEventListener() {},
    addListener() {},
    removeListener() {},
  }) as unknown as MediaQueryList
window.ResizeObserver ??= class {
  observe() {}
  unobserve() {}
  disconnect() {}
}

// A warning of Vue's or an error in the console is a defect that the assertions didn't look for.
let consoleSpies: MockInstance[] = []
beforeEach(() => {
  consoleSpies = [vi.spyOn(console, 'error'), vi.spyOn(console, 'warn')].map((spy) =>
    spy.mockImplementation((...words: unknown[]) => {
      throw new Error(`Unexpected in the console: ${words.map(String).join(' ')}`)
    }),
  )
})
afterEach(() => {
  for (const spy of consoleSpies) spy.mockRestore()
  document.body.innerHTML = ''
})

// Last, because what is set up last is taken down first: a component goes before the document that it stands in.
enableAutoUnmount(afterEach)
