import { describe, expect, it } from 'vitest'
import { priceItems } from '../../seed/priceBook/priceItems.ts'
import { computeEstimate, openEstimate, type LineInput } from '../../shared/engine/index.ts'
import { buildEstimateInput, buildLineInput, buildRoomInput } from '../support/buildEngineInput.ts'

/*
 * Rules of thumb of the trade: common practice, no source. They say nothing of what a price should be;
 * they check that with such prices keyed the arithmetic gives what the trade expects.
 */

const itemOf = (key: string) => {
  const item = priceItems.find((one) => one.key === key)
  if (!item) throw new Error(`The demo's price book has no ${key}.`)
  return item
}

const room = buildRoomInput({ shape: { kind: 'rectangle', lengthIn: 180, widthIn: 144 } })
const likelyOf = (own: Partial<LineInput>) =>
  openEstimate(buildEstimateInput({ rooms: [room], lines: [buildLineInput({ roomKey: room.key, ...own })] })).line('line').amountCents
    .likely

describe('common practice, no source: plank or sheet flooring', () => {
  it('is about $3 a square foot in materials by one’s own hands: 180 sq ft cost about $540', () => {
    expect(likelyOf({ quantity: 'floor_area', unitPriceE4: { low: 24_000, likely: 30_000, high: 39_000 } })).toBe(54_000)
  })

  it('is $5 to $7 a square foot hired: 180 sq ft cost $900 to $1,260', () => {
    const line = buildLineInput({
      roomKey: room.key,
      basis: 'hired',
      quantity: 'floor_area',
      unitPriceE4: { low: 50_000, likely: 60_000, high: 70_000 },
    })
    const { totalCents } = computeEstimate(buildEstimateInput({ rooms: [room], lines: [line] })).totals
    expect(totalCents).toEqual({ low: 90_000, likely: 108_000, high: 126_000 })
  })

  it.each(['floor/plank-vinyl', 'floor/sheet-vinyl'])('%s of the demo stands where the rule does', (key) => {
    const { materials, installed } = itemOf(key)
    expect((materials?.likely ?? 0) / 10_000).toBeGreaterThanOrEqual(2.5)
    expect((materials?.likely ?? 0) / 10_000).toBeLessThanOrEqual(3.5)
    expect((installed?.likely ?? 0) / 10_000).toBeGreaterThanOrEqual(5)
    expect((installed?.likely ?? 0) / 10_000).toBeLessThanOrEqual(7)
  })
})

describe('common practice, no source: renewing the old drain lines of a small house', () => {
  it('costs $5,000 to $10,000', () => {
    const { installed, minimumChargeCents, unit, houseFormula } = itemOf('drain-pipe/renew-small-house')
    const line = buildLineInput({ basis: 'hired', unit, quantity: houseFormula ?? '', unitPriceE4: installed, minimumChargeCents })
    const { totalCents } = computeEstimate(buildEstimateInput({ lines: [line] })).totals
    expect(totalCents).toMatchObject({ low: 500_000, high: 1_000_000 })
    expect(totalCents.likely).toBeGreaterThan(500_000)
    expect(totalCents.likely).toBeLessThan(1_000_000)
  })

  it('is likely to cost that much when it is keyed by fixture and by foot of stack as well', () => {
    const lines = [
      buildLineInput({
        key: 'branches',
        basis: 'hired',
        unit: 'each',
        quantity: 6,
        unitPriceE4: itemOf('drain-pipe/fixture-branch').installed,
      }),
      buildLineInput({ key: 'stack', basis: 'hired', unit: 'lf', quantity: 20, unitPriceE4: itemOf('drain-pipe/stack').installed }),
    ]
    const { likely } = computeEstimate(buildEstimateInput({ lines })).totals.totalCents
    expect(likely).toBeGreaterThan(500_000)
    expect(likely).toBeLessThan(1_000_000)
  })
})
