const LINES_PER_ROOM = 25
const FORMULAS = [
  'floor_area',
  'wall_area * 2',
  'base_length',
  'ceil(wall_area / 32)',
  'max(floor_area, 40)',
  'perimeter - 3',
  '2',
  'ceiling_area',
]
const UNITS = ['sf', 'sf', 'lf', 'sheet', 'sf', 'lf', 'each', 'sf']
const SYSTEMS = ['floors', 'walls', 'inside-doors', 'ceilings', 'kitchen', 'electrical']
const TRADES = ['flooring', 'painting', 'carpentry', 'drywall', 'cabinets', 'electrical']

/** An invented estimate document of so many lines over rooms of 25 lines each, alike on every machine. */
export function estimateDocumentOf(lineCount: number): object {
  const rooms = Array.from({ length: Math.ceil(lineCount / LINES_PER_ROOM) }, (_, index) => ({
    key: `room-${index + 1}`,
    name: `Room ${index + 1}`,
    use: 'sleeping',
    shape: { kind: 'rectangle', length: `${10 + (index % 7)}' 6"`, width: `${8 + (index % 5)}'` },
    ceiling: { kind: 'flat', height: "8'" },
    openings: [
      { kind: 'door', width: `2' 8"`, height: `6' 8"`, count: 1 },
      { kind: 'window', width: "3'", height: "4'", count: 1 + (index % 3) },
    ],
  }))
  const lines = Array.from({ length: lineCount }, (_, index) => ({
    key: `line-${index + 1}`,
    room: `room-${Math.floor(index / LINES_PER_ROOM) + 1}`,
    system: SYSTEMS[index % SYSTEMS.length],
    trade: TRADES[index % TRADES.length],
    description: `Invented work ${index + 1}`,
    unit: UNITS[index % UNITS.length],
    quantity: FORMULAS[index % FORMULAS.length],
    wastePercent: index % 3 === 0 ? 10 : 0,
    basis: index % 4 === 0 ? 'own-hands' : 'hired',
    unitPrice: { low: `${2 + (index % 9)}.40`, likely: `${3 + (index % 9)}.00`, high: `${4 + (index % 9)}.90` },
    minimumCharge: index % 4 === 0 ? '0' : '150',
    hoursPerUnit: 0.05,
    evidence: 'measured',
  }))
  return {
    format: 'quoinbook.estimate',
    version: 1,
    house: {
      name: 'Invented house',
      yearBuilt: 1950,
      storeys: 1,
      footprint: { kind: 'rectangle', length: "42'", width: "28'" },
      wallHeight: "8'",
      overhang: '12"',
      roof: [{ kind: 'gable', rise: 6 }],
    },
    rooms,
    lines,
    settings: {
      overheadAndProfitPercent: 20,
      salesTax: { rule: 'materials', percent: 8.25 },
      permits: '450.00',
      contingency: { method: 'percent', percent: 10 },
    },
  }
}
