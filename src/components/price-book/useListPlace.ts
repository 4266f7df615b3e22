import { nextTick, watch } from 'vue'

/**
 * Keeps one's place in a long list while one of its things is open in its stead: back in the list, it is scrolled to where it was and the focus is on
 * what had been opened. `openKey` is `null` while the list shows.
 */
export function useListPlace(openKey: () => string | null): void {
  let scrolledTo = 0

  watch(openKey, async (key, before) => {
    if (key !== null && before === null) {
      scrolledTo = window.scrollY
      await nextTick()
      window.scrollTo(0, 0)
    }
    if (key === null && before !== null) {
      await nextTick()
      window.scrollTo(0, scrolledTo)
      const opened = [...document.querySelectorAll<HTMLElement>('[data-key]')].find(({ dataset }) => dataset.key === before)
      opened?.focus({ preventScroll: true })
    }
  })
}
