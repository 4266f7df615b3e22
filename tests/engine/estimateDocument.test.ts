import { describe, expect, it } from 'vitest'
import {
  computeEstimate,
  defaultSettings,
  readEstimateDocument,
  toEstimateInput,
  writeEstimateDocument,
  type EstimateDocument,
} from '../../shared/engine/index.ts'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import { buildEstimateDocument } from '../support/buildEstimateDocument.ts'
import { buildEstimate, buildEstimateWhole, buildLines } from '../support/buildEstimateWhole.ts'
import { buildKeyedRoom } from '../support/buildKeyedRoom.ts'
import { demoWholes } from '../support/demoWholes.ts'

function read(document: unknown) {
  const result = readEstimateDocument(document)
  if (!result.ok) throw new Error(JSON.stringify(result.errors))
  return result
}

function problems(document: unknown) {
  const result = readEstimateDocument(document)
  return result.ok ? [] : result.errors
}

/** The document with one field put, by its path: `put('lines[0].unitPrice.low', '-1')`. `undefined` takes the field out. */
function put(path: string, value: unknown, document: EstimateDocument = buildEstimateDocument()): unknown {
  const copy = structuredClone(document) as unknown as Record<string, unknown>
  const keys = path.split(/[.[\]]+/).filter(Boolean)
  const last = keys.pop() as string
  const target = keys.reduce<Record<string, unknown>>((part, key) => (part[key] ??= {}) as Record<string, unknown>, copy)
  if (value === undefined) delete target[last]
  else target[last] = value
  return copy
}

