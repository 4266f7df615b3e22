import { describe, expect, it } from 'vitest'
import { buildEstimateRows, refreshSubtotals, type Grouping, type GroupRow, type Subtotal } from '../../../src/composables/estimateRows.ts'
import { newRow, type LineRow } from '../../../src/composables/lineRow.ts'
import { fieldsOfLine } from '../../../src/composables/lineRow.ts'
import { buildLine } from '../../support/buildEstimateWhole.ts'
import { buildKeyedRoom } from '../../support/buildKeyedRoom.ts'

const figures = {
  measured: 0,
  quantity: 0,
  amountCents: { low: 0, likely: 0, high: 0 },
  hours: 0,
  error: null,
  unitPriceE4: null,
  formulaDimension: null,
}
const line = (key: string, own: Parameters<typeof buildLine>[0]): LineRow =>
  newRow(key, fieldsOfLine(buildLine(own)), buildLine().book, figures)
const rooms = [buildKeyedRoom({ id: 'bath', name: 'Bath', position: 2 }), buildKeyedRoom({ id: 'bed', name: 'Bedroom', position: 1 })]
const lines = [
  line('a', { roomId: 'bath', system: 'floors', trade: 'tile' }),
  line('b', { roomId: null, system: 'roof', trade: 'roofing' }),
  line('c', { roomId: 'bath', system: 'walls', trade: 'painting' }),
]
const subtotal = (likely: number): Subtotal => ({ amountCents: { low: 1, likely, high: 9 }, hours: 2, lineCount: 1 })

function build(grouping: Grouping, own: Partial<Parameters<typeof buildEstimateRows>[0]> = {}) {
  return buildEstimateRows({ lines, grouping, rooms, collapsed: new Set(), subtotals: new Map(), known: new Map(), ...own })
}
const keys = (rows: readonly { key: string }[]) => rows.map(({ key }) => key)

describe('buildEstimateRows', () => {
  it('groups by room in the order of the rooms, the whole house first, and leaves empty rooms out', () => {
    expect(keys(build('room'))).toEqual(['head:room:house', 'b', 'foot:room:house', 'head:room:bath', 'a', 'c', 'foot:room:bath'])
  })

  it('groups by house system and by trade in the order of the catalogue', () => {
    expect(keys(build('system')).filter((key) => key.startsWith('head'))).toEqual([
      'head:system:roof',
      'head:system:floors',
      'head:system:walls',
    ])
    expect(keys(build('trade')).filter((key) => key.startsWith('head'))).toEqual([
      'head:trade:roofing',
      'head:trade:painting',
      'head:trade:tile',
    ])
  })

  it('keeps the lines’ own order in one list, with a place to add at its foot', () => {
    expect(keys(build('none'))).toEqual(['a', 'b', 'c', 'foot:none:house'])
  })

  it('folds a group up to its head', () => {
    const rows = build('room', { collapsed: new Set(['room:bath']) })
    expect(keys(rows)).toEqual(['head:room:house', 'b', 'foot:room:house', 'head:room:bath'])
    expect(rows.at(-1)).toMatchObject({ title: 'Bath', isCollapsed: true, lineCount: 2 })
  })

  it('gives heads and feet their subtotals, and the line that an added one goes below', () => {
    const rows = build('room', { subtotals: new Map([['bath', subtotal(500)]]) })
    expect(rows.at(-1)).toMatchObject({ kind: 'foot', amountCents: { likely: 500 }, hours: 2, lineCount: 2, lastLineKey: 'c' })
  })

  it('shows lines of a room that is gone under a head of their own', () => {
    const lost = [...lines, line('d', { roomId: 'gone' })]
    expect(keys(build('room', { lines: lost })).slice(-3)).toEqual(['head:room:gone', 'd', 'foot:room:gone'])
  })

  it('hands back the same heads and feet, so that the grid keeps their rows', () => {
    const known = new Map<string, GroupRow>()
    const [head] = build('room', { known })
    const [same] = build('room', { known, subtotals: new Map([[null, subtotal(700)]]) })
    expect(same).toBe(head)
    expect(same).toMatchObject({ amountCents: { likely: 700 } })
  })
})

describe('refreshSubtotals', () => {
  it('puts fresh sums into the heads and feet that changed and names those alone', () => {
    const known = new Map<string, GroupRow>()
    build('room', { known })
    const changed = refreshSubtotals(known.values(), new Map([['bath', subtotal(500)]]))
    expect(keys(changed)).toEqual(['foot:room:bath', 'head:room:bath'])
    expect(refreshSubtotals(known.values(), new Map([['bath', subtotal(500)]]))).toEqual([])
  })
})
