import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { computeEstimate, readEstimateDocument } from '../../shared/engine/index.ts'
import { estimateResultsSchema } from '../../shared/schemas/results.ts'

function readJson(path: string): unknown {
  return JSON.parse(readFileSync(new URL(path, import.meta.url), 'utf8'))
}

describe('seed/exampleEstimate.json', () => {
  const read = readEstimateDocument(readJson('../../seed/exampleEstimate.json'))
  if (!read.ok) throw new Error(JSON.stringify(read.errors))
  const results = computeEstimate(read.input)

  it('gives the results that are kept with it', () => {
    expect(results).toEqual(estimateResultsSchema.parse(readJson('../fixtures/exampleEstimateResults.json')))
    expect(results.errors).toEqual([])
  })

  // Worked by hand: 44 × 30 ft of plan × √(1 + (6/12)²); 125 sf + 10 % in boxes of 22.5 is 7 boxes.
  it('agrees with a pencil', () => {
    expect(results.house.roof_area).toBeCloseTo(1475.8, 2)
    expect(results.rooms['bed-1']).toMatchObject({ floor_area: 125, perimeter: 45, wall_area_gross: 360 })
    expect(results.lines.find(({ key }) => key === 'plank')).toMatchObject({
      quantity: 157.5,
      amountCents: { low: 37_800, likely: 47_250, high: 61_425 },
    })
    expect(results.totals.directCents.likely).toBe(649_200 + 47_250 + 7_700 + 25_168 + 56_000)
  })

  it('shows each part of the document: unknowns, an inspection, a metric length, own hands and hired work', () => {
    const { unknowns, inspections, lines } = read.document
    expect(unknowns?.map(({ key }) => key)).toEqual(inspections?.flatMap(({ settles }) => settles))
    expect(new Set(lines.map(({ basis }) => basis)).size).toBe(2)
    expect(JSON.stringify(read.document)).toContain('2.44 m')
  })
})
