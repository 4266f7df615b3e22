// @vitest-environment jsdom
import ExcelJS from 'exceljs'
import { beforeAll, describe, expect, it } from 'vitest'
import { definedNameProblem, sheetNameProblem } from '../../shared/engine/workbook/workbookNames.ts'
import { writeWorkbook } from '../../server/features/workbook/writeWorkbook.ts'
import { workbookSheets } from '../../shared/engine/index.ts'
import { buildContext, buildLine, buildRoom, buildWhole, resultsOf } from '../support/buildWorkbookEstimate.ts'
import { lineCell, workbookBytes } from '../support/expectWorkbookAgrees.ts'
import { recalculateWorkbook } from '../support/recalculateWorkbook.ts'
import { xlsxParts } from '../support/xlsxParts.ts'

const SPREADSHEET_NS = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main'

/** First characters that a spreadsheet takes for a formula: the OWASP list (CSV injection), ASVS 5.0 1.2.10. */
const DANGEROUS = ['=1+1', '+1', '-1 door', '@x', '\t=1', '\r=1', '=HYPERLINK("http://example.test","x")']
const hostile = buildWhole({
  house: { name: `=cmd|' /C calc'!A0 & "Sons" <b>`, address: '@SUM(A1)' },
  rooms: [buildRoom({ id: 'bed-1', name: "=Bed 'one' *?~" }), buildRoom({ id: 'bed-2', name: "=Bed 'one' *?~" })],
  lines: [
    ...DANGEROUS.map((description, index) =>
      buildLine({ id: `line-${index}`, description, note: description, roomId: index % 2 ? 'bed-1' : 'bed-2' }),
    ),
    buildLine({ id: 'long', description: 'Long note', note: `${'x'.repeat(40_000)}` }),
    buildLine({ id: 'controls', description: 'a\u0000b\u001fc\ud800d _x0041_', note: 'one\ntwo' }),
    buildLine({ id: 'broken', description: 'Broken', quantity: 'floor_area' }),
    buildLine({ id: 'own', itemKey: null, override: { price: { low: 1, likely: 2, high: 3 }, reason: '=because' } }),
  ],
})

