import { describe, expect, it } from 'vitest'
import { computeEstimate, openEstimate } from '../../shared/engine/index.ts'
import { allocateCents } from '../../shared/engine/money/allocateCents.ts'
import { divideRounded } from '../../shared/engine/money/divideRounded.ts'
import { hundredthsOf } from '../../shared/engine/money/roundQuantity.ts'
import { buildEstimateInput, buildLineInput, samePrice } from '../support/buildEngineInput.ts'

/** Cents of one unit at a price in ten-thousandths of a dollar. */
function priced(unitPriceE4: number): number {
  return openEstimate(buildEstimateInput({ lines: [buildLineInput({ quantity: '1', unitPriceE4: samePrice(unitPriceE4) })] })).line('line')
    .amountCents.likely
}

describe('rounding to whole numbers', () => {
  // IEEE 754 names both: ties to even give 0 2 2 4 here, ties away 1 2 3 4. Ours is half away from zero, as the trade prints it.
  it('takes 0.5, 1.5, 2.5, 3.5 to 1, 2, 3, 4', () => {
    expect([1n, 3n, 5n, 7n].map((halves) => divideRounded(halves, 2n))).toEqual([1n, 2n, 3n, 4n])
    expect([-1n, -3n].map((halves) => divideRounded(halves, 2n))).toEqual([-1n, -2n])
  })
})

describe('rounding decimals to cents, half up', () => {
  // As decimal arithmetic rounds; a binary double of 0.135 or 0.175 may fall to either side.
  it('takes 0.125, 0.135, 0.175 to 0.13, 0.14, 0.18', () => {
    expect([0.125, 0.135, 0.175].map(hundredthsOf)).toEqual([13, 14, 18])
    expect([1_250, 1_350, 1_750].map(priced)).toEqual([13, 14, 18])
  })

  // As a binary double 2.675 is a hair less and rounds to 2.67; the decimal that was keyed rounds to 2.68.
  it('takes 2.675 to 2.68, although its binary form is below it', () => {
    expect(hundredthsOf(2.675)).toBe(268)
    expect(priced(26_750)).toBe(268)
  })
})

describe('sums', () => {
  // Common practice: each line is rounded before it is summed, so that the column foots. Rounded after, it would be 0.32.
  it('of three lines of 0.105 are 0.33', () => {
    const lines = [1, 2, 3].map((number) => buildLineInput({ key: `line-${number}`, quantity: '1', unitPriceE4: samePrice(1_050) }))
    expect(computeEstimate(buildEstimateInput({ lines })).totals.totalCents.likely).toBe(33)
  })

  // Common practice: the largest remainder takes the odd cent.
  it('of 100.00 split in three are whole: 33.34, 33.33, 33.33', () => {
    expect(allocateCents(10_000, [1, 1, 1])).toEqual([3334, 3333, 3333])
  })
})
