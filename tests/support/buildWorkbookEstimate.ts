import { computeEstimate, defaultSettings, toEstimateInput, type WorkbookContext } from '../../shared/engine/index.ts'
import type { EstimateSettings, EstimateWhole, Line } from '../../shared/schemas/estimate.ts'
import type { House } from '../../shared/schemas/house.ts'
import type { Room } from '../../shared/schemas/room.ts'

const TIME = '2026-11-30T09:15:00.000Z'
const ZERO = { low: 0, likely: 0, high: 0 }

export function buildHouse(fields: Partial<House> = {}): House {
  return {
    id: 'house-1',
    name: '9 Pump Court',
    address: '9 Pump Court, Merrow Harbor',
    regionKey: 'merrow-harbor',
    yearBuilt: 1931,
    storeys: 1,
    kind: 'detached',
    footprint: { kind: 'rectangle', lengthIn: 42 * 12, widthIn: 28 * 12 },
    wallHeightIn: 96,
    overhangIn: 12,
    roof: [{ kind: 'gable', rise: 6 }],
    note: '',
    version: 1,
    createdAt: TIME,
    updatedAt: TIME,
    ...fields,
  }
}

export function buildRoom(fields: Partial<Room> & Pick<Room, 'id'>): Room {
  return {
    houseId: 'house-1',
    name: 'Front bedroom',
    use: 'sleeping',
    shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 },
    ceiling: { kind: 'flat', heightIn: 96 },
    openings: [
      { kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true },
      { kind: 'window', widthIn: 36, heightIn: 48, count: 2, fromWalls: true, fromBase: true },
    ],
    deductions: [],
    note: '',
    position: 1,
    version: 1,
    ...fields,
  }
}

export function buildLine(fields: Partial<Line> & Pick<Line, 'id'>): Line {
  return {
    estimateId: 'estimate-1',
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
    hoursPerUnit: 0.045,
    evidence: 'measured',
    note: '',
    position: 1,
    version: 1,
    book: {
      materials: { low: 24_000, likely: 30_000, high: 39_000 },
      installed: { low: 48_000, likely: 58_000, high: 72_500 },
    },
    ...fields,
  }
}

export function buildWhole({
  house = {},
  rooms = [buildRoom({ id: 'bed-1' })],
  lines = [buildLine({ id: 'line-1' })],
  settings = {},
  unknowns = [],
  inspections = [],
}: {
  house?: Partial<House>
  rooms?: Room[]
  lines?: Line[]
  settings?: Partial<EstimateSettings>
  unknowns?: unknown[]
  inspections?: unknown[]
} = {}): EstimateWhole {
  const totals = {
    directCents: ZERO,
    overheadAndProfitCents: ZERO,
    salesTaxCents: ZERO,
    permitsCents: ZERO,
    contingencyCents: ZERO,
    totalCents: ZERO,
  }
  return {
    estimate: {
      id: 'estimate-1',
      houseId: 'house-1',
      name: 'Working estimate',
      version: 3,
      priceBookVersion: 1,
      regionKey: 'merrow-harbor',
      settings: { ...defaultSettings, ...settings },
      unknowns,
      inspections,
      totals,
      errorCount: 0,
    },
    house: buildHouse(house),
    rooms,
    lines,
  }
}

export function buildContext(fields: Partial<WorkbookContext> = {}): WorkbookContext {
  return {
    firm: { name: 'Alder & Finch House Advisers', isDemo: true },
    regionName: 'Merrow Harbor',
    priceBook: { version: 1, effectiveDate: '2026-03-01' },
    items: [{ key: 'floor/plank-vinyl', name: 'Vinyl plank, floating', unit: 'sf', priceDate: '2026-02-15' }],
    figuresAt: TIME,
    preparedBy: 'Tobias Finch',
    preparedFor: ['Ilse Varden'],
    ...fields,
  }
}

/** The engine's own figures of an estimate. */
export function resultsOf(whole: EstimateWhole) {
  return computeEstimate(toEstimateInput(whole))
}
