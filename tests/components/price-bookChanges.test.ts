import { describe, expect, it } from 'vitest'
import { itemChanges, regionChanges } from '../../src/components/price-book/priceBookChanges.ts'
import { itemPatch } from '../../src/components/price-book/itemForm.ts'
import { rowTransaction, createRowMaker } from '../../src/components/price-book/gridRows.ts'
import { buildPriceItem } from '../support/buildPriceItem.ts'

const plank = buildPriceItem()
const paint = buildPriceItem({ key: 'walls/paint', name: 'Wall paint' })
const region = {
  key: 'merrow-harbor',
  name: 'Merrow Harbor',
  materialsFactor: 1,
  laborFactor: 1.1,
  salesTaxRule: 'materials',
  salesTaxPercent: 8,
  rowVersion: 1,
} as const

describe('itemChanges', () => {
  it('names what was added, changed and dropped, with both figures', () => {
    const dearer = { ...plank, installed: { low: 50_000, likely: 60_000, high: 75_000 }, wastePercent: 8, rowVersion: 2 }
    const added = buildPriceItem({ key: 'floor/oak', name: 'Oak strip' })
    expect(itemChanges([plank, paint], [dearer, added], null)).toEqual([
      {
        kind: 'changed',
        key: plank.key,
        name: plank.name,
        regionName: null,
        fields: [
          { title: 'Installed', before: '$4.80 / $5.80 / $7.25', after: '$5.00 / $6.00 / $7.50' },
          { title: 'Waste', before: '10 %', after: '8 %' },
        ],
      },
      { kind: 'dropped', key: paint.key, name: paint.name, regionName: null, fields: [] },
      { kind: 'added', key: 'floor/oak', name: 'Oak strip', regionName: null, fields: [] },
    ])
  })

  it('sees no change where a figure came back to what it was', () => {
    expect(itemChanges([plank], [{ ...plank, rowVersion: 5 }], null)).toEqual([])
  })
})

describe('regionChanges', () => {
  it('names the factors that differ', () => {
    expect(regionChanges([region], [{ ...region, laborFactor: 1.15, rowVersion: 2 }])).toEqual([
      {
        kind: 'changed',
        key: region.key,
        name: region.name,
        regionName: null,
        fields: [{ title: 'Labor factor', before: '1.1', after: '1.15' }],
      },
    ])
  })
})

describe('itemPatch', () => {
  it('holds the changed fields alone', () => {
    expect(itemPatch(plank, { ...plank, note: 'New' })).toEqual({ note: 'New' })
    expect(itemPatch(plank, { ...plank })).toBeNull()
  })
})

describe('grid rows', () => {
  it('stay the same object while nothing in them changes, and make the least transaction when something does', () => {
    const rowOf = createRowMaker()
    const held = {}
    const before = [rowOf(plank, held, plank), rowOf(paint, held, paint)]
    expect(rowOf(plank, held, plank)).toBe(before[0])
    const dearer = { ...plank, wastePercent: 8 }
    const oak = buildPriceItem({ key: 'floor/oak' })
    const after = [rowOf(dearer, held, plank), rowOf(oak, held, null)]
    const { add, update, remove } = rowTransaction(before, after)
    expect(add.map(({ item }) => item.key)).toEqual(['floor/oak'])
    expect(update.map(({ item }) => item.key)).toEqual([plank.key])
    expect(remove.map(({ item }) => item.key)).toEqual([paint.key])
  })
})
