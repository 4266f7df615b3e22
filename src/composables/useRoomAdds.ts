import { computed, onScopeDispose, ref } from 'vue'
import { newIdempotencyKey, ProblemError } from '../api/http.ts'
import { addRoom } from '../api/rooms.ts'
import { useRoomDraftsStore } from '../stores/roomDrafts.ts'
import type { NewRoom, Room } from '../../shared/schemas/room.ts'
import { useErrorMessage } from './useErrorMessage.ts'

/** A room that was keyed and that the server doesn't have yet. */
export interface WaitingRoom {
  /** Sent with each try, so that a repeat adds no second room. */
  key: string
  room: NewRoom
  /** Why it isn't saved; empty while it is on its way. */
  why: string
  /** The server won't have it as it is; trying again by itself would not help. */
  isRefused: boolean
}

const RETRY_MS = 5_000

/** Adds rooms one after the other, as fast as they are keyed. Without a connection they wait on this device and are sent when it is back. */
export function useRoomAdds(houseId: string, onAdded: (room: Room, key: string) => void) {
  const drafts = useRoomDraftsStore()
  const errorMessage = useErrorMessage()
  const storageKey = `adds-${houseId}`
  const waiting = ref<WaitingRoom[]>(takeUp())
  const next = computed(() => waiting.value.find(({ isRefused }) => !isRefused))
  let isSending = false
  let timer: ReturnType<typeof setTimeout> | undefined

  function takeUp(): WaitingRoom[] {
    const laidBy = drafts.takeUp(storageKey)?.draft
    return Array.isArray(laidBy) ? (laidBy as WaitingRoom[]).map((one) => ({ ...one, isRefused: false })) : []
  }

  function layBy(): void {
    if (waiting.value.length === 0) drafts.drop(storageKey)
    else drafts.layBy(storageKey, { draft: waiting.value, saved: null })
  }

  function add(room: NewRoom): string {
    const key = newIdempotencyKey()
    waiting.value.push({ key, room, why: '', isRefused: false })
    layBy()
    void sendAll()
    return key
  }

  /** In the order in which they were keyed, so that they stand so in the list. */
  async function sendAll(): Promise<void> {
    if (isSending) return
    isSending = true
    clearTimeout(timer)
    try {
      while (next.value && (await sendOne(next.value)));
    } finally {
      isSending = false
    }
  }

  /** Whether to go on with the next. */
  async function sendOne(one: WaitingRoom): Promise<boolean> {
    try {
      const room = await addRoom(houseId, one.room, one.key)
      drop(one.key)
      onAdded(room, one.key)
      return true
    } catch (error) {
      one.why = errorMessage(error)
      const isPassing = error instanceof ProblemError && (error.isUnreachable || error.status === 429 || error.status >= 500)
      one.isRefused = !isPassing
      layBy()
      if (isPassing) timer = setTimeout(() => void sendAll(), RETRY_MS)
      return one.isRefused
    }
  }

  function drop(key: string): void {
    waiting.value = waiting.value.filter((one) => one.key !== key)
    layBy()
  }

  function retry(): void {
    for (const one of waiting.value) one.isRefused = false
    void sendAll()
  }

  const retryWhenBack = () => void sendAll()
  window.addEventListener('online', retryWhenBack)
  onScopeDispose(() => {
    window.removeEventListener('online', retryWhenBack)
    clearTimeout(timer)
  })
  void sendAll()

  return { waiting, add, drop, retry }
}
