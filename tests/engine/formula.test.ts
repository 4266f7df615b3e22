import fc from 'fast-check'
import { evaluate } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { MEASURES, openEstimate } from '../../shared/engine/index.ts'
import { needsNoParser, parseFormula } from '../../shared/engine/formula/parseFormula.ts'
import { buildEstimateInput, buildLineInput, buildOpening, buildRoomInput } from '../support/buildEngineInput.ts'
import { evaluateFormula, roomVariables } from '../support/evaluateFormula.ts'

/** The bedroom: floor 125, walls 360, perimeter 45, 12.5 × 10 × 8 ft. */
const bedroom = buildRoomInput()

describe('a formula', () => {
  describe('computes', () => {
    it.each([
      ['180', 180],
      ['12.5', 12.5],
      ['.5', 0.5],
      ['1e3', 1000],
      ['floor_area', 125],
      ['floor_area + 25', 150],
      ['floor_area - 25', 100],
      ['floor_area * 1.1', 137.5],
      ['floor_area / 10', 12.5],
      ['2 + 3 * 4', 14],
      ['(2 + 3) * 4', 20],
      ['2 ^ 3 ^ 2', 512],
      ['2 ^ -1', 0.5],
      ['-2 ^ 2 + 10', 6],
      ['length ^ 2', 156.25],
      ['10 - 4 - 3', 3],
      ['100 / 10 / 2', 5],
      ['- -3', 3],
      ['+3', 3],
      ['min(floor_area, 100, 110)', 100],
      ['max(floor_area, 130)', 130],
      ['abs(100 - floor_area)', 25],
      ['ceil(wall_area / 32)', 12],
      ['floor(wall_area / 32)', 11],
      ['round(wall_area / 32)', 11],
      ['round(wall_area / 32, 1)', 11.3],
      ['round(2.5)', 3],
      ['round(1.005, 2)', 1.01],
      ['sqrt(floor_area * 5)', 25],
      ['height > 7 ? wall_area : floor_area', 360],
      ['height > 8 ? wall_area : floor_area', 125],
      ['height >= 8 ? 1 : 2', 1],
      ['height <= 8 ? 1 : 2', 1],
      ['height < 8 ? 1 : 2', 2],
      ['height == 8 ? 1 : 2', 1],
      ['height != 8 ? 1 : 2', 2],
      ['height > 9 ? 1 : height > 7 ? 2 : 3', 2],
      ['floor_area\n  + 25', 150],
      ['sum_rooms(floor_area)', 125],
    ])('%s → %d', (text, value) => expect(evaluateFormula(text)).toBeCloseTo(value, 9))
  })

  it('rounds up what is whole but for the noise of a binary fraction to itself', () => {
    expect(evaluateFormula('ceil(0.1 * 3 * 10)')).toBe(3)
    expect(evaluateFormula('floor(0.7 * 10 * 10)')).toBe(70)
  })

  it('takes two figures that differ by noise alone for one', () => {
    expect(evaluateFormula('0.1 + 0.2 == 0.3 ? 1 : 2')).toBe(1)
    expect(evaluateFormula('0.1 + 0.2 > 0.3 ? 1 : 2')).toBe(2)
  })

  it('works out only the end that its condition takes', () => {
    expect(evaluateFormula('doors > 0 ? 10 / doors : 4')).toBe(4)
    expect(evaluateFormula('height > 0 ? 4 : wall_area', buildRoomInput({ ceiling: null }))).toBeNaN()
    expect(evaluateFormula('floor_area > 0 ? 4 : wall_area', buildRoomInput({ ceiling: null }))).toBe(4)
  })

  it('needs no parser for a number or a measure', () => {
    const noParser = () => {
      throw new Error('parsed')
    }
    for (const text of ['180', ' 12.5 ', 'floor_area']) {
      expect(needsNoParser(text)).toBe(true)
      expect(parseFormula(text, 'room', noParser).kind).toMatch(/number|measure/)
    }
    expect(needsNoParser('floor_area * 2')).toBe(false)
  })

  it('knows where each of its parts stands', () => {
    const node = parseFormula('floor_area', 'room', () => ({ type: 'none' }))
    expect(node.at).toEqual([0, 10])
  })
})

