import { readonly, ref } from 'vue'

export const THEMES = ['system', 'light', 'dark'] as const
export type Theme = (typeof THEMES)[number]

const STORAGE_KEY = 'quoinbook-theme'
const theme = ref<Theme>(rememberedTheme())
showTheme(theme.value)

/** The chosen theme, remembered on this device; `system` follows the device. */
export function useTheme() {
  function chooseTheme(chosen: Theme): void {
    theme.value = chosen
    showTheme(chosen)
    rememberTheme(chosen)
  }
  return { theme: readonly(theme), chooseTheme }
}

function showTheme(chosen: Theme): void {
  const root = document.documentElement
  if (chosen === 'system') delete root.dataset.theme
  else root.dataset.theme = chosen
}

function rememberedTheme(): Theme {
  try {
    const remembered = localStorage.getItem(STORAGE_KEY)
    return THEMES.find((known) => known === remembered) ?? 'system'
  } catch {
    // Storage is switched off on this device: the theme then lasts as long as the page.
    return 'system'
  }
}

function rememberTheme(chosen: Theme): void {
  try {
    localStorage.setItem(STORAGE_KEY, chosen)
  } catch {
    return
  }
}