describe('readEstimateDocument', () => {
  describe('fills in what is left out', () => {
    const { input, keyed } = read(buildEstimateDocument())

    it('with the firm’s settings', () => expect(input.settings).toEqual(defaultSettings))

    it('with nothing for what a house has not keyed', () => {
      expect(input.house).toEqual({ storeys: 1, footprint: null, wallHeightIn: null, overhangIn: null, roof: [] })
    })

    it('with no waste, package, minimum or hours, and the widest evidence', () => {
      expect(input.lines[0]).toMatchObject({
        wastePercent: 0,
        packageSize: null,
        minimumChargeCents: 0,
        hoursPerUnit: 0,
        evidence: 'seen',
        trade: 'general',
      })
    })

    it('with the house as a whole for a line without a room', () => {
      expect(read(put('lines[0].room', undefined)).input.lines[0]?.roomKey).toBeNull()
    })

    it('with one of an opening, taken from walls and base', () => {
      const document = put('rooms[0].openings', [{ kind: 'door', width: `2' 8"`, height: `6' 8"` }])
      expect(read(document).input.rooms[0]?.openings).toEqual([
        { kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true },
      ])
    })

    it('with part of the settings', () => {
      const { settings } = read(put('settings', { permits: '450.00', evidence: { seen: { spread: 2, quantityPercent: 20 } } })).input
      expect(settings).toEqual({
        ...defaultSettings,
        permitsCents: 45_000,
        evidence: { ...defaultSettings.evidence, seen: { spread: 2, quantityPercent: 20 } },
      })
    })

    it('with the rest of an evidence mark that is given in part', () => {
      const { evidence } = read(put('settings', { evidence: { seen: { spread: 2 }, bid: { quantityPercent: 1 } } })).input.settings
      expect(evidence).toEqual({
        ...defaultSettings.evidence,
        seen: { spread: 2, quantityPercent: 12 },
        bid: { spread: 0.15, quantityPercent: 1 },
      })
    })

    it('with no percentage where there is no sales tax', () => {
      expect(read(put('settings', { salesTax: { rule: 'none' } })).input.settings.salesTax).toEqual({ rule: 'none', percent: 0 })
    })

    it('and says no word of it in the document', () => expect(keyed.lines[0]?.note).toBe(''))
  })

  describe('takes', () => {
    it('lengths as numbers of feet', () => {
      expect(read(put('rooms[0].shape.length', 12.5)).input.rooms[0]?.shape).toMatchObject({ lengthIn: 150 })
      expect(read(put('rooms[0].shape.length', '3.81 m')).input.rooms[0]?.shape).toMatchObject({ lengthIn: 150 })
    })

    it('an overhang of nothing', () => {
      for (const none of [0, '0', `0"`, `0'`, `0' 0"`, '0-0', '0 ft 0 in', '0.0 m', '0 mm'])
        expect(read(put('house.overhang', none)).input.house.overhangIn).toBe(0)
    })

    it('polygon corners as lengths or feet, zero and below zero', () => {
      const shape = {
        kind: 'polygon',
        corners: [
          ['0', 0],
          [`12' 6"`, '0'],
          [12.5, 10],
          [`-1'`, `10'`],
          [-2, 4],
        ],
      }
      expect(read(put('rooms[0].shape', shape)).input.rooms[0]?.shape).toEqual({
        kind: 'polygon',
        corners: [
          [0, 0],
          [150, 0],
          [150, 120],
          [-12, 120],
          [-24, 48],
        ],
      })
    })

    it('a place of zero in any notation', () => {
      const corners = [
        [`0' 0"`, `0'-0"`],
        [`12'`, '-0'],
        [`12'`, `-0' 6"`],
        ['0 ft 0 in', '0.0'],
      ]
      expect(read(put('house.footprint', { kind: 'polygon', corners })).input.house.footprint).toEqual({
        kind: 'polygon',
        corners: [
          [0, 0],
          [144, 0],
          [144, -6],
          [0, 0],
        ],
      })
    })

    it('a polygon that closes itself twice', () => {
      const shape = {
        kind: 'polygon',
        corners: [
          [0, 0],
          [10, 0],
          [10, 10],
          [0, 0],
        ],
      }
      expect(computeEstimate(read(put('rooms[0].shape', shape)).input).rooms['bed-1']?.floor_area).toBe(50)
    })

    it('an L', () => {
      const shape = { kind: 'ell', length: `20'`, width: `15'`, cutLength: `8'`, cutWidth: `5'` }
      expect(computeEstimate(read(put('rooms[0].shape', shape)).input).rooms['bed-1']?.floor_area).toBe(260)
    })

    it('a quantity as a number, and a package as one', () => {
      expect(read(put('lines[0].quantity', 180)).input.lines[0]?.quantity).toBe('180')
      expect(read(put('lines[0].packageSize', 22.5)).input.lines[0]?.packageSize).toBe(22.5)
      expect(read(put('lines[0].packageSize', '22.5')).input.lines[0]?.packageSize).toBe(22.5)
    })

    it('a price of zero, and a line without one', () => {
      expect(read(put('lines[0].unitPrice.low', '0')).input.lines[0]?.unitPriceE4?.low).toBe(0)
      expect(computeEstimate(read(put('lines[0].unitPrice', null)).input).errors).toMatchObject([
        { path: 'lines[0].unitPrice', code: 'no-price' },
      ])
    })

    it('a unit by any spelling, and leaves one that nobody knows to its line', () => {
      expect(computeEstimate(read(put('lines[0].unit', 'SQ FT')).input).errors).toEqual([])
      expect(computeEstimate(read(put('lines[0].unit', 'parsec')).input).errors).toMatchObject([
        { path: 'lines[0].unit', code: 'unknown-unit' },
      ])
    })

    it('a formula of any length, and leaves one that is too long to its line', () => {
      const { errors } = computeEstimate(read(put('lines[0].quantity', '('.repeat(10_000))).input)
      expect(errors).toMatchObject([{ path: 'lines[0].quantity', code: 'too-long' }])
    })

    it('no rooms and no lines', () => {
      expect(computeEstimate(read(buildEstimateDocument({ rooms: [], lines: [] })).input).totals.totalCents.likely).toBe(0)
    })

    it('a fixed contingency', () => {
      expect(read(put('settings.contingency', { method: 'fixed', amount: '1250.5' })).input.settings.contingency).toEqual({
        method: 'fixed',
        amountCents: 125_050,
      })
    })
  })

  describe('refuses, by path and code', () => {
    it.each([
      ['format', 'other', 'format', 'invalid-value'],
      ['version', 2, 'version', 'invalid-value'],
      ['house', undefined, 'house', 'invalid-type'],
      ['house.name', '', 'house.name', 'too-small'],
      ['house.storeys', 1.3, 'house.storeys', 'not-multiple-of'],
      ['house.colour', 'red', 'house.colour', 'unknown-field'],
      ['extra', 1, 'extra', 'unknown-field'],
      ['lines[0].extra', 1, 'lines[0].extra', 'unknown-field'],
      ['rooms[0].shape.extra', 1, 'rooms[0].shape.extra', 'unknown-field'],
      ['rooms[0].shape.length', `12'' 6`, 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', '-3', 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', `1e9'`, 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', -3, 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', 0, 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', 2641, 'rooms[0].shape.length', 'bad-length'],
      ['rooms[0].shape.length', undefined, 'rooms[0].shape.length', 'invalid-type'],
      ['rooms[0].shape.kind', 'circle', 'rooms[0].shape.kind', 'invalid-union'],
      ['rooms[0].ceiling', { kind: 'flat', height: '' }, 'rooms[0].ceiling.height', 'bad-length'],
      ['rooms[0].ceiling', { kind: 'sloped', low: `8'`, high: `7'` }, 'rooms[0].ceiling.high', 'out-of-order'],
      ['rooms[0].shape', { kind: 'ell', length: 10, width: 10, cutLength: 10, cutWidth: 5 }, 'rooms[0].shape.cutLength', 'cut-too-large'],
      [
        'rooms[0].shape',
        {
          kind: 'polygon',
          corners: [
            [0, 0],
            [10, 10],
            [10, 0],
            [0, 10],
          ],
        },
        'rooms[0].shape.corners[2]',
        'walls-cross',
      ],
      [
        'house.footprint',
        {
          kind: 'polygon',
          corners: [
            [0, 0],
            [10, 10],
            [10, 0],
            [0, 10],
          ],
        },
        'house.footprint.corners[2]',
        'walls-cross',
      ],
      ['house.roof', [{ kind: 'gable', rise: 6, sharePercent: 30 }], 'house.roof', 'bad-shares'],
      ['house.roof', [{ kind: 'gable', rise: 25 }], 'house.roof[0].rise', 'too-big'],
      ['lines[0].unitPrice.low', '-1', 'lines[0].unitPrice.low', 'negative'],
      ['lines[0].unitPrice.low', '2.40001', 'lines[0].unitPrice.low', 'too-many-decimals'],
      ['lines[0].unitPrice.low', 2.4, 'lines[0].unitPrice.low', 'invalid-type'],
      ['lines[0].unitPrice.low', '1e2', 'lines[0].unitPrice.low', 'bad-amount'],
      ['lines[0].unitPrice.low', '', 'lines[0].unitPrice.low', 'bad-amount'],
      ['lines[0].unitPrice.low', '3.01', 'lines[0].unitPrice', 'out-of-order'],
      ['lines[0].unitPrice', undefined, 'lines[0].unitPrice', 'invalid-type'],
      ['lines[0].minimumCharge', '1.005', 'lines[0].minimumCharge', 'too-many-decimals'],
      ['lines[0].minimumCharge', '1000000001', 'lines[0].minimumCharge', 'too-large'],
      ['lines[0].packageSize', '0', 'lines[0].packageSize', 'too-small'],
      ['lines[0].packageSize', 'many', 'lines[0].packageSize', 'invalid-type'],
      ['lines[0].wastePercent', 101, 'lines[0].wastePercent', 'too-big'],
      ['lines[0].basis', 'borrowed', 'lines[0].basis', 'invalid-value'],
      ['lines[0].quantity', null, 'lines[0].quantity', 'invalid-union'],
      ['lines[0].room', 'attic', 'lines[0].room', 'unknown-room'],
      ['settings.contingency', { method: 'careful-figure', chance: 0.8 }, 'settings.contingency.method', 'not-available'],
      ['settings.salesTax', { rule: 'all', percent: 8 }, 'settings.salesTax.rule', 'invalid-value'],
      ['settings.salesTax', { rule: 'materials' }, 'settings.salesTax.percent', 'invalid-type'],
      ['settings.evidence', { seen: { spread: 2, width: 3 } }, 'settings.evidence.seen.width', 'unknown-field'],
      ['settings.permits', 450, 'settings.permits', 'invalid-type'],
      [
        'unknowns',
        [{ key: 'a', description: 'A', system: 'floors', chance: 1.2, cost: { low: '1', likely: '2', high: '3' } }],
        'unknowns[0].chance',
        'too-big',
      ],
      ['inspections', [{ key: 'a', description: 'A', cost: '95', settles: ['b'] }], 'inspections[0].settles[0]', 'unknown-key'],
    ])('%s = %j', (path, value, at, code) => {
      expect(problems(put(path, value))).toMatchObject([{ path: at, code, message: expect.stringMatching(/\S/) }])
    })

    it('keys that are given twice', () => {
      const { rooms, lines } = buildEstimateDocument()
      expect(problems(buildEstimateDocument({ rooms: [...rooms, ...rooms], lines: [...lines, ...lines] }))).toMatchObject([
        { path: 'rooms[1].key', code: 'repeated-key' },
        { path: 'lines[1].key', code: 'repeated-key' },
      ])
    })

    it('more formula than can be parsed in a moment', () => {
      const [line] = buildEstimateDocument().lines
      const lines = Array.from({ length: 1100 }, (_, index) => ({
        ...line!,
        key: `line-${index}`,
        quantity: `${index} + ${'1'.repeat(490)}`,
      }))
      expect(problems(buildEstimateDocument({ lines }))).toMatchObject([{ path: 'lines', code: 'too-much-formula' }])
    })

    it('the careful figure, and says which contingencies are available', () => {
      expect(problems(put('settings.contingency', { method: 'careful-figure', chance: 0.8 }))[0]?.message).toMatch(
        /percent and fixed are available/,
      )
    })

    it.each([null, [], 'text', 3, {}])('%j, which is no document', (value) => expect(problems(value).length).toBeGreaterThan(0))

    it('all fields that are wrong at once', () => {
      const twice = put('lines[0].unitPrice.low', '-1', put('rooms[0].shape.width', 'wide') as EstimateDocument)
      expect(problems(twice).map(({ path }) => path)).toEqual(['rooms[0].shape.width', 'lines[0].unitPrice.low'])
    })
  })
})

describe('writeEstimateDocument', () => {
  const whole = buildEstimateWhole({
    estimate: buildEstimate({
      unknowns: [
        {
          key: 'fibre',
          description: 'Ceilings hold asbestos',
          system: 'ceilings',
          chance: 0.6,
          cost: { low: '1', likely: '2', high: '3' },
        },
      ],
      inspections: [{ key: 'sample', description: 'Laboratory sample', cost: '95.00', settles: ['fibre'] }],
    }),
    rooms: [
      buildKeyedRoom({ id: 'bed-1', note: 'Bay to the street' }),
      buildKeyedRoom({
        id: 'bed-2',
        shape: {
          kind: 'polygon',
          corners: [
            [-12, 0],
            [150.5, 0],
            [150.5, 120.25],
          ],
        },
        ceiling: { kind: 'sloped', lowIn: 60, highIn: 96 },
      }),
      buildKeyedRoom({
        id: 'kitchen',
        ceiling: null,
        openings: [{ kind: 'cased', widthIn: 60, heightIn: 84, count: 1, fromWalls: false, fromBase: true }],
        deductions: [
          { kind: 'cabinets', widthIn: 96, heightIn: 34.5, depthIn: 24, count: 1, fromWalls: true, fromFloor: true, fromBase: false },
        ],
      }),
    ],
    lines: buildLines(
      {
        roomId: 'bed-1',
        quantity: 'floor_area',
        basis: 'own-hands',
        wastePercent: 10,
        packageSize: 22.5,
        hoursPerUnit: 0.045,
        note: 'Level first',
      },
      {
        roomId: 'bed-2',
        quantity: 'floor_area',
        override: { price: { low: 1_525, likely: 20_000, high: 30_000 }, reason: 'Bid by phone' },
      },
      {
        itemKey: null,
        book: { materials: null, installed: null },
        override: { price: { low: 1, likely: 2, high: 3 }, reason: 'Own line' },
        minimumChargeCents: 35_000,
      },
      { book: { materials: null, installed: null } },
    ),
  })

  it('loses nothing that was keyed', () => {
    const { keyed } = read(JSON.parse(JSON.stringify(writeEstimateDocument(whole))))
    const { id, version, createdAt, updatedAt, ...houseFields } = whole.house
    expect([id, version, createdAt, updatedAt].every(Boolean)).toBe(true)
    expect(keyed.house).toEqual(houseFields)
    expect(keyed.rooms).toEqual(
      whole.rooms.map(({ id: key, houseId: _house, position: _place, version: _version, ...fields }) => ({ key, ...fields })),
    )
    expect(keyed.lines).toEqual(
      whole.lines.map(({ id: key, estimateId: _estimate, position: _place, version: _version, roomId: roomKey, ...fields }) => ({
        key,
        roomKey,
        ...fields,
      })),
    )
    expect(keyed.settings).toEqual(whole.estimate.settings)
    expect(keyed.priceBookVersion).toBe(whole.estimate.priceBookVersion)
    expect(keyed.name).toBe(whole.estimate.name)
  })

  it('keeps unknowns and inspections as they are', () => {
    const { unknowns, inspections } = read(writeEstimateDocument(whole)).document
    expect({ unknowns, inspections }).toEqual({ unknowns: whole.estimate.unknowns, inspections: whole.estimate.inspections })
  })

  it('writes lengths as the trade does, and money as decimal strings', () => {
    const { rooms, lines } = writeEstimateDocument(whole)
    expect(rooms[0]?.shape).toMatchObject({ kind: 'rectangle', length: expect.stringMatching(/^\d+' \d+"$/) })
    expect(lines[1]).toMatchObject({
      unitPrice: { low: '0.1525', likely: '2.00', high: '3.00' },
      priceReason: 'Bid by phone',
      minimumCharge: '0.00',
    })
  })

  it('gives the same figures as the estimate itself, for each house of the demo', async () => {
    for (const demo of [whole, ...(await demoWholes())]) expect(documentFigures(demo)).toEqual(computeEstimate(toEstimateInput(demo)))
  })

  function documentFigures(estimate: EstimateWhole) {
    return computeEstimate(read(JSON.parse(JSON.stringify(writeEstimateDocument(estimate)))).input)
  }
})
