import { describe, expect, it } from 'vitest'
import { itemMatcher } from '../../src/components/price-book/itemMatcher.ts'
import { buildPriceItem } from '../support/buildPriceItem.ts'

const plank = buildPriceItem()
const paint = buildPriceItem({
  key: 'walls/paint',
  name: 'Wall paint, two coats',
  system: 'walls',
  trade: 'painting',
  note: 'Señor blue',
  packageName: 'gallon',
})

function found(search: string, system: string | null = null): string[] {
  return [plank, paint].filter(itemMatcher({ search, system })).map(({ key }) => key)
}

describe('itemMatcher', () => {
  it('finds by the beginnings of words, in any order and of any field', () => {
    expect(found('pla vin')).toEqual([plank.key])
    expect(found('flooring')).toEqual([plank.key])
    expect(found('walls and pai')).toEqual([paint.key])
    expect(found('floor/plank')).toEqual([plank.key])
    expect(found('C3020 box')).toEqual([plank.key])
  })

  it('asks for every word, by its beginning alone', () => {
    expect(found('plank coats')).toEqual([])
    expect(found('lank')).toEqual([])
  })

  it('reads letters with marks as without', () => {
    expect(found('senor')).toEqual([paint.key])
  })

  it('leaves everything without words, and one system when it is chosen', () => {
    expect(found('  ')).toEqual([plank.key, paint.key])
    expect(found('', 'walls')).toEqual([paint.key])
  })

  it('is instant over thousands of items', () => {
    const items = Array.from({ length: 5000 }, (_, index) => buildPriceItem({ key: `floor/item-${index}`, name: `Item ${index}` }))
    items.filter(itemMatcher({ search: 'warm up', system: null }))
    const start = performance.now()
    const hits = items.filter(itemMatcher({ search: 'item 49 plan', system: null }))
    expect(performance.now() - start).toBeLessThan(100)
    expect(hits).toHaveLength(111)
  })
})
