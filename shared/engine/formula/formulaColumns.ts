import { HOUSE_MEASURES } from '../takeoff/houseMeasureList.ts'
import type { Measure } from '../takeoff/measure.ts'
import { ROOM_PLACE } from '../takeoff/roomMeasureList.ts'

/** The figures that compiled formulas read. NaN stands for a measure that can't be had. */
export interface FormulaColumns {
  /** One row of figures a room, one after the other. Replaced as a whole when rooms need more of it. */
  roomValues: Float64Array
  /** Where the row of each room begins. */
  roomRows: number[]
  /** Goes up with every change of a room: what was summed over rooms before is stale. */
  roomsStamp: number
  houseValues: Float64Array
}

/** Place of each measure in the house's column. */
export const HOUSE_PLACE: Readonly<Record<string, number>> = Object.fromEntries(HOUSE_MEASURES.map(({ name }, place) => [name, place]))

/** Reads a measure for the room whose row is given; a measure of the house is the same for each. */
export function measureReader({ scope, name }: Measure, columns: FormulaColumns): (row: number) => number {
  if (scope === 'house') {
    const { houseValues } = columns
    const place = HOUSE_PLACE[name] ?? -1
    return () => houseValues[place] as number
  }
  const place = ROOM_PLACE[name as keyof typeof ROOM_PLACE]
  return (row) => columns.roomValues[row + place] as number
}
