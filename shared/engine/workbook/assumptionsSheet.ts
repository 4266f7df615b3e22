import { cautionsFor, documentNotices } from '../../catalogue/cautions.ts'
import { EVIDENCE_MARKS, type EstimateWhole, type Evidence } from '../../schemas/estimate.ts'
import { evidenceWords } from './evidenceWords.ts'
import { contingencyText, endsText, taxText } from './settingsWords.ts'
import { SheetDraft, text } from './sheetDraft.ts'
import { SHEET_TITLES } from './sheetTitles.ts'
import { statedInspections, statedUnknowns } from './statedUnknowns.ts'
import type { WorkbookContext } from './workbookContext.ts'
import type { WorkbookLine } from './workbookLines.ts'
import type { StyleName, WorkbookSheet } from './workbookModel.ts'

const WIDTHS = [30, 74]

const EVIDENCE_MEANING: Record<Evidence, string> = {
  seen: 'looked at, not measured: the widest range.',
  measured: 'measured on site.',
  tested: 'opened up, tested or inspected.',
  bid: 'a contractor has put a price to it: the narrowest range.',
}

/** One section of the sheet: a heading and rows of a topic and its words. */
interface Section {
  heading: string
  rows: readonly { topic: string; words: string; topicStyle?: StyleName; style?: StyleName }[]
}

/** What the figures rest on, what isn't in them, and what can hurt someone. */
export function assumptionsSheet(whole: EstimateWhole, lines: readonly WorkbookLine[], context: WorkbookContext): WorkbookSheet {
  const draft = new SheetDraft(SHEET_TITLES.assumptions)
  draft.set(1, 1, text('Assumptions and cautions', 'title'))
  draft.set(2, 1, text(`${whole.house.name}: what the figures rest on, what is not in them, and what can hurt someone.`, 'subtitle'))
  let row = 4
  for (const { heading, rows } of sections(whole, lines, context)) {
    if (rows.length === 0) continue
    draft.setRow(row, 1, [text(heading, 'heading'), text('', 'heading')])
    row += 1
    for (const { topic, words, topicStyle = 'label', style = 'text' } of rows) {
      draft.setRow(row, 1, [text(topic, topicStyle), text(words, style)])
      row += 1
    }
    row += 1
  }
  return draft.finish({ widths: WIDTHS, frozen: { rows: 2, columns: 0 }, print: { orientation: 'portrait', titleRows: null } })
}

function sections(whole: EstimateWhole, lines: readonly WorkbookLine[], context: WorkbookContext): Section[] {
  return [
    { heading: 'What this is, and is not', rows: noticeRows(context) },
    { heading: 'What can hurt someone', rows: cautionRows(whole) },
    { heading: 'How to read the figures', rows: readingRows(whole) },
    { heading: 'How sure each line is', rows: evidenceRows(lines) },
    { heading: 'Not known, and not in the total', rows: unknownRows(whole) },
    { heading: 'Inspections that would tell', rows: inspectionRows(whole) },
    { heading: 'Lines left out of the sums', rows: leftOutRows(lines) },
  ]
}

function noticeRows({ firm }: WorkbookContext): Section['rows'] {
  const demo = firm.isDemo
    ? [
        {
          topic: 'Demonstration',
          words: 'The firm, the house, the people and every price in this workbook are invented.',
          topicStyle: 'caution-label' as const,
        },
      ]
    : []
  return [...demo, ...documentNotices.map((words, index) => ({ topic: index === 0 ? 'Notice' : '', words, style: 'notice' as const }))]
}

function cautionRows({ house, lines }: EstimateWhole): Section['rows'] {
  const cautions = cautionsFor({ yearBuilt: house.yearBuilt, systems: [...new Set(lines.map(({ system }) => system))] })
  return cautions.map(({ title, text: words, source }) => ({
    topic: title,
    words: `${words}\n(${source})`,
    topicStyle: 'caution-label' as const,
  }))
}

function readingRows({ estimate: { settings } }: EstimateWhole): Section['rows'] {
  return [
    { topic: 'Low, likely, high', words: endsText(settings.ends) },
    {
      topic: 'Sums of lows and of highs',
      words:
        'All lines seldom come in low together, or high together: the low and high totals are the outer bounds of the lines, wider than one in ten.',
    },
    { topic: 'Own hands', words: 'The price is that of materials alone. The owner’s hours are counted and nobody is paid for them.' },
    {
      topic: 'Hired',
      words: 'The price is for materials and labor, put in place, and never less than the minimum that the trade comes for.',
    },
    {
      topic: 'Quantity',
      words:
        'What was measured, with waste; for own hands up to whole packages where the item is sold so; rounded to two decimals before it is priced.',
    },
    {
      topic: 'Rounding',
      words: 'Each amount is rounded to the cent, half a cent away from zero. Every sum is of the rounded amounts, so columns add up.',
    },
    { topic: 'Overhead and profit', words: `${settings.overheadAndProfitPercent} % on hired work, for the contractor who runs the job.` },
    { topic: 'Sales tax', words: taxText(settings.salesTax) },
    { topic: 'Contingency', words: contingencyText(settings.contingency) },
    {
      topic: 'Changing a figure',
      words:
        'Tinted cells may be changed: quantities, waste, prices, the percentages on the Summary, the dimensions on Rooms. Everything else recalculates.',
    },
  ]
}

function evidenceRows(lines: readonly WorkbookLine[]): Section['rows'] {
  return EVIDENCE_MARKS.map((mark) => {
    const count = lines.filter(({ line }) => line.evidence === mark).length
    return { topic: evidenceWords(mark), words: `${count === 1 ? '1 line' : `${count} lines`}: ${EVIDENCE_MEANING[mark]}` }
  })
}

function unknownRows({ estimate }: EstimateWhole): Section['rows'] {
  return statedUnknowns(estimate.unknowns).map(({ description, words }) => ({ topic: description, words }))
}

function inspectionRows({ estimate }: EstimateWhole): Section['rows'] {
  return statedInspections(estimate.inspections, estimate.unknowns).map(({ description, words }) => ({ topic: description, words }))
}

function leftOutRows(lines: readonly WorkbookLine[]): Section['rows'] {
  return lines.flatMap(({ number, line, problem }) =>
    problem === null ? [] : [{ topic: `Line ${number}: ${line.description}`, words: problem, style: 'problem' as const }],
  )
}
