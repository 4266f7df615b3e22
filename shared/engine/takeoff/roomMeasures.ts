import type { RoomInput } from '../estimateInput.ts'
import { had, notHad, type MeasureValue } from './measure.ts'
import { measureRoom } from './measureRoom.ts'
import { ROOM_MEASURE_COUNT, ROOM_MEASURES } from './roomMeasureList.ts'
import { whyNoRoomMeasure } from './whyNoRoomMeasure.ts'

/** All measures of a room by name, in feet, square feet and cubic feet; what can't be had says why. */
export function roomMeasures(room: RoomInput): Record<string, MeasureValue> {
  const values = new Float64Array(ROOM_MEASURE_COUNT)
  measureRoom(room, values)
  const entries = ROOM_MEASURES.map(({ name }, place): [string, MeasureValue] => {
    const value = values[place] ?? NaN
    return [name, Number.isNaN(value) ? notHad(whyNoRoomMeasure(room, name)) : had(value)]
  })
  return Object.fromEntries(entries)
}
