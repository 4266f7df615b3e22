import type { Dimension } from '../../catalogue/units.ts'
import type { Measure } from './measure.ts'
import { ROOM_MEASURES } from './roomMeasureList.ts'

/** What comes from the house's own fields. */
const FROM_HOUSE = [
  ['footprint_area', 'area', 'Footprint'],
  ['outside_perimeter', 'length', 'Outside perimeter'],
  ['roof_area', 'area', 'Roof on the slope'],
  ['roof_squares', 'area', 'Roof in squares'],
  ['ridge_length', 'length', 'Ridge'],
  ['eave_length', 'length', 'Eaves'],
  ['gable_area', 'area', 'Gables'],
  ['outside_wall_area', 'area', 'Outside walls with gables'],
  ['attic_area', 'area', 'Attic'],
  ['crawl_area', 'area', 'Crawl space'],
  ['fixtures', 'count', 'Plumbing fixtures'],
  ['drainage_fixture_units', 'count', 'Drainage fixture units'],
] as const satisfies readonly (readonly [string, Dimension, string])[]

/** What comes from its rooms. */
const FROM_ROOMS = [
  ['living_area', 'area', 'Living area'],
  ['windows', 'count', 'Windows'],
  ['sleeping_rooms', 'count', 'Sleeping rooms'],
] as const satisfies readonly (readonly [string, Dimension, string])[]

export type OwnHouseMeasureName = (typeof FROM_HOUSE)[number][0]

const SQUARE_SQ_FT = 100

export const OWN_HOUSE_MEASURES: readonly Measure[] = FROM_HOUSE.map(([name, dimension, title]) => ({
  name,
  scope: 'house',
  dimension,
  size: name === 'roof_squares' ? SQUARE_SQ_FT : 1,
  title,
}))

/** A sum over the rooms for each measure that a room has: `sum_floor_area` … */
const SUMS: readonly Measure[] = ROOM_MEASURES.map(({ name, dimension, title }) => ({
  name: `sum_${name}`,
  scope: 'house',
  dimension,
  size: 1,
  title: `${title}, all rooms`,
}))

export const ROOMS_HOUSE_MEASURES: readonly Measure[] = [
  ...FROM_ROOMS.map(([name, dimension, title]): Measure => ({ name, scope: 'house', dimension, size: 1, title })),
  ...SUMS,
]

export const HOUSE_MEASURES: readonly Measure[] = [...OWN_HOUSE_MEASURES, ...ROOMS_HOUSE_MEASURES]
