import { describe, expect, it } from 'vitest'
import { lanternStreet } from '../../seed/houses/lanternStreet.ts'
import { priceItems } from '../../seed/priceBook/priceItems.ts'
import { priceTable } from '../../seed/priceBook/priceTable.ts'
import { regionItems } from '../../seed/priceBook/regionItems.ts'
import { regions } from '../../seed/priceBook/regions.ts'
import { SYSTEM_KEYS } from '../../shared/catalogue/houseSystems.ts'
import { findUniformat } from '../../shared/catalogue/uniformat.ts'
import { checkFormula, computeEstimate, defaultSettings, type LineInput } from '../../shared/engine/index.ts'
import { priceItemFieldsSchema, regionSchema, type PriceItemFields } from '../../shared/schemas/priceItem.ts'

const SALES_TAX_RULES = ['materials', 'none', 'whole-contract']

const allRows: PriceItemFields[] = [...priceItems, ...regionItems.map(({ item }) => item)]
const keysOf = (items: readonly PriceItemFields[]) => items.map(({ key }) => key)

function lineOf(item: PriceItemFields, roomKey: string | null, quantity: string): LineInput {
  return {
    ...item,
    key: `${item.key} ${roomKey ?? 'house'}`,
    roomKey,
    quantity,
    basis: item.installed ? 'hired' : 'own-hands',
    unitPriceE4: item.installed ?? item.materials,
    evidence: 'seen',
  }
}

describe('the demo price book', () => {
  it('holds at least 320 items', () => {
    expect(priceItems.length).toBeGreaterThanOrEqual(320)
  })

  it.each(SYSTEM_KEYS)('has at least six items for %s', (system) => {
    expect(priceItems.filter((item) => item.system === system).length).toBeGreaterThanOrEqual(6)
  })

  it('names each item once', () => {
    const repeated = keysOf(priceItems).filter((key, index, keys) => keys.indexOf(key) !== index)
    expect(repeated).toEqual([])
  })

  it('keeps each row to the schema: low ≤ likely ≤ high, and a price for own hands or for hired work', () => {
    for (const item of allRows) expect(priceItemFieldsSchema.safeParse(item).error?.message, item.key).toBeUndefined()
  })

  it('classifies each item by an individual element of UNIFORMAT II', () => {
    const unclassified = priceItems.filter(({ uniformat }) => findUniformat(uniformat)?.level !== 3)
    expect(keysOf(unclassified)).toEqual([])
  })

  it('brings a formula along that gives what the unit counts, for a room or for the house', () => {
    const faults = priceItems.flatMap(({ key, unit, roomFormula, houseFormula }) => {
      const room = roomFormula === null ? null : checkFormula(roomFormula, { scope: 'room', unit })
      const house = houseFormula === null ? null : checkFormula(houseFormula, { scope: 'house', unit })
      return [room, house].flatMap((checked) => (checked && !checked.ok ? [`${key}: ${checked.message}`] : []))
    })
    expect(faults).toEqual([])
    expect(keysOf(priceItems.filter((item) => item.roomFormula === null && item.houseFormula === null))).toEqual([])
  })

  it('gives a quantity on a whole house and in a finished room with the formulas as they come along', () => {
    const { house, rooms } = lanternStreet
    const lines = priceItems.flatMap((item) => [
      ...(item.houseFormula === null ? [] : [lineOf(item, null, item.houseFormula)]),
      ...(item.roomFormula === null ? [] : [lineOf(item, 'living', item.roomFormula)]),
    ])
    const results = computeEstimate({ house, rooms, lines, settings: defaultSettings })
    expect(results.errors).toEqual([])
    expect(results.lines.filter(({ quantity }) => quantity <= 0).map(({ key }) => key)).toEqual([])
  })

  it('asks more for hired work than for its materials', () => {
    const odd = allRows.filter(
      ({ materials, installed }) => materials !== null && installed !== null && materials.likely > installed.likely,
    )
    expect(keysOf(odd)).toEqual([])
  })

  it('counts own-hands hours only where own hands can do it', () => {
    expect(keysOf(priceItems.filter((item) => item.materials === null && item.hoursPerUnit > 0))).toEqual([])
  })

  it.each([
    'electrical/service-200',
    'electrical/panel',
    'heat/furnace-gas',
    'heat/gas-pipe',
    'water-heater/gas-40',
    'sewer/replace-trench',
    'hazard/ceiling-texture-abated',
    'hazard/oil-tank-buried',
    'siding/paint-lead-safe',
    'pest/droppings-clean-up',
  ])('leaves %s to a licensed trade', (key) => {
    expect(priceItems.find((item) => item.key === key)).toMatchObject({ materials: null })
  })

  it('leaves all abatement to a licensed trade', () => {
    expect(keysOf(priceItems.filter((item) => item.trade === 'abatement' && item.materials !== null))).toEqual([])
  })

  it('dates each price in 2026, on several days', () => {
    const dates = new Set(allRows.map(({ priceDate }) => priceDate))
    expect([...dates].every((date) => date.startsWith('2026-'))).toBe(true)
    expect(dates.size).toBeGreaterThan(20)
  })

  it('says what each item includes', () => {
    expect(keysOf(priceItems.filter(({ note }) => note.length < 10))).toEqual([])
  })

  // Common practice: plank flooring about $3 a square foot in materials, $5 to $7 hired; old drain lines of a small house $5,000 to $10,000.
  it('is of the size that the trade expects', () => {
    const find = (key: string) => priceItems.find((item) => item.key === key)
    expect(find('floor/plank-vinyl')).toMatchObject({ materials: { likely: 30_000 }, installed: { likely: 60_000 } })
    expect(find('drain-pipe/renew-small-house')).toMatchObject({ installed: { low: 50_000_000, high: 100_000_000 } })
  })
})

