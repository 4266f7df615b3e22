import { describe, expect, it } from 'vitest'
import { houseMeasures, openEstimate, roomMeasures, type HouseInput, type LineInput, type RoomInput } from '../../shared/engine/index.ts'
import { slopeFactor } from '../../shared/engine/geometry/slopeFactor.ts'
import type { RoofGroup } from '../../shared/schemas/house.ts'
import { buildEstimateInput, buildHouseInput, buildLineInput, buildOpening, buildRoomInput } from '../support/buildEngineInput.ts'

function houseOf(lengthFt: number, widthFt: number, kind: RoofGroup['kind'], rise: number): HouseInput {
  return buildHouseInput({
    footprint: { kind: 'rectangle', lengthIn: lengthFt * 12, widthIn: widthFt * 12 },
    overhangIn: 0,
    roof: [{ kind, rise }],
  })
}

function ofHouse(house: HouseInput, name: string): number {
  const measure = houseMeasures(house, [])[name]
  return measure?.ok ? measure.value : NaN
}

function ofRoom(room: RoomInput, name: string): number {
  const measure = roomMeasures(room)[name]
  return measure?.ok ? measure.value : NaN
}

function roomOf(lengthFt: number, widthFt: number, own: Partial<RoomInput> = {}): RoomInput {
  return buildRoomInput({ shape: { kind: 'rectangle', lengthIn: lengthFt * 12, widthIn: widthFt * 12 }, ...own })
}

/** What is bought for a line of a room. */
function bought(room: RoomInput, own: Partial<LineInput>): number {
  return openEstimate(buildEstimateInput({ rooms: [room], lines: [buildLineInput({ roomKey: room.key, ...own })] })).line('line').quantity
}

function boughtForHouse(house: HouseInput, own: Partial<LineInput>): number {
  return openEstimate(buildEstimateInput({ house, lines: [buildLineInput(own)] })).line('line').quantity
}

describe('roof slopes: Pythagoras on the common rafter, √(1 + (rise/12)²)', () => {
  it.each([
    [3, 1.0308],
    [4, 1.0541],
    [5, 1.0833],
    [6, 1.118],
    [8, 1.2019],
    [9, 1.25],
    [10, 1.3017],
    [12, 1.4142],
    [18, 1.8028],
  ])('%d in 12 has a factor of %d', (rise, factor) => expect(Math.abs(slopeFactor(rise, 12) - factor)).toBeLessThanOrEqual(0.0001))

  // Weak: a roofer's chart in two decimals. It prints 1.06 for 4 in 12, where the formula gives 1.054, so that row is left out.
  it.each([
    [2, 1.02],
    [3, 1.03],
    [5, 1.08],
    [6, 1.12],
    [7, 1.16],
    [8, 1.2],
  ])('a printed chart has %d in 12 as %d', (rise, factor) => expect(Math.abs(slopeFactor(rise, 12) - factor)).toBeLessThanOrEqual(0.01))

  it('a house 28 ft wide at 4 in 12 has rafters of 14 ft 9 in', () => {
    expect(Math.abs(14 * slopeFactor(4, 12) - 14.757)).toBeLessThanOrEqual(0.02)
  })

  it('5,000 sq ft of plan at 6 in 12 are 5,590 sq ft, 55.90 squares', () => {
    expect(Math.abs(ofHouse(houseOf(100, 50, 'gable', 6), 'roof_area') - 5590)).toBeLessThanOrEqual(1)
    expect(ofHouse(houseOf(100, 50, 'gable', 6), 'roof_squares')).toBeCloseTo(55.9, 2)
  })

  it('925 sq ft of roof are 9.25 squares: a roofing square is 100 sq ft', () => {
    expect(ofHouse(houseOf(37, 25, 'flat', 0), 'roof_squares')).toBe(9.25)
  })

  it('gable and hip over one eave line at one pitch have one area', () => {
    for (const rise of [3, 6, 12])
      expect(ofHouse(houseOf(42, 28, 'hip', rise), 'roof_area')).toBe(ofHouse(houseOf(42, 28, 'gable', rise), 'roof_area'))
  })

  it('a gable end of 28 ft at 6 in 12 rises 7 ft: 98 sq ft each, 196 both', () => {
    expect(ofHouse(houseOf(42, 28, 'gable', 6), 'gable_area')).toBe(196)
  })
})

