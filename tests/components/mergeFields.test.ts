import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isSame, mergeFields } from '../../src/composables/mergeFields.ts'

const base = { name: 'Front bedroom', note: '', shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 }, openings: [{ kind: 'door' }] }

describe('mergeFields', () => {
  it('takes both changes when they are of different fields', () => {
    const { merged, conflicts } = mergeFields(base, { ...base, name: 'Bedroom 1' }, { ...base, note: 'Soft by the window' })

    expect(merged).toEqual({ ...base, name: 'Bedroom 1', note: 'Soft by the window' })
    expect(conflicts).toEqual([])
  })

  it('merges the length and the width of one shape', () => {
    const mine = { ...base, shape: { ...base.shape, lengthIn: 156 } }
    const theirs = { ...base, shape: { ...base.shape, widthIn: 132 } }

    expect(mergeFields(base, mine, theirs)).toEqual({
      merged: { ...base, shape: { kind: 'rectangle', lengthIn: 156, widthIn: 132 } },
      conflicts: [],
    })
  })

  it('names a field that both changed, with both values, and leaves theirs standing', () => {
    const mine = { ...base, shape: { ...base.shape, lengthIn: 156 } }
    const theirs = { ...base, shape: { ...base.shape, lengthIn: 162 } }

    expect(mergeFields(base, mine, theirs)).toEqual({ merged: theirs, conflicts: [{ path: 'shape.lengthIn', mine: 156, theirs: 162 }] })
  })

  it('holds shapes of different kinds against each other as a whole', () => {
    const shape: { kind: string; corners?: number[] } = { kind: 'polygon', corners: [1, 2, 3] }
    const mine = { ...base, shape: { ...base.shape, lengthIn: 156 } }
    const theirs = { ...base, shape } as unknown as typeof base

    expect(mergeFields(base, mine, theirs).conflicts).toEqual([{ path: 'shape', mine: mine.shape, theirs: shape }])
  })

  it('treats a list as one value', () => {
    const mine = { ...base, openings: [] }
    const theirs = { ...base, openings: [{ kind: 'door' }, { kind: 'window' }] }

    expect(mergeFields(base, mine, theirs).conflicts.map(({ path }) => path)).toEqual(['openings'])
  })

  it('sees no conflict where both made the same change', () => {
    const both = { ...base, name: 'Bedroom 1' }

    expect(mergeFields(base, both, { ...both })).toEqual({ merged: both, conflicts: [] })
  })
})

describe('mergeFields always', () => {
  const record = fc.record({
    a: fc.integer({ min: 0, max: 2 }),
    b: fc.constantFrom('x', 'y'),
    c: fc.record({ kind: fc.constantFrom('flat', 'sloped'), heightIn: fc.integer({ min: 0, max: 2 }) }),
    d: fc.array(fc.boolean(), { maxLength: 2 }),
  })

  it('gives theirs when I changed nothing, and mine when they changed nothing', () => {
    fc.assert(
      fc.property(record, record, (was, changed) => {
        expect(mergeFields(was, was, changed)).toEqual({ merged: changed, conflicts: [] })
        expect(mergeFields(was, changed, was)).toEqual({ merged: changed, conflicts: [] })
      }),
    )
  })

  it('finds the same conflicts whichever side is called mine', () => {
    fc.assert(
      fc.property(record, record, record, (was, one, other) => {
        const paths = mergeFields(was, one, other).conflicts.map(({ path }) => path)
        expect(mergeFields(was, other, one).conflicts.map(({ path }) => path)).toEqual(paths)
      }),
    )
  })

  it('gives one result from either side when nothing is at odds', () => {
    fc.assert(
      fc.property(record, record, record, (was, one, other) => {
        const { merged, conflicts } = mergeFields(was, one, other)
        fc.pre(conflicts.length === 0)
        expect(mergeFields(was, other, one).merged).toEqual(merged)
      }),
    )
  })
})

describe('isSame', () => {
  it('compares by content', () => {
    expect(isSame({ a: [1, { b: 2 }] }, { a: [1, { b: 2 }] })).toBe(true)
    expect(isSame({ a: 1 }, { a: 1, b: undefined })).toBe(true)
    expect(isSame([1, 2], [2, 1])).toBe(false)
    expect(isSame(null, {})).toBe(false)
  })
})
