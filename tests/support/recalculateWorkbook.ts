import ExcelJS from 'exceljs'
import { HyperFormula, type RawCellContent, type Sheets } from 'hyperformula'

/** A workbook as an independent spreadsheet engine reads it: cells and names parsed from the file, every formula computed anew. */
export interface RecalculatedWorkbook {
  /** The value of a named cell. */
  named(name: string): unknown
  value(sheet: string, address: string): unknown
  /** The formula that stands in a cell, without `=`. */
  formula(sheet: string, address: string): string | undefined
  /** What the file holds as the cell's last result. */
  cached(sheet: string, address: string): unknown
  set(sheet: string, address: string, content: RawCellContent): void
  setNamed(name: string, content: RawCellContent): void
  /** Where a name points: sheet and address. */
  place(name: string): { sheet: string; address: string }
  names(): string[]
  /** Cells of a sheet that hold a formula. */
  formulaCells(sheet: string): string[]
  sheetNames(): string[]
  destroy(): void
}

/** Reads the bytes of an .xlsx file into HyperFormula. Throws where a name or a formula can't be taken. */
export async function recalculateWorkbook(bytes: Buffer): Promise<RecalculatedWorkbook> {
  const file = new ExcelJS.Workbook()
  await file.xlsx.load(bytes as unknown as ArrayBuffer as never)
  const sheets: Sheets = {}
  for (const worksheet of file.worksheets) sheets[worksheet.name] = contentsOf(worksheet)
  const names = namesOf(file)
  const engine = HyperFormula.buildFromSheets(
    sheets,
    // Binary numbers as they come: the formulas must not need a program that tidies them up.
    { licenseKey: 'gpl-v3', smartRounding: false },
    [...names].map(([name, reference]) => ({ name, expression: `=${reference}` })),
  )
  const places = new Map([...names].map(([name, reference]) => [name, placeOf(reference)]))

  function addressOf(sheet: string, address: string) {
    const sheetId = engine.getSheetId(sheet)
    const parsed = sheetId === undefined ? undefined : engine.simpleCellAddressFromString(address, sheetId)
    if (!parsed) throw new RangeError(`There is no cell ${address} on ${sheet}`)
    return parsed
  }
  function place(name: string) {
    const found = places.get(name)
    if (!found) throw new RangeError(`There is no name ${name}`)
    return found
  }
  function cellOf(sheet: string, address: string): ExcelJS.Cell {
    const worksheet = file.getWorksheet(sheet)
    if (!worksheet) throw new RangeError(`There is no sheet ${sheet}`)
    return worksheet.getCell(address)
  }

  return {
    named: (name) => engine.getCellValue(addressOf(place(name).sheet, place(name).address)),
    value: (sheet, address) => engine.getCellValue(addressOf(sheet, address)),
    formula: (sheet, address) => cellOf(sheet, address).formula,
    cached: (sheet, address) => (cellOf(sheet, address).formula ? (cellOf(sheet, address).result ?? '') : cellOf(sheet, address).value),
    set: (sheet, address, content) => void engine.setCellContents(addressOf(sheet, address), content),
    setNamed: (name, content) => void engine.setCellContents(addressOf(place(name).sheet, place(name).address), content),
    place,
    names: () => [...names.keys()],
    formulaCells: (sheet) => formulaCellsOf(file, sheet),
    sheetNames: () => file.worksheets.map(({ name }) => name),
    destroy: () => engine.destroy(),
  }
}

function contentsOf(worksheet: ExcelJS.Worksheet): RawCellContent[][] {
  const rows: RawCellContent[][] = []
  for (let row = 1; row <= worksheet.rowCount; row += 1) {
    const cells: RawCellContent[] = []
    for (let column = 1; column <= worksheet.columnCount; column += 1) cells.push(contentOf(worksheet.getCell(row, column)))
    rows.push(cells)
  }
  return rows
}

function contentOf(cell: ExcelJS.Cell): RawCellContent {
  if (cell.type === ExcelJS.ValueType.Merge) return null
  if (cell.formula) return `=${cell.formula}`
  const { value } = cell
  if (typeof value === 'number' || typeof value === 'boolean') return value
  // An apostrophe keeps text text: "12-6" or "=1+1" must not be read as something else.
  if (typeof value === 'string') return value === '' ? null : `'${value}`
  if (value === null || value === undefined) return null
  throw new TypeError(`Cell ${cell.address} holds something that no sheet should: ${JSON.stringify(value)}`)
}

/** Names of single cells, without the print titles and areas. */
function namesOf(file: ExcelJS.Workbook): Map<string, string> {
  const { model } = file.definedNames as unknown as { model: { name: string; ranges: string[] }[] }
  return new Map(model.filter(({ name }) => !name.startsWith('_xlnm')).map(({ name, ranges }) => [name, ranges[0] ?? '']))
}

function placeOf(reference: string): { sheet: string; address: string } {
  const match = /^(?:'(.+)'|([^'!]+))!\$([A-Z]+)\$(\d+)$/.exec(reference)
  if (!match) throw new RangeError(`${reference} is not one cell`)
  return { sheet: (match[1] ?? match[2] ?? '').replaceAll("''", "'"), address: `${match[3]}${match[4]}` }
}

function formulaCellsOf(file: ExcelJS.Workbook, sheet: string): string[] {
  const addresses: string[] = []
  file.getWorksheet(sheet)?.eachRow((row) => row.eachCell((cell) => cell.formula && addresses.push(cell.address)))
  return addresses
}
