import type { PriceItem } from '../../shared/schemas/priceItem.ts'

/** A price item. Name only the field that matters. */
export function buildPriceItem(fields: Partial<PriceItem> = {}): PriceItem {
  return {
    key: 'floor/plank-vinyl',
    name: 'Vinyl plank, floating',
    system: 'floors',
    trade: 'flooring',
    unit: 'sf',
    uniformat: 'C3020',
    materials: { low: 24_000, likely: 30_000, high: 39_000 },
    installed: { low: 48_000, likely: 58_000, high: 72_500 },
    laborSharePercent: 45,
    wastePercent: 10,
    packageSize: 22.5,
    packageName: 'box',
    minimumChargeCents: 25_000,
    hoursPerUnit: 0.045,
    roomFormula: 'floor_area',
    houseFormula: null,
    priceDate: '2026-02-15',
    note: 'Click planks over a flat floor.',
    rowVersion: 1,
    ...fields,
  }
}
