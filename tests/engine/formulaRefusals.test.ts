import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkFormula, openEstimate } from '../../shared/engine/index.ts'
import { buildEstimateInput, buildLineInput, buildOpening, buildRoomInput } from '../support/buildEngineInput.ts'

const check = (text: string, scope: 'room' | 'house' = 'room') => checkFormula(text, { scope, unit: 'each' })

describe('a formula is refused', () => {
  describe('with a stable code, words, and the part that is at fault', () => {
    it.each([
      ['', 'bad-syntax', [0, 0]],
      ['floor_area *', 'bad-syntax', [11, 12]],
      ['* 2', 'bad-syntax', [0, 1]],
      ['2 + * 3', 'bad-syntax', [4, 5]],
      ['(2 + 3', 'bad-syntax', [0, 1]],
      ['2 + 3)', 'bad-syntax', [5, 6]],
      ['2, 3', 'bad-syntax', [1, 2]],
      ['1 ? 2', 'bad-syntax', [4, 5]],
      ['1:1e9', 'bad-syntax', [1, 2]],
      ['min', 'bad-syntax', [0, 3]],
      ['max()', 'bad-syntax', [0, 5]],
      ['sum_rooms(1, 2)', 'bad-syntax', [0, 15]],
      ['flor_area', 'unknown-name', [0, 9]],
      ['2 + widht', 'unknown-name', [4, 9]],
      ['2 windows', 'not-allowed', [0, 9]],
      ['2(3)', 'not-allowed', [0, 2]],
      ['10%', 'not-allowed', [2, 3]],
      ['3!', 'not-allowed', [1, 2]],
      ['windows = 3', 'not-allowed', [8, 9]],
      ['1 < 2 < 3 ? 1 : 2', 'not-allowed', [0, 1]],
      ['2 ^ windows', 'not-allowed', [4, 11]],
      ['9 ^ 99', 'not-allowed', [4, 6]],
      ['sum_rooms(sum_rooms(1))', 'not-allowed', [10, 19]],
      ['1e99', 'too-large', [0, 4]],
    ] as const)('%s: %s', (text, code, at) => {
      const checked = check(text)
      expect(checked).toMatchObject({ ok: false, code, at })
      expect(checked.ok ? '' : checked.message).toMatch(/\w.*\.$|…$|\?$/)
    })
  })

  it('names the measure that a misspelt one is most like', () => {
    expect(check('flor_area')).toMatchObject({ message: '`flor_area` is not a measure. Did you mean `floor_area`?' })
    expect(check('Floor_Area')).toMatchObject({ message: '`Floor_Area` is not a measure. Did you mean `floor_area`?' })
    expect(check('colour')).toMatchObject({ message: expect.stringMatching(/^`colour` is not a measure\. Measures are floor_area,/) })
  })

  it('tells a room’s measure from the house’s', () => {
    expect(check('floor_area', 'house')).toMatchObject({
      code: 'unknown-name',
      message: expect.stringContaining('Write sum_rooms(floor_area)'),
    })
    expect(check('sum_rooms(roof_area)', 'house')).toMatchObject({ code: 'unknown-name', at: [10, 19] })
  })

  it('says what percent is written as', () => {
    expect(check('floor_area * 10%')).toMatchObject({
      message: '`%` has no place in a formula. Percent is a plain number here: write 0.1 for 10 percent.',
    })
  })
})

describe('hostile text', () => {
  it.each([
    'import(1)',
    'cellsByName.constructor',
    'constructor',
    '__proto__',
    'hasOwnProperty(1)',
    'toString()',
    'evaluate("1")',
    'parse("1+1")',
    'createUnit("x")',
    'simplify("x")',
    'f(x) = x',
    'f = 3',
    '[1, 2; 3, 4]',
    '{a: 1}.a',
    '"text"',
    "'text'",
    'range(1, 1e9)',
    '1:1e9:1',
    'a.b.c',
    'x -> 1',
    '1; 2',
    '# remark',
    'true',
    'Infinity',
    'NaN',
    'null',
    'i',
    'pi',
    '2 in',
    '3 mod 2',
    'not 1',
    '1 and 1',
    "3'",
    '5 cm',
    '1 << 40',
    '~1',
    '1 | 2',
    '2 .* 3',
    '٣',
    'ﬂoor_area',
  ])('%s is refused', (text) => expect(check(text).ok).toBe(false))

  it('of ten thousand brackets is refused at once', () => {
    const started = performance.now()
    expect(check('('.repeat(10_000) + '1' + ')'.repeat(10_000))).toMatchObject({ ok: false, code: 'too-long' })
    expect(check('('.repeat(249) + '1' + ')'.repeat(249))).toMatchObject({ ok: false, code: 'too-deep' })
    expect(performance.now() - started).toBeLessThan(200)
  })

  it('may be 500 characters long and 50 deep, and no more', () => {
    expect(check('1'.repeat(6) + ' '.repeat(494)).ok).toBe(true)
    expect(check('1'.repeat(6) + ' '.repeat(495))).toMatchObject({ ok: false, code: 'too-long' })
    expect(check('('.repeat(50) + '1' + ')'.repeat(50)).ok).toBe(true)
    expect(check('('.repeat(51) + '1' + ')'.repeat(51))).toMatchObject({ ok: false, code: 'too-deep' })
    expect(check('abs('.repeat(51) + '1' + ')'.repeat(51))).toMatchObject({ ok: false, code: 'too-deep' })
    expect(check(`${'-'.repeat(400)}1`)).toMatchObject({ ok: false, code: 'too-deep' })
    expect(check('2^'.repeat(200) + '1')).toMatchObject({ ok: false, code: 'too-deep' })
  })

  it('that is a long sum is not deep', () => expect(check(Array(240).fill('1').join('+')).ok).toBe(true))

  it('of any kind is read or refused, and never thrown', () => {
    const signs = fc.constantFrom(...'0123456789+-*/^()?:<>=!,. \n', 'floor_area', 'sum_rooms(', 'min(', 'import', '.constructor')
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ maxLength: 60 }),
          fc.array(signs, { maxLength: 30 }).map((parts) => parts.join('')),
        ),
        (text) => {
          const checked = check(text)
          const isInText = checked.ok || (checked.at[0] >= 0 && checked.at[0] <= checked.at[1] && checked.at[1] <= Math.max(text.length, 1))
          expect(isInText, JSON.stringify({ text, checked })).toBe(true)
        },
      ),
      { numRuns: 2000 },
    )
  })
})

