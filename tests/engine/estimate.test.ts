import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { computeEstimate, openEstimate, type LineInput } from '../../shared/engine/index.ts'
import type { EstimateSettings } from '../../shared/schemas/estimate.ts'
import { buildEstimateInput, buildLineInput, buildOpening, buildRoomInput, buildSettings, samePrice } from '../support/buildEngineInput.ts'

const figuresOf = (own: Partial<LineInput>) =>
  openEstimate(buildEstimateInput({ rooms: [buildRoomInput()], lines: [buildLineInput(own)] })).line('line')

function totalsOf(lines: Partial<LineInput>[], settings: Partial<EstimateSettings>) {
  const keyed = lines.map((own, index) => buildLineInput({ key: `line-${index}`, ...own }))
  return computeEstimate(buildEstimateInput({ lines: keyed, settings: buildSettings(settings) })).totals
}

describe('a line', () => {
  it('of the estimate document comes to what the document says', () => {
    const plank = figuresOf({
      roomKey: 'bedroom',
      quantity: 'floor_area',
      wastePercent: 10,
      packageSize: 22.5,
      unitPriceE4: { low: 24_000, likely: 30_000, high: 39_000 },
      hoursPerUnit: 0.045,
    })
    expect(plank).toMatchObject({
      measured: 125,
      quantity: 157.5,
      amountCents: { low: 37_800, likely: 47_250, high: 61_425 },
      hours: 7.09,
      error: null,
    })
  })

  it('may have a number for its quantity', () => {
    expect(figuresOf({ quantity: 180 })).toMatchObject({ measured: 180, quantity: 180, formulaDimension: 'any' })
  })

  describe('quantity', () => {
    it('is measured × waste to 2 decimals, half up, before it is priced', () => {
      expect(figuresOf({ quantity: '33.335', unitPriceE4: samePrice(1_000_000) })).toMatchObject({
        quantity: 33.34,
        amountCents: samePrice(333_400),
      })
      expect(figuresOf({ quantity: '1.005' }).quantity).toBe(1.01)
      expect(figuresOf({ quantity: '101', wastePercent: 7.5 }).quantity).toBe(108.58)
    })

    it('goes up to whole packages by own hands', () => {
      expect(figuresOf({ quantity: '225', packageSize: 22.5 }).quantity).toBe(225)
      expect(figuresOf({ quantity: '225.01', packageSize: 22.5 }).quantity).toBe(247.5)
      expect(figuresOf({ quantity: '0.1', packageSize: 22.5 }).quantity).toBe(22.5)
      expect(figuresOf({ quantity: '0', packageSize: 22.5 }).quantity).toBe(0)
    })

    it('takes noise for no package more', () => {
      expect(figuresOf({ quantity: '75 * 3 * 0.1 * 10', packageSize: 22.5 }).quantity).toBe(225)
    })

    it('is not packaged for hired work', () => {
      expect(figuresOf({ quantity: '225.01', packageSize: 22.5, basis: 'hired' }).quantity).toBe(225.01)
    })
  })

  describe('amount', () => {
    it('is at least the minimum charge for hired work, at each end', () => {
      const hired = figuresOf({
        basis: 'hired',
        quantity: '10',
        minimumChargeCents: 2500,
        unitPriceE4: { low: 20_000, likely: 30_000, high: 40_000 },
      })
      expect(hired.amountCents).toEqual({ low: 2500, likely: 3000, high: 4000 })
    })

    it('knows no minimum charge by own hands', () => {
      expect(figuresOf({ quantity: '10', minimumChargeCents: 250_000 }).amountCents.likely).toBe(3000)
    })

    it('rounds to the cent, half up', () => {
      expect(figuresOf({ quantity: '0.5', unitPriceE4: samePrice(100) }).amountCents.likely).toBe(1)
      expect(figuresOf({ quantity: '1', unitPriceE4: samePrice(1_250) }).amountCents.likely).toBe(13)
    })

    it('is exact where a product passes what a double holds', () => {
      expect(figuresOf({ quantity: '98765.43', unitPriceE4: samePrice(99_999_999) }).amountCents.likely).toBe(98_765_429_012)
    })
  })

  it('counts hours for own hands alone', () => {
    expect(figuresOf({ hoursPerUnit: 0.0333 }).hours).toBe(3.33)
    expect(figuresOf({ hoursPerUnit: 0.0333, basis: 'hired' }).hours).toBe(0)
  })

  describe('has an error, and stays out of the totals, where', () => {
    const errorOf = (own: Partial<LineInput>) => {
      const { errors, lines, totals } = computeEstimate(
        buildEstimateInput({ rooms: [buildRoomInput()], lines: [buildLineInput({ key: 'good' }), buildLineInput(own)] }),
      )
      expect(lines.map(({ key }) => key)).toEqual(['good'])
      expect(totals.totalCents.likely).toBe(30_000)
      expect(errors).toHaveLength(1)
      return errors[0]
    }

    it('there is no price', () => expect(errorOf({ unitPriceE4: null })).toMatchObject({ path: 'lines[1].unitPrice', code: 'no-price' }))
    it('the room is not there', () => expect(errorOf({ roomKey: 'cellar' })).toMatchObject({ path: 'lines[1].room', code: 'unknown-room' }))
    it('the unit is unknown', () => expect(errorOf({ unit: 'parsec' })).toMatchObject({ path: 'lines[1].unit', code: 'unknown-unit' }))
    it('the formula is of another unit', () =>
      expect(errorOf({ roomKey: 'bedroom', quantity: 'perimeter' })).toMatchObject({ path: 'lines[1].quantity', code: 'unit-mismatch' }))
    it('the formula names nothing', () =>
      expect(errorOf({ quantity: 'nothing' })).toMatchObject({ path: 'lines[1].quantity', code: 'unknown-name' }))
    it('it comes to a billion dollars', () =>
      expect(errorOf({ quantity: '1000000', unitPriceE4: samePrice(10_000_000) })).toMatchObject({
        path: 'lines[1].quantity',
        code: 'too-large',
      }))
  })

  it('of a cent under a billion dollars is computed', () => {
    expect(figuresOf({ quantity: '999999999.99', unitPriceE4: samePrice(10_000) }).amountCents.likely).toBe(99_999_999_999)
  })

  it('keeps its quantity where only the price is missing', () => {
    expect(figuresOf({ unitPriceE4: null })).toMatchObject({ measured: 100, quantity: 100, amountCents: samePrice(0), unitPriceE4: null })
  })
})

