import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { MEASURES, roomMeasures, type RoomInput } from '../../shared/engine/index.ts'
import { buildDeduction, buildOpening, buildRoomInput } from '../support/buildEngineInput.ts'

function valueOf(room: RoomInput, name: string): number {
  const measure = roomMeasures(room)[name]
  if (!measure?.ok) throw new Error(`${name}: ${measure?.message}`)
  return measure.value
}

function reasonFor(room: RoomInput, name: string): string {
  const measure = roomMeasures(room)[name]
  return measure?.ok === false ? measure.message : ''
}

const door = buildOpening({ kind: 'door', widthIn: 32, heightIn: 80 })
const windows = buildOpening({ kind: 'window', widthIn: 36, heightIn: 48, count: 2 })

describe('roomMeasures', () => {
  it('measures the bedroom of the estimate document as it says', () => {
    const room = buildRoomInput({ openings: [door, windows] })
    expect(valueOf(room, 'floor_area')).toBe(125)
    expect(valueOf(room, 'ceiling_area')).toBe(125)
    expect(valueOf(room, 'perimeter')).toBe(45)
    expect(valueOf(room, 'wall_area_gross')).toBe(360)
    expect(valueOf(room, 'opening_area')).toBeCloseTo(41.78, 2)
    expect(valueOf(room, 'wall_area')).toBeCloseTo(318.22, 2)
    expect(valueOf(room, 'base_length')).toBeCloseTo(42.33, 2)
    expect(valueOf(room, 'volume')).toBe(1000)
    expect([valueOf(room, 'windows'), valueOf(room, 'doors')]).toEqual([2, 1])
    expect([valueOf(room, 'length'), valueOf(room, 'width'), valueOf(room, 'height')]).toEqual([12.5, 10, 8])
  })

  it('gives each measure of a room that formulas may name, and no other', () => {
    const names = MEASURES.filter(({ scope }) => scope === 'room').map(({ name }) => name)
    expect(Object.keys(roomMeasures(buildRoomInput()))).toEqual(names)
  })

  describe('openings', () => {
    it('take doors and cased openings from the base, and never windows', () => {
      const cased = buildOpening({ kind: 'cased', widthIn: 60, heightIn: 84 })
      expect(valueOf(buildRoomInput({ openings: [door, cased, windows] }), 'base_length')).toBeCloseTo(45 - 32 / 12 - 5, 9)
    })

    it('count a cased opening as no door', () => {
      expect(valueOf(buildRoomInput({ openings: [buildOpening({ kind: 'cased' })] }), 'doors')).toBe(0)
    })

    it('that are switched off for the walls stay in the opening area', () => {
      const room = buildRoomInput({ openings: [{ ...door, fromWalls: false }] })
      expect(valueOf(room, 'wall_area')).toBe(360)
      expect(valueOf(room, 'opening_area')).toBeCloseTo(17.78, 2)
    })

    it('that are switched off for the base leave it whole', () => {
      expect(valueOf(buildRoomInput({ openings: [{ ...door, fromBase: false }] }), 'base_length')).toBe(45)
    })
  })

  describe('deductions', () => {
    const room = buildRoomInput({ deductions: [buildDeduction({ widthIn: 60, heightIn: 36, depthIn: 24, count: 2, fromFloor: true })] })

    it('take what they cover from walls, floor and base, by their switches', () => {
      expect(valueOf(room, 'wall_area')).toBe(330)
      expect(valueOf(room, 'floor_area')).toBe(105)
      expect(valueOf(room, 'base_length')).toBe(35)
    })

    it('leave ceiling, perimeter, gross walls, openings and volume as they are', () => {
      expect(valueOf(room, 'ceiling_area')).toBe(125)
      expect(valueOf(room, 'perimeter')).toBe(45)
      expect(valueOf(room, 'wall_area_gross')).toBe(360)
      expect(valueOf(room, 'opening_area')).toBe(0)
      expect(valueOf(room, 'volume')).toBe(1000)
    })

    it('take nothing where they are switched off', () => {
      const off = buildDeduction({ fromWalls: false, fromFloor: false, fromBase: false })
      expect(roomMeasures(buildRoomInput({ deductions: [off] }))).toEqual(roomMeasures(buildRoomInput()))
    })
  })

  describe('a sloped ceiling', () => {
    const sloped = buildRoomInput({ ceiling: { kind: 'sloped', lowIn: 60, highIn: 150 } })

    it('rises across the width: 10 ft of run, 7½ ft of rise make 12½ ft of slope', () => {
      expect(valueOf(sloped, 'ceiling_area')).toBeCloseTo(12.5 * 12.5, 9)
    })

    it('has the mean for its height, so that a rectangle’s walls are a low one, a high one and two that slope', () => {
      expect(valueOf(sloped, 'height')).toBe(8.75)
      expect(valueOf(sloped, 'wall_area_gross')).toBeCloseTo(12.5 * 5 + 12.5 * 12.5 + 2 * 10 * 8.75, 9)
      expect(valueOf(sloped, 'volume')).toBe(125 * 8.75)
    })

    it('rises across the shorter side of an L or a polygon', () => {
      const ell = { kind: 'ell' as const, lengthIn: 120, widthIn: 240, cutLengthIn: 12, cutWidthIn: 12 }
      const room = buildRoomInput({ shape: ell, ceiling: { kind: 'sloped', lowIn: 60, highIn: 150 } })
      expect(valueOf(room, 'ceiling_area')).toBeCloseTo((10 * 20 - 1) * 1.25, 9)
    })
  })

  describe('what can’t be had', () => {
    it('says so while no ceiling height is keyed, and has the rest', () => {
      const room = buildRoomInput({ ceiling: null, openings: [door] })
      for (const name of ['height', 'wall_area', 'wall_area_gross', 'volume', 'ceiling_area'])
        expect(reasonFor(room, name)).toBe('No ceiling height is keyed.')
      expect(valueOf(room, 'floor_area')).toBe(125)
      expect(valueOf(room, 'doors')).toBe(1)
    })

    it('says so when openings take more than the walls, and has the gross', () => {
      const room = buildRoomInput({ openings: [buildOpening({ widthIn: 150, heightIn: 96, count: 6, fromBase: false })] })
      expect(reasonFor(room, 'wall_area')).toMatch(/^Openings and deductions take more than all of the walls/)
      expect(valueOf(room, 'wall_area_gross')).toBe(360)
    })

    it('says so when doors take more than the perimeter', () => {
      const room = buildRoomInput({ openings: [buildOpening({ widthIn: 120, heightIn: 12, count: 5 })] })
      expect(reasonFor(room, 'base_length')).toMatch(/^Doors and deductions take more than the whole perimeter/)
    })

    it('says so when deductions take more than the floor', () => {
      const room = buildRoomInput({
        deductions: [buildDeduction({ widthIn: 150, depthIn: 121, fromFloor: true, fromWalls: false, fromBase: false })],
      })
      expect(reasonFor(room, 'floor_area')).toMatch(/^Deductions take more than the whole floor/)
    })

    it('says which walls cross, and still counts doors and windows', () => {
      const bowTie = {
        kind: 'polygon' as const,
        corners: [
          [0, 0],
          [120, 120],
          [120, 0],
          [0, 120],
        ] as [number, number][],
      }
      const room = buildRoomInput({ shape: bowTie, openings: [door] })
      expect(reasonFor(room, 'floor_area')).toMatch(/^Wall 1 meets wall 3\./)
      expect(valueOf(room, 'doors')).toBe(1)
    })

    it('lets openings take exactly all of the walls', () => {
      const room = buildRoomInput({ openings: [buildOpening({ widthIn: 540, heightIn: 96, fromBase: false })] })
      expect(valueOf(room, 'wall_area')).toBe(0)
    })
  })
})

