import { describe, expect, it } from 'vitest'
import { workbookSheets } from '../../shared/engine/index.ts'
import { rowHeight } from '../../shared/engine/workbook/rowHeight.ts'
import { ribbonText } from '../../shared/engine/workbook/rangeRibbon.ts'
import { statedInspections, statedUnknowns } from '../../shared/engine/workbook/statedUnknowns.ts'
import type { WorkbookCell, WorkbookSheet } from '../../shared/engine/workbook/workbookModel.ts'
import { buildContext, buildLine, buildRoom, buildWhole, resultsOf } from '../support/buildWorkbookEstimate.ts'
import { expectAgreement, expectResultsStand, openWorkbook } from '../support/expectWorkbookAgrees.ts'

type Parts = Parameters<typeof buildWhole>[0]

function sheetOf(parts: Parts, name: string): WorkbookSheet {
  const whole = buildWhole(parts)
  const sheet = workbookSheets(whole, resultsOf(whole), buildContext()).sheets.find((one) => one.name === name)
  if (!sheet) throw new Error(`There is no sheet ${name}`)
  return sheet
}
function textsOf(sheet: WorkbookSheet): string[] {
  return sheet.rows.flatMap(({ cells }) => cells.flatMap((cell) => (typeof cell?.value === 'string' ? [cell.value] : [])))
}

const ROOMS = [
  buildRoom({ id: 'bed-1' }),
  buildRoom({
    id: 'kitchen',
    name: 'Kitchen',
    use: 'kitchen',
    shape: { kind: 'ell', lengthIn: 171.25, widthIn: 143.5, cutLengthIn: 48, cutWidthIn: 36.75 },
    ceiling: { kind: 'sloped', lowIn: 84, highIn: 121.5 },
    deductions: [{ kind: 'cabinets', widthIn: 96, heightIn: 36, depthIn: 24, count: 2, fromWalls: true, fromFloor: true, fromBase: true }],
  }),
  buildRoom({
    id: 'sunroom',
    name: 'Sun room',
    use: 'living',
    shape: {
      kind: 'polygon',
      corners: [
        [0, 0],
        [150, 0],
        [180, 60],
        [120, 130.5],
        [0, 110],
      ],
    },
    openings: [
      { kind: 'cased', widthIn: 60, heightIn: 84, count: 1, fromWalls: false, fromBase: true },
      { kind: 'window', widthIn: 30, heightIn: 50, count: 3, fromWalls: true, fromBase: false },
    ],
  }),
  buildRoom({
    id: 'cellar',
    name: 'Cellar',
    use: 'cellar',
    ceiling: null,
    openings: [],
    shape: { kind: 'rectangle', lengthIn: 400, widthIn: 300 },
  }),
]

