import type { Queryable } from '../../db/client.ts'
import { positionAt, positionAtEnd, positionBelowIndex, positionBetween } from '../../db/positions.ts'
import { invalid } from '../../errors/AppError.ts'
import { findLastRoomPosition, findNextRoomPosition, findRoom, findRooms, updateRoomPosition } from './roomRepository.ts'

/** The position for a new room below another, or at the end (`null`). Where no gap is left the rooms are spread anew. */
export function placeRoom(tx: Queryable, houseId: string, afterRoomId: string | null): number {
  if (afterRoomId === null) return positionAtEnd(findLastRoomPosition(tx, houseId))
  const above = findRoom(tx, houseId, afterRoomId)
  if (!above) throw invalid([{ path: 'afterRoomId', code: 'unknown-room', message: 'is not a room of this house' }])
  const position = positionBetween(above.position, findNextRoomPosition(tx, houseId, above.position))
  if (position !== null) return position
  const ids = findRooms(tx, houseId).map(({ id }) => id)
  ids.forEach((id, index) => updateRoomPosition(tx, id, positionAt(index)))
  return positionBelowIndex(ids.indexOf(afterRoomId))
}
