import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { effectivePrice, regionalPrice } from '../../shared/engine/index.ts'
import { samePrice } from '../support/buildEngineInput.ts'

const plank = {
  materials: { low: 24_000, likely: 30_000, high: 39_000 },
  installed: { low: 50_000, likely: 58_000, high: 72_000 },
  minimumChargeCents: 35_000,
  laborSharePercent: 45,
}

describe('regionalPrice', () => {
  it('takes materials by the materials factor', () => {
    expect(regionalPrice(plank, { materialsFactor: 1.1, laborFactor: 1.2 }).materials).toEqual({
      low: 26_400,
      likely: 33_000,
      high: 42_900,
    })
  })

  it('takes installed prices by both factors, blended by the labor share: 0.45 × 1.2 + 0.55 × 1.1 = 1.145', () => {
    expect(regionalPrice(plank, { materialsFactor: 1.1, laborFactor: 1.2 }).installed).toEqual({
      low: 57_250,
      likely: 66_410,
      high: 82_440,
    })
  })

  it('takes the minimum charge as installed prices, to the cent', () => {
    expect(regionalPrice(plank, { materialsFactor: 1.1, laborFactor: 1.2 }).minimumChargeCents).toBe(40_075)
  })

  it('rounds once, half up, without the noise of a binary fraction', () => {
    const odd = { ...plank, materials: samePrice(5), laborSharePercent: 0 }
    expect(regionalPrice(odd, { materialsFactor: 1.1, laborFactor: 1 }).materials).toEqual(samePrice(6))
    expect(regionalPrice({ ...odd, materials: samePrice(10_050) }, { materialsFactor: 1.15, laborFactor: 1 }).materials).toEqual(
      samePrice(11_558),
    )
  })

  it('has no price where the book has none', () => {
    const region = { materialsFactor: 1.1, laborFactor: 1.2 }
    expect(regionalPrice({ ...plank, materials: null }, region).materials).toBeNull()
    expect(regionalPrice({ ...plank, installed: null }, region).installed).toBeNull()
  })

  it('is the base price where both factors are 1', () => {
    const { materials, installed, minimumChargeCents } = plank
    expect(regionalPrice(plank, { materialsFactor: 1, laborFactor: 1 })).toEqual({ materials, installed, minimumChargeCents })
  })

  it('always keeps low, likely and high in order', () => {
    const factor = fc.integer({ min: 200, max: 5000 }).map((thousandths) => thousandths / 1000)
    fc.assert(
      fc.property(
        factor,
        factor,
        fc.integer({ min: 0, max: 1000 }),
        fc.array(fc.nat(1_000_000), { minLength: 3, maxLength: 3 }),
        (materialsFactor, laborFactor, share, prices) => {
          const [low = 0, likely = 0, high = 0] = [...prices].sort((a, b) => a - b)
          const item = { ...plank, installed: { low, likely, high }, laborSharePercent: share / 10 }
          const { installed } = regionalPrice(item, { materialsFactor, laborFactor })
          return installed !== null && installed.low <= installed.likely && installed.likely <= installed.high
        },
      ),
    )
  })
})

describe('effectivePrice', () => {
  const book = { materials: samePrice(10), installed: samePrice(20) }

  it('is the book’s for who does the work', () => {
    expect(effectivePrice({ basis: 'own-hands', override: null, book })).toEqual(samePrice(10))
    expect(effectivePrice({ basis: 'hired', override: null, book })).toEqual(samePrice(20))
    expect(effectivePrice({ basis: 'hired', override: null, book: { ...book, installed: null } })).toBeNull()
  })

  it('is the line’s own where it has one', () => {
    expect(effectivePrice({ basis: 'hired', override: { price: samePrice(30), reason: 'bid by phone' }, book })).toEqual(samePrice(30))
  })
})
