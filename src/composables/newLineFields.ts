import type { Basis, LineFields } from '../../shared/schemas/estimate.ts'
import type { PriceItem } from '../../shared/schemas/priceItem.ts'

/** One of whatever it is, where an item brings no formula along. */
const ONE = '1'

/**
 * A line for an item: its formula for a room or for the house, its waste, package, minimum charge and hours come along. Where the item has no price for the
 * wanted basis it takes the other one.
 */
export function fieldsOfItem(item: PriceItem, { roomId, basis }: { roomId: string | null; basis: Basis }): LineFields {
  const hasWanted = (basis === 'own-hands' ? item.materials : item.installed) !== null
  const other: Basis = basis === 'own-hands' ? 'hired' : 'own-hands'
  return {
    roomId,
    itemKey: item.key,
    system: item.system,
    trade: item.trade,
    description: item.name,
    unit: item.unit,
    quantity: (roomId === null ? item.houseFormula : item.roomFormula) ?? ONE,
    wastePercent: item.wastePercent,
    packageSize: item.packageSize,
    basis: hasWanted ? basis : other,
    override: null,
    minimumChargeCents: item.minimumChargeCents,
    hoursPerUnit: item.hoursPerUnit,
    evidence: 'seen',
    note: '',
  }
}

/** A line of one's own, before its price is keyed. */
export function ownLineFields(place: Pick<LineFields, 'roomId' | 'system' | 'trade'>): LineFields {
  return {
    ...place,
    itemKey: null,
    description: 'New line',
    unit: 'each',
    quantity: ONE,
    wastePercent: 0,
    packageSize: null,
    basis: 'hired',
    override: null,
    minimumChargeCents: 0,
    hoursPerUnit: 0,
    evidence: 'seen',
    note: '',
  }
}
