import type { Basis, Evidence, LineFields, PriceOverride } from '../../shared/schemas/estimate.ts'
import { readPrice, readTable } from '../priceBook/textTable.ts'
import { priceItems } from '../priceBook/priceItems.ts'

/** A line of a demo estimate: its room by key, all that comes from the item filled in. */
export type DemoLine = Omit<LineFields, 'roomId'> & { roomKey: string | null }

const WHO_BY_WORDS: Record<string, Basis> = { 'own hands': 'own-hands', hired: 'hired' }
const itemByKey = new Map(priceItems.map((item) => [item.key, item]))
const REASON_MARK = 'because '

/**
 * Lines of an estimate as a table with the columns `room | item | quantity | by | evidence | own price`.
 * `house` in the room column is the house as a whole; an empty quantity takes the item's own formula.
 * Below a row: its note, and `because …` for the reason of an own price.
 *
 * @throws Error that names the row which can't be read.
 */
export function lineTable(table: string): DemoLine[] {
  return readTable(table).map(({ cell, notes }) => {
    const item = itemByKey.get(cell('item'))
    const basis = WHO_BY_WORDS[cell('by')]
    if (!item || !basis) throw new Error(`Line ${cell('room')} ${cell('item')}: no such item, or nobody does it`)
    const isOfHouse = cell('room') === 'house'
    const formula = cell('quantity') || (isOfHouse ? item.houseFormula : item.roomFormula)
    if (!formula) throw new Error(`Line ${cell('room')} ${cell('item')}: needs a quantity`)
    return {
      roomKey: isOfHouse ? null : cell('room'),
      itemKey: item.key,
      system: item.system,
      trade: item.trade,
      description: item.name,
      unit: item.unit,
      quantity: formula,
      wastePercent: item.wastePercent,
      packageSize: item.packageSize,
      basis,
      override: readOverride(cell('own price'), notes),
      minimumChargeCents: item.minimumChargeCents,
      hoursPerUnit: item.hoursPerUnit,
      evidence: cell('evidence') as Evidence,
      note: notes.filter((note) => !note.startsWith(REASON_MARK)).join(' '),
    }
  })
}

function readOverride(ownPrice: string, notes: string[]): PriceOverride | null {
  const price = readPrice(ownPrice)
  const reason = notes.find((note) => note.startsWith(REASON_MARK))?.slice(REASON_MARK.length)
  if (price === null || reason === undefined) return null
  return { price, reason: reason.charAt(0).toUpperCase() + reason.slice(1) }
}
