import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { closeWalk } from '../../src/components/rooms/closeWalk.ts'
import { wallCrossings } from '../../src/components/rooms/wallCrossings.ts'
import { cornersFromWalk, normalDegrees, walkFromCorners, walkGap, type WallWalk } from '../../src/components/rooms/wallRuns.ts'
import type { Corner } from '../../shared/schemas/room.ts'

const RIGHT = 90
const LEFT = -90

function walk(...runs: [lengthIn: number, turnDegrees: number][]): WallWalk {
  return { start: [0, 0], headingDegrees: 0, runs: runs.map(([lengthIn, turnDegrees]) => ({ lengthIn, turnDegrees })) }
}

const ell: Corner[] = [
  [0, 0],
  [180, 0],
  [180, 72],
  [96, 72],
  [96, 120],
  [0, 120],
]

describe('cornersFromWalk', () => {
  it('goes round a rectangle by right turns, without repeating the first corner', () => {
    expect(cornersFromWalk(walk([144, RIGHT], [120, RIGHT], [144, RIGHT], [120, RIGHT]))).toEqual([
      [0, 0],
      [144, 0],
      [144, 120],
      [0, 120],
    ])
  })

  it('follows an inside corner by a left turn', () => {
    expect(cornersFromWalk(walk([180, RIGHT], [72, RIGHT], [84, LEFT], [48, RIGHT], [96, RIGHT], [120, RIGHT]))).toEqual(ell)
  })

  it('keeps the end as a corner while the walk has not come round', () => {
    const corners = cornersFromWalk(walk([144, RIGHT], [120, RIGHT], [144, RIGHT]))

    expect(corners).toHaveLength(4)
    expect(corners.at(-1)).toEqual([0, 120])
  })

  it('takes a wall at an angle', () => {
    const [, , end] = cornersFromWalk(walk([100, 45], [Math.SQRT2 * 10, 0]))

    expect(end?.[0]).toBeCloseTo(110, 9)
    expect(end?.[1]).toBeCloseTo(10, 9)
  })
})

describe('walkFromCorners', () => {
  it('reads an L back as it would be keyed', () => {
    expect(walkFromCorners(ell)).toEqual(walk([180, RIGHT], [72, RIGHT], [84, LEFT], [48, RIGHT], [96, RIGHT], [120, RIGHT]))
  })

  it('keeps a corner in the middle of a straight wall', () => {
    const corners: Corner[] = [
      [0, 0],
      [60, 0],
      [144, 0],
      [144, 120],
      [0, 120],
    ]
    expect(walkFromCorners(corners).runs[0]).toEqual({ lengthIn: 60, turnDegrees: 0 })
  })
})

describe('wall runs always', () => {
  const sixtyFourths = fc.integer({ min: 64, max: 64 * 600 }).map((count) => count / 64)
  const corner = fc.tuple(fc.integer({ min: -6400, max: 6400 }), fc.integer({ min: -6400, max: 6400 })) as fc.Arbitrary<Corner>

  it('give back the corners that they were read from', () => {
    fc.assert(
      fc.property(fc.array(corner, { minLength: 3, maxLength: 60 }), (corners) => {
        const walls = walkFromCorners(corners).runs
        fc.pre(walls.every(({ lengthIn }) => lengthIn > 1))
        const again = cornersFromWalk(walkFromCorners(corners))
        expect(again).toHaveLength(corners.length)
        again.forEach(([x, y], index) => {
          expect(x).toBeCloseTo(corners[index]?.[0] ?? NaN, 6)
          expect(y).toBeCloseTo(corners[index]?.[1] ?? NaN, 6)
        })
      }),
    )
  })

  it('are exact to the sixty-fourth at right angles, whatever way the first wall runs', () => {
    fc.assert(
      fc.property(
        sixtyFourths,
        sixtyFourths,
        fc.constantFrom(0, 90, 180, -90),
        fc.constantFrom(RIGHT, LEFT),
        (length, width, headingDegrees, turn) => {
          const keyed: WallWalk = { ...walk([length, turn], [width, turn], [length, turn], [width, turn]), headingDegrees }
          const corners = cornersFromWalk(keyed)
          expect(corners).toHaveLength(4)
          expect(walkFromCorners(corners)).toEqual(keyed)
        },
      ),
    )
  })
})

describe('closeWalk', () => {
  it('adds the one wall that is missing', () => {
    expect(closeWalk(walk([144, RIGHT], [120, RIGHT], [144, RIGHT])).runs.at(-1)).toEqual({ lengthIn: 120, turnDegrees: RIGHT })
  })

  it('adds the two walls of a missing corner', () => {
    const closed = closeWalk(walk([180, RIGHT], [72, RIGHT], [84, LEFT], [48, RIGHT]))

    expect(cornersFromWalk(closed)).toEqual(ell)
  })

  it('goes home in one line where that is the only clear way', () => {
    const closed = closeWalk(walk([100, RIGHT], [50, LEFT]))

    expect(cornersFromWalk(closed)).toEqual([
      [0, 0],
      [100, 0],
      [100, 50],
    ])
    expect(closed.runs.at(-1)?.lengthIn).toBeCloseTo(Math.hypot(100, 50), 9)
  })

  it('takes up a tape that was read a little off in the last two walls, keeping the angles', () => {
    const closed = closeWalk(walk([144, RIGHT], [120, RIGHT], [143, RIGHT], [119.5, RIGHT]))

    expect(closed.runs).toEqual(walk([144, RIGHT], [120, RIGHT], [144, RIGHT], [120, RIGHT]).runs)
  })

  it('leaves a closed walk as it is', () => {
    const closed = walk([144, RIGHT], [120, RIGHT], [144, RIGHT], [120, RIGHT])

    expect(closeWalk(closed)).toBe(closed)
  })

  it('always comes home, facing the first wall again', () => {
    const run = fc.tuple(fc.integer({ min: 12, max: 400 }), fc.constantFrom(RIGHT, LEFT, 0, 45, -30))
    fc.assert(
      fc.property(fc.array(run, { minLength: 3, maxLength: 12 }), (runs) => {
        const open = walk(...runs)
        fc.pre(!walkGap(open).isClosed && walkGap(open).gapIn > 1 / 64)
        const closed = closeWalk(open)
        expect(walkGap(closed).gapIn).toBeLessThan(1e-6)
        const turns = closed.runs.reduce((sum, { turnDegrees }) => sum + turnDegrees, 0)
        const wasAdjusted = closed.runs.length === open.runs.length
        expect(wasAdjusted || Math.abs(normalDegrees(turns)) < 1e-6).toBe(true)
      }),
    )
  })
})

describe('wallCrossings', () => {
  it('finds the spot where two walls cross, and which they are', () => {
    const bowTie: Corner[] = [
      [0, 0],
      [100, 100],
      [100, 0],
      [0, 100],
    ]
    expect(wallCrossings(bowTie)).toEqual([{ walls: [1, 3], at: [50, 50] }])
  })

  it('finds a wall that runs back along another', () => {
    const corners: Corner[] = [
      [0, 0],
      [100, 0],
      [40, 0],
      [40, 80],
    ]
    expect(wallCrossings(corners)[0]).toEqual({ walls: [1, 2], at: [100, 0] })
  })

  it('finds none in an L', () => {
    expect(wallCrossings(ell)).toEqual([])
  })
})
