import { describe, expect, it } from 'vitest'
import { createItemSearch } from '../../../src/composables/itemSearch.ts'
import { buildPriceItem } from '../../support/buildPriceItem.ts'

const search = createItemSearch([
  buildPriceItem({ key: 'floor/plank-vinyl', name: 'Vinyl plank, floating', system: 'floors', trade: 'flooring' }),
  buildPriceItem({ key: 'floor/sheet-vinyl', name: 'Sheet vinyl, glued', system: 'floors', trade: 'flooring' }),
  buildPriceItem({ key: 'siding/vinyl', name: 'Vinyl siding', system: 'siding', trade: 'siding' }),
  buildPriceItem({ key: 'wall/paint', name: 'Paint walls, two coats', system: 'walls', trade: 'painting' }),
])
const names = (question: string, system?: string) => search(question, { system, limit: 10 }).map(({ name }) => name)

describe('createItemSearch', () => {
  it('finds items in which every word begins some word, in any order', () => {
    expect(names('pla vin')).toEqual(['Vinyl plank, floating'])
    expect(names('coats paint')).toEqual(['Paint walls, two coats'])
    expect(names('vinyl zinc')).toEqual([])
  })

  it('puts items that begin with the word first', () => {
    expect(names('vinyl')).toEqual(['Vinyl siding', 'Vinyl plank, floating', 'Sheet vinyl, glued'])
  })

  it('puts the wanted system first among equals', () => {
    expect(names('vinyl', 'floors')[0]).toBe('Vinyl plank, floating')
  })

  it('finds by key, house system and trade, after names', () => {
    expect(names('painting')).toEqual(['Paint walls, two coats'])
    expect(names('floors')).toHaveLength(2)
  })

  it('gives all items for no words, up to the limit', () => {
    expect(search('', { limit: 3 })).toHaveLength(3)
  })
})
