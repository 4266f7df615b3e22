import PrimeVue from 'primevue/config'
import type { App } from 'vue'
import { primeTheme } from './primeTheme.ts'

/** Makes PrimeVue's components usable in the app; more than once does no harm. */
export function installPrimeVue(app: App): void {
  const isInstalled = '$primevue' in app.config.globalProperties
  if (!isInstalled) app.use(PrimeVue, { theme: { preset: primeTheme, options: { darkModeSelector: 'none' } } })
}
