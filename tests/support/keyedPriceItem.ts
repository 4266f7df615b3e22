import type { PriceItemFields } from '../../shared/schemas/priceItem.ts'

/** What the admin keys of an item of two dollars in materials and five installed a square foot. Name only the field that matters. */
export function keyedPriceItem(fields: Partial<PriceItemFields> = {}): PriceItemFields {
  return {
    key: 'floor/test-plank',
    name: 'Test plank',
    system: 'floors',
    trade: 'flooring',
    unit: 'sf',
    uniformat: 'C3020',
    materials: { low: 16_000, likely: 20_000, high: 26_000 },
    installed: { low: 40_000, likely: 50_000, high: 70_000 },
    laborSharePercent: 60,
    wastePercent: 10,
    packageSize: 20,
    packageName: 'box',
    minimumChargeCents: 25_000,
    hoursPerUnit: 0.05,
    roomFormula: 'floor_area',
    houseFormula: 'sum_floor_area',
    priceDate: '2026-01-15',
    note: 'Floating, over a sound floor.',
    ...fields,
  }
}
