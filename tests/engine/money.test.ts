import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatCents, formatUnitPrice, parseCents, parseUnitPriceE4 } from '../../shared/engine/index.ts'
import { allocateCents } from '../../shared/engine/money/allocateCents.ts'
import { divideRounded } from '../../shared/engine/money/divideRounded.ts'
import { exactDecimal } from '../../shared/engine/money/exactDecimal.ts'
import { lineAmountCents } from '../../shared/engine/money/lineAmount.ts'
import { exactPercent, percentOf } from '../../shared/engine/money/percentOf.ts'
import { hundredthsOf, toBillionth, wholePackages } from '../../shared/engine/money/roundQuantity.ts'
import { LINE_MAX_CENTS, UNIT_PRICE_MAX_E4 } from '../../shared/schemas/common.ts'

describe('divideRounded', () => {
  it.each([
    [5n, 2n, 3n],
    [-5n, 2n, -3n],
    [4n, 3n, 1n],
    [-4n, 3n, -1n],
    [0n, 7n, 0n],
  ])('%d / %d, half away from zero, is %d', (dividend, divisor, quotient) => expect(divideRounded(dividend, divisor)).toBe(quotient))
})

describe('hundredthsOf', () => {
  it.each([
    [1.005, 101],
    [2.675, 268],
    [1.00499, 100],
    [137.5, 13_750],
    [0, 0],
    [0.004999, 0],
    [0.005, 1],
    [1.1 * 1.15, 127],
    [1_000_000.005, 100_000_001],
  ])('rounds %d to %d hundredths', (quantity, hundredths) => expect(hundredthsOf(quantity)).toBe(hundredths))

  it('always agrees with the decimal that was meant', () => {
    const decimal = fc.record({ whole: fc.integer({ min: 0, max: 1_000_000 }), thousandths: fc.integer({ min: 0, max: 999 }) })
    fc.assert(
      fc.property(decimal, ({ whole, thousandths }) => {
        const meant = whole * 1000 + thousandths
        return hundredthsOf(meant / 1000) === Math.floor((meant + 5) / 10)
      }),
    )
  })
})

describe('wholePackages', () => {
  it.each([
    [225.00000000000003, 22.5, 10],
    [225, 22.5, 10],
    [225.001, 22.5, 11],
    [0.1, 22.5, 1],
    [0, 22.5, 0],
    [198, 22.5, 9],
    [0.30000000000000004, 0.1, 3],
  ])('%d in packages of %d are %d', (quantity, size, packages) => expect(wholePackages(quantity, size)).toBeCloseTo(packages, 12))

  it('always holds the quantity, and one fewer would not', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 10_000_000 }), fc.integer({ min: 1, max: 100_000 }), (hundredths, size) => {
        const packages = wholePackages(hundredths / 100, size / 100)
        return packages * size >= hundredths && (packages - 1) * size < hundredths
      }),
    )
  })
})

describe('toBillionth', () => {
  it('takes the noise of a binary fraction off', () => expect(toBillionth(0.1 + 0.2)).toBe(0.3))
  it('leaves what is too large for it as it is', () => expect(toBillionth(1e300)).toBe(1e300))
})

describe('lineAmountCents', () => {
  it.each([
    [15_750, 30_000, 47_250],
    [100, 125, 1],
    [100, 50, 1],
    [100, 49, 0],
    [1, 1, 0],
    [0, 30_000, 0],
  ])('%d hundredths at %d ten-thousandths are %d cents', (hundredths, priceE4, cents) =>
    expect(lineAmountCents(hundredths, priceE4)).toBe(cents),
  )

  it('is exact at any size', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 100_000_000_000 }), fc.integer({ min: 0, max: UNIT_PRICE_MAX_E4 }), (hundredths, priceE4) => {
        const exact = (BigInt(hundredths) * BigInt(priceE4) + 5000n) / 10_000n
        return BigInt(lineAmountCents(hundredths, priceE4)) === BigInt(Number(exact))
      }),
    )
  })
})

describe('percentOf', () => {
  it.each([
    [47_250, 8.25, 3898],
    [200_000, 20, 40_000],
    [1, 50, 1],
    [1, 49.9999, 0],
    [0, 8.25, 0],
    [100, 0.5, 1],
    [33_333, 6.8875, 2296],
    [10_000_000_000_000, 8.8751, 887_510_000_000],
  ])('of %d cents, %d percent are %d cents', (cents, percent, share) => expect(percentOf(cents, exactPercent(percent))).toBe(share))

  it('is exact for percents of up to four decimals, at any size', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: LINE_MAX_CENTS * 100 }), fc.integer({ min: 0, max: 1_000_000 }), (cents, percentE4) => {
        const exact = (BigInt(cents) * BigInt(percentE4) + 500_000n) / 1_000_000n
        return BigInt(percentOf(cents, exactPercent(percentE4 / 10_000))) === exact
      }),
    )
  })
})

