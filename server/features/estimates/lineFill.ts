import type { Basis, Line, LineFields } from '../../../shared/schemas/estimate.ts'
import type { PriceItem } from '../../../shared/schemas/priceItem.ts'
import type { PricedItem } from '../price-book/priceBookService.ts'

/** What comes along with an item. */
export type LineFill = Pick<
  Line,
  | 'itemKey'
  | 'system'
  | 'trade'
  | 'description'
  | 'unit'
  | 'quantity'
  | 'wastePercent'
  | 'packageSize'
  | 'basis'
  | 'override'
  | 'minimumChargeCents'
  | 'hoursPerUnit'
  | 'book'
>

/** A line's fields as the item suggests them, for a room or for the house as a whole. */
export function fillFromItem({ item, prices }: PricedItem, roomId: string | null): LineFill {
  const basis: Basis = prices.installed ? 'hired' : 'own-hands'
  return {
    itemKey: item.key,
    system: item.system,
    trade: item.trade,
    description: item.name,
    unit: item.unit,
    quantity: suggestedQuantity(item, roomId),
    wastePercent: item.wastePercent,
    packageSize: item.packageSize,
    basis,
    override: null,
    minimumChargeCents: prices.minimumChargeCents,
    hoursPerUnit: item.hoursPerUnit,
    book: { materials: prices.materials, installed: prices.installed },
  }
}

/** The item's formula for where the line stands; one, where it has none. */
export function suggestedQuantity({ roomFormula, houseFormula }: PriceItem, roomId: string | null): string {
  return (roomId === null ? houseFormula : roomFormula) ?? '1'
}

/** What a line of the estimator's own begins with; description, unit and price are theirs to give. */
export const OWN_LINE_START = {
  itemKey: null,
  system: 'permits',
  trade: 'general',
  quantity: '1',
  wastePercent: 0,
  packageSize: null,
  basis: 'hired',
  minimumChargeCents: 0,
  hoursPerUnit: 0,
  book: { materials: null, installed: null },
} as const satisfies Partial<LineFields & Pick<Line, 'book'>>
