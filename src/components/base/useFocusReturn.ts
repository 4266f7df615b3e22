import { nextTick, onUnmounted, watch, type Ref } from 'vue'

/**
 * Gives the keyboard back to where it was before something opened over the page, when that closes or goes away. Where it came from
 * may be gone with what was done; then the page takes it. Whoever has taken the focus meanwhile keeps it.
 * Answers with what is to be called once the thing is out of sight.
 */
export function useFocusReturn(isOpen: Readonly<Ref<boolean>>): () => void {
  let opener: HTMLElement | null = null

  watch(
    isOpen,
    (opens) => {
      if (opens) opener = document.activeElement instanceof HTMLElement ? document.activeElement : null
    },
    { immediate: true, flush: 'sync' },
  )

  function giveBack(): void {
    const from = opener
    opener = null
    if (from === null || !isFocusFree()) return
    if (from.isConnected && from !== document.body) from.focus()
    // Others may know a better place than the top of the page: they go first.
    else void nextTick(() => isFocusFree() && document.getElementById('main')?.focus({ preventScroll: true }))
  }

  onUnmounted(giveBack)
  // What has just gone out of sight still holds the focus until it is taken off the page.
  return () => void nextTick(giveBack)
}

function isFocusFree(): boolean {
  return document.activeElement === null || document.activeElement === document.body
}
