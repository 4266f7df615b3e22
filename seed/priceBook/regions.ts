import type { Region } from '../../shared/schemas/priceItem.ts'

/** The three price regions of the invented county of Merrow. Base prices are the valley's. */
export const regions: readonly Region[] = [
  {
    key: 'merrow-harbor',
    name: 'Merrow Harbor',
    materialsFactor: 1.06,
    laborFactor: 1.18,
    salesTaxRule: 'materials',
    salesTaxPercent: 6.25,
  },
  {
    key: 'merrow-valley',
    name: 'Merrow Valley',
    materialsFactor: 1,
    laborFactor: 1,
    salesTaxRule: 'whole-contract',
    salesTaxPercent: 4.5,
  },
  {
    key: 'merrow-uplands',
    name: 'Merrow Uplands',
    materialsFactor: 1.04,
    laborFactor: 0.88,
    salesTaxRule: 'none',
    salesTaxPercent: 0,
  },
]
