import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatLength, parseLength } from '../../shared/engine/index.ts'
import { LENGTH_MAX_IN } from '../../shared/schemas/common.ts'

function inchesOf(text: string): number {
  const parsed = parseLength(text)
  if (!parsed.ok) throw new Error(parsed.message)
  return parsed.inches
}

function refusalOf(text: string): string {
  const parsed = parseLength(text)
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.inches} in`)
  return parsed.message
}

describe('parseLength', () => {
  describe('feet and inches', () => {
    it.each([
      [`12' 6"`, 150],
      [`12'6`, 150],
      [`12' 6`, 150],
      [`12'`, 144],
      [`12' 6 1/2"`, 150.5],
      [`12' 6-1/2"`, 150.5],
      [`12'-6"`, 150],
      [`12'-6 1/2"`, 150.5],
      [`12-6`, 150],
      [`12-6"`, 150],
      [`12 - 6`, 150],
      [`12-6 1/2`, 150.5],
      [`12ft 6in`, 150],
      ['12ft6in', 150],
      ['12 ft. 6 in.', 150],
      ['12 ft', 144],
      ['12 feet 6 inches', 150],
      ['1 foot', 12],
      [`0' 6"`, 6],
      [`12' 0"`, 144],
      [`12' 11.5"`, 155.5],
      [`12 1/2'`, 150],
    ])('reads %s', (text, inches) => expect(inchesOf(text)).toBe(inches))
  })

  describe('inches alone', () => {
    it.each([
      [`150"`, 150],
      ['150 in', 150],
      ['150in', 150],
      ['150 inches', 150],
      [`6 1/2"`, 6.5],
      [`6-1/2"`, 6.5],
      [`1/2"`, 0.5],
      [`6.5"`, 6.5],
      [`14"`, 14],
    ])('reads %s', (text, inches) => expect(inchesOf(text)).toBe(inches))
  })

  describe('a bare number', () => {
    it.each([
      ['12.5', 150],
      ['12,5', 150],
      ['12', 144],
      ['.5', 6],
      ['12.33', 147.953125],
    ])('is feet: %s', (text, inches) => expect(inchesOf(text)).toBe(inches))
  })

  describe('metric, by the exact inch of 25.4 mm', () => {
    it.each([
      ['3.81 m', 150],
      ['3,81 m', 150],
      ['3.81m', 150],
      ['381 cm', 150],
      ['3810 mm', 150],
      ['25.4 mm', 1],
      ['3.81 metres', 150],
      ['381 centimeters', 150],
    ])('reads %s', (text, inches) => expect(inchesOf(text)).toBe(inches))
  })

  describe('what phones and word processors make of the marks', () => {
    it.each([
      ['12′ 6″', 150],
      ['12’ 6”', 150],
      ['12‘6“', 150],
      ['12′ 6½″', 150.5],
      ['12’6 ¾”', 150.75],
      ['½″', 0.5],
      ['12–6', 150],
      ['12\u00a0ft\u00a06\u00a0in', 150],
      ['12 FT 6 IN', 150],
      [`  12 '   6 "  `, 150],
    ])('reads %s', (text, inches) => expect(inchesOf(text)).toBe(inches))
  })

  it.each(['⅛', '¼', '⅜', '½', '⅝', '¾', '⅞'].map((sign, index) => [sign, (index + 1) / 8] as const))(
    'reads %s as an eighth part',
    (sign, part) => expect(inchesOf(`6${sign}"`)).toBe(6 + part),
  )

  it('holds to the nearest 1/64 inch', () => {
    expect(inchesOf(`6 1/3"`)).toBe(6 + 21 / 64)
    expect(inchesOf('1 m')).toBe(Math.round((1000 / 25.4) * 64) / 64)
  })

  describe('refuses, each with its own sentence', () => {
    it.each([
      ['', 'Nothing is keyed. Write `12\' 6"` or `12.5`.'],
      ['   ', 'Nothing is keyed. Write `12\' 6"` or `12.5`.'],
      [`12'' 6`, "`12'' 6` has two inch marks. Write `12' 6\"` or `12.5`."],
      [`12" 6"`, '`12" 6"` has two inch marks. Write `12\' 6"` or `12.5`.'],
      [`9'' 3`, "`9'' 3` has two inch marks. Write `9' 3\"` or `9.25`."],
      [`12' 6'`, "`12' 6'` has two foot marks. Write `12' 6\"` or `12.5`."],
      ['-3', '`-3` is below zero. A length is more than zero: write `3`.'],
      ['−3', '`−3` is below zero. A length is more than zero: write `3`.'],
      [`1e9'`, "`1e9'` has an exponent. Write the digits out, as `12' 6\"` or `12.5`."],
      [`12' 14"`, '`12\' 14"` has 14 inches after the feet; a foot has 12. Write `13\' 2"`, or all of it in inches.'],
      [`12' 12"`, '`12\' 12"` has 12 inches after the feet; a foot has 12. Write `13\' 0"`, or all of it in inches.'],
      ['12-14', '`12-14` has 14 inches after the feet; a foot has 12. Write `13\' 2"`, or all of it in inches.'],
      ['0', '`0` is zero. A length is more than zero: write `12\' 6"` or `12.5`.'],
      [`0' 0"`, '`0\' 0"` is zero. A length is more than zero: write `12\' 6"` or `12.5`.'],
      ['2641', '`2641` is longer than half a mile. A bare number is feet: write `12\' 6"` or `12.5`.'],
      ['twelve', '`twelve` is not a length. Write `12\' 6"` or `12.5`.'],
      ['NaN', '`NaN` is not a length. Write `12\' 6"` or `12.5`.'],
      ['=1+1', '`=1+1` is not a length. Write `12\' 6"` or `12.5`.'],
      ['12 6', '`12 6` does not say what is feet. Write `12\' 6"` or `12.5`.'],
      ['6-1/2', '`6-1/2` does not say what is feet and what is inches. Write `6 1/2"` or `12\' 6 1/2"`.'],
      ['12 1/2', '`12 1/2` does not say what is feet and what is inches. Write `6 1/2"` or `12\' 6 1/2"`.'],
      [`12.5' 6"`, '`12.5\' 6"` has a part of a foot and inches as well. Write `12\' 6"` or `12.5`.'],
      [`12' 6/0"`, '`12\' 6/0"` has a fraction over zero. Write `6 1/2"`.'],
      [`12' 5/4"`, "`12' 5/4\"` has a fraction that can't be read. Write one that is less than an inch, as `12' 6 1/2\"`."],
      ['1,250', '`1,250` could be read with a decimal comma or with thousands. Write it with a point and without commas.'],
      ['0.001"', '`0.001"` is less than 1/64 inch, the finest that is kept here.'],
    ])('%s', (text, message) => expect(refusalOf(text)).toBe(message))

    it('text that is too long, cut short in the answer', () => {
      expect(refusalOf('9'.repeat(5000))).toBe(`\`${'9'.repeat(24)}…\` is too long for a length. Write \`12' 6"\` or \`12.5\`.`)
    })
  })
})