// Lumber-yard rules in print only on weak pages: 3 bundles of shingles a square, 4 squares of 15 lb felt a roll.
describe('roofing for 3,350 sq ft of plan at 4 in 12: 3,531.2 sq ft', () => {
  const house = houseOf(67, 50, 'gable', 4)

  it('is 35.31 squares', () => expect(ofHouse(house, 'roof_squares')).toBeCloseTo(35.31, 2))
  it('takes 106 bundles of shingles, whole ones', () =>
    expect(boughtForHouse(house, { unit: 'each', quantity: 'ceil(roof_area / 100 * 3)' })).toBe(106))
  it('takes 117 with a tenth of waste', () => {
    expect(boughtForHouse(house, { unit: 'each', quantity: 'roof_area / 100 * 3', wastePercent: 10, packageSize: 1 })).toBe(117)
  })
  it('takes 9 rolls of felt', () => expect(boughtForHouse(house, { unit: 'square', quantity: 'roof_squares', packageSize: 4 }) / 4).toBe(9))
})

describe('a room of 12 × 15 ft, 8 ft high', () => {
  const room = roomOf(15, 12)
  const deducted = roomOf(15, 12, {
    openings: [buildOpening({ widthIn: 36, heightIn: 80 }), buildOpening({ kind: 'window', widthIn: 36, heightIn: 48, count: 2 })],
  })

  it('has 54 ft of perimeter and 432 sq ft of walls', () => {
    expect([ofRoom(room, 'perimeter'), ofRoom(room, 'wall_area')]).toEqual([54, 432])
  })

  it('less a door 3-0 × 6-8 and two windows 3-0 × 4-0 at their true sizes has 388', () => expect(ofRoom(deducted, 'wall_area')).toBe(388))

  // Rules in circulation deduct 20, 21 or 30 for a door and 12, 15 or 20 for a window, or nothing: so it is a switch of each opening, and true sizes win.
  it('keeps what is not to be deducted', () => {
    const kept = { ...deducted, openings: deducted.openings.map((opening) => ({ ...opening, fromWalls: false })) }
    expect(ofRoom(kept, 'wall_area')).toBe(432)
  })

  it('takes 14 sheets of 4 × 8 ft, and 15 with a tenth of waste', () => {
    expect(bought(room, { unit: 'sheet', quantity: 'ceil(wall_area / 32)' })).toBe(14)
    expect(bought(room, { quantity: 'wall_area', packageSize: 32, wastePercent: 10 }) / 32).toBe(15)
  })

  // Common practice: base is the perimeter less door widths.
  it('takes 51 ft of base past a 3-0 door, 56.1 with waste, 4 sticks of 16 ft', () => {
    const door = roomOf(15, 12, { openings: [buildOpening({ widthIn: 36 })] })
    expect(ofRoom(door, 'base_length')).toBe(51)
    expect(bought(door, { unit: 'lf', quantity: 'base_length', wastePercent: 10 })).toBe(56.1)
    expect(bought(door, { unit: 'lf', quantity: 'base_length', wastePercent: 10, packageSize: 16 })).toBe(64)
  })

  // Common practice.
  it('takes 198 sq ft of plank with a tenth of waste, 9 boxes of 22.5', () => {
    expect(bought(room, { quantity: 'floor_area', wastePercent: 10 })).toBe(198)
    expect(bought(room, { quantity: 'floor_area', wastePercent: 10, packageSize: 22.5 }) / 22.5).toBe(9)
  })

  // Common practice: straight lay 10 percent, diagonal 15, herringbone 15 to 20.
  it('takes 198, 207 and up to 216 sq ft of tile by its lay', () => {
    expect([10, 15, 20].map((wastePercent) => bought(room, { quantity: 'floor_area', wastePercent }))).toEqual([198, 207, 216])
  })
})

