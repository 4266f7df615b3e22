import { describe, expect, it } from 'vitest'
import { CELL_COLUMNS, clearedCell, type CellColumn } from '../../../src/composables/lineCells.ts'
import { fieldsOfLine, newRow, type LineRow } from '../../../src/composables/lineRow.ts'
import { planPaste } from '../../../src/composables/pastePlan.ts'
import { parseTabbedText } from '../../../src/composables/tabbedText.ts'
import { buildLine } from '../../support/buildEstimateWhole.ts'
import { buildKeyedRoom } from '../../support/buildKeyedRoom.ts'
import { buildPriceItem } from '../../support/buildPriceItem.ts'

const figures = {
  measured: 0,
  quantity: 0,
  amountCents: { low: 0, likely: 0, high: 0 },
  hours: 0,
  error: null,
  unitPriceE4: null,
  formulaDimension: null,
}
const row = (key: string, own: Parameters<typeof buildLine>[0] = {}): LineRow =>
  newRow(key, fieldsOfLine(buildLine(own)), buildLine().book, figures)
const rooms = [buildKeyedRoom({ id: 'kitchen', name: 'Kitchen and dining' }), buildKeyedRoom({ id: 'bath', name: 'Bath' })]
const rows = [row('a'), row('b', { roomId: 'bath', system: 'bathroom', trade: 'plumbing' })]

function plan(text: string, from: CellColumn, own: Partial<Parameters<typeof planPaste>[0]> = {}) {
  const columns = CELL_COLUMNS.slice(CELL_COLUMNS.indexOf(from))
  return planPaste({ cells: parseTabbedText(text), rows, columns, rooms, findItem: () => undefined, last: rows.at(-1), ...own })
}

describe('planPaste', () => {
  it('fills cells to the right of and below the focused one', () => {
    expect(plan('Oak floor\tBath\nTub\tKitchen', 'description').edits).toEqual([
      { key: 'a', before: { description: 'Vinyl plank, floating', roomId: null }, after: { description: 'Oak floor', roomId: 'bath' } },
      { key: 'b', before: { description: 'Vinyl plank, floating', roomId: 'bath' }, after: { description: 'Tub', roomId: 'kitchen' } },
    ])
  })

  it('takes numbers as spreadsheets dress them, and formulas as they are', () => {
    const edits = plan('$1,234.50\n=floor_area * 2', 'quantity').edits
    expect(edits.map(({ after }) => after)).toEqual([{ quantity: '1234.5' }, { quantity: 'floor_area * 2' }])
  })

  it('reads lengths as feet and a decimal comma as a point', () => {
    const edits = plan('12\' 6"\n1 234,50', 'quantity').edits
    expect(edits.map(({ after }) => after)).toEqual([{ quantity: '12.5' }, { quantity: '1234.5' }])
  })

  it('puts an own price around one figure, low and high in the book’s proportion', () => {
    expect(plan('6', 'price').edits[0]?.after).toEqual({
      override: { price: { low: 40_000, likely: 60_000, high: 80_000 }, reason: 'Pasted' },
    })
  })

  it('passes over computed columns', () => {
    expect(plan('100.00\t90 to 110\t3\tsees a note', 'amount').edits[0]?.after).toEqual({ note: 'sees a note' })
  })

  it('marks what can’t be taken, cell by cell, and takes the rest', () => {
    const { edits, wrong } = plan('Oak floor\tAttic\t12', 'description')
    expect(edits[0]?.after).toEqual({ description: 'Oak floor', quantity: '12' })
    expect(wrong).toEqual([{ at: 'a', field: 'roomId', text: 'Attic', words: '`Attic` is no room of this house.' }])
  })

  it('grows lines at the end, in the last line’s room and system, blank rows left out', () => {
    const { added, edits } = plan('One\nTwo\nThree\n\t\nFour', 'description')
    expect(edits).toHaveLength(2)
    expect(added.map(({ fields }) => fields)).toMatchObject([
      { description: 'Three', roomId: 'bath', system: 'bathroom', trade: 'plumbing', itemKey: null, quantity: '1' },
      { description: 'Four' },
    ])
  })

  it('brings the item along where a grown line is named like one', () => {
    const { added } = plan('x\ny\nVinyl plank, floating', 'description', {
      findItem: (name) => (name === 'Vinyl plank, floating' ? buildPriceItem() : undefined),
    })
    expect(added[0]).toMatchObject({
      fields: { itemKey: 'floor/plank-vinyl', quantity: 'floor_area', wastePercent: 10 },
      book: { installed: { likely: 58_000 } },
    })
  })

  it('marks a cell of a line that grows by its place among them', () => {
    expect(plan('a\tBath\nb\tBath\nc\tAttic', 'description').wrong).toMatchObject([{ at: 0, field: 'roomId' }])
  })
})

describe('clearedCell', () => {
  const own = { price: { low: 1, likely: 2, high: 3 }, reason: 'a bid' }
  it.each([
    ['note', { note: '' }],
    ['room', { roomId: null }],
    ['quantity', { quantity: '0' }],
    ['price', { override: null }],
    ['description', null],
    ['basis', null],
    ['amount', null],
  ] as const)('makes of %s %j', (column, patch) => {
    expect(clearedCell(row('a', { override: own }), column)).toEqual(patch)
  })

  it('keeps the price of a line that the book has none for', () => {
    expect(clearedCell(row('a', { itemKey: null, override: own }), 'price')).toBeNull()
  })
})
