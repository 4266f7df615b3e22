import { BASES, EVIDENCE_MARKS, type Basis, type Evidence, type LineFields, type PriceOverride } from '../../shared/schemas/estimate.ts'
import { readPrice, readTable, type TableRow } from '../priceBook/textTable.ts'

/** What a person keys of a line; the rest comes along with the item. */
export interface DemoLine {
  /** `null`: the house as a whole. */
  roomKey: string | null
  /** `null`: no item of the price book, but work of the estimator's own. */
  itemKey: string | null
  /** What the price book would have brought along. */
  ownWork?: Pick<LineFields, 'system' | 'trade' | 'description' | 'unit'>
  /** `null`: the item's own formula. */
  quantity: string | null
  basis: Basis
  evidence: Evidence
  override: PriceOverride | null
  note: string
}

const HOUSE = 'house'
const REASON_MARK = 'because '

/**
 * Lines of an estimate as a table with the columns `room | item | quantity | by | evidence | own price`.
 * `house` in the room column is the house as a whole; an empty quantity takes the item's own formula.
 * Below a row: its note, and `because …` for the reason of an own price.
 *
 * @throws Error that names the row which can't be read.
 */
export function lineTable(table: string): DemoLine[] {
  return readTable(table).map((row) => {
    const { cell, notes } = row
    const basis = BASES.find((known) => known === cell('by').replace(' ', '-'))
    const evidence = EVIDENCE_MARKS.find((known) => known === cell('evidence'))
    if (!basis || !evidence) throw new Error(`Line ${cell('room')} ${cell('item')}: who does it, or how it is known, can't be read`)
    return {
      roomKey: cell('room') === HOUSE ? null : cell('room'),
      itemKey: cell('item'),
      quantity: cell('quantity') || null,
      basis,
      evidence,
      override: readOverride(row),
      note: notes.filter((note) => !note.startsWith(REASON_MARK)).join(' '),
    }
  })
}

function readOverride({ cell, notes }: TableRow): PriceOverride | null {
  const price = readPrice(cell('own price'))
  const reason = notes.find((note) => note.startsWith(REASON_MARK))?.slice(REASON_MARK.length)
  if (price === null) return null
  if (reason === undefined) throw new Error(`Line ${cell('room')} ${cell('item')}: an own price needs its reason`)
  return { price, reason: reason.charAt(0).toUpperCase() + reason.slice(1) }
}