// Spread rates as paint makers print them: 400, 350 (smooth) and 300 (textured, bare wallboard) sq ft a gallon.
describe('paint', () => {
  it('for 10 × 15 ft, 8 ft high, at 400 sq ft a gallon is 1 gallon for a coat and 2 for two', () => {
    expect(bought(roomOf(15, 10), { unit: 'gal', quantity: 'ceil(wall_area / 400)' })).toBe(1)
    expect(bought(roomOf(15, 10), { unit: 'gal', quantity: 'ceil(wall_area / 400 * 2)' })).toBe(2)
  })

  it('covers less of a rough wall', () => {
    const gallons = (rate: number) => bought(roomOf(15, 10), { unit: 'gal', quantity: `wall_area / ${rate}` })
    expect([gallons(350), gallons(300)]).toEqual([1.14, 1.33])
  })

  // Weak: one worked example in print, which rounds 7 ft 2 in to 7.17 ft and so comes to 485.77 and 426.35.
  it('for 67 ft 9 in round, 7 ft 2 in high, less 59.42 sq ft, at 350 a gallon is 1.2175 gallons: buy 2', () => {
    const room = buildRoomInput({
      shape: { kind: 'rectangle', lengthIn: 240, widthIn: 166.5 },
      ceiling: { kind: 'flat', heightIn: 86 },
      openings: [buildOpening({ kind: 'window', widthIn: 92, heightIn: 93 })],
    })
    expect(ofRoom(room, 'perimeter')).toBe(67.75)
    expect(Math.abs(ofRoom(room, 'wall_area_gross') - 485.54)).toBeLessThanOrEqual(0.01)
    expect(Math.abs(ofRoom(room, 'wall_area') - 426.12)).toBeLessThanOrEqual(0.01)
    expect(Math.abs(ofRoom(room, 'wall_area') - 426.35)).toBeLessThanOrEqual(0.3)
    expect(bought(room, { unit: 'gal', quantity: 'wall_area / 350' })).toBe(1.22)
    expect(bought(room, { unit: 'gal', quantity: 'ceil(wall_area / 350)' })).toBe(2)
  })
})

describe('concrete', () => {
  // US Navy training course 14070, chapter 5, which prints 21 cu yd.
  it('for the foundation of the Navy’s 20 × 32 ft building: 527.40 cu ft, with waste 580.14, 21.49 cu yd', () => {
    const parts = '(85.76 + 50.04 + 133.32 + 69.32 + 188.96)'
    expect(boughtForHouse(buildHouseInput(), { unit: 'cf', quantity: parts })).toBe(527.4)
    expect(boughtForHouse(buildHouseInput(), { unit: 'cf', quantity: parts, wastePercent: 10 })).toBe(580.14)
    expect(boughtForHouse(buildHouseInput(), { unit: 'cy', quantity: `${parts} / 27`, wastePercent: 10 })).toBe(21.49)
  })

  // Weak page; the arithmetic was checked. Taking 4 in for 0.33 ft gives 1.222, the common slip.
  it('for a slab of 10 × 10 ft, 4 in thick, is 33.333 cu ft, 1.2346 cu yd', () => {
    const slab = openEstimate(
      buildEstimateInput({
        rooms: [roomOf(10, 10)],
        lines: [buildLineInput({ roomKey: 'bedroom', unit: 'cy', quantity: 'floor_area * 4 / 12 / 27' })],
      }),
    ).line('line')
    expect(Math.abs(slab.measured - 1.2346)).toBeLessThanOrEqual(0.0005)
  })

  it('of a cubic yard covers 81 sq ft 4 in thick, and 54 sq ft 6 in thick', () => {
    expect([4, 6].map((thick) => boughtForHouse(buildHouseInput(), { quantity: `27 * 12 / ${thick}` }))).toEqual([81, 54])
  })
})

// ANSI Z765-2021, annex: an opening in the upper floor no larger than the treads takes nothing from it.
describe('living area', () => {
  it('of two floors of 28 × 42 ft is 2,352 sq ft', () => {
    const floors = [roomOf(42, 28, { key: 'lower', use: 'living' }), roomOf(42, 28, { key: 'upper', use: 'sleeping' })]
    expect(houseMeasures(buildHouseInput(), floors).living_area).toEqual({ ok: true, value: 2352 })
  })
})

// NIST Handbook 130, lumber: a board foot is 144 cu in of nominal size.
describe('board feet', () => {
  it('of a 2 × 4 of 8 ft are 5.333, of a 2 × 10 of 12 ft 20', () => {
    const measured = (quantity: string) =>
      openEstimate(buildEstimateInput({ lines: [buildLineInput({ unit: 'each', quantity })] })).line('line').measured
    expect(Math.abs(measured('2 * 4 * 8 * 12 / 144') - 5.333)).toBeLessThanOrEqual(0.001)
    expect(measured('2 * 10 * 12 * 12 / 144')).toBe(20)
  })
})
