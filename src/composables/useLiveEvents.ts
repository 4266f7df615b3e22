import { useQueryClient } from '@tanstack/vue-query'
import { onBeforeUnmount, onMounted } from 'vue'
import { readCurrentUser } from '../api/accounts.ts'
import { useSessionStore } from '../stores/session.ts'

export interface LiveEvent {
  type: 'house' | 'estimate' | 'price-book' | 'people'
  id: string
  version: number
}

const REOPEN_MS = 5_000
const listeners = new Set<(event: LiveEvent) => void>()
/** Lists in which a thing of this type shows. */
const LISTS: Record<LiveEvent['type'], string[]> = { house: ['houses'], estimate: ['houses'], 'price-book': [], people: [] }

/** Hears each live event as it comes, for a page that keeps its own copy of what it shows; answers with the way to stop. */
export function onLiveEvent(listener: (event: LiveEvent) => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

/**
 * Listens to what others change while the caller is mounted, and has the screens that show it read again.
 * `onSignedOut` is called when the stream ends because the session did.
 */
export function useLiveEvents(onSignedOut: () => void): void {
  const queries = useQueryClient()
  const session = useSessionStore()
  let stream: EventSource | null = null
  let timer: ReturnType<typeof setTimeout> | undefined

  function open(): void {
    if (typeof EventSource === 'undefined') return
    stream = new EventSource('/api/events')
    stream.onmessage = ({ data }: MessageEvent<string>) => follow(readEvent(data))
    stream.onerror = () => void lookWhy()
  }

  function follow(event: LiveEvent | null): void {
    if (!event) return
    for (const listener of listeners) listener(event)
    const isPerThing = event.type === 'house' || event.type === 'estimate'
    void queries.invalidateQueries({ queryKey: isPerThing ? [event.type, event.id] : [event.type] })
    for (const list of LISTS[event.type]) void queries.invalidateQueries({ queryKey: [list] })
  }

  /** A browser reopens a broken stream by itself, but not one that was refused or closed. */
  async function lookWhy(): Promise<void> {
    const isReopening = stream?.readyState === EventSource.CONNECTING
    const user = await readCurrentUser().catch(() => session.user)
    if (user === null && session.isSignedIn) {
      close()
      onSignedOut()
    } else if (!isReopening && stream !== null) {
      close()
      timer = setTimeout(open, REOPEN_MS)
    }
  }

  function close(): void {
    stream?.close()
    stream = null
    clearTimeout(timer)
  }

  onMounted(open)
  onBeforeUnmount(close)
}

function readEvent(data: string): LiveEvent | null {
  try {
    const event = JSON.parse(data) as LiveEvent
    return event.type in LISTS ? event : null
  } catch {
    return null
  }
}