describe('a measure’s name', () => {
  const lineOf = (quantity: string, roomKey: string | null, unit = 'sf') => {
    const rooms = [buildRoomInput(), buildRoomInput({ key: 'hall', use: 'hall', openings: [buildOpening({ kind: 'window', count: 3 })] })]
    return openEstimate(buildEstimateInput({ rooms, lines: [buildLineInput({ quantity, roomKey, unit })] })).line('line')
  }

  it('is the room’s on a line of a room, and the house’s on a line of the house', () => {
    expect(lineOf('windows', 'hall', 'each').measured).toBe(3)
    expect(lineOf('windows', 'bedroom', 'each').measured).toBe(0)
    expect(lineOf('windows', null, 'each').measured).toBe(3)
  })

  it('may be the house’s on a line of a room, where the room has none of that name', () => {
    expect(lineOf('living_area', 'bedroom').measured).toBe(250)
  })

  it('sums over the rooms, each with its own figures', () => {
    expect(lineOf('sum_rooms(floor_area)', null).measured).toBe(250)
    expect(lineOf('sum_rooms(windows > 0 ? floor_area : 0)', null).measured).toBe(125)
    expect(lineOf('sum_rooms(1)', null, 'each').measured).toBe(2)
    expect(lineOf('sum_rooms(ceil(wall_area / 32)) + 1', null, 'sheet').measured).toBe(23)
    expect(lineOf('sum_wall_area - sum_rooms(wall_area)', null).measured).toBe(0)
  })

  it.each(MEASURES.map(({ name, scope, dimension, size }) => ({ name, scope, unit: unitFor(dimension, size) })))(
    '$name can be named in the scope of a $scope',
    ({ name, scope, unit }) => {
      const { error } = lineOf(name, scope === 'room' ? 'bedroom' : null, unit)
      expect([null, 'no-measure']).toContain(error?.code ?? null)
    },
  )
})

function unitFor(dimension: string, size: number): string {
  if (size === 100) return 'square'
  return { length: 'lf', area: 'sf', volume: 'cf', count: 'each' }[dimension] ?? ''
}

describe('always', () => {
  const names = Object.keys(roomVariables(bedroom))
  const leaf = fc.oneof(
    fc.constantFrom(...names),
    fc.integer({ min: 0, max: 400 }).map(String),
    fc.integer({ min: 1, max: 999 }).map((n) => (n / 8).toString()),
  )
  const { expression } = fc.letrec<{ expression: string }>((tie) => {
    const part = tie('expression')
    const operator = fc.constantFrom('+', '-', '*', '/')
    const comparison = fc.constantFrom('<', '<=', '>', '>=', '==', '!=')
    return {
      expression: fc.oneof(
        { depthSize: 'small', withCrossShrink: true },
        leaf,
        fc.tuple(part, operator, part).map(([a, sign, b]) => `${a} ${sign} ${b}`),
        fc.tuple(part, operator, part).map(([a, sign, b]) => `(${a}) ${sign} (${b})`),
        part.map((a) => `-(${a})`),
        fc.tuple(part, fc.integer({ min: 0, max: 3 })).map(([a, n]) => `(${a}) ^ ${n}`),
        fc.tuple(part, part).map(([a, b]) => `min(${a}, ${b})`),
        fc.tuple(part, part).map(([a, b]) => `max(${a}, ${b})`),
        fc.tuple(fc.constantFrom('abs', 'ceil', 'floor', 'round'), part).map(([name, a]) => `${name}(${a})`),
        fc.tuple(part, comparison, part, part, part).map(([a, sign, b, yes, no]) => `(${a} ${sign} ${b} ? ${yes} : ${no})`),
      ),
    }
  })

  it('gives what mathjs itself gives', () => {
    fc.assert(
      fc.property(
        expression.filter((text) => text.length <= 400),
        (text) => {
          const ours = evaluateFormula(text, bedroom)
          const theirs = Number(evaluate(text, roomVariables(bedroom)))
          fc.pre(Number.isFinite(theirs) && Number.isFinite(ours))
          expect(Math.abs(ours - theirs) <= 1e-9 * Math.max(1, Math.abs(theirs)), `${text}: ${ours}, ${theirs}`).toBe(true)
        },
      ),
      { numRuns: 2000 },
    )
  })

  it('has no answer where mathjs has none', () => {
    fc.assert(
      fc.property(
        expression.filter((text) => text.length <= 400),
        (text) => {
          const theirs = Number(evaluate(text, roomVariables(bedroom)))
          fc.pre(!Number.isFinite(theirs))
          expect(evaluateFormula(text, bedroom), text).toBeNaN()
        },
      ),
      { numRuns: 500 },
    )
  })
})
