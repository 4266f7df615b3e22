import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { blankDraft } from '../../src/components/rooms/blankDraft.ts'
import { copyName } from '../../src/components/rooms/copyName.ts'
import { fieldOfPath } from '../../src/components/rooms/fieldOfPath.ts'
import { newRoomFields } from '../../src/components/rooms/newRoomFields.ts'
import { readRoomDraft } from '../../src/components/rooms/readRoomDraft.ts'
import { draftFromRoom } from '../../src/components/rooms/roomDraft.ts'
import { guessUse } from '../../src/components/rooms/roomUses.ts'
import type { Corner, Shape } from '../../shared/schemas/room.ts'
import { buildKeyedRoom } from '../support/buildKeyedRoom.ts'

function problemsOf(change: (draft: ReturnType<typeof draftFromRoom>) => void) {
  const draft = draftFromRoom(buildKeyedRoom())
  change(draft)
  return readRoomDraft(draft)
}

describe('draftFromRoom and readRoomDraft', () => {
  it('write lengths as the trade does and read them back', () => {
    const draft = draftFromRoom(buildKeyedRoom())

    expect(draft.lengthText).toBe(`12' 6"`)
    expect(readRoomDraft(draft)).toMatchObject({ problems: [], fields: { shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 } } })
  })

  it('give back every room that can be keyed', () => {
    const length = fc.integer({ min: 64, max: 64 * 400 }).map((parts) => parts / 64)
    const shape: fc.Arbitrary<Shape> = fc.record({ kind: fc.constant('rectangle' as const), lengthIn: length, widthIn: length })
    const opening = fc.record({
      kind: fc.constantFrom('door' as const, 'window' as const, 'cased' as const),
      widthIn: length,
      heightIn: length,
      count: fc.integer({ min: 1, max: 200 }),
      fromWalls: fc.boolean(),
      fromBase: fc.boolean(),
    })
    const ceiling = fc.oneof(
      fc.constant(null),
      fc.record({ kind: fc.constant('flat' as const), heightIn: length }),
      fc.record({ kind: fc.constant('sloped' as const), lowIn: length, highIn: length }),
    )
    fc.assert(
      fc.property(shape, ceiling, fc.array(opening, { maxLength: 4 }), (keyedShape, keyedCeiling, openings) => {
        const {
          name,
          use,
          shape: kept,
          ceiling: height,
          openings: rows,
          deductions,
          note,
        } = buildKeyedRoom({ shape: keyedShape, ceiling: keyedCeiling, openings })
        const { fields, problems } = readRoomDraft(draftFromRoom(buildKeyedRoom({ shape: keyedShape, ceiling: keyedCeiling, openings })))
        expect(problems).toEqual([])
        expect(fields).toEqual({ name, use, shape: kept, ceiling: height, openings: rows, deductions, note })
      }),
    )
  })

  it('read a room of wall runs back into its corners', () => {
    const corners: Corner[] = [
      [0, 0],
      [180, 0],
      [180, 72],
      [96, 72],
      [96, 120],
      [0, 120],
    ]
    const { fields } = readRoomDraft(draftFromRoom(buildKeyedRoom({ shape: { kind: 'polygon', corners } })))

    expect(fields.shape).toEqual({ kind: 'polygon', corners })
  })
})

