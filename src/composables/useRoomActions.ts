import { useQueryClient } from '@tanstack/vue-query'
import { onScopeDispose } from 'vue'
import { housesQuery } from '../api/houses.ts'
import { ProblemError } from '../api/http.ts'
import { orderRooms, removeRoom, restoreRoom, roomsQuery, updateRoom } from '../api/rooms.ts'
import type { HouseSummary } from '../../shared/schemas/house.ts'
import type { RemovedRoom, Room, RoomPatch } from '../../shared/schemas/room.ts'
import { onLiveEvent } from './useLiveEvents.ts'
import { useUndoToast } from './useUndoToast.ts'

/** What can be done to the rooms of a house as a list; the list on the screen follows at once and falls back to what is saved when a write fails. */
export function useRoomActions(houseId: string) {
  const queries = useQueryClient()
  const { offerUndo, sayProblem } = useUndoToast()
  const { queryKey } = roomsQuery(houseId)

  function setRooms(change: (rooms: Room[]) => Room[]): void {
    queries.setQueryData<Room[]>(queryKey, (rooms) => change(rooms ?? []))
  }

  /** The rail counts rooms and the estimate stands on them. */
  function tellOthers(): void {
    void queries.invalidateQueries({ queryKey: ['houses'] })
    void queries.invalidateQueries({ queryKey: ['estimate'] })
  }

  /** Takes a room that was just read or written into the list. */
  function takeIn(room: Room): void {
    setRooms((rooms) => {
      const isKnown = rooms.some(({ id }) => id === room.id)
      const next = isKnown ? rooms.map((known) => (known.id === room.id && known.version <= room.version ? room : known)) : [...rooms, room]
      return next.toSorted((one, other) => one.position - other.position)
    })
  }

  async function save(room: Room, patch: RoomPatch): Promise<Room> {
    const saved = await updateRoom(room, patch)
    takeIn(saved)
    tellOthers()
    return saved
  }

  async function remove(room: Room): Promise<void> {
    setRooms((rooms) => rooms.filter(({ id }) => id !== room.id))
    try {
      const { removedLineIds } = await removeLatest(room)
      offerUndo(removedWords(room.name, removedLineIds.length), () => bringBack(room))
    } catch (error) {
      sayProblem(error)
    }
    tellOthers()
    await queries.invalidateQueries({ queryKey })
  }

  async function bringBack(room: Room): Promise<void> {
    takeIn(await restoreRoom(room))
    tellOthers()
    await queries.invalidateQueries({ queryKey })
  }

  async function reorder(ids: readonly string[]): Promise<void> {
    setRooms((rooms) => ids.flatMap((id) => rooms.find((room) => room.id === id) ?? []).map((room, position) => ({ ...room, position })))
    try {
      await orderRooms(houseId, ids)
    } catch (error) {
      sayProblem(error)
    }
    await queries.invalidateQueries({ queryKey })
  }

  // A room that somebody else writes comes as news of the estimate that stands on it.
  const stopHearing = onLiveEvent(({ type, id }) => {
    const houses = queries.getQueryData<HouseSummary[]>(housesQuery.queryKey)
    const isOfAnotherHouse = houses?.some((house) => house.estimateId === id && house.id !== houseId)
    if (type === 'estimate' && !isOfAnotherHouse) void queries.invalidateQueries({ queryKey })
  })
  onScopeDispose(stopHearing)

  return { save, takeIn, remove, reorder, tellOthers }
}

/** Who removes a room means it as it stands now; a word that somebody changed meanwhile comes back with the undo. */
async function removeLatest(room: Room): Promise<RemovedRoom> {
  try {
    return await removeRoom(room)
  } catch (error) {
    if (!(error instanceof ProblemError) || !error.isStale) throw error
    return removeRoom(error.current as Room)
  }
}

function removedWords(name: string, lineCount: number): string {
  if (lineCount === 0) return `${name} removed. It had no estimate lines.`
  return `${name} and its ${lineCount === 1 ? 'estimate line' : `${lineCount} estimate lines`} removed.`
}
