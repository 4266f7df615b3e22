import { describe, expect, it } from 'vitest'
import { checkFormula } from '../../shared/engine/index.ts'
import { findUnit, UNITS } from '../../shared/catalogue/units.ts'

const inRoom = (text: string, unit: string) => checkFormula(text, { scope: 'room', unit })
const inHouse = (text: string, unit: string) => checkFormula(text, { scope: 'house', unit })

function refusal(checked: ReturnType<typeof checkFormula>): string {
  expect(checked).toMatchObject({ ok: false, code: 'unit-mismatch' })
  return checked.ok ? '' : checked.message
}

describe('the unit of a formula', () => {
  it('is refused where the item counts something else', () => {
    expect(refusal(inRoom('floor_area', 'lf'))).toBe('This formula gives sq ft; the item is priced per lf.')
    expect(refusal(inRoom('perimeter', 'sf'))).toBe('This formula gives lineal feet; the item is priced per sf.')
    expect(refusal(inRoom('volume', 'sf'))).toBe('This formula gives cu ft; the item is priced per sf.')
    expect(refusal(inRoom('windows', 'lf'))).toBe('This formula gives a count; the item is priced per lf.')
    expect(refusal(inRoom('floor_area', 'each'))).toBe('This formula gives sq ft; the item is priced per each.')
  })

  it('is what the measures give', () => {
    expect(inRoom('floor_area * 1.1', 'sf')).toEqual({ ok: true, dimension: 'area' })
    expect(inRoom('base_length + 2', 'lf')).toEqual({ ok: true, dimension: 'length' })
    expect(inRoom('volume', 'cf')).toEqual({ ok: true, dimension: 'volume' })
    expect(inRoom('windows + doors', 'each')).toEqual({ ok: true, dimension: 'count' })
  })

  it('is any for a number', () => {
    for (const { key } of UNITS) expect(inHouse('180', key)).toEqual({ ok: true, dimension: 'any' })
  })

  it.each(['SF', 'sq ft', 'Sq. Ft.', 's.f.', 'ft2', 'ft²', 'square foot', 'square  feet'])('may be spelled %s', (unit) =>
    expect(inRoom('floor_area', unit).ok).toBe(true),
  )

  it.each(['lineal feet', 'linear feet', 'lin. ft.', 'feet'])('may be spelled %s', (unit) =>
    expect(inRoom('perimeter', unit).ok).toBe(true),
  )

  it.each(['bundle', 'rolls', 'box', 'BF', 'bags', 'pair', 'qt', 'lbs', 'fixture', 'visit', 'allowance'])(
    'may be what the trade counts, as %s',
    (unit) => expect(inHouse('12', unit).ok).toBe(true),
  )

  it('has no spelling that means two of them', () => {
    for (const unit of UNITS) {
      for (const spelling of [unit.key, unit.name, unit.plural, ...unit.aliases]) expect(findUnit(spelling)?.key).toBe(unit.key)
    }
  })

  it('that nobody knows is refused', () => {
    expect(inRoom('floor_area', 'parsec')).toMatchObject({ ok: false, code: 'unknown-unit' })
  })

  describe('of sums', () => {
    it('refuses to mix', () => {
      expect(refusal(inRoom('floor_area + perimeter', 'sf'))).toBe('`floor_area + perimeter` mixes sq ft with lineal feet.')
      expect(refusal(inRoom('2 * (wall_area - windows)', 'sf'))).toBe('`wall_area - windows` mixes sq ft with a count.')
      expect(refusal(inRoom('min(floor_area, perimeter)', 'sf'))).toMatch(/mixes sq ft with lineal feet/)
      expect(refusal(inRoom('height > 8 ? floor_area : perimeter', 'sf'))).toMatch(/mixes sq ft with lineal feet/)
      expect(refusal(inRoom('floor_area > height ? 1 : 2', 'each'))).toMatch(/mixes sq ft with lineal feet/)
    })

    it('lets a literal stand for whatever it is added to', () => {
      expect(inRoom('floor_area + 25', 'sf').ok).toBe(true)
      expect(inRoom('max(perimeter, 40)', 'lf').ok).toBe(true)
      expect(inRoom('floor_area > 150 ? floor_area : 150', 'sf').ok).toBe(true)
    })
  })

  describe('of products', () => {
    it('multiplies dimensions', () => {
      expect(inRoom('length * width', 'sf').ok).toBe(true)
      expect(inRoom('length * width * height', 'cf').ok).toBe(true)
      expect(inRoom('floor_area * height', 'cf').ok).toBe(true)
      expect(inRoom('length ^ 2', 'sf').ok).toBe(true)
      expect(inRoom('windows * height', 'lf').ok).toBe(true)
      expect(refusal(inRoom('floor_area * height', 'sf'))).toMatch(/gives cu ft/)
      expect(refusal(inRoom('floor_area ^ 2', 'sf'))).toMatch(/feet to the power of 4/)
    })

    it('divides them', () => {
      expect(inRoom('volume / height', 'sf').ok).toBe(true)
      expect(inRoom('wall_area / perimeter', 'lf').ok).toBe(true)
      expect(inRoom('wall_area / floor_area', 'each').ok).toBe(true)
    })

    it('takes roots of areas alone', () => {
      expect(inRoom('sqrt(floor_area) * 4', 'lf').ok).toBe(true)
      expect(inRoom('floor_area ^ 0.5', 'lf').ok).toBe(true)
      expect(refusal(inRoom('sqrt(perimeter)', 'lf'))).toMatch(/square root of lineal feet/)
    })

    it('keeps the dimension by a literal, but lets a count by a literal be so much for each', () => {
      expect(refusal(inRoom('floor_area * 2', 'lf'))).toMatch(/gives sq ft/)
      expect(inRoom('windows * 14', 'lf').ok).toBe(true)
    })
  })

  describe('of what is divided by a literal', () => {
    it('may be a count: sheets, gallons, sticks', () => {
      expect(inRoom('ceil(wall_area / 32)', 'sheet').ok).toBe(true)
      expect(inRoom('ceil(wall_area / 350) * 2', 'gal').ok).toBe(true)
      expect(inRoom('ceil(perimeter / 16) + ceil(wall_area / 32)', 'each').ok).toBe(true)
    })

    it('may be a larger unit of its own dimension, or of one that a literal has made it', () => {
      expect(inHouse('roof_area / 100', 'square').ok).toBe(true)
      expect(inRoom('floor_area / 9', 'sy').ok).toBe(true)
      expect(inRoom('volume / 27', 'cy').ok).toBe(true)
      expect(inRoom('floor_area * 0.333 / 27', 'cy').ok).toBe(true)
    })

    it('is still what it was beside a measure', () => {
      expect(refusal(inRoom('wall_area / 2 + perimeter', 'sf'))).toMatch(/mixes/)
      expect(refusal(inRoom('floor_area / 2', 'lf'))).toMatch(/gives sq ft/)
    })
  })

  describe('of what is multiplied by a literal', () => {
    it('may be so many for each of it, where the item is counted', () => {
      expect(inHouse('ceil(roof_squares * 3)', 'bundle')).toEqual({ ok: true, dimension: 'area' })
      expect(inRoom('0.004 * wall_area', 'gal').ok).toBe(true)
      expect(inRoom('base_length * 0.75 + base_length * 2', 'each').ok).toBe(true)
    })

    it('is still what it was for anything else', () => {
      expect(refusal(inRoom('floor_area * 2', 'lf'))).toMatch(/gives sq ft/)
      expect(refusal(inHouse('roof_squares * 3', 'sf'))).toMatch(/gives squares/)
      expect(refusal(inRoom('floor_area * 2 + wall_area', 'each'))).toMatch(/gives sq ft/)
      expect(refusal(inRoom('wall_area + floor_area * 2', 'each'))).toMatch(/gives sq ft/)
      expect(refusal(inRoom('floor_area * 2 + perimeter', 'each'))).toMatch(/mixes/)
    })
  })

  describe('of squares', () => {
    it('is a unit of its own', () => {
      expect(inHouse('roof_squares', 'square').ok).toBe(true)
      expect(refusal(inHouse('roof_area', 'square'))).toBe(
        'This formula gives sq ft; the item is priced per square. Use roof_squares, or divide by 100.',
      )
      expect(refusal(inHouse('roof_squares', 'sf'))).toBe('This formula gives squares; the item is priced per sf.')
      expect(refusal(inHouse('roof_squares + roof_area', 'sf'))).toMatch(/mixes squares with sq ft/)
      expect(refusal(inRoom('floor_area', 'sy'))).toMatch(/Divide by 9\.$/)
    })
  })

  it('of sum_rooms is that of its argument', () => {
    expect(inHouse('sum_rooms(wall_area)', 'sf').ok).toBe(true)
    expect(refusal(inHouse('sum_rooms(wall_area)', 'lf'))).toMatch(/gives sq ft/)
  })

  it('of a comparison is none', () => {
    expect(refusal(inRoom('floor_area > 100', 'sf'))).toBe(
      '`floor_area > 100` gives yes or no, not a quantity. Write condition ? one : other.',
    )
    expect(refusal(inRoom('(floor_area > 100) * 2', 'sf'))).toMatch(/gives yes or no/)
  })
})
