import type { HouseInput, RoomInput } from '../estimateInput.ts'
import { ROOMS_HOUSE_MEASURES } from './houseMeasureList.ts'
import type { MeasureValue } from './measure.ts'
import { measureRoom } from './measureRoom.ts'
import { ownHouseMeasures } from './ownHouseMeasures.ts'
import { ROOM_MEASURE_COUNT } from './roomMeasureList.ts'
import { roomsMeasure, type MeasuredRoom } from './roomsMeasure.ts'

/** All measures of a house and of its rooms together, by name, in feet, square feet and cubic feet; what can't be had says why. */
export function houseMeasures(house: HouseInput, rooms: readonly RoomInput[]): Record<string, MeasureValue> {
  const measured = rooms.map((room): MeasuredRoom => {
    const values = new Float64Array(ROOM_MEASURE_COUNT)
    measureRoom(room, values)
    return { room, values, row: 0 }
  })
  const overRooms = ROOMS_HOUSE_MEASURES.map(({ name }) => [name, roomsMeasure(name, measured)] as const)
  return { ...ownHouseMeasures(house), ...Object.fromEntries(overRooms) }
}
