import { useEventListener } from '@vueuse/core'
import { ref } from 'vue'

/** Whether the page is being printed: for what is drawn on paper alone. */
export function usePrinting() {
  const isPrinting = ref(false)
  useEventListener(window, 'beforeprint', () => (isPrinting.value = true))
  useEventListener(window, 'afterprint', () => (isPrinting.value = false))
  return isPrinting
}
