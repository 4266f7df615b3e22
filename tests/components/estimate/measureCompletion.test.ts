import { describe, expect, it } from 'vitest'
import { completeMeasure, nameAt, namesIn } from '../../../src/composables/measureCompletion.ts'

describe('nameAt', () => {
  it('finds the name that the caret stands behind', () => {
    expect(nameAt('2 * flo', 7)).toEqual({ from: 4, to: 7, name: 'flo' })
  })

  it('takes the whole name as its span where the caret stands inside', () => {
    expect(nameAt('floor_area + 1', 5)).toEqual({ from: 0, to: 10, name: 'floor' })
  })

  it('finds none in a number or behind a sign', () => {
    expect(nameAt('12', 2)).toBeNull()
    expect(nameAt('floor_area + ', 13)).toBeNull()
  })
})

describe('completeMeasure', () => {
  const names = (typed: string, scope: 'room' | 'house' = 'room') => completeMeasure(typed, scope, 20).map(({ name }) => name)

  it('offers names that begin with what is typed, then names in which a word does', () => {
    expect(names('wall')[0]).toBe('wall_area')
    expect(names('area')).toContain('floor_area')
  })

  it('offers a room’s line the house’s measures too, but not the other way round', () => {
    expect(names('roof')).toContain('roof_area')
    expect(names('ceiling', 'house')).not.toContain('ceiling_area')
  })

  it('names a measure that both have once', () => {
    expect(names('windows').filter((name) => name === 'windows')).toHaveLength(1)
  })

  it('offers nothing once the only name is whole', () => {
    expect(names('ridge_length')).toEqual([])
  })
})

describe('namesIn', () => {
  it('lists the measures of a formula once each, functions and unknown names left out', () => {
    expect(namesIn('max(floor_area, wall_area) + floor_area * bogus')).toEqual(['floor_area', 'wall_area'])
  })
})