describe('the totals', () => {
  const ownHands = { quantity: '1000', unitPriceE4: samePrice(10_000) }
  const hired = { quantity: '2000', unitPriceE4: samePrice(10_000), basis: 'hired' as const }
  const likely = (totals: ReturnType<typeof totalsOf>) => Object.values(totals).map((range) => range.likely)

  it('add overhead and profit on hired work, tax on materials, permits and contingency, in that order', () => {
    const totals = totalsOf([ownHands, hired], {
      overheadAndProfitPercent: 20,
      salesTax: { rule: 'materials', percent: 8.25 },
      permitsCents: 45_000,
      contingency: { method: 'percent', percent: 10 },
    })
    expect(likely(totals)).toEqual([300_000, 40_000, 8_250, 45_000, 39_325, 432_575])
  })

  it('tax own hands, hired work and its overhead and profit, under the whole-contract rule', () => {
    const totals = totalsOf([ownHands, hired], { overheadAndProfitPercent: 20, salesTax: { rule: 'whole-contract', percent: 8.25 } })
    expect(likely(totals)).toEqual([300_000, 40_000, 28_050, 0, 0, 368_050])
  })

  it('tax nothing under none', () => {
    expect(likely(totalsOf([ownHands, hired], { salesTax: { rule: 'none', percent: 8.25 } }))).toEqual([300_000, 0, 0, 0, 0, 300_000])
  })

  it('add a fixed contingency as it is', () => {
    const totals = totalsOf([ownHands], { contingency: { method: 'fixed', amountCents: 123_456 } })
    expect(totals.contingencyCents).toEqual(samePrice(123_456))
    expect(totals.totalCents.likely).toBe(223_456)
  })

  it('round each percentage once, half up, on a base of whole cents', () => {
    const totals = totalsOf([{ quantity: '0.1', unitPriceE4: samePrice(10_000), basis: 'hired' }], {
      overheadAndProfitPercent: 15,
      contingency: { method: 'percent', percent: 12.5 },
    })
    expect(likely(totals)).toEqual([10, 2, 0, 0, 2, 14])
  })

  it('do the same at low, likely and high', () => {
    const { totalCents } = totalsOf([{ unitPriceE4: { low: 10_000, likely: 20_000, high: 40_000 } }], {
      contingency: { method: 'percent', percent: 10 },
    })
    expect(totalCents).toEqual({ low: 11_000, likely: 22_000, high: 44_000 })
  })

  it('of an empty estimate are permits and what stands on them', () => {
    expect(likely(totalsOf([], { permitsCents: 10_000, contingency: { method: 'percent', percent: 10 } }))).toEqual([
      0, 0, 0, 10_000, 1_000, 11_000,
    ])
  })

  it('of a hundred billion dollars are an error, in words', () => {
    const lines = Array.from({ length: 120 }, (_, index) =>
      buildLineInput({ key: `line-${index}`, quantity: '900000000', unitPriceE4: samePrice(10_000) }),
    )
    const { errors } = computeEstimate(buildEstimateInput({ lines }))
    expect(errors).toEqual([{ path: 'totals.totalCents', code: 'too-large', message: expect.stringMatching(/hundred billion dollars/) }])
  })
})

