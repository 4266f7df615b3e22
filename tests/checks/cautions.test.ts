import { describe, expect, it } from 'vitest'
import { CAUTIONS, cautionsFor, documentNotices } from '../../shared/catalogue/cautions.ts'
import { SYSTEM_KEYS } from '../../shared/catalogue/houseSystems.ts'

const keysFor = (yearBuilt: number | null, systems: readonly string[]) => cautionsFor({ yearBuilt, systems }).map(({ key }) => key)

describe('cautionsFor', () => {
  // 40 CFR part 745: target housing was built before 1978.
  it('presumes lead paint in a house of 1977 and not in one of 1978', () => {
    expect(keysFor(1977, ['walls'])).toContain('lead-paint')
    expect(keysFor(1978, ['walls'])).not.toContain('lead-paint')
  })

  // 29 CFR 1926.1101(b): installed no later than 1980, so that 1980 itself counts.
  it('presumes asbestos up to 1980, and clears nothing by a later year alone', () => {
    expect(keysFor(1980, ['ceilings'])).toContain('asbestos')
    expect(keysFor(1980, ['ceilings'])).not.toContain('asbestos-any-age')
    expect(keysFor(1981, ['ceilings'])).toContain('asbestos-any-age')
    expect(keysFor(1981, ['ceilings'])).not.toContain('asbestos')
  })

  it('takes an unknown year as an old one, and says that it is not known', () => {
    const lead = cautionsFor({ yearBuilt: null, systems: ['walls'] }).find(({ key }) => key === 'lead-paint')
    expect(lead?.text).toMatch(/^The year built is not known/)
    expect(keysFor(null, ['ceilings']).filter((key) => key.startsWith('asbestos'))).toEqual(['asbestos'])
  })

  it('brings up only what the systems of the lines touch, and always leaves suspect materials alone', () => {
    expect(keysFor(2020, [])).toEqual(['suspect-materials'])
    expect(keysFor(2020, ['roof'])).toContain('falls')
    expect(keysFor(2020, ['floors'])).not.toContain('falls')
  })

  it('leaves the catalogue as it is', () => {
    const before = JSON.stringify(CAUTIONS)
    cautionsFor({ yearBuilt: null, systems: SYSTEM_KEYS })
    expect(JSON.stringify(CAUTIONS)).toBe(before)
  })
})

describe('the cautions', () => {
  it('name their source, once each', () => {
    expect(new Set(CAUTIONS.map(({ key }) => key)).size).toBe(CAUTIONS.length)
    for (const { key, source, title, text } of CAUTIONS) {
      expect(source.length, key).toBeGreaterThan(4)
      expect(title.length, key).toBeLessThanOrEqual(60)
      expect(text.length, key).toBeGreaterThan(60)
    }
  })

  it('speak to each kind of danger', () => {
    expect(CAUTIONS.map(({ key }) => key)).toEqual(
      expect.arrayContaining([
        'asbestos',
        'lead-paint',
        'suspected-growth',
        'knob-and-tube',
        'aluminum-wiring',
        'electrical',
        'gas',
        'structure',
        'falls',
        'confined-spaces',
        'egress',
        'digging',
        'radon',
        'oil-tank',
        'vermiculite',
        'droppings',
      ]),
    )
  })

  it('say that an estimate is no inspection, no appraisal and no offer of credit', () => {
    expect(documentNotices.join(' ')).toContain('An estimate is not an inspection, an appraisal or an offer of credit')
  })
})
