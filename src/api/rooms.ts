import { queryOptions } from '@tanstack/vue-query'
import type { NewRoom, RemovedRoom, Room, RoomPatch } from '../../shared/schemas/room.ts'
import { http } from './http.ts'

export function roomsQuery(houseId: string) {
  return queryOptions({
    queryKey: ['house', houseId, 'rooms'],
    queryFn: ({ signal }) => http.get<Room[]>(`/houses/${houseId}/rooms`, { signal }),
  })
}

/** The same key on a repeat adds no second room. */
export function addRoom(houseId: string, room: NewRoom, idempotencyKey: string): Promise<Room> {
  return http.post<Room>(`/houses/${houseId}/rooms`, room, { idempotencyKey })
}

/** Throws a stale `ProblemError` whose `current` is the room as somebody else left it. */
export function updateRoom(room: Pick<Room, 'id' | 'houseId' | 'version'>, patch: RoomPatch): Promise<Room> {
  return http.patch<Room>(`/houses/${room.houseId}/rooms/${room.id}`, patch, { ifMatch: room.version })
}

/** Removes the room and its lines of the estimate, and says which lines they were. */
export function removeRoom(room: Pick<Room, 'id' | 'houseId' | 'version'>): Promise<RemovedRoom> {
  return http.delete<RemovedRoom>(`/houses/${room.houseId}/rooms/${room.id}`, { ifMatch: room.version })
}

/** Brings the room back, and the lines that went with it. */
export function restoreRoom({ houseId, id }: Pick<Room, 'id' | 'houseId'>): Promise<Room> {
  return http.post<Room>(`/houses/${houseId}/rooms/${id}/restore`)
}

export function orderRooms(houseId: string, ids: readonly string[]): Promise<Room[]> {
  return http.put<Room[]>(`/houses/${houseId}/rooms/order`, { ids })
}
