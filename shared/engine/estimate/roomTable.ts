import type { RoomInput } from '../estimateInput.ts'
import type { FormulaColumns } from '../formula/formulaColumns.ts'
import { measureRoom } from '../takeoff/measureRoom.ts'
import { ROOM_MEASURE_COUNT } from '../takeoff/roomMeasureList.ts'
import type { MeasuredRoom } from '../takeoff/roomsMeasure.ts'

/** Row of a place without a room. */
export const NO_ROW = -1

/** A room's place in the table, and the lines that are for it. A line may name a room that isn't there: its place waits. */
export interface RoomPlace {
  measured: MeasuredRoom | null
  /** Slots of its lines. */
  readonly slots: Set<number>
}

/** The rooms with their measured figures, one row each in the columns that formulas read. */
export class RoomTable {
  readonly rooms: MeasuredRoom[] = []
  private readonly places = new Map<string, RoomPlace>()
  private readonly freeRows: number[] = []

  constructor(private readonly columns: FormulaColumns) {}

  /** The place of a room's key, whether the room is there or not. */
  placeOf(key: string): RoomPlace {
    const known = this.places.get(key)
    if (known) return known
    const place: RoomPlace = { measured: null, slots: new Set() }
    this.places.set(key, place)
    return place
  }

  /** Measures a room and puts it in its place, over the one that was there. */
  put(room: RoomInput): RoomPlace {
    const place = this.placeOf(room.key)
    if (place.measured) place.measured.room = room
    else place.measured = this.add(room)
    measureRoom(room, this.columns.roomValues, place.measured.row)
    this.columns.roomsStamp += 1
    return place
  }

  /** Takes a room away; its lines stay, without a room. */
  remove(key: string): RoomPlace {
    const place = this.placeOf(key)
    if (place.measured === null) throw new RangeError(`There is no room ${key} in this estimate.`)
    const index = this.rooms.indexOf(place.measured)
    this.rooms.splice(index, 1)
    this.columns.roomRows.splice(index, 1)
    this.freeRows.push(place.measured.row)
    place.measured = null
    this.columns.roomsStamp += 1
    return place
  }

  has(key: string): boolean {
    return this.places.get(key)?.measured != null
  }

  roomAt(row: number): RoomInput {
    const measured = this.rooms.find((one) => one.row === row)
    if (measured === undefined) throw new RangeError(`There is no room in row ${row}.`)
    return measured.room
  }

  private add(room: RoomInput): MeasuredRoom {
    const measured = { room, row: this.freeRows.pop() ?? this.rooms.length * ROOM_MEASURE_COUNT }
    this.rooms.push(measured)
    this.columns.roomRows.push(measured.row)
    const needed = measured.row + ROOM_MEASURE_COUNT
    if (needed > this.columns.roomValues.length) {
      const values = new Float64Array(needed * 2)
      values.set(this.columns.roomValues)
      this.columns.roomValues = values
    }
    return measured
  }
}
