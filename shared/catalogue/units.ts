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

export const UNITS = [
  { key: 'sf', name: 'square foot', plural: 'square feet', dimension: 'area', size: 1, aliases: ['sq ft', 'sqft', 'ft2', 'sq. ft.'] },
  { key: 'lf', name: 'lineal foot', plural: 'lineal feet', dimension: 'length', size: 1, aliases: ['lin ft', 'ft', 'lft'] },
  { key: 'square', name: 'square', plural: 'squares', dimension: 'area', size: 100, aliases: ['sq', 'squares', 'roofing square'] },
  { key: 'sy', name: 'square yard', plural: 'square yards', dimension: 'area', size: 9, aliases: ['sq yd', 'yd2'] },
  { key: 'cf', name: 'cubic foot', plural: 'cubic feet', dimension: 'volume', size: 1, aliases: ['cu ft', 'ft3'] },
  { key: 'cy', name: 'cubic yard', plural: 'cubic yards', dimension: 'volume', size: 27, aliases: ['cu yd', 'yd3'] },
  { key: 'each', name: 'each', plural: 'each', dimension: 'count', size: 1, aliases: ['ea', 'no', 'pc', 'pcs'] },
  { key: 'set', name: 'set', plural: 'sets', dimension: 'count', size: 1, aliases: ['sets'] },
  { key: 'sheet', name: 'sheet', plural: 'sheets', dimension: 'count', size: 1, aliases: ['sheets'] },
  { key: 'hour', name: 'hour', plural: 'hours', dimension: 'count', size: 1, aliases: ['hr', 'hrs', 'hours'] },
  { key: 'day', name: 'day', plural: 'days', dimension: 'count', size: 1, aliases: ['days'] },
  { key: 'week', name: 'week', plural: 'weeks', dimension: 'count', size: 1, aliases: ['wk', 'weeks'] },
  { key: 'month', name: 'month', plural: 'months', dimension: 'count', size: 1, aliases: ['mo', 'months'] },
  { key: 'gal', name: 'gallon', plural: 'gallons', dimension: 'count', size: 1, aliases: ['gallon', 'gallons'] },
  { key: 'ton', name: 'ton', plural: 'tons', dimension: 'count', size: 1, aliases: ['tons'] },
  { key: 'load', name: 'load', plural: 'loads', dimension: 'count', size: 1, aliases: ['loads'] },
  { key: 'lump', name: 'lump sum', plural: 'lump sums', dimension: 'count', size: 1, aliases: ['ls', 'job', 'lump sum'] },
] as const satisfies readonly Unit[]

export type UnitKey = (typeof UNITS)[number]['key']
export const UNIT_KEYS = UNITS.map((unit) => unit.key) as [UnitKey, ...UnitKey[]]

const unitBySpelling = new Map<string, Unit>(
  UNITS.flatMap((unit) => [unit.key, ...unit.aliases].map((spelling) => [spelling, unit] as const)),
)

/** The unit that a spelling names (`SF`, `sq ft`, `sf` are one), or `null`. */
export function findUnit(spelling: string): Unit | null {
  return unitBySpelling.get(spelling.trim().toLowerCase()) ?? null
}
