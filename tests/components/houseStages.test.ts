import { describe, expect, it } from 'vitest'
import { houseStages, type StageState } from '../../src/components/layout/houseStages.ts'
import type { House, HouseSummary } from '../../shared/schemas/house.ts'

type Measured = Pick<House, 'footprint' | 'wallHeightIn' | 'roof'>
const UNMEASURED: Measured = { footprint: null, wallHeightIn: null, roof: [] }
const MEASURED: Measured = {
  footprint: { kind: 'rectangle', lengthIn: 480, widthIn: 300 },
  wallHeightIn: 108,
  roof: [{ kind: 'gable', rise: 6 }],
}

function states(house: Measured, counts: Pick<HouseSummary, 'roomCount' | 'lineCount' | 'errorCount'>): Record<string, StageState> {
  const stages = houseStages(house as House, counts as HouseSummary)
  return Object.fromEntries(stages.map(({ name, state }) => [name, state]))
}

describe('houseStages', () => {
  it('goes from the foundation up in the order of the work', () => {
    expect(houseStages(undefined, undefined).map(({ title }) => title)).toEqual(['Details', 'Rooms', 'Estimate', 'Summary'])
  })

  it('has every stage empty for a house that was just added', () => {
    expect(states(UNMEASURED, { roomCount: 0, lineCount: 0, errorCount: 0 })).toEqual({
      'house-details': 'empty',
      rooms: 'empty',
      estimate: 'empty',
      summary: 'empty',
    })
  })

  it('has every stage done for a measured house whose lines all count', () => {
    expect(states(MEASURED, { roomCount: 12, lineCount: 96, errorCount: 0 })).toEqual({
      'house-details': 'done',
      rooms: 'done',
      estimate: 'done',
      summary: 'done',
    })
  })

  it('has details under way while a part of the outside is unmeasured', () => {
    expect(states({ ...MEASURED, roof: [] }, { roomCount: 0, lineCount: 0, errorCount: 0 })['house-details']).toBe('under-way')
  })

  it('has estimate and summary under way while lines are left out, and says how many', () => {
    const stages = houseStages(MEASURED as House, { roomCount: 1, lineCount: 5, errorCount: 2 } as HouseSummary)
    expect(stages.slice(2)).toMatchObject([
      { state: 'under-way', says: '2 errors' },
      { state: 'under-way', says: '2 left out' },
    ])
  })
})