describe('the results', () => {
  it('hold every measure that can be had, and none that can’t', () => {
    const rooms = [buildRoomInput({ openings: [buildOpening()] }), buildRoomInput({ key: 'den', ceiling: null })]
    const { house, rooms: measured } = computeEstimate(buildEstimateInput({ rooms }))
    expect(house.roof_area).toBe(1475.80486515)
    expect(house).not.toHaveProperty('attic_area')
    expect(measured.bedroom?.wall_area).toBe(342.222222222)
    expect(measured.den).toMatchObject({ floor_area: 125 })
    expect(measured.den).not.toHaveProperty('wall_area')
  })

  it('take any key for a room, whatever it means to a program', () => {
    const { rooms } = computeEstimate(buildEstimateInput({ rooms: [buildRoomInput({ key: '__proto__' })] }))
    expect(Object.keys(rooms)).toEqual(['__proto__'])
  })
})

describe('always', () => {
  const anyLine = fc.record({
    quantity: fc.integer({ min: 0, max: 10_000_000 }).map((thousandths) => String(thousandths / 1000)),
    wastePercent: fc.integer({ min: 0, max: 400 }).map((quarters) => quarters / 4),
    packageSize: fc.option(fc.integer({ min: 1, max: 10_000 }).map((hundredths) => hundredths / 100)),
    basis: fc.constantFrom('own-hands' as const, 'hired' as const),
    unitPriceE4: fc
      .tuple(fc.nat(500_000), fc.nat(500_000), fc.nat(500_000))
      .map(([low, more, most]) => ({ low, likely: low + more, high: low + more + most })),
    minimumChargeCents: fc.nat(100_000),
  })
  const anySettings = fc.record({
    overheadAndProfitPercent: fc.nat(1_000_000).map((e4) => e4 / 10_000),
    salesTax: fc.record({
      rule: fc.constantFrom('none' as const, 'materials' as const, 'whole-contract' as const),
      percent: fc.nat(250_000).map((e4) => e4 / 10_000),
    }),
    permitsCents: fc.nat(1_000_000),
    contingency: fc.nat(1_000_000).map((e4) => ({ method: 'percent' as const, percent: e4 / 10_000 })),
  })

  it('columns foot: direct is the sum of the rounded lines, and the total of its parts', () => {
    fc.assert(
      fc.property(fc.array(anyLine, { maxLength: 20 }), anySettings, (own, settings) => {
        const lines = own.map((line, index) => buildLineInput({ key: `line-${index}`, ...line }))
        const { lines: computed, totals } = computeEstimate(buildEstimateInput({ lines, settings: buildSettings(settings) }))
        for (const end of ['low', 'likely', 'high'] as const) {
          const sum = computed.reduce((cents, { amountCents }) => cents + amountCents[end], 0)
          const { directCents, overheadAndProfitCents, salesTaxCents, permitsCents, contingencyCents, totalCents } = totals
          const before = directCents[end] + overheadAndProfitCents[end] + salesTaxCents[end] + permitsCents[end]
          expect(directCents[end]).toBe(sum)
          expect(totalCents[end]).toBe(before + contingencyCents[end])
        }
      }),
    )
  })

  it('low ≤ likely ≤ high, in every line and every total', () => {
    fc.assert(
      fc.property(fc.array(anyLine, { maxLength: 20 }), anySettings, (own, settings) => {
        const lines = own.map((line, index) => buildLineInput({ key: `line-${index}`, ...line }))
        const { lines: computed, totals } = computeEstimate(buildEstimateInput({ lines, settings: buildSettings(settings) }))
        for (const { low, likely, high } of [...computed.map(({ amountCents }) => amountCents), ...Object.values(totals)]) {
          expect(low <= likely && likely <= high).toBe(true)
        }
      }),
    )
  })

  it('each printed figure can be recomputed by hand from the printed figures it stands on', () => {
    fc.assert(
      fc.property(anyLine, (own) => {
        const line = buildLineInput(own)
        const { quantity, amountCents } = openEstimate(buildEstimateInput({ lines: [line] })).line('line')
        const product = BigInt(Math.round(quantity * 100)) * BigInt(own.unitPriceE4.likely)
        const priced = Number((product + 5000n) / 10_000n)
        expect(amountCents.likely).toBe(own.basis === 'hired' ? Math.max(priced, own.minimumChargeCents) : priced)
      }),
    )
  })

  it('the order of lines is irrelevant to the totals', () => {
    fc.assert(
      fc.property(fc.array(anyLine, { maxLength: 20 }), (own) => {
        const lines = own.map((line, index) => buildLineInput({ key: `line-${index}`, ...line }))
        const totals = computeEstimate(buildEstimateInput({ lines })).totals
        expect(computeEstimate(buildEstimateInput({ lines: [...lines].reverse() })).totals).toEqual(totals)
      }),
    )
  })
})
