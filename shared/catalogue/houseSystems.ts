import type { TradeKey } from './trades.ts'

export interface HouseSystem {
  key: string
  title: string
  /** What its work is measured by, in the trade's words. */
  measuredBy: string
  /** Who does most of it, where a line of one's own names no other trade. */
  trade: TradeKey
  /** UNIFORMAT II elements that its work belongs to, the usual one first (see uniformat.ts). */
  uniformat: readonly string[]
}

/**
 * The 31 house systems, in the order of a walk from roof to paperwork.
 * UNIFORMAT II classifies building elements and has none for fees, tests and protection: these take the element that they most often serve.
 */
export const HOUSE_SYSTEMS = [
  {
    key: 'roof',
    title: 'Roof covering, flashing, gutters',
    measuredBy: 'squares from footprint, overhang and pitch; lineal feet',
    trade: 'roofing',
    uniformat: ['B3010', 'B3020', 'B1020', 'D2040'],
  },
  {
    key: 'roof-ventilation',
    title: 'Roof and attic ventilation',
    measuredBy: 'attic area, and the net free area it needs against what is there',
    trade: 'roofing',
    uniformat: ['B3020', 'B3010', 'D3040'],
  },
  { key: 'siding', title: 'Siding and outside paint', measuredBy: 'net outside wall area, gables', trade: 'siding', uniformat: ['B2010'] },
  { key: 'windows', title: 'Windows', measuredBy: 'count by size and type', trade: 'windows-doors', uniformat: ['B2020'] },
  {
    key: 'egress',
    title: 'Egress in sleeping rooms',
    measuredBy: 'clear opening width, height and area, sill height, how it opens',
    trade: 'windows-doors',
    uniformat: ['B2020', 'G2040'],
  },
  { key: 'outside-doors', title: 'Outside doors', measuredBy: 'count', trade: 'windows-doors', uniformat: ['B2030'] },
  { key: 'foundation', title: 'Foundation', measuredBy: 'lineal feet, cracks', trade: 'masonry', uniformat: ['A1010', 'A1020', 'A2020'] },
  {
    key: 'crawl-space',
    title: 'Crawl space, cellar, basement',
    measuredBy: 'area, height, access',
    trade: 'general',
    uniformat: ['A2020', 'A1030', 'D2090'],
  },
  { key: 'pests', title: 'Pests', measuredBy: 'area, entry points', trade: 'pest-control', uniformat: ['B2010', 'B1010'] },
  {
    key: 'floor-structure',
    title: 'Floor structure and subfloor',
    measuredBy: 'sheets, joists, area',
    trade: 'carpentry',
    uniformat: ['B1010'],
  },
  { key: 'insulation', title: 'Insulation', measuredBy: 'area, R-value', trade: 'insulation', uniformat: ['B3010', 'B2010', 'B1010'] },
  {
    key: 'supply-piping',
    title: 'Supply piping',
    measuredBy: 'fixtures, lineal feet, material',
    trade: 'plumbing',
    uniformat: ['D2020', 'G3010'],
  },
  {
    key: 'drain-piping',
    title: 'Drain, waste and vent piping',
    measuredBy: 'fixtures, drainage fixture units, lineal feet',
    trade: 'plumbing',
    uniformat: ['D2030'],
  },
  { key: 'sewer', title: 'Sewer lateral', measuredBy: 'lineal feet, depth', trade: 'sewer', uniformat: ['G3020'] },
  { key: 'water-heater', title: 'Water heater', measuredBy: 'count, size, install year', trade: 'plumbing', uniformat: ['D2020', 'D2010'] },
  {
    key: 'electrical',
    title: 'Electrical service and wiring',
    measuredBy: 'panel, circuits, outlets, area',
    trade: 'electrical',
    uniformat: ['D5010', 'D5020', 'D5090'],
  },
  { key: 'lighting', title: 'Lighting, devices, alarms', measuredBy: 'count', trade: 'electrical', uniformat: ['D5020', 'D5030'] },
  {
    key: 'heating-cooling',
    title: 'Heating and cooling',
    measuredBy: 'rooms, watts or tons',
    trade: 'heating',
    uniformat: ['D3020', 'D3030', 'D3040', 'D3050', 'D3060'],
  },
  { key: 'floors', title: 'Floors', measuredBy: 'floor area, waste, packages', trade: 'flooring', uniformat: ['C3020', 'C2020'] },
  { key: 'walls', title: 'Walls and paint', measuredBy: 'net wall area, coats, coverage', trade: 'painting', uniformat: ['C3010'] },
  { key: 'ceilings', title: 'Ceilings', measuredBy: 'ceiling area', trade: 'drywall', uniformat: ['C3030'] },
  {
    key: 'inside-walls',
    title: 'Inside walls and openings',
    measuredBy: 'lineal feet × height',
    trade: 'carpentry',
    uniformat: ['C1010', 'B1010', 'F2010'],
  },
  {
    key: 'inside-doors',
    title: 'Inside doors and trim',
    measuredBy: 'count, lineal feet',
    trade: 'carpentry',
    uniformat: ['C1020', 'C1030', 'C2010'],
  },
  {
    key: 'kitchen',
    title: 'Kitchen',
    measuredBy: 'cabinet lineal feet, counter square feet, fixtures, appliances',
    trade: 'cabinets',
    uniformat: ['C1030', 'E2010', 'E1090', 'D2010'],
  },
  {
    key: 'bathroom',
    title: 'Bathroom',
    measuredBy: 'fixtures, surround square feet',
    trade: 'plumbing',
    uniformat: ['D2010', 'C3010', 'C1030'],
  },
  { key: 'laundry', title: 'Laundry', measuredBy: 'hook-ups', trade: 'plumbing', uniformat: ['D2010', 'D2020', 'E1090'] },
  { key: 'smells', title: 'Smells and stains', measuredBy: 'area to clean or seal', trade: 'cleaning', uniformat: ['C3010', 'C3020'] },
  {
    key: 'site',
    title: 'Site: grading, drainage, walks, decks, garage, fences',
    measuredBy: 'area, lineal feet',
    trade: 'site-work',
    uniformat: ['G1030', 'G2030', 'G2020', 'G2040', 'G2050', 'G3030'],
  },
  {
    key: 'hazards',
    title: 'Hazards',
    measuredBy: 'area, lineal feet, count',
    trade: 'abatement',
    uniformat: ['F2020', 'G1040'],
  },
  {
    key: 'permits',
    title: 'Permits, design, disposal, protection',
    measuredBy: 'per rule, load or week',
    trade: 'professional',
    uniformat: ['F2010', 'B1010', 'D2020', 'D5010'],
  },
  {
    key: 'inspections',
    title: 'Inspections and tests',
    measuredBy: 'each',
    trade: 'inspection',
    uniformat: ['B1010', 'B3010', 'D5010', 'G3020', 'F2020'],
  },
] as const satisfies readonly HouseSystem[]

export type SystemKey = (typeof HOUSE_SYSTEMS)[number]['key']
export const SYSTEM_KEYS = HOUSE_SYSTEMS.map((system) => system.key) as [SystemKey, ...SystemKey[]]

const systemByKey = new Map<string, (typeof HOUSE_SYSTEMS)[number]>(HOUSE_SYSTEMS.map((system) => [system.key, system]))

/** The house system that a key names, or `null`. */
export function findHouseSystem(key: string): HouseSystem | null {
  return systemByKey.get(key) ?? null
}
