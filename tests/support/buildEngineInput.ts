import { defaultSettings, type EstimateInput, type HouseInput, type LineInput, type RoomInput } from '../../shared/engine/index.ts'
import type { EstimateSettings } from '../../shared/schemas/estimate.ts'
import type { Deduction, Opening } from '../../shared/schemas/room.ts'

/** A bedroom 12' 6" × 10', 8' high, without openings. Name only the field that matters. */
export function buildRoomInput(own: Partial<RoomInput> = {}): RoomInput {
  return {
    key: 'bedroom',
    name: 'Front bedroom',
    use: 'sleeping',
    shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 },
    ceiling: { kind: 'flat', heightIn: 96 },
    openings: [],
    deductions: [],
    ...own,
  }
}

export function buildOpening(own: Partial<Opening> = {}): Opening {
  return { kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true, ...own }
}

export function buildDeduction(own: Partial<Deduction> = {}): Deduction {
  return { kind: 'cabinets', widthIn: 60, heightIn: 34, depthIn: 24, count: 1, fromWalls: true, fromFloor: false, fromBase: true, ...own }
}

/** A house of 42' × 28', one storey of 8', gable roof of 6 in 12 with 12" of overhang. */
export function buildHouseInput(own: Partial<HouseInput> = {}): HouseInput {
  return {
    storeys: 1,
    footprint: { kind: 'rectangle', lengthIn: 504, widthIn: 336 },
    wallHeightIn: 96,
    overhangIn: 12,
    roof: [{ kind: 'gable', rise: 6 }],
    ...own,
  }
}

/** A line of 100 sf of the house, own hands at $2 · $3 · $4, without waste, package or hours. */
export function buildLineInput(own: Partial<LineInput> = {}): LineInput {
  return {
    key: 'line',
    roomKey: null,
    system: 'floors',
    trade: 'flooring',
    unit: 'sf',
    quantity: '100',
    wastePercent: 0,
    packageSize: null,
    basis: 'own-hands',
    unitPriceE4: { low: 20_000, likely: 30_000, high: 40_000 },
    minimumChargeCents: 0,
    hoursPerUnit: 0,
    evidence: 'measured',
    ...own,
  }
}

/** Settings that add nothing to the lines. */
export function buildSettings(own: Partial<EstimateSettings> = {}): EstimateSettings {
  return {
    ...defaultSettings,
    overheadAndProfitPercent: 0,
    salesTax: { rule: 'none', percent: 0 },
    permitsCents: 0,
    contingency: { method: 'percent', percent: 0 },
    ...own,
  }
}

/** An estimate whose total is the sum of its lines. */
export function buildEstimateInput(own: Partial<EstimateInput> = {}): EstimateInput {
  return { house: buildHouseInput(), rooms: [], lines: [], settings: buildSettings(), ...own }
}

/** The same price three times, in ten-thousandths of a dollar. */
export function samePrice(e4: number): { low: number; likely: number; high: number } {
  return { low: e4, likely: e4, high: e4 }
}