describe('exactDecimal', () => {
  it.each([
    [8.25, 825n, 2],
    [20, 20n, 0],
    [0.1, 1n, 1],
    [1e-7, 1n, 7],
    [1.5e21, 1_500_000_000_000_000_000_000n, 0],
  ])('reads %d as it prints', (value, digits, scale) => expect(exactDecimal(value)).toEqual({ digits, scale }))
})

describe('allocateCents', () => {
  it('gives the odd cents to the largest remainders', () => {
    expect(allocateCents(10_000, [1, 1, 1])).toEqual([3334, 3333, 3333])
    expect(allocateCents(100, [1, 2, 3])).toEqual([17, 33, 50])
    expect(allocateCents(5, [0, 1])).toEqual([0, 5])
  })

  it('refuses to split by nothing', () => expect(() => allocateCents(100, [0, 0])).toThrow(RangeError))

  it('always sums to the whole, and strays from no exact share by a cent', () => {
    const weights = fc
      .array(fc.integer({ min: 0, max: 1_000_000 }), { minLength: 1, maxLength: 30 })
      .filter((all) => all.some((weight) => weight > 0))
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000 }), weights, (cents, all) => {
        const parts = allocateCents(cents, all)
        const weightSum = all.reduce((sum, weight) => sum + weight, 0)
        const isWhole = parts.reduce((sum, part) => sum + part, 0) === cents
        return isWhole && parts.every((part, index) => Math.abs(part - (cents * (all[index] as number)) / weightSum) < 1)
      }),
    )
  })
})

describe('formatCents', () => {
  it.each([
    [123_450, '$1,235', '$1,234.50'],
    [0, '$0', '$0.00'],
    [49, '$0', '$0.49'],
    [50, '$1', '$0.50'],
    [-123_450, '-$1,235', '-$1,234.50'],
    [-49, '$0', '-$0.49'],
    [100_000_000_000, '$1,000,000,000', '$1,000,000,000.00'],
  ])('writes %d cents as %s in a summary and %s on a line', (cents, summary, line) => {
    expect(formatCents(cents)).toBe(summary)
    expect(formatCents(cents, { cents: true })).toBe(line)
  })
})

describe('formatUnitPrice', () => {
  it.each([
    [24_000, '$2.40'],
    [1_525, '$0.1525'],
    [30_000, '$3.00'],
    [30_010, '$3.001'],
    [0, '$0.00'],
    [12_345_678_900, '$1,234,567.89'],
  ])('writes %d ten-thousandths as %s', (e4, text) => expect(formatUnitPrice(e4)).toBe(text))
})

describe('parseCents', () => {
  it.each([
    ['1250', 125_000],
    ['1250.5', 125_050],
    ['$1,250.50', 125_050],
    ['1 250.50', 125_050],
    ['0', 0],
    ['.5', 50],
    ['1000000000', LINE_MAX_CENTS],
  ])('reads %s', (text, cents) => expect(parseCents(text)).toEqual({ ok: true, cents }))

  it.each([
    ['', 'Nothing is keyed. Write `1250` or `1250.50`.'],
    ['-1', '`-1` is below zero. Write an amount of zero or more.'],
    ['(40)', '`(40)` is below zero. Write an amount of zero or more.'],
    ['1.005', '`1.005` has 3 decimals; at most 2 are kept here.'],
    ['1e3', '`1e3` is not an amount of dollars. Write `1250` or `1250.50`.'],
    ['12,50', '`12,50` is not an amount of dollars. Write `1250` or `1250.50`.'],
    ['ten', '`ten` is not an amount of dollars. Write `1250` or `1250.50`.'],
    ['1000000000.01', '`1000000000.01` is over one billion dollars.'],
  ])('refuses %s', (text, message) => expect(parseCents(text)).toEqual({ ok: false, message }))
})

describe('parseUnitPriceE4', () => {
  it.each([
    ['2.4', 24_000],
    ['$0.1525', 1_525],
    ['3', 30_000],
  ])('reads %s', (text, e4) => expect(parseUnitPriceE4(text)).toEqual({ ok: true, e4 }))

  it.each([
    ['-1', '`-1` is below zero. Write an amount of zero or more.'],
    ['2.40001', '`2.40001` has 5 decimals; at most 4 are kept here.'],
    ['1000000.0001', '`1000000.0001` is over one million dollars for one unit.'],
  ])('refuses %s', (text, message) => expect(parseUnitPriceE4(text)).toEqual({ ok: false, message }))
})

describe('always', () => {
  it('an amount that is written can be read again', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: LINE_MAX_CENTS }), (cents) => {
        const parsed = parseCents(formatCents(cents, { cents: true }))
        return parsed.ok && parsed.cents === cents
      }),
    )
  })

  it('a unit price that is written can be read again', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: UNIT_PRICE_MAX_E4 }), (e4) => {
        const parsed = parseUnitPriceE4(formatUnitPrice(e4))
        return parsed.ok && parsed.e4 === e4
      }),
    )
  })
})
