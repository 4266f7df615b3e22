import type { RoomInput } from '../estimateInput.ts'
import { had, notHad, type MeasureValue } from './measure.ts'
import { ROOM_PLACE, type RoomMeasureName } from './roomMeasureList.ts'
import { whyNoRoomMeasure } from './whyNoRoomMeasure.ts'

/** A room and where its row begins in the column of figures. */
export interface MeasuredRoom {
  room: RoomInput
  row: number
}

/** Uses that no one lives in: left out of the living area. */
const NOT_LIVED_IN: ReadonlySet<string> = new Set(['cellar', 'attic', 'storage'])

/** Whether a room counts in the living area. */
export function isLivedIn({ use }: Pick<RoomInput, 'use'>): boolean {
  return !NOT_LIVED_IN.has(use)
}

/** A measure of the house that comes from its rooms. Living area is the floors of all but cellar, attic and storage. A room that lacks the measure is named. */
export function roomsMeasure(name: string, rooms: readonly MeasuredRoom[], values: Float64Array): MeasureValue {
  if (rooms.length === 0) return notHad('No rooms are keyed yet.')
  if (name === 'sleeping_rooms') return had(rooms.filter(({ room }) => room.use === 'sleeping').length)
  if (name === 'living_area') {
    const livedIn = rooms.filter(({ room }) => isLivedIn(room))
    return sumOf('floor_area', livedIn, values)
  }
  return sumOf((name === 'windows' ? name : name.slice('sum_'.length)) as RoomMeasureName, rooms, values)
}

function sumOf(name: RoomMeasureName, rooms: readonly MeasuredRoom[], values: Float64Array): MeasureValue {
  const place = ROOM_PLACE[name]
  let sum = 0
  for (const { room, row } of rooms) {
    const value = values[row + place] as number
    if (Number.isNaN(value)) return notHad(`${room.name}: ${whyNoRoomMeasure(room, name)}`)
    sum += value
  }
  return had(sum)
}
