import { afterEach, describe, expect, it, vi } from 'vitest'
import { createEstimateModel } from '../../../src/composables/estimateModel.ts'
import { needsFormulaParser } from '../../../src/composables/formulaParser.ts'
import { buildEstimateWhole, buildLines } from '../../support/buildEstimateWhole.ts'
import { fakeEstimateServer } from '../../support/fakeEstimateServer.ts'

afterEach(() => vi.restoreAllMocks())

describe('the parser of formulas', () => {
  it('is not needed for plain numbers and names of measures', () => {
    expect(needsFormulaParser(['12', '12.5', 'floor_area'])).toBe(false)
    expect(needsFormulaParser(['12', 'floor_area * 2'])).toBe(true)
  })

  it('comes with the first formula that needs it, and the line counts from then on', async () => {
    const whole = buildEstimateWhole({ lines: buildLines({ quantity: '100' }, { quantity: '10' }) })
    const model = createEstimateModel(whole, { calls: fakeEstimateServer(whole).calls, onBehind: () => {} })
    const totals: number[] = []
    model.onNews(() => totals.push(model.totals().totalCents.likely))
    model.preview('line-1', { quantity: '2 * 100' })
    expect([...model.leftOut()]).toEqual(['line-1'])
    await vi.dynamicImportSettled()
    expect([...model.leftOut()]).toEqual([])
    expect(totals).toEqual([3_000, 63_000])
  })
})
