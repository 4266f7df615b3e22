import { onScopeDispose, ref } from 'vue'

const SHOWN_MS = 6_000

/** One line of news that stands for a while where the page keeps a place for it. */
export function useNotice() {
  const text = ref('')
  let timer: ReturnType<typeof setTimeout> | undefined

  function say(news: string): void {
    text.value = news
    clearTimeout(timer)
    timer = setTimeout(() => (text.value = ''), SHOWN_MS)
  }

  onScopeDispose(() => clearTimeout(timer))
  return { text, say }
}
