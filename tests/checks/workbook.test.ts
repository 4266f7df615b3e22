import { beforeAll, describe, expect, it } from 'vitest'
import { demoHouses } from '../../seed/houses/index.ts'
import type { EstimateSettings, EstimateWhole, Line } from '../../shared/schemas/estimate.ts'
import { buildContext } from '../support/buildWorkbookEstimate.ts'
import { demoWholes } from '../support/demoWholes.ts'
import { expectAgreement, expectResultsStand, lineCell, openWorkbook, withLine } from '../support/expectWorkbookAgrees.ts'
import type { RecalculatedWorkbook } from '../support/recalculateWorkbook.ts'

/*
 * Each demo house's workbook, parsed from its file and recalculated by HyperFormula, against the engine's own figures: as issued, and after a quantity,
 * a price and an adder were changed in the sheet on one side and in the estimate on the other. To the cent.
 */
describe.each(demoHouses.map(({ key }) => key))('the workbook of %s', (key) => {
  let whole: EstimateWhole

  beforeAll(async () => {
    const found = (await demoWholes()).find(({ house }) => house.id === key)
    if (!found) throw new Error(`The demo has no house ${key}`)
    whole = found
  }, 60_000)

  async function changed(change: (workbook: RecalculatedWorkbook) => EstimateWhole): Promise<void> {
    const workbook = await openWorkbook(whole, buildContext())
    const before = workbook.named('total_likely')
    const wholeAfter = change(workbook)
    expectAgreement(workbook, wholeAfter)
    expect(workbook.named('total_likely')).not.toBe(before)
    workbook.destroy()
  }
  function withSettings(settings: Partial<EstimateSettings>): EstimateWhole {
    return { ...whole, estimate: { ...whole.estimate, settings: { ...whole.estimate.settings, ...settings } } }
  }
  function lineWhere(isSought: (line: Line) => boolean): Line {
    const line = whole.lines.find(isSought)
    if (!line) throw new Error('The demo house has no such line')
    return line
  }

  it('comes to the engine’s figures, line by line and total by total', async () => {
    const workbook = await openWorkbook(whole, buildContext())
    expectAgreement(workbook, whole)
    expectResultsStand(workbook)
    workbook.destroy()
  })

  it('follows a changed quantity', () =>
    changed((workbook) => {
      const { id } = lineWhere((line) => /^[\d.]+$/.test(line.quantity) && line.itemKey !== null)
      workbook.set('Estimate', lineCell(whole, id, 'measured'), 437.35)
      return withLine(whole, id, { quantity: '437.35' })
    }))

  it('follows a changed dimension of a room, through every formula that rests on it', () =>
    changed((workbook) => {
      const index = whole.rooms.findIndex(({ shape }) => shape.kind === 'rectangle')
      const { sheet, address } = workbook.place(`room_${index + 1}_length`)
      workbook.set(sheet, address, (19 * 12 + 7.5) / 12)
      const rooms = whole.rooms.map((room, at) =>
        at === index && room.shape.kind === 'rectangle' ? { ...room, shape: { ...room.shape, lengthIn: 19 * 12 + 7.5 } } : room,
      )
      return { ...whole, rooms }
    }))

  it('follows a changed price of the book, on every line that takes it', () =>
    changed((workbook) => {
      const line = lineWhere((one) => one.basis === 'hired' && one.override === null && one.itemKey !== null && one.book.installed !== null)
      const installed = line.book.installed ?? { low: 0, likely: 0, high: 0 }
      const dearer = { low: installed.low + 11_111, likely: installed.likely + 22_222, high: installed.high + 33_333 }
      for (const [end, column] of [
        ['low', 'priceLow'],
        ['likely', 'priceLikely'],
        ['high', 'priceHigh'],
      ] as const) {
        const [, sheet = '', address = ''] =
          /^'(.+)'!(.+)$/.exec(workbook.formula('Estimate', lineCell(whole, line.id, column)) ?? '') ?? []
        workbook.set(sheet, address.replaceAll('$', ''), dearer[end] / 10_000)
      }
      const takesIt = (one: Line) =>
        one.itemKey === line.itemKey && one.basis === 'hired' && JSON.stringify(one.book.installed) === JSON.stringify(installed)
      return { ...whole, lines: whole.lines.map((one) => (takesIt(one) ? { ...one, book: { ...one.book, installed: dearer } } : one)) }
    }))

  it('follows changed adders', () =>
    changed((workbook) => {
      workbook.setNamed('overhead_percent', 17.35)
      workbook.setNamed('tax_percent', 6.875)
      workbook.setNamed('tax_rule', 'whole contract')
      workbook.setNamed('permits_amount', 612.4)
      const isPercent = whole.estimate.settings.contingency.method === 'percent'
      workbook.setNamed(isPercent ? 'contingency_percent' : 'contingency_amount', isPercent ? 12.5 : 4321.09)
      return withSettings({
        overheadAndProfitPercent: 17.35,
        salesTax: { rule: 'whole-contract', percent: 6.875 },
        permitsCents: 61_240,
        contingency: isPercent ? { method: 'percent', percent: 12.5 } : { method: 'fixed', amountCents: 432_109 },
      })
    }))

  it('takes the sales tax by each of the rules', async () => {
    const workbook = await openWorkbook(whole, buildContext())
    for (const [words, rule] of [
      ['none', 'none'],
      ['materials', 'materials'],
      ['whole contract', 'whole-contract'],
    ] as const) {
      workbook.setNamed('tax_rule', words)
      workbook.setNamed('tax_percent', 8.25)
      expectAgreement(workbook, withSettings({ salesTax: { rule, percent: 8.25 } }))
    }
    workbook.destroy()
  })
})
