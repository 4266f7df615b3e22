/** What a unit counts, so that a formula of another kind is refused. */
export type Dimension = 'length' | 'area' | 'volume' | 'count'

export interface Unit {
  key: string
  name: string
  plural: string
  dimension: Dimension
  /** How many of the dimension's base unit (lf, sf, cf) one holds; 1 for counts. */
  size: number
  /** Other ways that people write it. */
  aliases: readonly string[]
}

const FOOT_SPELLINGS = ['lin ft', 'ft', 'lft', 'foot', 'feet', 'linear foot', 'linear feet'] as const
const EACH_SPELLINGS = ['ea', 'no', 'pc', 'pcs', 'piece', 'pieces', 'unit', 'units', 'item', 'items'] as const

export const UNITS = [
  { key: 'sf', name: 'square foot', plural: 'square feet', dimension: 'area', size: 1, aliases: ['sq ft', 'sqft', 'ft2', 'ft²'] },
  { key: 'lf', name: 'lineal foot', plural: 'lineal feet', dimension: 'length', size: 1, aliases: FOOT_SPELLINGS },
  { key: 'square', name: 'square', plural: 'squares', dimension: 'area', size: 100, aliases: ['sq', 'roofing square', 'roofing squares'] },
  { key: 'sy', name: 'square yard', plural: 'square yards', dimension: 'area', size: 9, aliases: ['sq yd', 'yd2', 'yd²'] },
  { key: 'cf', name: 'cubic foot', plural: 'cubic feet', dimension: 'volume', size: 1, aliases: ['cu ft', 'ft3', 'ft³'] },
  { key: 'cy', name: 'cubic yard', plural: 'cubic yards', dimension: 'volume', size: 27, aliases: ['cu yd', 'yd3', 'yd³'] },
  { key: 'each', name: 'each', plural: 'each', dimension: 'count', size: 1, aliases: EACH_SPELLINGS },
  { key: 'pair', name: 'pair', plural: 'pairs', dimension: 'count', size: 1, aliases: ['pr'] },
  { key: 'set', name: 'set', plural: 'sets', dimension: 'count', size: 1, aliases: ['kit', 'kits'] },
  { key: 'sheet', name: 'sheet', plural: 'sheets', dimension: 'count', size: 1, aliases: ['panel', 'panels'] },
  { key: 'stick', name: 'stick', plural: 'sticks', dimension: 'count', size: 1, aliases: [] },
  { key: 'bf', name: 'board foot', plural: 'board feet', dimension: 'count', size: 1, aliases: ['bd ft', 'fbm'] },
  { key: 'bundle', name: 'bundle', plural: 'bundles', dimension: 'count', size: 1, aliases: ['bdl'] },
  { key: 'roll', name: 'roll', plural: 'rolls', dimension: 'count', size: 1, aliases: [] },
  { key: 'box', name: 'box', plural: 'boxes', dimension: 'count', size: 1, aliases: ['bx', 'carton', 'cartons', 'case', 'cases'] },
  { key: 'bag', name: 'bag', plural: 'bags', dimension: 'count', size: 1, aliases: ['sack', 'sacks'] },
  { key: 'tube', name: 'tube', plural: 'tubes', dimension: 'count', size: 1, aliases: ['cartridge', 'cartridges'] },
  { key: 'gal', name: 'gallon', plural: 'gallons', dimension: 'count', size: 1, aliases: ['gals'] },
  { key: 'qt', name: 'quart', plural: 'quarts', dimension: 'count', size: 1, aliases: ['qts'] },
  { key: 'lb', name: 'pound', plural: 'pounds', dimension: 'count', size: 1, aliases: ['lbs'] },
  { key: 'ton', name: 'ton', plural: 'tons', dimension: 'count', size: 1, aliases: ['tn'] },
  { key: 'load', name: 'load', plural: 'loads', dimension: 'count', size: 1, aliases: [] },
  { key: 'fixture', name: 'fixture', plural: 'fixtures', dimension: 'count', size: 1, aliases: [] },
  { key: 'opening', name: 'opening', plural: 'openings', dimension: 'count', size: 1, aliases: [] },
  { key: 'circuit', name: 'circuit', plural: 'circuits', dimension: 'count', size: 1, aliases: [] },
  { key: 'room', name: 'room', plural: 'rooms', dimension: 'count', size: 1, aliases: [] },
  { key: 'visit', name: 'visit', plural: 'visits', dimension: 'count', size: 1, aliases: ['trip', 'trips'] },
  { key: 'hour', name: 'hour', plural: 'hours', dimension: 'count', size: 1, aliases: ['hr', 'hrs'] },
  { key: 'day', name: 'day', plural: 'days', dimension: 'count', size: 1, aliases: [] },
  { key: 'week', name: 'week', plural: 'weeks', dimension: 'count', size: 1, aliases: ['wk', 'wks'] },
  { key: 'month', name: 'month', plural: 'months', dimension: 'count', size: 1, aliases: ['mo', 'mos'] },
  { key: 'lump', name: 'lump sum', plural: 'lump sums', dimension: 'count', size: 1, aliases: ['ls', 'lump', 'job', 'allowance', 'allow'] },
] as const satisfies readonly Unit[]

export type UnitKey = (typeof UNITS)[number]['key']
export const UNIT_KEYS = UNITS.map((unit) => unit.key) as [UnitKey, ...UnitKey[]]

const unitBySpelling = new Map<string, Unit>(
  UNITS.flatMap((unit) => [unit.key, unit.name, unit.plural, ...unit.aliases].map((spelling) => [spelling, unit] as const)),
)

/** The unit that a spelling names (`SF`, `sq. ft.`, `square feet` and `sf` are one), or `null`. */
export function findUnit(spelling: string): Unit | null {
  const plain = spelling.replaceAll('.', '').replace(/\s+/g, ' ').trim().toLowerCase()
  return unitBySpelling.get(plain) ?? null
}
