import { defaultSettings, type EstimateInput, type LineInput, type RoomInput } from '../../shared/engine/index.ts'

/** A quantity of the model, as each way of computing it says it. */
export interface ModelFormula {
  /** As our engine and mathjs take it. */
  text: string
  unit: string
  /** As a spreadsheet takes it, over the cells of the room's row: `{floor_area}` is replaced by the cell. */
  cells: string
}

export const MODEL_FORMULAS: readonly ModelFormula[] = [
  { text: 'floor_area', unit: 'sf', cells: '{floor_area}' },
  { text: 'wall_area', unit: 'sf', cells: '{wall_area}' },
  { text: 'ceiling_area * 1.05', unit: 'sf', cells: '{ceiling_area}*1.05' },
  { text: 'base_length', unit: 'lf', cells: '{base_length}' },
  { text: 'perimeter - 3', unit: 'lf', cells: '{perimeter}-3' },
  { text: 'ceil(wall_area / 350 * 2)', unit: 'gal', cells: 'ROUNDUP({wall_area}/350*2,0)' },
  { text: 'windows + doors', unit: 'each', cells: '{windows}+{doors}' },
  { text: '(length + 2) * (width + 2)', unit: 'sf', cells: '({length}+2)*({width}+2)' },
  { text: 'floor_area > 150 ? floor_area : 150', unit: 'sf', cells: 'IF({floor_area}>150,{floor_area},150)' },
  { text: 'min(wall_area, 400) + max(floor_area, 100)', unit: 'sf', cells: 'MIN({wall_area},400)+MAX({floor_area},100)' },
  { text: 'sqrt(floor_area) * 4', unit: 'lf', cells: 'SQRT({floor_area})*4' },
  { text: '12', unit: 'each', cells: '12' },
]

export const MODEL_SYSTEMS = 31
export const MODEL_TRADES = 23
const LINES_A_ROOM = 50
const ROOMS_LEAST = 6

/**
 * An estimate of so many lines, about fifty a room: each with a formula over its room, waste, package or minimum charge, three prices, a house system and a trade.
 * Made by arithmetic, so that it is the same each time.
 */
export function modelEstimate(lineCount: number): EstimateInput {
  const roomCount = Math.max(ROOMS_LEAST, Math.round(lineCount / LINES_A_ROOM))
  return {
    house: {
      storeys: 1,
      footprint: { kind: 'rectangle', lengthIn: 504, widthIn: 336 },
      wallHeightIn: 96,
      overhangIn: 12,
      roof: [{ kind: 'gable', rise: 6 }],
    },
    rooms: Array.from({ length: roomCount }, (_, index) => modelRoom(index)),
    lines: Array.from({ length: lineCount }, (_, index) => modelLine(index, roomCount)),
    settings: { ...defaultSettings, salesTax: { rule: 'whole-contract', percent: 8.25 }, permitsCents: 45_000 },
  }
}

export function modelRoom(index: number, lengthIn = 120 + (index % 40) * 3): RoomInput {
  return {
    key: `room-${index}`,
    name: `Room ${index}`,
    use: 'living',
    shape: { kind: 'rectangle', lengthIn, widthIn: 108 + (index % 17) * 6 },
    ceiling: { kind: 'flat', heightIn: 96 },
    openings: [
      { kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true },
      { kind: 'window', widthIn: 36, heightIn: 48, count: 1 + (index % 3), fromWalls: true, fromBase: true },
    ],
    deductions: [],
  }
}

export function modelLine(index: number, roomCount: number, likelyE4 = 20_000 + (index % 97) * 1_250): LineInput {
  const formula = MODEL_FORMULAS[index % MODEL_FORMULAS.length] as ModelFormula
  const isHired = index % 3 === 0
  return {
    key: `line-${index}`,
    roomKey: `room-${index % roomCount}`,
    system: `system-${index % MODEL_SYSTEMS}`,
    trade: `trade-${index % MODEL_TRADES}`,
    unit: formula.unit,
    quantity: formula.text,
    wastePercent: (index % 4) * 5,
    packageSize: isHired || index % 5 > 0 ? null : 22.5,
    basis: isHired ? 'hired' : 'own-hands',
    unitPriceE4: { low: Math.round(likelyE4 * 0.8), likely: likelyE4, high: Math.round(likelyE4 * 1.4) },
    minimumChargeCents: isHired ? 25_000 : 0,
    hoursPerUnit: isHired ? 0 : 0.045,
    evidence: 'measured',
  }
}
