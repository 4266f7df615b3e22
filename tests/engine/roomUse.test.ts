import { describe, expect, it } from 'vitest'
import { readEstimateDocument } from '../../shared/engine/index.ts'

function documentWithUse(use: unknown) {
  return {
    format: 'quoinbook.estimate',
    version: 1,
    house: { name: 'Invented house' },
    rooms: [{ key: 'a', name: 'A', use, shape: { kind: 'rectangle', length: 10, width: 10 } }],
    lines: [],
  }
}

function useRead(use: unknown): string | undefined {
  const read = readEstimateDocument(documentWithUse(use))
  return read.ok ? read.input.rooms[0]?.use : undefined
}

describe('the use of a room in an estimate document', () => {
  it('is taken whatever its case', () => {
    expect(useRead('Kitchen')).toBe('kitchen')
  })

  it('counts as another kind of room when it is not known here', () => {
    expect(useRead('sunroom')).toBe('other')
  })

  it('is refused by its path when it is no word', () => {
    const read = readEstimateDocument(documentWithUse(7))
    expect(read.ok ? [] : read.errors.map(({ path }) => path)).toEqual(['rooms[0].use'])
  })
})
