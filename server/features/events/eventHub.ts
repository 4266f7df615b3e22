import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { SessionEnd } from '../accounts/sessionService.ts'

/** Something changed: screens that show it read it again. */
export interface AppEvent {
  type: 'house' | 'estimate' | 'price-book' | 'people'
  id: string
  version: number
  /** The house that it belongs to; decides which owners may hear of it. */
  houseId?: string
}

export interface EventReader {
  sessionIdHash: string
  user: CurrentUser
  send(event: AppEvent): void
  close(): void
}

export type MayHear = (user: CurrentUser, event: AppEvent) => boolean
export type EventHub = ReturnType<typeof createEventHub>

/** Open event streams of this process, and what is told to them. */
export function createEventHub() {
  const readers = new Set<EventReader>()
  let mayHear: MayHear = () => false

  function closeWhere(isMeant: (reader: EventReader) => boolean): void {
    for (const reader of [...readers]) {
      if (!isMeant(reader)) continue
      readers.delete(reader)
      reader.close()
    }
  }

  return {
    /** Tells every reader who may know of it. Call it after the write's transaction. */
    publish(event: AppEvent): void {
      for (const reader of readers) if (mayHear(reader.user, event)) reader.send(event)
    },

    /** Who may hear what; set once when the app is put together, because the houses know it and they publish too. */
    filterBy(predicate: MayHear): void {
      mayHear = predicate
    },

    /** Adds a reader; call the answer when it leaves. */
    join(reader: EventReader): () => void {
      readers.add(reader)
      return () => readers.delete(reader)
    },

    countOf(userId: string): number {
      return [...readers].filter((reader) => reader.user.id === userId).length
    },

    count(): number {
      return readers.size
    },

    /** A session ended: its stream ends with it. */
    endSession({ userId, idHash, exceptIdHash }: SessionEnd): void {
      closeWhere(
        ({ user, sessionIdHash }) => user.id === userId && (idHash === null ? sessionIdHash !== exceptIdHash : sessionIdHash === idHash),
      )
    },

    closeAll(): void {
      closeWhere(() => true)
    },
  }
}
