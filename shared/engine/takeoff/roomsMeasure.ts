import type { RoomInput } from '../estimateInput.ts'
import { ROOM_PLACE } from './roomMeasureList.ts'
import { had, notHad, type MeasureValue } from './measure.ts'
import { whyNoRoomMeasure } from './whyNoRoomMeasure.ts'

/** A room with its row of figures. */
export interface MeasuredRoom {
  room: RoomInput
  values: Float64Array
  row: number
}

/** Uses that no one lives in: left out of the living area. */
const NOT_LIVED_IN: ReadonlySet<string> = new Set(['cellar', 'attic', 'storage'])

export function isLivedIn({ use }: Pick<RoomInput, 'use'>): boolean {
  return !NOT_LIVED_IN.has(use)
}

/** A measure of the house that comes from its rooms. Living area leaves out cellar, attic and storage. A room that lacks the measure is named. */
export function roomsMeasure(name: string, rooms: readonly MeasuredRoom[]): MeasureValue {
  if (rooms.length === 0) return notHad('No rooms are keyed yet.')
  if (name === 'sleeping_rooms') return had(rooms.filter(({ room }) => room.use === 'sleeping').length)
  if (name === 'living_area')
    return sumOf(
      'floor_area',
      rooms.filter(({ room }) => isLivedIn(room)),
    )
  return sumOf(name === 'windows' ? 'windows' : name.slice('sum_'.length), rooms)
}

function sumOf(name: string, rooms: readonly MeasuredRoom[]): MeasureValue {
  const place = ROOM_PLACE[name as keyof typeof ROOM_PLACE]
  let sum = 0
  for (const { room, values, row } of rooms) {
    const value = values[row + place] ?? NaN
    if (Number.isNaN(value)) return notHad(`${room.name}: ${whyNoRoomMeasure(room, name)}`)
    sum += value
  }
  return had(sum)
}
