import { PassThrough } from 'node:stream'
import { buffer } from 'node:stream/consumers'
import type { AddWorksheetOptions, Cell, Worksheet } from 'exceljs'
import { cellAddress, sheetAddress } from '../../../shared/engine/workbook/cellAddress.ts'
import { looksLikeFormula } from '../../../shared/engine/workbook/cellText.ts'
import { definedNameProblem, sheetNameProblem } from '../../../shared/engine/workbook/workbookNames.ts'
import type { WorkbookCell, WorkbookSheet, WorkbookSheets } from '../../../shared/engine/workbook/workbookModel.ts'
import { SteadyWorkbookWriter } from './steadyWorkbookWriter.ts'
import { workbookStyle } from './workbookStyles.ts'

/** ECMA-376 part 1, 18.3.1.63: US Letter. The library's own list of papers begins behind it. */
const LETTER: number = 1
const MARGINS = { left: 0.4, right: 0.4, top: 0.75, bottom: 0.7, header: 0.35, footer: 0.35 }
/** A width counts digits; the file's unit includes the space on both sides of them. */
const COLUMN_PADDING = 0.71

/** The bytes of a workbook. The same sheets give the same bytes. Throws when a sheet or a cell has a name that spreadsheet programs refuse. */
export async function writeWorkbook(workbook: WorkbookSheets): Promise<Buffer> {
  checkNames(workbook)
  const output = new PassThrough()
  const bytes = buffer(output)
  const madeAt = new Date(workbook.properties.madeAt)
  const writer = new SteadyWorkbookWriter({ stream: output, useStyles: true, useSharedStrings: true })
  writer.creator = workbook.properties.creator
  writer.lastModifiedBy = workbook.properties.creator
  writer.title = workbook.properties.title
  writer.created = madeAt
  writer.modified = madeAt
  writer.views = [{ x: 0, y: 0, width: 24_000, height: 14_000, firstSheet: 0, activeTab: 0, visibility: 'visible' }]
  for (const sheet of workbook.sheets) writeSheet(writer, sheet, workbook)
  for (const { name, sheet, row, column } of workbook.names) writer.definedNames.add(sheetAddress(sheet, row, column), name)
  await writer.commit()
  return bytes
}

function writeSheet(writer: SteadyWorkbookWriter, sheet: WorkbookSheet, workbook: WorkbookSheets): void {
  const worksheet = writer.addWorksheet(sheet.name, sheetOptions(sheet, workbook))
  worksheet.columns = sheet.columns.map(({ width }) => ({ width: width + COLUMN_PADDING }))
  for (const { row, column, choices, message } of sheet.choices) {
    worksheet.getCell(row, column).dataValidation = {
      type: 'list',
      allowBlank: false,
      formulae: [`"${choices.join(',')}"`],
      showErrorMessage: true,
      error: message,
    }
  }
  sheet.rows.forEach(({ cells, height }, index) => {
    const row = worksheet.getRow(index + 1)
    cells.forEach((cell, column) => cell && writeCell(row.getCell(column + 1), cell))
    for (const { top, left, bottom, right } of sheet.merges) if (top === index + 1) worksheet.mergeCells(top, left, bottom, right)
    row.height = height
    row.commit()
  })
  commitSheet(worksheet)
}

/** Only the streaming writer's sheets can be committed, and its types don't say which those are. */
function commitSheet(worksheet: Worksheet): void {
  ;(worksheet as Worksheet & { commit(): void }).commit()
}

function writeCell(target: Cell, cell: WorkbookCell): void {
  if (cell.formula !== undefined) {
    target.value = { formula: cell.formula, result: cell.result, date1904: false }
    target.style = workbookStyle(cell.style, false)
    return
  }
  const staysText = typeof cell.value === 'string' && looksLikeFormula(cell.value)
  target.value = typeof cell.value === 'string' ? escapedText(cell.value) : cell.value
  target.style = workbookStyle(cell.style, staysText)
}

/** `_x0041_` in a text would be read as an escaped `A` (ECMA-376 part 1, 22.9.2.19), so its underscore is escaped itself. */
function escapedText(text: string): string {
  return text.replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_')
}

function sheetOptions({ frozen, print }: WorkbookSheet, { pageHead, pageFoot }: WorkbookSheets): Partial<AddWorksheetOptions> {
  const { area, titleRows, orientation } = print
  const isFrozen = frozen.rows > 0 || frozen.columns > 0
  return {
    views: [
      isFrozen
        ? { state: 'frozen', ySplit: frozen.rows, xSplit: frozen.columns, showGridLines: false }
        : { state: 'normal', showGridLines: false },
    ],
    pageSetup: {
      paperSize: LETTER,
      orientation,
      margins: MARGINS,
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      printArea: `${cellAddress(area.top, area.left).replace(/(\d+)$/, '$$$1')}:${cellAddress(area.bottom, area.right).replace(/(\d+)$/, '$$$1')}`,
      ...(titleRows ? { printTitlesRow: `${titleRows.from}:${titleRows.to}` } : {}),
    },
    headerFooter: {
      oddHeader: `&L${headText(pageHead)}&R&A`,
      oddFooter: `&L${headText(pageFoot)}&RPage &P of &N`,
    },
  }
}

/** In heads and feet an ampersand begins a code; doubled it is itself. 255 characters are all that a head can hold. */
function headText(text: string): string {
  return text.replace(/\s+/g, ' ').slice(0, 110).replaceAll('&', '&&')
}

function checkNames({ sheets, names }: WorkbookSheets): void {
  const taken = new Set<string>()
  const check = (kind: string, name: string, problem: string | null) => {
    const key = `${kind} ${name.toLowerCase()}`
    if (problem !== null) throw new RangeError(`The ${kind} name "${name}" ${problem}`)
    if (taken.has(key)) throw new RangeError(`Two have the ${kind} name "${name}"`)
    taken.add(key)
  }
  for (const { name } of sheets) check('sheet', name, sheetNameProblem(name))
  for (const { name } of names) check('cell', name, definedNameProblem(name))
}
