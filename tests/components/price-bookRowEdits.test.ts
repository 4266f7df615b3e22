import { describe, expect, it } from 'vitest'
import { keyCell } from '../../src/components/price-book/rowEdits.ts'
import { buildPriceItem } from '../support/buildPriceItem.ts'

const item = buildPriceItem()

describe('keyCell', () => {
  it('gives the patch of a price that fits', () => {
    expect(keyCell(item, {}, 'installed.likely', '$5.90')).toEqual({
      held: {},
      patch: { installed: { low: 48_000, likely: 59_000, high: 72_500 } },
    })
  })

  it('gives no patch when the same figure is keyed again', () => {
    expect(keyCell(item, {}, 'installed.likely', '5.80')).toEqual({ held: {}, patch: null })
  })

  it.each([
    ['-1', /below zero/],
    ['1.23456', /5 decimals/],
    ['abc', /not an amount/],
  ])('holds %s with the reason', (text, reason) => {
    const { held, patch } = keyCell(item, {}, 'materials.low', text)
    expect(patch).toBeNull()
    expect(held['materials.low']).toEqual({ text, problem: expect.stringMatching(reason) })
  })

  it('holds an end that is out of order and says against what', () => {
    const { held, patch } = keyCell(item, {}, 'materials.low', '5')
    expect(patch).toBeNull()
    expect(held['materials.low']?.problem).toBe('low must be at most likely, $3.00')
  })

  it('saves all three once the others follow', () => {
    const first = keyCell(item, {}, 'materials.low', '5')
    const second = keyCell(item, first.held, 'materials.likely', '6')
    expect(second.patch).toBeNull()
    expect(Object.keys(second.held)).toEqual(['materials.low', 'materials.likely'])
    const third = keyCell(item, second.held, 'materials.high', '7')
    expect(third).toEqual({ held: {}, patch: { materials: { low: 50_000, likely: 60_000, high: 70_000 } } })
  })

  it('takes a price away when all three are cleared, as long as the other price stays', () => {
    const first = keyCell(item, {}, 'materials.low', '')
    expect(first.held['materials.low']?.problem).toMatch(/go together/)
    const second = keyCell(item, first.held, 'materials.likely', '')
    const third = keyCell(item, second.held, 'materials.high', '')
    expect(third).toEqual({ held: {}, patch: { materials: null } })
  })

  it('keeps the last price of an item', () => {
    const hiredAlone = buildPriceItem({ materials: null })
    let held = {}
    let patch: unknown = null
    for (const end of ['low', 'likely', 'high'] as const) ({ held, patch } = keyCell(hiredAlone, held, `installed.${end}`, ''))
    expect(patch).toBeNull()
    expect(Object.values(held)).toHaveLength(3)
  })

  it('leaves what is held elsewhere in the row', () => {
    const { held } = keyCell(item, {}, 'wastePercent', '101')
    expect(held.wastePercent?.problem).toBe('must be at most 100')
    expect(keyCell(item, held, 'installed.low', '4').held).toEqual(held)
  })

  it.each([
    ['wastePercent', '12.5 %', { wastePercent: 12.5 }],
    ['minimumChargeCents', '$1,250.50', { minimumChargeCents: 125_050 }],
    ['packageSize', '', { packageSize: null }],
    ['hoursPerUnit', '0.06', { hoursPerUnit: 0.06 }],
    ['name', ' Oak strip ', { name: 'Oak strip' }],
    ['priceDate', '2026-12-01', { priceDate: '2026-12-01' }],
  ] as const)('reads %s from "%s"', (field, text, patch) => {
    expect(keyCell(item, {}, field, text)).toEqual({ held: {}, patch })
  })

  it.each([
    ['packageSize', '0'],
    ['uniformat', 'Z9'],
    ['priceDate', '1 Dec'],
    ['name', '  '],
    ['hoursPerUnit', 'two'],
    ['laborSharePercent', '1e2'],
  ] as const)('holds %s "%s"', (field, text) => {
    const { held, patch } = keyCell(item, {}, field, text)
    expect(patch).toBeNull()
    expect(held[field]?.text).toBe(text)
    expect(held[field]?.problem).not.toBe('')
  })
})