describe('workbookSheets', () => {
  it('agrees with the engine for rooms of every shape, ceiling, opening and deduction', async () => {
    const quantities = [
      'floor_area',
      'ceiling_area',
      'wall_area',
      'base_length',
      'opening_area',
      'volume / 27',
      'windows',
      'ceil(wall_area_gross / 32)',
    ]
    const units = ['sf', 'sf', 'sf', 'lf', 'sf', 'cy', 'each', 'sheet']
    const lines = ['bed-1', 'kitchen', 'sunroom'].flatMap((roomId) =>
      quantities.map((quantity, index) =>
        buildLine({ id: `${roomId}-${index}`, roomId, quantity, unit: units[index] ?? 'each', wastePercent: 7.5 }),
      ),
    )
    const houseLines = ['roof_squares', 'sum_rooms(floor_area)', 'living_area', 'outside_wall_area', 'sleeping_rooms', 'sum_windows'].map(
      (quantity, index) =>
        buildLine({ id: `house-${index}`, quantity, unit: ['square', 'sf', 'sf', 'sf', 'each', 'each'][index] ?? 'each' }),
    )
    const whole = buildWhole({ rooms: ROOMS, lines: [...lines, ...houseLines] })
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    expectResultsStand(workbook)
    workbook.destroy()
  })

  it.each([[{ kind: 'gable', rise: 8 }], [{ kind: 'hip', rise: 5 }], [{ kind: 'shed', rise: 3 }], [{ kind: 'flat', rise: 0 }]] as const)(
    'agrees on the roof of a house with %o',
    async (group) => {
      const lines = ['roof_area', 'ridge_length', 'eave_length', 'gable_area', 'outside_wall_area'].map((quantity, index) =>
        buildLine({ id: `line-${index}`, quantity, unit: quantity.endsWith('area') ? 'sf' : 'lf' }),
      )
      const whole = buildWhole({ house: { roof: [group], overhangIn: 17.5 }, lines })
      const workbook = await openWorkbook(whole, buildContext())
      expectAgreement(workbook, whole)
      expectResultsStand(workbook)
      const { sheet, address } = workbook.place('house_footprint_area')
      expect(workbook.formula(sheet, address)).toMatch(/^E\d+\*E\d+$/)
      workbook.destroy()
    },
  )

  it('takes own hands up to whole packages, hired work up to its minimum, and an own price for what it is', async () => {
    const whole = buildWhole({
      rooms: ROOMS,
      lines: [
        buildLine({ id: 'packaged', roomId: 'bed-1', quantity: 'floor_area', basis: 'own-hands', wastePercent: 10, packageSize: 22.5 }),
        buildLine({ id: 'minimum', quantity: '3', minimumChargeCents: 25_000 }),
        buildLine({
          id: 'own-price',
          quantity: '7',
          override: { price: { low: 12_345, likely: 23_456, high: 34_567 }, reason: 'Bid by phone' },
        }),
        buildLine({ id: 'own-line', itemKey: null, quantity: '1', override: { price: { low: 1, likely: 2, high: 3 }, reason: 'Ours' } }),
      ],
      settings: { contingency: { method: 'fixed', amountCents: 123_456 }, salesTax: { rule: 'whole-contract', percent: 8.25 } },
    })
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    expectResultsStand(workbook)
    expect(workbook.named('contingency_amount')).toBe(1234.56)
    workbook.destroy()
  })

  it('shows a line that can’t be computed with its reason, and leaves it out of every sum', async () => {
    const lines = [
      buildLine({ id: 'good' }),
      buildLine({ id: 'bad', roomId: 'cellar', quantity: 'wall_area', description: 'Cellar walls' }),
    ]
    const whole = buildWhole({ rooms: ROOMS, lines })
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    expect(workbook.named('lines_counted')).toBe(1)
    expect(workbook.named('lines_left_out')).toBe(1)
    workbook.destroy()
    expect(textsOf(sheetOf({ rooms: ROOMS, lines }, 'Estimate'))).toContain('Left out of the sums: No ceiling height is keyed.')
    expect(textsOf(sheetOf({ rooms: ROOMS, lines }, 'Assumptions and cautions'))).toContain('Line 2: Cellar walls')
  })

  it('keeps the own price of a line that can’t be computed, which the estimate sheet leaves blank', async () => {
    const override = { price: { low: 12_345, likely: 23_456, high: 34_567 }, reason: 'Bid by phone' }
    const whole = buildWhole({ rooms: ROOMS, lines: [buildLine({ id: 'bad', roomId: 'cellar', quantity: 'wall_area', override })] })
    const workbook = await openWorkbook(whole, buildContext())
    expectResultsStand(workbook)
    workbook.destroy()
  })

  it('is whole without a line, without a room and without a footprint', async () => {
    const whole = buildWhole({ house: { footprint: null, overhangIn: null, wallHeightIn: null, roof: [] }, rooms: [], lines: [] })
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    expectResultsStand(workbook)
    workbook.destroy()
  })

  it('keeps a quantity that no spreadsheet could work out as its figure', async () => {
    const rooms = Array.from({ length: 60 }, (_, index) => buildRoom({ id: `room-${index}`, position: index }))
    const deep = `${'ceil('.repeat(45)}floor_area${')'.repeat(45)}`
    const lines = [
      buildLine({ id: 'long', quantity: `sum_rooms(${Array.from({ length: 12 }, () => 'wall_area_gross').join(' + ')})` }),
      buildLine({ id: 'deep', roomId: 'room-0', quantity: deep }),
    ]
    const whole = buildWhole({ rooms, lines })
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    for (const address of ['G6', 'G7']) expect(workbook.formula('Estimate', address)).toBeUndefined()
    workbook.destroy()
  })

  it('notes an own price beside the book’s', () => {
    const own = buildLine({ id: 'own-price', override: { price: { low: 10_000, likely: 20_000, high: 30_000 }, reason: 'Bid by phone' } })
    const texts = textsOf(sheetOf({ lines: [buildLine({ id: 'line-1' }), own] }, 'Prices used'))
    expect(texts).toContain('Own price in its place on line 2, see below.')
    expect(texts).toContain('Bid by phone')
  })

  it('brings the cautions that the house and its lines call for, and says when all is invented', () => {
    const texts = textsOf(sheetOf({}, 'Assumptions and cautions')).join('\n')
    expect(texts).toMatch(/lead/i)
    expect(texts).toMatch(/not an inspection, an appraisal or an offer of credit/)
    expect(texts).toMatch(/are invented/)
  })

  it('names no function that one of the spreadsheet programs lacks', () => {
    const common = /^(?:ABS|COUNTIF|COUNTIFS|IF|MAX|MIN|REPT|ROUND|ROUNDDOWN|ROUNDUP|SQRT|SUM|SUMIFS)$/
    const whole = buildWhole({
      rooms: ROOMS,
      lines: [buildLine({ id: 'line-1', roomId: 'kitchen', quantity: 'ceil(wall_area / 32)', unit: 'sheet' })],
    })
    const formulas = workbookSheets(whole, resultsOf(whole), buildContext()).sheets.flatMap(({ rows }) =>
      rows.flatMap(({ cells }) => cells.flatMap((cell: WorkbookCell | undefined) => (cell?.formula === undefined ? [] : [cell.formula]))),
    )
    expect(formulas.length).toBeGreaterThan(100)
    for (const formula of formulas) {
      expect(formula).not.toMatch(/^=/)
      for (const [, name = ''] of formula.matchAll(/([A-Z][A-Z.]+)\(/g)) expect(name).toMatch(common)
    }
  })
})

describe('rowHeight', () => {
  const columns = [{ width: 20 }, { width: 10 }]

  it('grows with the lines of its longest text, and never past what a row can be', () => {
    const one = rowHeight([{ value: 'Short', style: 'text' }], 1, columns, [])
    const three = rowHeight([{ value: 'Sixty letters of text that will run on into a third line or so', style: 'text' }], 1, columns, [])
    expect(one).toBeCloseTo(15, 0)
    expect(three).toBeGreaterThan(2 * one)
    expect(rowHeight([{ value: 'x'.repeat(30_000), style: 'text' }], 1, columns, [])).toBe(409)
  })

  it('reckons with a merged cell’s whole width', () => {
    const cell = { value: 'Twenty-nine letters and blank', style: 'text' } as const
    expect(rowHeight([cell], 1, columns, [{ top: 1, left: 1, bottom: 1, right: 2 }])).toBeLessThan(rowHeight([cell], 1, columns, []))
  })
})

describe('ribbonText', () => {
  it('draws low to high with a tick at likely', () => {
    expect(ribbonText({ low: 20, likely: 50, high: 100 }, 100, 10, '·')).toBe('··━━━┃━━━━━')
    expect(ribbonText({ low: 0, likely: 0, high: 0 }, 0, 10, '·')).toBe('')
  })
})

describe('unknowns and inspections', () => {
  const unknowns = [
    { key: 'fibre', description: 'Ceilings hold asbestos', chance: 0.6, cost: { low: '2500', likely: '4800.50', high: '9000' } },
    { nonsense: 1 },
  ]

  it('are stated as the document has them; what can’t be read is left out', () => {
    expect(statedUnknowns(unknowns)).toEqual([
      { description: 'Ceilings hold asbestos', words: '60 in 100 that it turns out so; then $2,500 to $9,000, likely $4,800.50.' },
    ])
    expect(statedInspections([{ description: 'Sample', cost: '95.00', settles: ['fibre'] }], unknowns)).toEqual([
      { description: 'Sample', words: 'Costs $95.00. Would settle: Ceilings hold asbestos.' },
    ])
  })
})
