import { onScopeDispose, shallowReactive } from 'vue'
import type { Room, RoomPatch } from '../../../shared/schemas/room.ts'
import { useRoomDraftsStore } from '../../stores/roomDrafts.ts'
import type { RoomDraft } from './roomDraft.ts'
import { roomEditor, type RoomEditor } from './roomEditor.ts'

interface RoomEditorsOptions {
  send(room: Room, patch: RoomPatch): Promise<Room>
  onSaved(room: Room): void
  /** Somebody else has removed a room that was open here. */
  onGone(name: string): void
}

/** An editor for each room that has been opened, or that holds something unsaved from the last time; all are saved when the page is left. */
export function useRoomEditors({ send, onSaved, onGone }: RoomEditorsOptions) {
  const drafts = useRoomDraftsStore()
  const editors = shallowReactive(new Map<string, RoomEditor>())

  function open(room: Room): RoomEditor {
    const known = editors.get(room.id)
    if (known) return known
    const takenUp = drafts.takeUp(room.id) as { draft: RoomDraft; saved: Room } | null
    const editor = roomEditor(room, {
      send,
      onSaved,
      layBy: (laidBy) => (laidBy ? drafts.layBy(room.id, laidBy) : drafts.drop(room.id)),
      takenUp,
    })
    editors.set(room.id, editor)
    return editor
  }

  /** Rooms as the server has them now: what somebody else changed goes into the open forms. */
  function hear(rooms: readonly Room[]): void {
    for (const room of rooms) {
      const editor = editors.get(room.id)
      if (editor) editor.save.hear(room)
      else if (drafts.takeUp(room.id)) open(room)
    }
    for (const [roomId, editor] of editors) {
      const isGone = rooms.every(({ id }) => id !== roomId)
      if (!isGone) continue
      onGone(editor.save.saved.value.name)
      void close(roomId)
    }
  }

  /** Saves what is left of a room and closes it. */
  async function close(roomId: string): Promise<void> {
    const editor = editors.get(roomId)
    editors.delete(roomId)
    await editor?.stop()
  }

  onScopeDispose(() => {
    for (const editor of editors.values()) void editor.stop()
  })

  return { editors, open, hear, close }
}
