import PrimeVue from 'primevue/config'
import type { App } from 'vue'
import { primeTheme } from './primeTheme.ts'

/** Makes PrimeVue's components usable. Loaded with the first page behind the sign-in, which stays light without it. */
export function installPrimeVue(app: App): void {
  app.use(PrimeVue, { theme: { preset: primeTheme, options: { darkModeSelector: 'none' } } })
}
