import { mount } from '@vue/test-utils'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { labelSpot } from '../../src/components/rooms/labelSpot.ts'
import { placeDimensions } from '../../src/components/rooms/placeDimensions.ts'
import { placeOnWalls, wallPieces } from '../../src/components/rooms/placeOnWalls.ts'
import { planLayout } from '../../src/components/rooms/planLayout.ts'
import RoomPlan from '../../src/components/rooms/RoomPlan.vue'
import { scaleBar } from '../../src/components/rooms/scaleBar.ts'
import type { Corner } from '../../shared/schemas/room.ts'
import { buildKeyedRoom } from '../support/buildKeyedRoom.ts'

const rectangle: Corner[] = [
  [0, 0],
  [150, 0],
  [150, 120],
  [0, 120],
]
const room = buildKeyedRoom()

function mountPlan(corners: readonly Corner[], own: { isOpen?: boolean; isNumbered?: boolean; openings?: typeof room.openings } = {}) {
  const { isOpen = false, openings = room.openings, ...props } = own
  return mount(RoomPlan, {
    props: { name: 'Front bedroom', plan: { corners, isOpen }, openings, deductions: [], areaText: '125.00 sq ft', ...props },
  })
}

describe('RoomPlan', () => {
  it('tells in words what it draws', () => {
    const plan = mountPlan(rectangle)
    const svg = plan.get('svg')

    expect(svg.attributes('role')).toBe('img')
    expect(svg.attributes('aria-label')).toBe('Plan of Front bedroom, to scale')
    const words = plan.get(`#${svg.attributes('aria-describedby')}`).text()
    expect(words).toContain(`4 walls: wall 1 12' 6", turn right; wall 2 10' 0", turn right`)
    expect(words).toContain(`wall 4 10' 0", back to the first corner`)
    expect(words).toContain(`door 2' 8" wide, 6' 8" high; 2 × window 3' 0" wide, 4' 0" high`)
  })

  it('writes each wall’s dimension beside it and draws each opening as often as it is counted', () => {
    const plan = mountPlan(rectangle)

    expect(plan.findAll('.dimension').map((dimension) => dimension.text())).toEqual([`12' 6"`, `10' 0"`, `12' 6"`, `10' 0"`])
    expect(plan.findAll('.piece.window')).toHaveLength(2)
    expect(plan.findAll('.piece.door')).toHaveLength(1)
  })

  it('marks the spot where walls cross and says which they are', () => {
    const plan = mountPlan([
      [0, 0],
      [100, 100],
      [100, 0],
      [0, 100],
    ])

    expect(plan.findAll('.crossing')).toHaveLength(1)
    expect(plan.text()).toContain('Wall 1 crosses wall 3.')
  })

  it('dashes the wall that closes the plan and hasn’t been keyed', () => {
    const plan = mountPlan(rectangle, { isOpen: true, isNumbered: true })

    expect(plan.find('.closing').exists()).toBe(true)
    expect(plan.text()).toContain(`wall 4 10' 0", not keyed, drawn to close the plan`)
    expect(plan.findAll('.number').map((number) => number.text())).toEqual(['1', '2', '3', '4'])
  })

  it('says so when an opening is wider than any wall', () => {
    const plan = mountPlan(rectangle, { openings: [{ ...room.openings[0]!, widthIn: 400 }] })

    expect(plan.text()).toContain('One piece is wider than the wall that is left')
    expect(plan.findAll('.piece')).toHaveLength(0)
  })
})

describe('planLayout', () => {
  it('keeps every wall inside the drawing and one scale for both directions', () => {
    const coordinate = fc.integer({ min: -5000, max: 5000 })
    fc.assert(
      fc.property(fc.array(fc.tuple(coordinate, coordinate), { minLength: 3, maxLength: 20 }), (corners) => {
        const layout = planLayout(corners, { width: 480, maxHeight: 400, margin: 46 })
        for (const corner of corners) {
          const [x, y] = layout.toPixels(corner)
          expect(x).toBeGreaterThanOrEqual(45.9)
          expect(x).toBeLessThanOrEqual(480 - 45.9)
          expect(y).toBeGreaterThanOrEqual(45.9)
          expect(y).toBeLessThanOrEqual(layout.height - 45.9)
        }
        expect(layout.height).toBeLessThanOrEqual(400.1)
      }),
    )
  })

  it('finds the way out of the room whichever way round the corners go', () => {
    const outwardOf = (corners: Corner[]) =>
      planLayout(corners, { width: 480, maxHeight: 400, margin: 46 }).walls.map(({ outward }) => outward.map((part) => part + 0))

    expect(outwardOf(rectangle)[0]).toEqual([0, -1])
    expect(outwardOf([...rectangle].reverse())[0]).toEqual([0, 1])
  })
})

