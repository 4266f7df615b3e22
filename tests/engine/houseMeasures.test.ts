import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { houseMeasures, MEASURES, type HouseInput, type RoomInput } from '../../shared/engine/index.ts'
import { buildHouseInput, buildOpening, buildRoomInput } from '../support/buildEngineInput.ts'

const bedroom = buildRoomInput()

function valueOf(name: string, house: HouseInput = buildHouseInput(), rooms: readonly RoomInput[] = [bedroom]): number {
  const measure = houseMeasures(house, rooms)[name]
  if (!measure?.ok) throw new Error(`${name}: ${measure?.message}`)
  return measure.value
}

function reasonFor(name: string, house: HouseInput = buildHouseInput(), rooms: readonly RoomInput[] = [bedroom]): string {
  const measure = houseMeasures(house, rooms)[name]
  return measure?.ok === false ? measure.message : ''
}

describe('houseMeasures', () => {
  it('gives each measure of the house that formulas may name, and no other', () => {
    const names = MEASURES.filter(({ scope }) => scope === 'house').map(({ name }) => name)
    expect(Object.keys(houseMeasures(buildHouseInput(), [])).sort()).toEqual([...names].sort())
  })

  describe('the roof of 42 × 28 ft with 12 in of overhang, 6 in 12', () => {
    it('covers 44 × 30 ft of plan, on the slope', () => {
      expect(valueOf('footprint_area')).toBe(1176)
      expect(valueOf('roof_area')).toBeCloseTo(1475.8, 2)
      expect(valueOf('roof_squares')).toBeCloseTo(14.758, 3)
    })

    it('as a gable has its ridge and two eaves from rake to rake, and two triangles of wall', () => {
      expect([valueOf('ridge_length'), valueOf('eave_length'), valueOf('gable_area')]).toEqual([44, 88, 196])
      expect(valueOf('outside_wall_area')).toBe(140 * 8 + 196)
    })

    it('as a hip has the longer side less the shorter for its ridge, eaves all round, no gable, and the same area', () => {
      const hip = buildHouseInput({ roof: [{ kind: 'hip', rise: 6 }] })
      expect([valueOf('ridge_length', hip), valueOf('eave_length', hip), valueOf('gable_area', hip)]).toEqual([14, 148, 0])
      expect(valueOf('roof_area', hip)).toBe(valueOf('roof_area'))
    })

    it('as a shed has one eave and no ridge; its high side and its two ends rise above the wall', () => {
      const shed = buildHouseInput({ roof: [{ kind: 'shed', rise: 3 }] })
      expect([valueOf('ridge_length', shed), valueOf('eave_length', shed), valueOf('gable_area', shed)]).toEqual([0, 44, 28 * 7 + 42 * 7])
    })

    it('as a flat roof is its plan, with eaves all round', () => {
      const flat = buildHouseInput({ roof: [{ kind: 'flat', rise: 0 }] })
      expect([valueOf('roof_area', flat), valueOf('eave_length', flat), valueOf('ridge_length', flat)]).toEqual([1320, 148, 0])
    })

    it('doesn’t depend on which side was keyed as the length', () => {
      const turned = buildHouseInput({ footprint: { kind: 'rectangle', lengthIn: 336, widthIn: 504 } })
      for (const name of ['roof_area', 'ridge_length', 'eave_length', 'gable_area']) expect(valueOf(name, turned)).toBe(valueOf(name))
    })
  })

  describe('a roof of several groups', () => {
    const withRoof = (...roof: HouseInput['roof']) => buildHouseInput({ overhangIn: 0, roof })

    it('shares the plan equally unless told', () => {
      const house = withRoof({ kind: 'gable', rise: 0 }, { kind: 'gable', rise: 9 })
      expect(valueOf('roof_area', house)).toBeCloseTo(588 + 588 * 1.25, 9)
    })

    it('shares it as told; what is left over is shared equally', () => {
      const house = withRoof({ kind: 'gable', rise: 9, sharePercent: 50 }, { kind: 'flat', rise: 0 }, { kind: 'shed', rise: 0 })
      expect(valueOf('roof_area', house)).toBeCloseTo(588 * 1.25 + 588, 9)
    })

    it('says so when the shares don’t come to the whole', () => {
      const house = withRoof({ kind: 'gable', rise: 9, sharePercent: 50 }, { kind: 'flat', rise: 0, sharePercent: 40 })
      expect(reasonFor('roof_area', house)).toBe('The shares of the roof groups do not come to 100 percent.')
    })

    it('has no ridge, eaves or gables worked out, and says what to write instead', () => {
      const house = withRoof({ kind: 'gable', rise: 9 }, { kind: 'flat', rise: 0 })
      expect(reasonFor('ridge_length', house)).toBe(
        'Ridge length is not worked out for a roof of several groups. Write the quantity as a number of lineal feet.',
      )
      expect(reasonFor('outside_wall_area', house)).toMatch(/^Gable area is not worked out/)
    })
  })

  describe('a footprint that is an L', () => {
    const ell = buildHouseInput({ footprint: { kind: 'ell', lengthIn: 480, widthIn: 360, cutLengthIn: 240, cutWidthIn: 120 } })

    it('has footprint, perimeter and roof area', () => {
      expect([valueOf('footprint_area', ell), valueOf('outside_perimeter', ell)]).toEqual([1000, 140])
      expect(valueOf('roof_area', ell)).toBeCloseTo((1000 + 140 + 4) * Math.sqrt(1.25), 9)
    })

    it('has no gable’s ridge, but a hip’s eaves', () => {
      expect(reasonFor('ridge_length', ell)).toMatch(
        /^Ridge length is not worked out for a gable roof over a footprint that is no rectangle/,
      )
      expect(valueOf('eave_length', { ...ell, roof: [{ kind: 'hip', rise: 6 }] })).toBe(148)
    })
  })

  describe('what can’t be had', () => {
    it.each([
      ['footprint_area', { footprint: null }, 'No footprint is keyed for the house.'],
      ['roof_area', { roof: [] }, 'No roof is keyed for the house.'],
      ['roof_area', { overhangIn: null }, 'No roof overhang is keyed for the house. Key 0 where there is none.'],
      ['outside_wall_area', { wallHeightIn: null }, 'No outside wall height is keyed for the house.'],
    ] as const)('%s says why', (name, own, reason) => expect(reasonFor(name, buildHouseInput(own))).toBe(reason))

    it('leaves gables and outside walls without an overhang', () => {
      expect(valueOf('outside_wall_area', buildHouseInput({ overhangIn: null }))).toBe(140 * 8 + 196)
    })

    it.each(['attic_area', 'crawl_area', 'fixtures', 'drainage_fixture_units'])('%s has no field yet, and is never a zero', (name) =>
      expect(reasonFor(name)).toMatch(/Write the quantity as a number/),
    )

    it('from rooms, while there are none', () => {
      for (const name of ['living_area', 'windows', 'sleeping_rooms', 'sum_floor_area'])
        expect(reasonFor(name, buildHouseInput(), [])).toBe('No rooms are keyed yet.')
    })

    it('names the room that keeps a sum from being had', () => {
      const rooms = [bedroom, buildRoomInput({ key: 'den', name: 'Den', ceiling: null })]
      expect(reasonFor('sum_wall_area', buildHouseInput(), rooms)).toBe('Den: No ceiling height is keyed.')
      expect(valueOf('sum_floor_area', buildHouseInput(), rooms)).toBe(250)
    })
  })

  describe('from its rooms', () => {
    const rooms = [
      buildRoomInput({ key: 'a', openings: [buildOpening({ kind: 'window', count: 2 })] }),
      buildRoomInput({ key: 'b', use: 'living', openings: [buildOpening({ kind: 'window', count: 3 }), buildOpening()] }),
      buildRoomInput({ key: 'c', use: 'cellar' }),
      buildRoomInput({ key: 'd', use: 'attic' }),
      buildRoomInput({ key: 'e', use: 'storage' }),
    ]

    it('counts windows and sleeping rooms', () => {
      expect([valueOf('windows', buildHouseInput(), rooms), valueOf('sleeping_rooms', buildHouseInput(), rooms)]).toEqual([5, 1])
    })

    it('leaves cellar, attic and storage out of the living area, and in the sums', () => {
      expect(valueOf('living_area', buildHouseInput(), rooms)).toBe(250)
      expect(valueOf('sum_floor_area', buildHouseInput(), rooms)).toBe(625)
      expect(valueOf('sum_doors', buildHouseInput(), rooms)).toBe(1)
    })
  })

  it('multiplies outside walls by storeys, half ones too', () => {
    expect(valueOf('outside_wall_area', buildHouseInput({ storeys: 1.5 }))).toBe(140 * 8 * 1.5 + 196)
  })
})

describe('always', () => {
  it('gable, hip, shed and flat of one pitch have one area over any plan', () => {
    const rise = fc.double({ min: 0, max: 24, noNaN: true })
    fc.assert(
      fc.property(rise, fc.integer({ min: 100, max: 900 }), fc.integer({ min: 100, max: 900 }), (pitch, lengthIn, widthIn) => {
        const areas = (['gable', 'hip', 'shed', 'flat'] as const).map((kind) =>
          valueOf('roof_area', buildHouseInput({ footprint: { kind: 'rectangle', lengthIn, widthIn }, roof: [{ kind, rise: pitch }] })),
        )
        expect(new Set(areas).size).toBe(1)
      }),
    )
  })
})
