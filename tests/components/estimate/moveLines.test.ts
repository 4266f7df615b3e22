import { describe, expect, it } from 'vitest'
import { moveLines } from '../../../src/composables/moveLines.ts'

describe('moveLines', () => {
  const all = ['a', 'x', 'b', 'y', 'c']
  const group = ['a', 'b', 'c']

  it('moves a line past the next of its group, over lines of other groups', () => {
    expect(moveLines(all, ['b'], -1, group)).toEqual(['b', 'a', 'x', 'y', 'c'])
    expect(moveLines(all, ['b'], 1, group)).toEqual(['a', 'x', 'y', 'c', 'b'])
  })

  it('keeps several lines together', () => {
    expect(moveLines(all, ['b', 'c'], -1, group)).toEqual(['b', 'c', 'a', 'x', 'y'])
  })

  it('has no place past the first and the last', () => {
    expect(moveLines(all, ['a'], -1, group)).toBeNull()
    expect(moveLines(all, ['c'], 1, group)).toBeNull()
    expect(moveLines(all, ['a', 'c'], 1, group)).toBeNull()
  })
})