describe('placeOnWalls', () => {
  it('spreads the pieces of a wall and lets none overlap', () => {
    const width = fc.integer({ min: 12, max: 96 })
    fc.assert(
      fc.property(fc.array(width, { maxLength: 20 }), (widths) => {
        const pieces = widths.map((widthIn) => ({ kind: 'window' as const, widthIn, depthIn: 0 }))
        const { placed, unplaced } = placeOnWalls(pieces, [150, 120, 150, 120])
        expect(placed.length + unplaced.length).toBe(widths.length)
        for (const wall of [0, 1, 2, 3]) {
          const here = placed.filter((piece) => piece.wall === wall)
          here.forEach((piece, index) => {
            const next = here[index + 1]
            const end = piece.fromIn + piece.widthIn
            expect(end).toBeLessThanOrEqual((next?.fromIn ?? [150, 120, 150, 120][wall] ?? 0) + 1e-9)
          })
        }
      }),
    )
  })

  it('repeats a piece as often as it is counted', () => {
    expect(wallPieces(room.openings, [])).toHaveLength(3)
  })
})

describe('scaleBar', () => {
  it('takes the longest round length that fits', () => {
    expect(scaleBar(2, 140)).toEqual({ feet: 5, pixels: 120 })
    expect(scaleBar(0.5, 140)).toEqual({ feet: 20, pixels: 120 })
  })
})

describe('labelSpot', () => {
  it('is the middle of a rectangle', () => {
    expect(labelSpot(rectangle)).toEqual({ at: [75, 60], clearIn: 60 })
  })

  it('lies inside an L and not in its cut', () => {
    const spot = labelSpot([
      [0, 0],
      [240, 0],
      [240, 40],
      [40, 40],
      [40, 240],
      [0, 240],
    ])
    const [x = 0, y = 0] = spot?.at ?? []
    expect(x < 40 || y < 40).toBe(true)
  })
})

describe('placeDimensions', () => {
  const SPACE = { nearest: 16, thickness: 5 }
  const horizontal = (fromX: number, toX: number) => ({
    from: [fromX, 100] as Corner,
    to: [toX, 100] as Corner,
    outward: [0, -1] as Corner,
    text: `12' 6"`,
  })

  it('stands each dimension as near as may be', () => {
    expect(placeDimensions([horizontal(0, 200)], SPACE)).toEqual([{ offset: 16, textOffset: 16 }])
  })

  it('puts the words off the line where the wall is shorter than they are', () => {
    expect(placeDimensions([horizontal(0, 20)], SPACE)).toEqual([{ offset: 16, textOffset: 29 }])
  })

  it('moves a dimension out whose words would run into those of a longer wall', () => {
    const [short, long] = placeDimensions([horizontal(0, 60), { ...horizontal(10, 70), from: [10, 102], to: [75, 102] }], SPACE)

    expect(long?.offset).toBe(16)
    expect(short?.offset).toBeGreaterThan(16)
  })

  it('stands the second dimension of a notch in line with those beyond it, where the two would cross', () => {
    const walls = outlineOf([
      [0, 0],
      [280, 0],
      [280, 160],
      [200, 160],
      [200, 220],
      [0, 220],
    ])
    const [, , alongNotch, intoNotch, bottom] = placeDimensions(walls, SPACE)

    expect(alongNotch).toEqual({ offset: 16, textOffset: 16 })
    // The room reaches 80 further right than the wall that goes into the notch.
    expect(intoNotch).toEqual({ offset: 96, textOffset: 96 })
    expect(bottom?.offset).toBe(16)
  })
})

function outlineOf(corners: readonly Corner[]) {
  return planLayout(corners, { width: 280, maxHeight: 220, margin: 0 }).walls.map(({ from, to, outward }) => ({
    from,
    to,
    outward,
    text: `8' 0"`,
  }))
}