describe('always', () => {
  const inches = fc.integer({ min: 64, max: 64 * 480 }).map((parts) => parts / 64)

  it('walls are gross less openings, and base is perimeter less doors', () => {
    fc.assert(
      fc.property(inches, inches, inches, fc.integer({ min: 1, max: 3 }), (lengthIn, widthIn, heightIn, count) => {
        const opening = buildOpening({ widthIn: 1, heightIn: 1, count })
        const room = buildRoomInput({
          shape: { kind: 'rectangle', lengthIn, widthIn },
          ceiling: { kind: 'flat', heightIn },
          openings: [opening],
        })
        expect(valueOf(room, 'wall_area') + valueOf(room, 'opening_area')).toBeCloseTo(valueOf(room, 'wall_area_gross'), 9)
        expect(valueOf(room, 'base_length') + count / 12).toBeCloseTo(valueOf(room, 'perimeter'), 9)
      }),
    )
  })

  it('a rectangle keyed as a polygon measures the same', () => {
    fc.assert(
      fc.property(inches, inches, (lengthIn, widthIn) => {
        const rectangle = buildRoomInput({ shape: { kind: 'rectangle', lengthIn, widthIn } })
        const corners: [number, number][] = [
          [0, 0],
          [lengthIn, 0],
          [lengthIn, widthIn],
          [0, widthIn],
        ]
        const polygon = buildRoomInput({ shape: { kind: 'polygon', corners } })
        expect(roomMeasures(polygon)).toEqual(roomMeasures(rectangle))
      }),
    )
  })

  it('a sloped ceiling whose ends are level is flat', () => {
    fc.assert(
      fc.property(inches, (heightIn) => {
        const level = buildRoomInput({ ceiling: { kind: 'sloped', lowIn: heightIn, highIn: heightIn } })
        expect(roomMeasures(level)).toEqual(roomMeasures(buildRoomInput({ ceiling: { kind: 'flat', heightIn } })))
      }),
    )
  })
})
