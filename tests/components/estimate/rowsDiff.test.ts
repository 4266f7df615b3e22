import { describe, expect, it } from 'vitest'
import { rowsDiff } from '../../../src/composables/rowsDiff.ts'

const [a, b, c, d, e] = ['a', 'b', 'c', 'd', 'e'].map((key) => ({ key })) as [object, object, object, object, object]

describe('rowsDiff', () => {
  it('finds what came in, and where', () => {
    expect(rowsDiff([a, b, e], [a, b, c, d, e])).toEqual({ remove: [], add: [c, d], addIndex: 2 })
  })

  it('finds what went', () => {
    expect(rowsDiff([a, b, c, d], [a, d])).toEqual({ remove: [b, c], add: [], addIndex: 1 })
  })

  it('finds what took another’s place', () => {
    expect(rowsDiff([a, b, c], [a, d, c])).toEqual({ remove: [b], add: [d], addIndex: 1 })
  })

  it('finds nothing between equal lists, and all between strangers', () => {
    expect(rowsDiff([a, b], [a, b])).toEqual({ remove: [], add: [], addIndex: 2 })
    expect(rowsDiff([], [a])).toEqual({ remove: [], add: [a], addIndex: 0 })
  })

  it('gives up where rows changed places', () => {
    expect(rowsDiff([a, b, c, d], [a, c, b, d])).toBeNull()
  })
})
