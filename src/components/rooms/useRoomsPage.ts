import { computed, onScopeDispose, ref, watch, type Ref } from 'vue'
import { roomMeasures } from '../../../shared/engine/takeoff/roomMeasures.ts'
import type { RoomInput } from '../../../shared/engine/estimateInput.ts'
import type { Room, RoomFields } from '../../../shared/schemas/room.ts'
import { useRoomActions } from '../../composables/useRoomActions.ts'
import { useRoomAdds } from '../../composables/useRoomAdds.ts'
import { useUndoToast } from '../../composables/useUndoToast.ts'
import { useRoomDraftsStore } from '../../stores/roomDrafts.ts'
import { blankDraft } from './blankDraft.ts'
import { copyName } from './copyName.ts'
import { measureText } from './measureText.ts'
import { draftFromRoom, type RoomDraft } from './roomDraft.ts'
import type { RoomEntry } from './roomEntry.ts'
import { roomMark } from './roomMark.ts'
import { useRoomEditors } from './useRoomEditors.ts'

export interface AddedRoom {
  id: string
  /** Made from another room: its name is the next thing to key; of a new one its openings are. */
  isCopy: boolean
}

/** Everything that the rooms page holds: the list, an editor for each room, the room that is being added, and what can be done to them. */
export function useRoomsPage(houseId: string, rooms: Readonly<Ref<Room[] | undefined>>) {
  const drafts = useRoomDraftsStore()
  const actions = useRoomActions(houseId)
  const { say } = useUndoToast()
  const { editors, open, hear, close } = useRoomEditors({
    send: actions.save,
    onSaved: actions.takeIn,
    onGone: (name) => say(`${name} was removed by somebody else. What you keyed there is kept on this device in case it comes back.`),
  })
  const lastAdded = ref<AddedRoom | null>(null)
  const copies = new Set<string>()
  const adds = useRoomAdds(houseId, (room, key) => {
    actions.takeIn(room)
    actions.tellOthers()
    lastAdded.value = { id: room.id, isCopy: copies.delete(key) }
  })

  const newKey = `new-${houseId}`
  const newDraft = ref((drafts.takeUp(newKey)?.draft as RoomDraft | undefined) ?? blankDraft([]))

  const entries = computed<RoomEntry[]>(() =>
    (rooms.value ?? []).map((room) => {
      const editor = editors.get(room.id)
      const input: RoomInput = editor?.input.value ?? { ...room, key: room.id }
      const area = roomMeasures(input).floor_area
      return {
        id: room.id,
        name: input.name,
        use: room.use,
        areaText: area?.ok ? `${measureText(area.value, 'area')} sq ft` : '',
        mark: roomMark(input, editor),
      }
    }),
  )

  function isUntouched(draft: RoomDraft): boolean {
    const texts = [draft.name, draft.lengthText, draft.widthText, ...draft.walk.runs.map(({ lengthText }) => lengthText)]
    return texts.every((text) => text === '')
  }

  function startNew(): void {
    newDraft.value = blankDraft([...(rooms.value ?? []), ...adds.waiting.value.map(({ room }) => room)])
  }

  function add(fields: RoomFields): void {
    adds.add(fields)
    startNew()
  }

  function dropNew(): void {
    startNew()
    drafts.drop(newKey)
  }

  /** Puts a room that was refused back into the form. */
  function takeBack(key: string): boolean {
    const one = adds.waiting.value.find((waiting) => waiting.key === key)
    if (!one) return false
    newDraft.value = draftFromRoom(one.room)
    adds.drop(key)
    return true
  }

  function roomOf(id: string): Room | undefined {
    const room = rooms.value?.find((known) => known.id === id)
    return editors.get(id)?.save.saved.value ?? room
  }

  async function duplicate(id: string): Promise<void> {
    await editors.get(id)?.save.flush()
    const room = roomOf(id)
    if (!room) return
    // What is keyed, though it may be waiting for the connection.
    const { use, shape, ceiling, openings, deductions, note } = editors.get(id)?.save.mine.value ?? room
    const name = copyName(
      room.name,
      entries.value.map((entry) => entry.name),
    )
    copies.add(adds.add({ name, use, shape, ceiling, openings, deductions, note, afterRoomId: id }))
  }

  async function remove(id: string): Promise<void> {
    await close(id)
    const room = rooms.value?.find((known) => known.id === id)
    if (room) await actions.remove(room)
  }

  /** The room to look at when this one has gone. */
  function neighbourOf(id: string): string | null {
    const ids = (rooms.value ?? []).map((room) => room.id)
    const index = ids.indexOf(id)
    return ids[index + 1] ?? ids[index - 1] ?? null
  }

  watch(
    rooms,
    (known, before) => {
      if (!known) return
      hear(known)
      const isFirst = before === undefined
      if (isFirst && isUntouched(newDraft.value)) startNew()
    },
    { immediate: true },
  )
  watch(
    newDraft,
    (draft) => {
      if (isUntouched(draft)) drafts.drop(newKey)
      else drafts.layBy(newKey, { draft, saved: null })
    },
    { deep: true },
  )
  // A page that is closed in the middle of a rest in the typing still sends what was typed.
  const saveAll = () => {
    for (const editor of editors.values()) void editor.save.flush()
  }
  window.addEventListener('pagehide', saveAll)
  onScopeDispose(() => window.removeEventListener('pagehide', saveAll))

  return {
    entries,
    editors,
    waiting: adds.waiting,
    newDraft,
    lastAdded,
    open,
    add,
    dropNew,
    takeBack,
    retryAdds: adds.retry,
    duplicate,
    remove,
    reorder: actions.reorder,
    neighbourOf,
  }
}
