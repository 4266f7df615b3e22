import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { effectScope, type EffectScope } from 'vue'
import { createEstimateModel, type EstimateModel } from '../../../src/composables/estimateModel.ts'
import { selectionSum } from '../../../src/composables/selectionSum.ts'
import { useEstimateTotals } from '../../../src/composables/useEstimateTotals.ts'
import { buildEstimateWhole, buildLines } from '../../support/buildEstimateWhole.ts'
import { fakeEstimateServer } from '../../support/fakeEstimateServer.ts'

let scope: EffectScope
let model: EstimateModel
let totals: ReturnType<typeof useEstimateTotals>

beforeEach(() => {
  vi.useFakeTimers()
  const whole = buildEstimateWhole({ lines: buildLines({ quantity: '100' }, { quantity: '10' }) })
  model = createEstimateModel(whole, { calls: fakeEstimateServer(whole).calls, onBehind: () => {} })
  scope = effectScope()
  totals = scope.run(() => useEstimateTotals(model))!
})
afterEach(() => {
  scope.stop()
  vi.useRealTimers()
})

describe('useEstimateTotals', () => {
  it('follows each keystroke and goes back with the entry', () => {
    const likely = () => totals.totals.value.totalCents.likely
    expect(likely()).toBe(33_000)
    model.preview('line-1', { quantity: '1' })
    expect(likely()).toBe(3_300)
    model.preview('line-1', { quantity: '12' })
    expect(likely()).toBe(6_600)
    model.preview('line-1', null)
    expect(likely()).toBe(33_000)
  })

  it('says how many lines it leaves out', () => {
    model.preview('line-1', { quantity: 'floor_aria' })
    expect(totals.leftOutCount.value).toBe(1)
    expect(totals.totals.value.totalCents.likely).toBe(3_000)
  })

  it('reads the total out once typing rests, and not after each key', () => {
    model.preview('line-1', { quantity: '1' })
    vi.advanceTimersByTime(500)
    model.preview('line-1', { quantity: '12' })
    vi.advanceTimersByTime(500)
    expect(totals.announcement.value).toBe('')
    vi.advanceTimersByTime(500)
    expect(totals.announcement.value).toBe('Total $66, from $44 to $88.')
  })
})

describe('selectionSum', () => {
  it('sums and averages the lines that count, and counts all that are selected', () => {
    model.preview('line-2', { quantity: 'nonsense' })
    expect(selectionSum(model.list.rows())).toEqual({ count: 2, sumCents: 30_000, averageCents: 30_000 })
  })

  it('sums nothing to nothing', () => {
    expect(selectionSum([])).toEqual({ count: 0, sumCents: 0, averageCents: 0 })
  })
})
