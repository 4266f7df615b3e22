import { defineStore } from 'pinia'
import { useSessionStore } from './session.ts'

/** What was typed into a room, or into the details of a house, and isn't saved: the form as it stood, and the record that it was made from. */
export interface LaidByDraft {
  draft: unknown
  saved: unknown
}

const KEY_PREFIX = 'quoinbook-rooms'

/** Keeps what was typed and not saved on this device, for each person, so that neither a reload nor a lost connection loses it. */
export const useRoomDraftsStore = defineStore('room-drafts', () => {
  const session = useSessionStore()

  function keyOf(roomId: string): string {
    return `${KEY_PREFIX}/${session.user?.id ?? ''}/${roomId}`
  }

  function layBy(roomId: string, laidBy: LaidByDraft): void {
    // Once the session has ended nothing more is anybody's; what was typed before is kept already.
    if (session.user) write(keyOf(roomId), laidBy)
  }

  function takeUp(roomId: string): LaidByDraft | null {
    const laidBy = read(keyOf(roomId))
    return isLaidBy(laidBy) ? laidBy : null
  }

  function drop(roomId: string): void {
    if (session.user) write(keyOf(roomId), null)
  }

  return { layBy, takeUp, drop }
})

function isLaidBy(value: unknown): value is LaidByDraft {
  return typeof value === 'object' && value !== null && 'draft' in value && 'saved' in value
}

// Where the device keeps nothing for a page (private windows, full storage) the draft lasts as long as the page.
function write(key: string, value: unknown): void {
  try {
    if (value === null) localStorage.removeItem(key)
    else localStorage.setItem(key, JSON.stringify(value))
  } catch {
    return
  }
}

function read(key: string): unknown {
  try {
    return JSON.parse(localStorage.getItem(key) ?? 'null')
  } catch {
    return null
  }
}
