import { ESTIMATE_COLUMN } from './estimateLayout.ts'
import { sumOfHours } from './lineSums.ts'
import { live, text, type SheetDraft } from './sheetDraft.ts'
import { SUMMARY_COLUMN as COLUMN } from './summaryColumns.ts'
import type { SummaryParts } from './summaryParts.ts'
import type { WorkbookCell } from './workbookModel.ts'

/** Facts about the house and the estimate, in two columns. Returns the last row. */
export function setFacts(draft: SheetDraft, firstRow: number, parts: SummaryParts): number {
  const { whole, context } = parts
  const left: [string, string][] = [
    ['Region', context.regionName],
    ['Price book', priceBookText(context.priceBook)],
    ['Built', whole.house.yearBuilt === null ? 'year not known' : String(whole.house.yearBuilt)],
    ['Kind', `${whole.house.kind}, ${whole.house.storeys === 1 ? '1 storey' : `${whole.house.storeys} storeys`}`],
  ]
  const right: [string, WorkbookCell, string?][] = [
    ['Prepared for', text(context.preparedFor.join(', ') || 'not shared yet', 'fact-right')],
    ['Prepared by', text(context.preparedBy, 'fact-right')],
    ['Figures as of', text(context.figuresAt.slice(0, 10), 'fact-right')],
    ['Lines counted', countedCell(parts, 'yes'), 'lines_counted'],
    ['Lines left out because of errors', countedCell(parts, 'no'), 'lines_left_out'],
    ['Hours of own hands', hoursCell(parts), 'own_hands_hours'],
  ]
  left.forEach(([label, value], index) =>
    draft.setRow(firstRow + index, COLUMN.label, [text(label, 'label'), text(value, 'fact'), text('', 'fact')]),
  )
  right.forEach(([label, cell, name], index) => {
    const row = firstRow + index
    draft.setRow(row, COLUMN.low, [text(label, 'label'), text('', 'label')])
    draft.merge(row, COLUMN.low, COLUMN.likely)
    if (name === undefined) draft.set(row, COLUMN.high, cell)
    else draft.setNamed(name, row, COLUMN.high, cell)
  })
  return firstRow + Math.max(left.length, right.length) - 1
}

function priceBookText({ version, effectiveDate }: SummaryParts['context']['priceBook']): string {
  return effectiveDate === null ? `version ${version}` : `version ${version}, in force from ${effectiveDate}`
}

function countedCell({ layout, lines }: SummaryParts, word: 'yes' | 'no'): WorkbookCell {
  const count = lines.filter(({ problem }) => (problem === null) === (word === 'yes')).length
  return live(`COUNTIF(${layout.range(ESTIMATE_COLUMN.counted)},"${word}")`, count, 'fact-count')
}

function hoursCell({ layout, lines }: SummaryParts): WorkbookCell {
  return live(layout.foot(ESTIMATE_COLUMN.hours), sumOfHours(lines), 'fact-hours')
}
