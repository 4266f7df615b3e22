import { ref } from 'vue'

const SLOW_MS = 300

/** Whether a page has been asked for that is a while in coming. */
export const isOnTheWay = ref(false)
let timer: ReturnType<typeof setTimeout> | undefined

export function startOnTheWay(): void {
  clearTimeout(timer)
  timer = setTimeout(() => (isOnTheWay.value = true), SLOW_MS)
}

export function arrive(): void {
  clearTimeout(timer)
  isOnTheWay.value = false
}
