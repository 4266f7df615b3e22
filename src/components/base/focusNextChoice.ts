import { nextTick } from 'vue'

/** A choice has gone with its buttons: the keyboard goes to the next one among the same notices, or to the page when it was the last. */
export async function focusNextChoice({ currentTarget }: Event): Promise<void> {
  const notices = currentTarget instanceof Element ? currentTarget.closest('.notices') : null
  await nextTick()
  const next = notices?.isConnected ? notices.querySelector<HTMLElement>('button') : null
  ;(next ?? document.getElementById('main'))?.focus({ preventScroll: true })
}
