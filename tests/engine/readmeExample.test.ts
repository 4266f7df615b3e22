import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { computeEstimate, readEstimateDocument } from '../../shared/engine/index.ts'

const [example, results] = [...readFileSync('README.md', 'utf8').matchAll(/```json\n(.*?)```/gs)].map(([, text]) => JSON.parse(text!)) as [
  unknown,
  { engine: string; lines: unknown[]; totals: { totalCents: unknown }; rooms: Record<string, object>; house: object; errors: unknown[] },
]

describe('the example of the README', () => {
  it('computes to the results that stand below it', () => {
    const read = readEstimateDocument(example)
    if (!read.ok) throw new Error(JSON.stringify(read.errors))
    const computed = computeEstimate(read.input)
    expect(computed.engine).toBe(results.engine)
    expect(computed.lines).toEqual(results.lines)
    expect(computed.totals.totalCents).toEqual(results.totals.totalCents)
    expect(computed.errors).toEqual(results.errors)
    expect(computed.house).toMatchObject(figuresIn(results.house))
    expect(computed.rooms['bed-1']).toMatchObject(figuresIn(results.rooms['bed-1']!))
  })
})

/** Without the `…` that stands for the rest. */
function figuresIn(measures: object): object {
  return Object.fromEntries(Object.entries(measures).filter(([name]) => name !== '…'))
}
