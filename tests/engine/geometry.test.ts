import { polygonArea } from 'd3-polygon'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkShape, shapeOutline } from '../../shared/engine/index.ts'
import { eaveOutline } from '../../shared/engine/geometry/eaveOutline.ts'
import { planFigures } from '../../shared/engine/geometry/planFigures.ts'
import { slopeFactor } from '../../shared/engine/geometry/slopeFactor.ts'
import type { Corner, Shape } from '../../shared/schemas/room.ts'

const ell: Shape = { kind: 'ell', lengthIn: 240, widthIn: 180, cutLengthIn: 96, cutWidthIn: 60 }

function polygon(...corners: Corner[]): Shape {
  return { kind: 'polygon', corners }
}

describe('shapeOutline', () => {
  it('runs a rectangle’s length along x', () => {
    expect(shapeOutline({ kind: 'rectangle', lengthIn: 150, widthIn: 120 })).toEqual([
      [0, 0],
      [150, 0],
      [150, 120],
      [0, 120],
    ])
  })

  it('cuts the far corner out of an ell', () => {
    expect(shapeOutline(ell)).toEqual([
      [0, 0],
      [240, 0],
      [240, 120],
      [144, 120],
      [144, 180],
      [0, 180],
    ])
  })

  it('holds a polygon’s corners to 1/64 inch, and closes it by itself', () => {
    expect(shapeOutline(polygon([0, 0], [100.001, 0], [100, 50.02], [0, 0]))).toEqual([
      [0, 0],
      [100, 0],
      [100, 50.015625],
    ])
  })
})

describe('planFigures', () => {
  it('measures a rectangle', () => {
    expect(planFigures({ kind: 'rectangle', lengthIn: 150, widthIn: 120 })).toEqual({
      areaSqIn: 18_000,
      perimeterIn: 540,
      lengthIn: 150,
      widthIn: 120,
      slopeRunIn: 120,
    })
  })

  it('takes the cut out of an ell’s area, and nothing out of its perimeter', () => {
    expect(planFigures(ell)).toMatchObject({ areaSqIn: 240 * 180 - 96 * 60, perimeterIn: 840, lengthIn: 240, widthIn: 180 })
  })

  it('measures a polygon, with length and width of the box around it', () => {
    const triangle = planFigures(polygon([12, 12], [48, 12], [12, 60]))
    expect(triangle).toEqual({ areaSqIn: 864, perimeterIn: 144, lengthIn: 36, widthIn: 48, slopeRunIn: 36 })
  })
})

describe('checkShape', () => {
  const codesOf = (shape: Shape) => checkShape(shape).map(({ path, code }) => [path, code])

  it('has nothing against a rectangle, an ell, or a polygon that is one', () => {
    expect(checkShape({ kind: 'rectangle', lengthIn: 150, widthIn: 120 })).toEqual([])
    expect(checkShape(ell)).toEqual([])
    expect(checkShape(polygon(...shapeOutline(ell)))).toEqual([])
  })

  it('refuses a cut that takes a whole side, and names it', () => {
    expect(codesOf({ ...ell, cutLengthIn: 240 } as Shape)).toEqual([['cutLengthIn', 'cut-too-large']])
    expect(codesOf({ ...ell, cutWidthIn: 200 } as Shape)).toEqual([['cutWidthIn', 'cut-too-large']])
  })

  it('refuses walls that cross, and names both', () => {
    const [problem] = checkShape(polygon([0, 0], [120, 120], [120, 0], [0, 120]))
    expect(problem).toMatchObject({ path: 'corners[2]', code: 'walls-cross' })
    expect(problem?.message).toMatch(/^Wall 1 meets wall 3\./)
  })

  it.each([
    ['a corner that touches another wall', polygon([0, 0], [120, 0], [120, 120], [60, 0], [0, 120])],
    ['a wall that lies on another', polygon([0, 0], [120, 0], [120, 60], [60, 60], [60, 0], [30, 0], [30, 90], [0, 90])],
    ['a wall that folds back on the one before', polygon([0, 0], [120, 0], [60, 0], [60, 120])],
    ['a wall that folds back where the walk closes', polygon([60, 0], [60, 120], [0, 0], [120, 0])],
  ])('refuses %s', (_, shape) => expect(codesOf(shape)).toContainEqual([expect.stringMatching(/^corners/), 'walls-cross']))

  it('refuses corners in one place', () => {
    expect(codesOf(polygon([0, 0], [120, 0], [120, 0], [0, 120]))).toEqual([['corners[2]', 'same-corner']])
  })

  it('refuses corners in one line', () => {
    expect(codesOf(polygon([0, 0], [60, 0], [120, 0]))).toEqual([['corners', 'no-area']])
  })

  it('takes a corner in the middle of a straight wall', () => {
    expect(checkShape(polygon([0, 0], [60, 0], [120, 0], [120, 120], [0, 120]))).toEqual([])
  })
})