describe('a formula without an answer', () => {
  const rooms = [buildRoomInput(), buildRoomInput({ key: 'den', name: 'Den', ceiling: null })]
  const errorOf = (quantity: string, roomKey: string | null = 'bedroom', unit = 'sf') =>
    openEstimate(buildEstimateInput({ rooms, lines: [buildLineInput({ quantity, roomKey, unit })] })).line('line').error

  it('divides by zero, and names what is zero', () => {
    expect(errorOf('100 / doors', 'bedroom', 'each')).toEqual({
      code: 'divides-by-zero',
      message: '`doors` is zero here, and the formula divides by it.',
      at: [6, 11],
    })
    expect(errorOf('floor_area / (length - 12.5)', 'bedroom', 'lf')).toMatchObject({ code: 'divides-by-zero', at: [13, 28] })
    expect(errorOf('doors ^ -1', 'bedroom', 'each')).toMatchObject({ code: 'divides-by-zero', at: [0, 10] })
  })

  it('is not saved from it by a function or a comparison that would swallow it', () => {
    expect(errorOf('min(5, 1 / 0)')).toMatchObject({ code: 'divides-by-zero', at: [11, 12] })
    expect(errorOf('1 / 0 > 3 ? 1 : 2')).toMatchObject({ code: 'divides-by-zero' })
    expect(errorOf('5 / (1 / 0)')).toMatchObject({ code: 'divides-by-zero' })
    expect(errorOf('(1 / 0) ^ 0')).toMatchObject({ code: 'divides-by-zero' })
  })

  it('is below zero', () => {
    expect(errorOf('100 - floor_area')).toEqual({
      code: 'negative',
      message: 'The formula gives -25; a quantity is zero or more.',
      at: [0, 16],
    })
    expect(errorOf('-3')).toMatchObject({ code: 'negative' })
    expect(errorOf('sqrt(100 - floor_area)', 'bedroom', 'lf')).toMatchObject({ code: 'not-finite', at: [0, 22] })
  })

  it('grows past what is computed', () => {
    const product = Array(15).fill('1e12').join(' * ')
    expect(errorOf(product)).toMatchObject({ code: 'not-finite' })
    expect(errorOf('floor_area * 1e9')).toMatchObject({ code: 'too-large' })
  })

  it('needs a measure that can’t be had, and says which and why', () => {
    expect(errorOf('wall_area', 'den')).toEqual({ code: 'no-measure', message: 'No ceiling height is keyed.', at: [0, 9] })
    expect(errorOf('floor_area + wall_area', 'den')).toEqual({
      code: 'no-measure',
      message: '`wall_area` can not be had. No ceiling height is keyed.',
      at: [13, 22],
    })
  })

  it('sums over a room that lacks the measure, and names the room', () => {
    expect(errorOf('sum_rooms(wall_area) * 2', null)).toEqual({
      code: 'no-measure',
      message: 'Den: `wall_area` can not be had. No ceiling height is keyed.',
      at: [10, 19],
    })
    expect(errorOf('sum_wall_area', null)).toMatchObject({ code: 'no-measure', message: 'Den: No ceiling height is keyed.' })
    expect(errorOf('sum_rooms(100 / doors)', null, 'each')).toMatchObject({
      code: 'divides-by-zero',
      message: expect.stringMatching(/^Front bedroom: `doors`/),
    })
  })

  it('sums over no rooms', () => {
    const live = openEstimate(buildEstimateInput({ lines: [buildLineInput({ quantity: 'sum_rooms(floor_area)' })] }))
    expect(live.line('line').error).toMatchObject({ code: 'no-measure', message: 'No rooms are keyed yet.' })
  })

  it('is zero where only noise is left below it', () => {
    const live = openEstimate(
      buildEstimateInput({
        rooms: [buildRoomInput({ openings: [buildOpening()] })],
        lines: [buildLineInput({ quantity: '0.3 - 0.1 * 3' })],
      }),
    )
    expect(live.line('line')).toMatchObject({ measured: 0, quantity: 0, error: null })
  })
})
