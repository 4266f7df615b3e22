import type { RoomInput } from '../estimateInput.ts'
import { fixedAddress } from './cellAddress.ts'

/** Columns of the table of rooms as they were keyed. */
export const ROOM_COLUMN = {
  number: 1,
  name: 2,
  use: 3,
  shape: 4,
  length: 5,
  width: 6,
  cutLength: 7,
  cutWidth: 8,
  ceiling: 9,
  low: 10,
  high: 11,
  keyed: 12,
  last: 14,
} as const

/** Columns of the table of what each room measures. */
export const MEASURE_COLUMN = {
  number: 1,
  name: 2,
  height: 3,
  plan_area: 4,
  floor_area: 5,
  ceiling_area: 6,
  perimeter: 7,
  wall_area_gross: 8,
  opening_area: 9,
  wall_area: 10,
  base_length: 11,
  volume: 12,
  windows: 13,
  doors: 14,
} as const

/** Columns of the table of openings. */
export const OPENING_COLUMN = {
  room: 1,
  name: 2,
  kind: 3,
  keyed: 4,
  width: 5,
  height: 6,
  count: 7,
  fromWalls: 8,
  fromBase: 9,
  area: 10,
  walls: 11,
  base: 12,
} as const

/** Columns of the table of what covers walls and floors. */
export const DEDUCTION_COLUMN = {
  room: 1,
  name: 2,
  kind: 3,
  keyed: 4,
  width: 5,
  height: 6,
  depth: 7,
  count: 8,
  fromWalls: 9,
  fromFloor: 10,
  fromBase: 11,
  walls: 12,
  floor: 13,
  base: 14,
} as const

const FIRST_HEADING_ROW = 4
/** From the spacer of a table over a blank row to the heading of the next; the head row and the first row follow. */
const TABLE_GAP = 2

interface Table {
  headingRow: number
  firstRow: number
  /** The blank row after the last: sums reach into it, so that a row put in at the end is counted. */
  spacerRow: number
}
type TableName = 'rooms' | 'measures' | 'openings' | 'deductions'

/** Where the tables of the rooms sheet stand, so that their formulas can point at each other. */
export class RoomsLayout implements Record<TableName, Table> {
  readonly rooms: Table
  readonly measures: Table
  readonly openings: Table
  readonly deductions: Table
  readonly houseRow: number

  constructor(rooms: readonly Pick<RoomInput, 'openings' | 'deductions'>[]) {
    const count = (list: 'openings' | 'deductions') => rooms.reduce((sum, room) => sum + room[list].length, 0)
    this.rooms = tableAt(FIRST_HEADING_ROW, rooms.length)
    this.measures = tableAfter(this.rooms, rooms.length)
    this.openings = tableAfter(this.measures, count('openings'))
    this.deductions = tableAfter(this.openings, count('deductions'))
    this.houseRow = this.deductions.spacerRow + TABLE_GAP
  }

  /** A column of a table, spacer and all, as formulas of the sheet write it. */
  range(table: TableName, column: number): string {
    const { firstRow, spacerRow } = this[table]
    return `${fixedAddress(firstRow, column)}:${fixedAddress(spacerRow, column)}`
  }
}

function tableAt(headingRow: number, rowCount: number): Table {
  return { headingRow, firstRow: headingRow + 2, spacerRow: headingRow + 2 + rowCount }
}

function tableAfter({ spacerRow }: Table, rowCount: number): Table {
  return tableAt(spacerRow + TABLE_GAP, rowCount)
}
