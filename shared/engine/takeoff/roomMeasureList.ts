import type { Dimension } from '../../catalogue/units.ts'
import type { Measure } from './measure.ts'

/** What every room measures. The order is that of a room's row in the engine's columns. */
const LIST = [
  ['floor_area', 'area', 'Floor area'],
  ['ceiling_area', 'area', 'Ceiling area'],
  ['perimeter', 'length', 'Perimeter'],
  ['wall_area_gross', 'area', 'Walls with openings'],
  ['opening_area', 'area', 'Doors, windows and openings'],
  ['wall_area', 'area', 'Walls less openings and built-ins'],
  ['base_length', 'length', 'Baseboard'],
  ['volume', 'volume', 'Volume'],
  ['windows', 'count', 'Windows'],
  ['doors', 'count', 'Doors'],
  ['length', 'length', 'Length'],
  ['width', 'length', 'Width'],
  ['height', 'length', 'Ceiling height'],
] as const satisfies readonly (readonly [string, Dimension, string])[]

export type RoomMeasureName = (typeof LIST)[number][0]

export const ROOM_MEASURES: readonly Measure[] = LIST.map(([name, dimension, title]) => ({
  name,
  scope: 'room',
  dimension,
  size: 1,
  title,
}))
export const ROOM_MEASURE_COUNT = LIST.length

/** Place of each measure in a room's row. */
export const ROOM_PLACE = Object.fromEntries(LIST.map(([name], place) => [name, place])) as Record<RoomMeasureName, number>