describe('eaveOutline', () => {
  it('grows a rectangle all round', () => {
    expect(eaveOutline({ kind: 'rectangle', lengthIn: 504, widthIn: 336 }, 12)).toEqual({
      areaSqIn: 528 * 360,
      perimeterIn: 2 * (528 + 360),
    })
  })

  it('grows an ell all round, its inner corner too', () => {
    const grown = planFigures({ ...ell, lengthIn: 264, widthIn: 204 } as Shape)
    expect(eaveOutline(ell, 12)).toEqual({ areaSqIn: grown.areaSqIn, perimeterIn: grown.perimeterIn })
  })

  it('says so where it closes a notch', () => {
    const notched = polygon([0, 0], [240, 0], [240, 120], [130, 120], [130, 60], [110, 60], [110, 120], [0, 120])
    expect(eaveOutline(notched, 9)).not.toBeNull()
    expect(eaveOutline(notched, 12)).toBeNull()
  })

  it('is the footprint where there is no overhang', () => {
    expect(eaveOutline(ell, 0)).toEqual({ areaSqIn: planFigures(ell).areaSqIn, perimeterIn: 840 })
  })
})

describe('slopeFactor', () => {
  it('is 1.1180 for a roof of 6 in 12', () => expect(slopeFactor(6, 12)).toBeCloseTo(1.118, 4))
  it('is 1 where nothing rises', () => expect(slopeFactor(0, 12)).toBe(1))
})

describe('always', () => {
  const sides = fc.integer({ min: 64, max: 64 * 600 }).map((parts) => parts / 64)
  /** Corners round a centre, one in each of so many sectors: never crossing. */
  const starCorners = fc.array(fc.integer({ min: 24, max: 600 }), { minLength: 3, maxLength: 24 }).map((radii) =>
    radii.map((radius, index): Corner => {
      const angle = (2 * Math.PI * index) / radii.length
      return [Math.round(radius * Math.cos(angle) * 64) / 64, Math.round(radius * Math.sin(angle) * 64) / 64]
    }),
  )
  const areaOf = (corners: readonly Corner[]) => planFigures(polygon(...corners)).areaSqIn

  it('an ell is its two rectangles', () => {
    fc.assert(
      fc.property(sides, sides, sides, sides, (a, b, c, d) => {
        const whole: Shape = { kind: 'ell', lengthIn: a + b, widthIn: c + d, cutLengthIn: b, cutWidthIn: d }
        const area = planFigures(whole).areaSqIn
        expect(area).toBe((a + b) * c + a * d)
        expect(areaOf(shapeOutline(whole))).toBe(area)
        expect(checkShape(whole)).toEqual([])
      }),
    )
  })

  it('a polygon’s area is that of an independent shoelace', () => {
    fc.assert(fc.property(starCorners, (corners) => Math.abs(areaOf(corners) - Math.abs(polygonArea(corners))) < 1e-6))
  })

  it('a star round its centre is a plan', () => {
    fc.assert(fc.property(starCorners, (corners) => checkShape(polygon(...corners)).length === 0))
  })

  it('area and perimeter don’t depend on where the walk begins or which way it goes', () => {
    fc.assert(
      fc.property(starCorners, fc.nat(), (corners, start) => {
        const begin = start % corners.length
        const elsewhere = [...corners.slice(begin), ...corners.slice(0, begin)]
        const { areaSqIn, perimeterIn } = planFigures(polygon(...corners))
        for (const same of [elsewhere, [...corners].reverse()]) {
          expect(planFigures(polygon(...same)).areaSqIn).toBeCloseTo(areaSqIn, 6)
          expect(planFigures(polygon(...same)).perimeterIn).toBeCloseTo(perimeterIn, 9)
        }
      }),
    )
  })

  it('a quarter turn and a shift change nothing', () => {
    fc.assert(
      fc.property(starCorners, sides, sides, (corners, dx, dy) => {
        const turned = corners.map(([x, y]): Corner => [dx - y, dy + x])
        expect(areaOf(turned)).toBeCloseTo(areaOf(corners), 6)
      }),
    )
  })

  it('a corner more in the middle of a wall changes nothing', () => {
    const evenCorners = starCorners.map((corners) => corners.map(([x, y]): Corner => [Math.round(x) * 2, Math.round(y) * 2]))
    fc.assert(
      fc.property(evenCorners, fc.nat(), (corners, pick) => {
        const index = pick % corners.length
        const [from, to] = [corners[index] as Corner, corners[(index + 1) % corners.length] as Corner]
        const middle: Corner = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]
        const more = [...corners.slice(0, index + 1), middle, ...corners.slice(index + 1)]
        expect(areaOf(more)).toBe(areaOf(corners))
        expect(planFigures(polygon(...more)).perimeterIn).toBeCloseTo(planFigures(polygon(...corners)).perimeterIn, 9)
      }),
    )
  })

  it('an overhang grows a rectangle as it grows its sides', () => {
    fc.assert(
      fc.property(sides, sides, fc.integer({ min: 0, max: 120 }), (lengthIn, widthIn, overhang) => {
        const grown = eaveOutline({ kind: 'rectangle', lengthIn, widthIn }, overhang)
        expect(grown?.areaSqIn).toBeCloseTo((lengthIn + 2 * overhang) * (widthIn + 2 * overhang), 6)
      }),
    )
  })
})
