import fc from 'fast-check'
import { HyperFormula } from 'hyperformula'
import { afterAll, describe, expect, it } from 'vitest'
import { lineAmountCents } from '../../shared/engine/money/lineAmount.ts'
import { exactPercent, percentOf } from '../../shared/engine/money/percentOf.ts'
import { hundredthsOf, wholePackages } from '../../shared/engine/money/roundQuantity.ts'
import { amountFormula, percentFormula, quantityFormula, sumFormula } from '../../shared/engine/workbook/moneyFormulas.ts'

const RUNS = { numRuns: 2000, seed: 20261201 }
const sheet = HyperFormula.buildFromArray([[0, 0, 0, null]], { licenseKey: 'gpl-v3', smartRounding: false })
afterAll(() => sheet.destroy())

/** The value of a formula over A1, B1 and C1, by a spreadsheet engine that rounds binary numbers as they come. */
function evaluated(formula: string, [a, b, c = 0]: readonly number[]): unknown {
  sheet.setCellContents({ sheet: 0, row: 0, col: 0 }, [[a, b, c, `=${formula}`]])
  return sheet.getCellValue({ sheet: 0, row: 0, col: 3 })
}
function cents(value: unknown): number {
  return Math.round(Number(value) * 100)
}
/** A figure that is printed with so many decimals. */
function decimal(max: number, decimals: number): fc.Arbitrary<number> {
  return fc.integer({ min: 0, max: max * 10 ** decimals }).map((digits) => digits / 10 ** decimals)
}

describe('amountFormula', () => {
  const formula = amountFormula('A1', 'B1', 'C1')

  it('rounds half a cent up although its binary form lies below', () => {
    expect(evaluated(amountFormula('A1', 'B1', null), [1, 1.005])).toBe(1.01)
    expect(evaluated(amountFormula('A1', 'B1', null), [2.5, 0.07])).toBe(0.18)
    expect(evaluated(amountFormula('A1', 'B1', null), [157.5, 3])).toBe(472.5)
  })

  it('is the minimum charge at least', () => {
    expect(evaluated(formula, [2, 3, 250])).toBe(250)
    expect(evaluated(formula, [200, 3, 250])).toBe(600)
  })

  it('always agrees with the engine’s whole numbers', () => {
    fc.assert(
      fc.property(decimal(20_000, 2), decimal(2000, 4), decimal(500, 2), (quantity, price, minimum) => {
        const amount = lineAmountCents(Math.round(quantity * 100), Math.round(price * 10_000))
        expect(cents(evaluated(formula, [quantity, price, minimum]))).toBe(Math.max(amount, Math.round(minimum * 100)))
      }),
      RUNS,
    )
  })

  it('agrees on prices that put every odd hundredth on half a cent', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 200_000 }), fc.integer({ min: 0, max: 5000 }), (hundredths, whole) => {
        const priceE4 = whole * 10_000 + 5000
        expect(cents(evaluated(amountFormula('A1', 'B1', null), [hundredths / 100, priceE4 / 10_000]))).toBe(
          lineAmountCents(hundredths, priceE4),
        )
      }),
      RUNS,
    )
  })
})

describe('quantityFormula', () => {
  it('adds waste and rounds to two decimals', () => {
    expect(evaluated(quantityFormula('A1', 'B1', null), [125, 10])).toBe(137.5)
    expect(evaluated(quantityFormula('A1', 'B1', null), [1.005, 0])).toBe(1.01)
  })

  it('goes up to whole packages', () => {
    expect(evaluated(quantityFormula('A1', 'B1', 'C1'), [125, 10, 22.5])).toBe(157.5)
    expect(evaluated(quantityFormula('A1', 'B1', 'C1'), [225, 0, 22.5])).toBe(225)
    expect(evaluated(quantityFormula('A1', 'B1', 'C1'), [204.545_454_545_454_55, 10, 22.5])).toBe(225)
  })

  it('always agrees with the engine’s rounding', () => {
    const inches = fc.integer({ min: 1, max: 60_000 }).map((sixtyFourths) => sixtyFourths / 64)
    fc.assert(
      fc.property(
        inches,
        inches,
        decimal(25, 2),
        decimal(60, 2).filter((size) => size > 0),
        (length, width, waste, size) => {
          const measured = (length * width) / 144
          const withWaste = measured * (1 + waste / 100)
          expect(Math.round(Number(evaluated(quantityFormula('A1', 'B1', null), [measured, waste])) * 100)).toBe(hundredthsOf(withWaste))
          expect(Math.round(Number(evaluated(quantityFormula('A1', 'B1', 'C1'), [measured, waste, size])) * 100)).toBe(
            hundredthsOf(wholePackages(withWaste, size) * size),
          )
        },
      ),
      RUNS,
    )
  })
})

describe('percentFormula', () => {
  it('takes a percentage of a rounded base and rounds once', () => {
    expect(evaluated(percentFormula('A1', 'B1'), [472.5, 8.25])).toBe(38.98)
    expect(evaluated(percentFormula('A1', 'B1'), [0.5, 5])).toBe(0.03)
  })

  it('always agrees with the engine’s exact arithmetic', () => {
    fc.assert(
      fc.property(decimal(3_000_000, 2), decimal(100, 4), (base, percent) => {
        expect(cents(evaluated(percentFormula('A1', 'B1'), [base, percent]))).toBe(percentOf(Math.round(base * 100), exactPercent(percent)))
      }),
      RUNS,
    )
  })
})

describe('sumFormula', () => {
  it('is free of the noise that a long sum gathers', () => {
    expect(0.1 + 0.2 + 0.3).not.toBe(0.6)
    expect(evaluated(sumFormula('A1:C1'), [0.1, 0.2, 0.3])).toBe(0.6)
  })
})