describe('formatLength', () => {
  it.each([
    [150.5, `12' 6 1/2"`],
    [150, `12' 6"`],
    [144, `12' 0"`],
    [144.5, `12' 0 1/2"`],
    [6.5, `6 1/2"`],
    [0.25, `1/4"`],
    [6, `6"`],
    [0, `0"`],
    [11.999, `1' 0"`],
    [1 / 64, `1/64"`],
    [-30, `-2' 6"`],
  ])('writes %d in as %s', (inches, text) => expect(formatLength(inches)).toBe(text))
})

describe('always', () => {
  const sixtyFourths = fc.integer({ min: 1, max: LENGTH_MAX_IN * 64 })

  it('what is written can be read again, to the very inch', () => {
    fc.assert(fc.property(sixtyFourths, (parts) => inchesOf(formatLength(parts / 64)) === parts / 64))
  })

  it('what is read stands on a whole 1/64', () => {
    fc.assert(fc.property(fc.double({ min: 0.02, max: 2600, noNaN: true }), (feet) => Number.isInteger(inchesOf(feet.toFixed(4)) * 64)))
  })

  it('millimetres are within 1/128 inch of themselves', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 800_000 }), (mm) => Math.abs(inchesOf(`${mm} mm`) - mm / 25.4) <= 1 / 128))
  })

  it('any text is read or refused in words, and never throws', () => {
    const signs = fc.constantFrom(...`0123456789'"-/ .,ftinmc½′″e+`)
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.string({ unit: signs, maxLength: 14 })), (text) => {
        const parsed = parseLength(text)
        return parsed.ok ? parsed.inches > 0 && parsed.inches <= LENGTH_MAX_IN : parsed.message.endsWith('.')
      }),
    )
  })
})
