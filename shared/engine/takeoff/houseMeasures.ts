import type { HouseInput, RoomInput } from '../estimateInput.ts'
import { ROOMS_HOUSE_MEASURES } from './houseMeasureList.ts'
import type { MeasureValue } from './measure.ts'
import { measureRoom } from './measureRoom.ts'
import { ownHouseMeasures } from './ownHouseMeasures.ts'
import { ROOM_MEASURE_COUNT } from './roomMeasureList.ts'
import { roomsMeasure } from './roomsMeasure.ts'

/** All measures of a house and of its rooms together, by name, in feet, square feet and cubic feet; what can't be had says why. */
export function houseMeasures(house: HouseInput, rooms: readonly RoomInput[]): Record<string, MeasureValue> {
  const values = new Float64Array(rooms.length * ROOM_MEASURE_COUNT)
  const measured = rooms.map((room, index) => ({ room, row: index * ROOM_MEASURE_COUNT }))
  for (const { room, row } of measured) measureRoom(room, values, row)
  const overRooms = ROOMS_HOUSE_MEASURES.map(({ name }) => [name, roomsMeasure(name, measured, values)] as const)
  return { ...ownHouseMeasures(house), ...Object.fromEntries(overRooms) }
}
