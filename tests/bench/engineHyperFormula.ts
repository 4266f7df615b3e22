import { HyperFormula, type RawCellContent, type SimpleCellAddress } from 'hyperformula'
import type { EstimateInput, LineInput, RoomInput } from '../../shared/engine/index.ts'
import { MODEL_FORMULAS, MODEL_SYSTEMS, MODEL_TRADES } from './engineModel.ts'

/** Columns of the rooms' sheet: what is keyed, then what is measured. */
const ROOM_COLUMNS: Record<string, string> = {
  length: 'A',
  width: 'B',
  height: 'C',
  windows: 'D',
  doors: 'E',
  floor_area: 'F',
  ceiling_area: 'G',
  perimeter: 'H',
  wall_area: 'I',
  base_length: 'J',
}

const LIKELY_COLUMN = 8

/** The model as a spreadsheet: rooms that measure themselves, a row a line with rounded quantity, amounts and hours, and roll-ups by SUM and SUMIF. */
export class EngineHyperFormula {
  private readonly book: HyperFormula

  constructor(input: EstimateInput) {
    this.book = HyperFormula.buildFromSheets(
      { Rooms: input.rooms.map(roomRow), Lines: input.lines.map(lineRow), Sums: sumRows(input) },
      { licenseKey: 'gpl-v3', useArrayArithmetic: false },
    )
  }

  recalculate(): void {
    this.book.rebuildAndRecalculate()
  }

  setPrice(line: number, likelyE4: number): void {
    this.set('Lines', line, LIKELY_COLUMN, likelyE4 / 10_000)
  }

  setRoomLength(room: number, lengthIn: number): void {
    this.set('Rooms', room, 0, lengthIn / 12)
  }

  /** Dollars. */
  likelyTotal(): number {
    return Number(this.book.getCellValue(this.address('Sums', 0, 1)))
  }

  destroy(): void {
    this.book.destroy()
  }

  private set(sheet: string, row: number, column: number, content: RawCellContent): void {
    this.book.setCellContents(this.address(sheet, row, column), content)
  }

  private address(sheet: string, row: number, col: number): SimpleCellAddress {
    return { sheet: this.book.getSheetId(sheet) ?? 0, row, col }
  }
}

function roomRow({ shape, openings }: RoomInput, index: number): RawCellContent[] {
  const row = index + 1
  const lengthIn = shape.kind === 'rectangle' ? shape.lengthIn : 0
  const widthIn = shape.kind === 'rectangle' ? shape.widthIn : 0
  const windows = openings.find(({ kind }) => kind === 'window')?.count ?? 0
  return [
    lengthIn / 12,
    widthIn / 12,
    8,
    windows,
    1,
    `=A${row}*B${row}`,
    `=A${row}*B${row}`,
    `=2*(A${row}+B${row})`,
    `=H${row}*C${row}-E${row}*32*80/144-D${row}*36*48/144`,
    `=H${row}-E${row}*32/12`,
  ]
}

function lineRow(line: LineInput, index: number): RawCellContent[] {
  const row = index + 1
  const roomRowNumber = Number(line.roomKey?.slice('room-'.length)) + 1
  const cells = MODEL_FORMULAS.find(({ text }) => text === line.quantity)?.cells ?? ''
  const measured = cells.replace(/\{(\w+)\}/g, (_, name: string) => `Rooms!${ROOM_COLUMNS[name]}${roomRowNumber}`)
  const price = line.unitPriceE4 ?? { low: 0, likely: 0, high: 0 }
  const quantity =
    line.packageSize === null ? `=ROUND(E${row}*F${row},2)` : `=ROUND(ROUNDUP(E${row}*F${row}/G${row}-0.000000001,0)*G${row},2)`
  return [
    line.roomKey,
    line.system,
    line.trade,
    line.minimumChargeCents / 100,
    `=${measured}`,
    (100 + line.wastePercent) / 100,
    line.packageSize,
    price.low / 10_000,
    price.likely / 10_000,
    price.high / 10_000,
    quantity,
    `=MAX(D${row},ROUND(K${row}*H${row},2))`,
    `=MAX(D${row},ROUND(K${row}*I${row},2))`,
    `=MAX(D${row},ROUND(K${row}*J${row},2))`,
    `=ROUND(K${row}*${line.hoursPerUnit},2)`,
  ]
}

function sumRows({ rooms, lines }: EstimateInput): RawCellContent[][] {
  const last = lines.length
  const sums = ['L', 'M', 'N', 'O']
  const byKey = (keyColumn: string, key: string) =>
    sums.map((column) => `=SUMIF(Lines!$${keyColumn}$1:$${keyColumn}$${last},"${key}",Lines!${column}$1:${column}$${last})`)
  return [
    sums.map((column) => `=SUM(Lines!${column}1:${column}${last})`),
    ...rooms.map(({ key }) => byKey('A', key)),
    ...Array.from({ length: MODEL_SYSTEMS }, (_, index) => byKey('B', `system-${index}`)),
    ...Array.from({ length: MODEL_TRADES }, (_, index) => byKey('C', `trade-${index}`)),
  ]
}
