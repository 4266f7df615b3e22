import { defaultSettings } from '../../shared/engine/index.ts'
import type { Estimate, EstimateWhole, Line } from '../../shared/schemas/estimate.ts'
import type { House } from '../../shared/schemas/house.ts'
import { buildKeyedRoom } from './buildKeyedRoom.ts'

const NOTHING = { low: 0, likely: 0, high: 0 }

/** A line of 100 sf hired at $2 · $3 · $4, without waste or minimum charge. Name only the field that matters. */
export function buildLine(own: Partial<Line> = {}): Line {
  return {
    id: 'line-1',
    estimateId: 'estimate-1',
    position: 1000,
    version: 1,
    roomId: null,
    itemKey: 'floor/plank-vinyl',
    system: 'floors',
    trade: 'flooring',
    description: 'Vinyl plank, floating',
    unit: 'sf',
    quantity: '100',
    wastePercent: 0,
    packageSize: null,
    basis: 'hired',
    override: null,
    minimumChargeCents: 0,
    hoursPerUnit: 0,
    evidence: 'seen',
    note: '',
    book: { materials: { low: 10_000, likely: 15_000, high: 20_000 }, installed: { low: 20_000, likely: 30_000, high: 40_000 } },
    ...own,
  }
}

/** Lines with ids and positions of their own, each with the fields given. */
export function buildLines(...fields: Partial<Line>[]): Line[] {
  return fields.map((own, index) => buildLine({ id: `line-${index + 1}`, position: (index + 1) * 1000, ...own }))
}

export function buildEstimate(own: Partial<Estimate> = {}): Estimate {
  const settings = { ...defaultSettings, overheadAndProfitPercent: 0, contingency: { method: 'percent' as const, percent: 0 } }
  const totals = {
    directCents: NOTHING,
    overheadAndProfitCents: NOTHING,
    salesTaxCents: NOTHING,
    permitsCents: NOTHING,
    contingencyCents: NOTHING,
    totalCents: NOTHING,
  }
  const pins = { priceBookVersion: 1, regionKey: 'merrow-valley' }
  return {
    id: 'estimate-1',
    houseId: 'house-1',
    name: 'Working estimate',
    version: 1,
    settings,
    totals,
    errorCount: 0,
    unknowns: [],
    inspections: [],
    ...pins,
    ...own,
  }
}

/** A whole estimate without adders: its total is the sum of its lines. One room, the bedroom of 125 sq ft. */
export function buildEstimateWhole(own: Partial<EstimateWhole> = {}): EstimateWhole {
  const house: House = {
    id: 'house-1',
    version: 1,
    createdAt: '2026-01-05T09:00:00.000Z',
    updatedAt: '2026-01-05T09:00:00.000Z',
    name: '14 Lantern Street',
    address: '',
    regionKey: 'merrow-valley',
    yearBuilt: 1926,
    storeys: 1,
    kind: 'detached',
    footprint: { kind: 'rectangle', lengthIn: 504, widthIn: 336 },
    wallHeightIn: 96,
    overhangIn: 12,
    roof: [{ kind: 'gable', rise: 6 }],
    note: '',
  }
  return { estimate: buildEstimate(), house, rooms: [buildKeyedRoom()], lines: [buildLine()], ...own }
}