describe('the file of a workbook', () => {
  let bytes: Buffer
  let parts: ReturnType<typeof xlsxParts>

  beforeAll(async () => {
    bytes = await workbookBytes(hostile, buildContext())
    parts = xlsxParts(bytes)
  })

  /** ECMA-376 part 2 (Open Packaging Conventions) and part 1, 12.3. */
  describe('as a package', () => {
    it('has the least parts of a workbook', () => {
      for (const name of [
        '[Content_Types].xml',
        '_rels/.rels',
        'xl/workbook.xml',
        'xl/_rels/workbook.xml.rels',
        'xl/worksheets/sheet1.xml',
        'xl/styles.xml',
      ]) {
        expect(parts.names).toContain(name)
      }
      expect(new Set(parts.names.map((name) => name.toLowerCase())).size).toBe(parts.names.length)
    })

    it('has nothing but well-formed XML in it', () => {
      for (const name of parts.names) expect(() => parts.xml(name), name).not.toThrow()
    })

    it('says of every part what it is, and relates every part that there is', () => {
      const types = parts.xml('[Content_Types].xml')
      const overrides = [...types.querySelectorAll('Override')].map((override) => override.getAttribute('PartName'))
      const defaults = [...types.querySelectorAll('Default')].map((one) => one.getAttribute('Extension'))
      for (const name of parts.names.filter((part) => part !== '[Content_Types].xml')) {
        const isTold = overrides.includes(`/${name}`) || defaults.includes(name.split('.').at(-1) ?? '')
        expect(isTold, name).toBe(true)
      }
      for (const partName of overrides) expect(parts.names).toContain((partName ?? '').slice(1))
      const targets = [...parts.xml('xl/_rels/workbook.xml.rels').querySelectorAll('Relationship')].map(
        (one) => `xl/${one.getAttribute('Target')}`,
      )
      for (const target of targets) expect(parts.names).toContain(target)
      expect(targets.filter((target) => target.includes('worksheets'))).toHaveLength(5)
    })

    it('reaches out to nothing: no external link, no hyperlink, no macro', () => {
      expect(parts.names.filter((name) => /external|vba|hyperlink/i.test(name))).toEqual([])
      for (const name of parts.names.filter((part) => part.endsWith('.rels'))) expect(parts.text(name)).not.toMatch(/TargetMode="External"/)
    })

    it('refers to styles and shared strings that there are', () => {
      const styleCount = parts.xml('xl/styles.xml').querySelectorAll('cellXfs > xf').length
      const stringCount = parts.xml('xl/sharedStrings.xml').querySelectorAll('sst > si').length
      for (const name of parts.names.filter((part) => part.startsWith('xl/worksheets/'))) {
        for (const cell of parts.xml(name).querySelectorAll('c')) {
          expect(Number(cell.getAttribute('s') ?? 0)).toBeLessThan(styleCount)
          if (cell.getAttribute('t') === 's') expect(Number(cell.querySelector('v')?.textContent)).toBeLessThan(stringCount)
        }
      }
    })

    it('is recalculated when it is opened', () => {
      expect(parts.xml('xl/workbook.xml').querySelector('calcPr')?.getAttribute('fullCalcOnLoad')).toBe('1')
    })
  })

  describe('its names', () => {
    it('are such as spreadsheets take, each once', () => {
      const names = [...parts.xml('xl/workbook.xml').querySelectorAll('definedName')]
        .filter((one) => !one.getAttribute('localSheetId'))
        .map((one) => one.getAttribute('name') ?? '')
      expect(names.length).toBeGreaterThan(60)
      expect(new Set(names.map((name) => name.toLowerCase())).size).toBe(names.length)
      for (const name of names) expect(definedNameProblem(name), name).toBeNull()
    })

    it('point at cells that there are', async () => {
      const workbook = await recalculateWorkbook(bytes)
      for (const name of workbook.names()) {
        const { sheet, address } = workbook.place(name)
        expect(workbook.sheetNames()).toContain(sheet)
        expect(workbook.value(sheet, address), name).not.toBeNull()
      }
      workbook.destroy()
    })

    /** "Rename a worksheet", support.microsoft.com: 1 to 31 characters, none of \ / ? * : [ ], no apostrophe at an end, not History, unique without case. */
    it('of its sheets are such as spreadsheets take', () => {
      const sheets = [...parts.xml('xl/workbook.xml').querySelectorAll('sheet')].map((sheet) => sheet.getAttribute('name') ?? '')
      expect(sheets).toEqual(['Summary', 'Estimate', 'Rooms', 'Prices used', 'Assumptions and cautions'])
      for (const name of sheets) expect(sheetNameProblem(name)).toBeNull()
    })
  })

  describe('text that looks like a formula', () => {
    it.each(DANGEROUS)('%j is a text cell, with the quote prefix where it would be read as a formula again', (text) => {
      const index = DANGEROUS.indexOf(text)
      const cell = cellOf('xl/worksheets/sheet2.xml', lineCell(hostile, `line-${index}`, 'description'))
      expect(cell.querySelector('f')).toBeNull()
      expect(cell.getAttribute('t')).toBe('s')
      const stored = sharedString(Number(cell.querySelector('v')?.textContent))
      expect(stored).toBe(text.replace('\r', '\n'))
      const isReadAgain = /^[=+\-@\t]/.test(stored)
      expect(styleOf(cell).getAttribute('quotePrefix')).toBe(isReadAgain ? '1' : null)
    })

    it('never becomes a formula anywhere', () => {
      for (const name of parts.names.filter((part) => part.startsWith('xl/worksheets/'))) {
        for (const formula of parts.xml(name).querySelectorAll('f')) {
          expect(formula.textContent).not.toMatch(/^=|cmd|HYPERLINK|SUM\(A1\)/)
        }
      }
    })

    it('keeps a plain figure a number', () => {
      const price = cellOf('xl/worksheets/sheet2.xml', lineCell(hostile, 'own', 'priceLow'))
      expect(price.getAttribute('t')).toBeNull()
      expect(price.querySelector('v')?.textContent).toBe('0.0001')
    })

    it('sums rooms of one hostile name apart, by their numbers', async () => {
      const workbook = await recalculateWorkbook(bytes)
      const summary = workbook
        .formulaCells('Summary')
        .filter((address) => /^D/.test(address) && /SUMIFS\(.*\$V\$/.test(workbook.formula('Summary', address) ?? ''))
      expect(summary).toHaveLength(3)
      for (const address of summary) expect(workbook.value('Summary', address)).toBe(workbook.cached('Summary', address))
      workbook.destroy()
    })
  })

  /** "Excel specifications and limits", support.microsoft.com: 32,767 characters and 253 line feeds in a cell, columns 255 wide, rows 409 points high. */
  describe('its limits', () => {
    it('cuts a text at 32,767 characters', () => {
      const cell = cellOf('xl/worksheets/sheet2.xml', lineCell(hostile, 'long', 'note'))
      expect(sharedString(Number(cell.querySelector('v')?.textContent))).toBe('x'.repeat(32_767))
    })

    it('keeps rows and columns within what a sheet can show', () => {
      for (const name of parts.names.filter((part) => part.startsWith('xl/worksheets/'))) {
        const sheet = parts.xml(name)
        for (const row of sheet.querySelectorAll('row')) expect(Number(row.getAttribute('ht') ?? 0)).toBeLessThanOrEqual(409)
        for (const column of sheet.querySelectorAll('col')) expect(Number(column.getAttribute('width'))).toBeLessThanOrEqual(255)
      }
    })

    it('holds no character that XML refuses, and escapes what reads like an escape (ECMA-376 part 1, 22.9.2.19)', () => {
      const cell = cellOf('xl/worksheets/sheet2.xml', lineCell(hostile, 'controls', 'description'))
      expect(sharedString(Number(cell.querySelector('v')?.textContent))).toBe('abcd _x005F_x0041_')
    })
  })

  it('is the same bytes each time', async () => {
    const again = await workbookBytes(hostile, buildContext())
    expect(again.equals(bytes)).toBe(true)
  })

  it('opens in a second reader', async () => {
    const workbook = new ExcelJS.Workbook()
    await workbook.xlsx.load(bytes as unknown as Parameters<typeof workbook.xlsx.load>[0])
    expect(workbook.worksheets).toHaveLength(5)
    expect(workbook.created).toEqual(new Date(buildContext().figuresAt))
  })

  /** ECMA-376 part 1, 18.3.1.63 (paper 1 is Letter), 18.3.1.46 (heads and feet), 18.2.5 (print titles). */
  it('prints on Letter, wide sheets across, one page wide, with heads repeated and pages counted', () => {
    const orientations = ['portrait', 'landscape', 'landscape', 'landscape', 'portrait']
    orientations.forEach((orientation, index) => {
      const sheet = parts.xml(`xl/worksheets/sheet${index + 1}.xml`)
      const setup = sheet.querySelector('pageSetup')
      expect(setup?.getAttribute('paperSize')).toBe('1')
      expect(setup?.getAttribute('orientation')).toBe(orientation)
      expect(setup?.getAttribute('fitToWidth')).toBe('1')
      expect(setup?.getAttribute('fitToHeight')).toBe('0')
      expect(sheet.querySelector('pageSetUpPr')?.getAttribute('fitToPage')).toBe('1')
      expect(sheet.querySelector('oddFooter')?.textContent).toMatch(/Not an inspection.*&RPage &P of &N$/)
      expect(sheet.querySelector('oddHeader')?.textContent).toContain('&& "Sons"')
    })
    const titles = [...parts.xml('xl/workbook.xml').querySelectorAll('definedName[name="_xlnm.Print_Titles"]')].map(
      (one) => one.textContent,
    )
    expect(titles).toEqual(["'Estimate'!$4:$5", "'Prices used'!$4:$4"])
    expect(parts.xml('xl/worksheets/sheet2.xml').querySelector('pane')?.getAttribute('state')).toBe('frozen')
  })

  it('is refused rather than written with a name that a spreadsheet would repair', async () => {
    const sheets = workbookSheets(buildWhole(), resultsOf(buildWhole()), buildContext())
    const [first] = sheets.sheets
    if (!first) throw new Error('No sheets')
    await expect(writeWorkbook({ ...sheets, sheets: [{ ...first, name: 'Roof/Gutters' }] })).rejects.toThrow(/holds one of/)
    await expect(writeWorkbook({ ...sheets, sheets: [first, { ...first, name: 'summary' }] })).rejects.toThrow(/Two have/)
    await expect(writeWorkbook({ ...sheets, names: [{ name: 'R1C1', sheet: 'Summary', row: 1, column: 1 }] })).rejects.toThrow(
      /looks like a cell/,
    )
  })

  function cellOf(part: string, address: string): Element {
    const cell = parts.xml(part).querySelector(`c[r="${address}"]`)
    if (!cell) throw new Error(`${part} has no cell ${address}`)
    expect(cell.namespaceURI).toBe(SPREADSHEET_NS)
    return cell
  }
  function sharedString(index: number): string {
    return parts.xml('xl/sharedStrings.xml').querySelectorAll('sst > si')[index]?.textContent ?? ''
  }
  function styleOf(cell: Element): Element {
    const style = parts.xml('xl/styles.xml').querySelectorAll('cellXfs > xf')[Number(cell.getAttribute('s'))]
    if (!style) throw new Error('The cell has no style')
    return style
  }
})
