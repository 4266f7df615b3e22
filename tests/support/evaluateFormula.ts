import { roomMeasures, type RoomInput } from '../../shared/engine/index.ts'
import { compileFormula } from '../../shared/engine/formula/compileFormula.ts'
import { mathjsParse } from '../../shared/engine/formula/mathjsParse.ts'
import { parseFormula } from '../../shared/engine/formula/parseFormula.ts'
import { HOUSE_MEASURES } from '../../shared/engine/takeoff/houseMeasureList.ts'
import { measureRoom } from '../../shared/engine/takeoff/measureRoom.ts'
import { ROOM_MEASURE_COUNT } from '../../shared/engine/takeoff/roomMeasureList.ts'
import { buildRoomInput } from './buildEngineInput.ts'

/** What a formula gives for a room, whatever it counts; NaN where it has no answer. */
export function evaluateFormula(text: string, room: RoomInput = buildRoomInput()): number {
  const roomValues = new Float64Array(ROOM_MEASURE_COUNT)
  measureRoom(room, roomValues)
  const columns = { roomValues, roomRows: [0], roomsStamp: 0, houseValues: new Float64Array(HOUSE_MEASURES.length).fill(NaN) }
  return compileFormula(parseFormula(text, 'room', mathjsParse), columns)(0)
}

/** The measures of a room that can be had, as the variables of a formula. */
export function roomVariables(room: RoomInput = buildRoomInput()): Record<string, number> {
  return Object.fromEntries(Object.entries(roomMeasures(room)).flatMap(([name, measure]) => (measure.ok ? [[name, measure.value]] : [])))
}