describe('the demo price regions', () => {
  it('are three, each with another sales-tax rule', () => {
    for (const region of regions) expect(regionSchema.safeParse(region).success, region.key).toBe(true)
    expect(regions.map(({ key }) => key)).toEqual(['merrow-harbor', 'merrow-valley', 'merrow-uplands'])
    expect(regions.map(({ salesTaxRule }) => salesTaxRule).sort()).toEqual(SALES_TAX_RULES)
  })

  it('price some items themselves, each once, in the unit of the base row', () => {
    const names = regionItems.map(({ regionKey, item }) => `${regionKey} ${item.key}`)
    expect(new Set(names).size).toBe(names.length)
    expect(names.length).toBeGreaterThanOrEqual(36)
    for (const { item } of regionItems) expect(item.unit).toBe(priceItems.find(({ key }) => key === item.key)?.unit)
  })
})

describe('priceTable', () => {
  const defaults = { system: 'roof', trade: 'roofing', priceDate: '2026-01-01' } as const
  const header =
    'key | name | unit | uniformat | own hands | hired | labor % | waste % | package | minimum | hours | room formula | house formula'

  it('reads a row with its note', () => {
    const row = 'roof/patch | Patch | lf | B3010 | 1 2.5 4 |  | 60 | 5 | 10 long stick | 12.50 | 0.2 |  | eave_length'
    const [item] = priceTable(defaults, `${header}\n${row}\n  Nails included.\n`)
    expect(item).toMatchObject({
      key: 'roof/patch',
      materials: { low: 10_000, likely: 25_000, high: 40_000 },
      installed: null,
      packageSize: 10,
      packageName: 'long stick',
      minimumChargeCents: 1250,
      roomFormula: null,
      houseFormula: 'eave_length',
      note: 'Nails included.',
    })
  })

  it('names the row that it can’t read', () => {
    const row = (price: string) => `${header}\nroof/patch | Patch | lf | B3010 | ${price} |  | 60 | 5 |  | 0 | 0 |  | 1`
    expect(() => priceTable(defaults, row('3 2 1'))).toThrow(/roof\/patch.*go up/s)
    expect(() => priceTable(defaults, row('1 2'))).toThrow(/roof\/patch/)
    expect(() => priceTable(defaults, row('1 2 3 | x'))).toThrow(/roof\/patch.*cells/)
  })
})
