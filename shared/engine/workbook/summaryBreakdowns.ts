import { HOUSE_SYSTEMS } from '../../catalogue/houseSystems.ts'
import { TRADES } from '../../catalogue/trades.ts'
import { cellAddress, fixedAddress } from './cellAddress.ts'
import { ESTIMATE_COLUMN } from './estimateLayout.ts'
import { sumOfCents, sumOfHours } from './lineSums.ts'
import { sumFormula, sumWhereFormula } from './moneyFormulas.ts'
import { CLEAR, ribbonFormula, ribbonText } from './rangeRibbon.ts'
import { live, number, text, type SheetDraft } from './sheetDraft.ts'
import { SUMMARY_COLUMN as COLUMN } from './summaryColumns.ts'
import type { SummaryParts } from './summaryParts.ts'
import { HOUSE_NUMBER, type WorkbookLine } from './workbookLines.ts'

const ENDS = ['low', 'likely', 'high'] as const
const AMOUNT_COLUMN = { low: ESTIMATE_COLUMN.amountLow, likely: ESTIMATE_COLUMN.amountLikely, high: ESTIMATE_COLUMN.amountHigh }
const RIBBON_CHARS = 28

/** One part of the house, and which lines it sums. */
interface Part {
  title: string
  lines: readonly WorkbookLine[]
  /** What the criterion column holds for its lines, as a formula writes it. */
  criterion(row: number): string
}

interface Breakdown {
  heading: string
  criterionColumn: number
  parts: Part[]
}

/** Direct cost by system, by room and by trade, each table footing to the direct cost. Returns the last row. */
export function setBreakdowns(draft: SheetDraft, firstRow: number, parts: SummaryParts): number {
  return breakdowns(parts).reduce((row, breakdown) => setBreakdown(draft, row, breakdown, parts) + 2, firstRow) - 2
}

function breakdowns({ whole, lines }: SummaryParts): Breakdown[] {
  const titled = (titles: readonly string[], titleOf: (line: WorkbookLine) => string): Part[] => {
    const known = titles.filter((title) => lines.some((line) => titleOf(line) === title))
    const others = [...new Set(lines.map(titleOf))].filter((title) => !titles.includes(title))
    return [...known, ...others].map((title) => ({
      title,
      lines: lines.filter((line) => titleOf(line) === title),
      criterion: (row) => fixedAddress(row, COLUMN.label),
    }))
  }
  const rooms = [
    { number: HOUSE_NUMBER, title: 'House as a whole' },
    ...whole.rooms.map(({ name }, index) => ({ number: index + 1, title: `${index + 1} ${name}` })),
  ]
  return [
    {
      heading: 'Direct cost by house system',
      criterionColumn: ESTIMATE_COLUMN.system,
      parts: titled(
        HOUSE_SYSTEMS.map(({ title }) => title),
        ({ systemTitle }) => systemTitle,
      ),
    },
    {
      heading: 'Direct cost by room',
      // By number: two rooms may have one name, and a name may hold what a spreadsheet takes for a pattern.
      criterionColumn: ESTIMATE_COLUMN.roomNumber,
      parts: rooms
        .map(({ number: roomNumber, title }) => ({
          title,
          lines: lines.filter((line) => line.roomNumber === roomNumber),
          criterion: () => String(roomNumber),
        }))
        .filter((part) => part.lines.length > 0),
    },
    {
      heading: 'Direct cost by trade',
      criterionColumn: ESTIMATE_COLUMN.trade,
      parts: titled(
        TRADES.map(({ title }) => title),
        ({ tradeTitle }) => tradeTitle,
      ),
    },
  ]
}

function setBreakdown(
  draft: SheetDraft,
  firstRow: number,
  { heading, criterionColumn, parts }: Breakdown,
  { layout }: SummaryParts,
): number {
  draft.setRow(firstRow, COLUMN.label, [
    text(heading, 'head'),
    text('Lines', 'head-right'),
    text('Range', 'head'),
    text('Low', 'head-right'),
    text('Likely', 'head-right'),
    text('High', 'head-right'),
    text('Hours', 'head-right'),
  ])
  const top = firstRow + 1
  const footRow = top + parts.length
  const most = Math.max(0, ...parts.map(({ lines }) => sumOfCents(lines).high)) / 100
  const mostFormula = parts.length > 0 ? `MAX(${fixedAddress(top, COLUMN.high)}:${fixedAddress(footRow - 1, COLUMN.high)})` : '0'
  parts.forEach((part, index) => {
    const row = top + index
    const counted = layout.range(ESTIMATE_COLUMN.counted)
    const where = (column: number) => sumWhereFormula(layout.range(column), [[layout.range(criterionColumn), part.criterion(row)]])
    const cents = sumOfCents(part.lines)
    const dollars = { low: cents.low / 100, likely: cents.likely / 100, high: cents.high / 100 }
    draft.set(row, COLUMN.label, text(part.title, 'label'))
    draft.set(
      row,
      COLUMN.setting,
      live(`COUNTIFS(${layout.range(criterionColumn)},${part.criterion(row)},${counted},"yes")`, countedLines(part.lines), 'count'),
    )
    const cells = { low: cellAddress(row, COLUMN.low), likely: cellAddress(row, COLUMN.likely), high: cellAddress(row, COLUMN.high) }
    draft.set(
      row,
      COLUMN.takenOn,
      live(
        ribbonFormula({ ...cells, most: mostFormula }, RIBBON_CHARS, CLEAR),
        ribbonText(dollars, most, RIBBON_CHARS, CLEAR),
        'ribbon-small',
      ),
    )
    for (const end of ENDS) draft.set(row, COLUMN[end], live(where(AMOUNT_COLUMN[end]), dollars[end], 'money'))
    draft.set(row, COLUMN.hours, live(where(ESTIMATE_COLUMN.hours), sumOfHours(part.lines), 'hours'))
  })
  setBreakdownFoot(
    draft,
    top,
    footRow,
    parts.flatMap(({ lines }) => lines),
  )
  return footRow
}

function setBreakdownFoot(draft: SheetDraft, top: number, row: number, lines: readonly WorkbookLine[]): void {
  const cents = sumOfCents(lines)
  const column = (of: number) => `${cellAddress(top, of)}:${cellAddress(row - 1, of)}`
  const isEmpty = row === top
  const sum = (of: number, result: number, style: 'foot-money' | 'foot-hours' | 'foot-count') =>
    isEmpty ? number(0, style) : live(sumFormula(column(of)), result, style)
  draft.setRow(row, COLUMN.label, [
    text('Direct cost', 'foot-label'),
    sum(COLUMN.setting, countedLines(lines), 'foot-count'),
    text('', 'foot-label'),
    ...ENDS.map((end) => sum(COLUMN[end], cents[end] / 100, 'foot-money')),
    sum(COLUMN.hours, sumOfHours(lines), 'foot-hours'),
  ])
}

function countedLines(lines: readonly WorkbookLine[]): number {
  return lines.filter(({ problem }) => problem === null).length
}