describe('readRoomDraft', () => {
  it('keeps a length that can’t be read out of what is saved, and says why at its field', () => {
    const { fields, problems } = problemsOf((draft) => (draft.widthText = `12'' 6`))

    expect(fields).not.toHaveProperty('shape')
    expect(problems).toEqual([{ field: 'width', message: expect.stringContaining('two inch marks'), isEmpty: false }])
  })

  it.each(['-3', `1e9'`, 'abc'])('refuses %s as a height', (heightText) => {
    const { fields, problems } = problemsOf((draft) => (draft.heightText = heightText))

    expect(fields).not.toHaveProperty('ceiling')
    expect(problems.map(({ field }) => field)).toEqual(['height'])
  })

  it('marks an empty height as empty and not as a fault', () => {
    const { problems } = problemsOf((draft) => (draft.heightText = ''))

    expect(problems).toEqual([{ field: 'height', message: 'is empty', isEmpty: true }])
  })

  it('saves no ceiling when it hasn’t been measured', () => {
    expect(problemsOf((draft) => (draft.ceilingKind = 'none')).fields.ceiling).toBeNull()
  })

  it('leaves an opening as it was while its width is being retyped', () => {
    const { fields, problems } = problemsOf((draft) => (draft.openings[0]!.widthText = '3 x'))

    expect(fields.openings).toEqual(buildKeyedRoom().openings)
    expect(problems).toHaveLength(1)
  })

  it('refuses a count of none', () => {
    const { problems } = problemsOf((draft) => (draft.openings[1]!.countText = '0'))

    expect(problems[0]?.message).toContain('whole number from 1')
  })

  it('refuses walls that cross, by name', () => {
    const { fields, problems, shape } = problemsOf((draft) => {
      draft.shapeKind = 'polygon'
      draft.walk = draftFromRoom(
        buildKeyedRoom({
          shape: {
            kind: 'polygon',
            corners: [
              [0, 0],
              [100, 100],
              [100, 0],
              [0, 120],
            ],
          },
        }),
      ).walk
    })

    expect(fields).not.toHaveProperty('shape')
    expect(shape?.kind).toBe('polygon')
    expect(problems[0]).toMatchObject({ field: 'shape', isEmpty: false })
    expect(problems[0]?.message).toMatch(/Wall 1 meets wall 3/)
  })

  it('follows wall runs up to the first that can’t be read', () => {
    const { walk, shape } = problemsOf((draft) => {
      draft.shapeKind = 'polygon'
      draft.walk.runs[2]!.lengthText = 'x'
    })

    expect(walk?.runs).toHaveLength(2)
    expect(shape).toBeNull()
  })
})

describe('newRoomFields', () => {
  it('needs a name and two lengths and brings the height along that most rooms have', () => {
    const draft = blankDraft([106, 106, 80].map((heightIn) => ({ ceiling: { kind: 'flat', heightIn } })))
    expect(newRoomFields(draft)).toBeNull()

    Object.assign(draft, { name: 'Kitchen', use: 'kitchen', lengthText: '14', widthText: '3.81 m' })

    expect(newRoomFields(draft)).toEqual({
      name: 'Kitchen',
      use: 'kitchen',
      shape: { kind: 'rectangle', lengthIn: 168, widthIn: 150 },
      ceiling: { kind: 'flat', heightIn: 106 },
      openings: [],
      deductions: [],
      note: '',
    })
  })
})

describe('fieldOfPath', () => {
  const draft = draftFromRoom(buildKeyedRoom())

  it.each([
    ['shape.lengthIn', 'length'],
    ['shape.corners[3]', 'shape'],
    ['ceiling.heightIn', 'height'],
    ['name', 'name'],
  ])('leads %s to %s', (path, field) => {
    expect(fieldOfPath(path, draft)).toBe(field)
  })

  it('finds the row of an opening', () => {
    expect(fieldOfPath('openings[1].widthIn', draft)).toBe(`opening-${draft.openings[1]?.id}-width`)
  })
})

describe('guessUse', () => {
  it.each([
    ['Front bedroom', 'sleeping'],
    ['Bathroom 2', 'bath'],
    ['Eat-in kitchen', 'kitchen'],
    ['Stair hall', 'hall'],
    ['Cellar', 'cellar'],
    ['Room 9', null],
  ])('takes %s for %s', (name, use) => {
    expect(guessUse(name)).toBe(use)
  })
})

describe('copyName', () => {
  it('takes the next free number', () => {
    expect(copyName('Bedroom', ['Bedroom'])).toBe('Bedroom 2')
    expect(copyName('Bedroom 2', ['Bedroom', 'Bedroom 2', 'Bedroom 3'])).toBe('Bedroom 4')
  })

  it('stays within the length of a name', () => {
    expect(copyName('x'.repeat(120), [])).toHaveLength(120)
  })
})

describe('wall runs that are not closed yet', () => {
  it('count the row that waits for the next wall for nothing', () => {
    const { fields, problems } = problemsOf((draft) => {
      draft.shapeKind = 'polygon'
      draft.walk.runs.push({ id: 999, lengthText: '', turn: 'right', angleText: '' })
    })

    expect(problems).toEqual([])
    expect(fields.shape).toMatchObject({ kind: 'polygon' })
  })

  it('are no fault when only the line home crosses a wall', () => {
    const { fields, problems } = problemsOf((draft) => {
      draft.shapeKind = 'polygon'
      draft.walk.runs[1]!.turn = 'left'
      draft.walk.runs[2]!.turn = 'right'
    })

    expect(fields).not.toHaveProperty('shape')
    expect(problems).toEqual([{ field: 'shape', message: expect.stringContaining('straight line home'), isEmpty: true }])
  })
})
