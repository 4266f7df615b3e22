import type { CellRange, StyleName, WorkbookCell, WorkbookColumn } from './workbookModel.ts'

interface TextLook {
  points: number
  wraps: boolean
}

const BODY_POINTS = 10
const SPECIAL: Partial<Record<StyleName, TextLook>> = {
  firm: { points: 9, wraps: false },
  title: { points: 18, wraps: false },
  heading: { points: 12, wraps: false },
  head: { points: BODY_POINTS, wraps: true },
  'head-right': { points: BODY_POINTS, wraps: true },
  label: { points: BODY_POINTS, wraps: true },
  text: { points: BODY_POINTS, wraps: true },
  notice: { points: BODY_POINTS, wraps: true },
  'caution-label': { points: BODY_POINTS, wraps: true },
  problem: { points: BODY_POINTS, wraps: true },
  small: { points: 8, wraps: false },
  ribbon: { points: 9, wraps: false },
  'ribbon-small': { points: 8, wraps: false },
  'range-label': { points: 14, wraps: false },
  'range-money': { points: 14, wraps: false },
  'total-label': { points: 11, wraps: false },
  'total-money': { points: 11, wraps: false },
}

/** Size of a style's letters and whether its text runs on in the next line: what a row's height follows from. */
export function textLook(style: StyleName): TextLook {
  return SPECIAL[style] ?? { points: BODY_POINTS, wraps: false }
}

/** Words take less room than the digits that a column's width counts, and lose some at the end of each line. */
const LETTERS_PER_DIGIT = 1.3
const BOLD_LETTERS_PER_DIGIT = 1.05
const LINE_PER_POINT = 1.28
const PADDING_POINTS = 2.2
/** The highest row there is ("Excel specifications and limits"). */
const ROW_MAX_POINTS = 409

/**
 * Height of a row that shows all of its text, in points. Reckoned here because programs differ on whether a row without a height grows with its text.
 * 150 letters of body text in a column 74 wide → two lines → 27.8 points.
 */
export function rowHeight(
  cells: readonly (WorkbookCell | undefined)[],
  row: number,
  columns: readonly WorkbookColumn[],
  merges: readonly CellRange[],
): number {
  // Array.from: a row's cells have holes, which map would leave out.
  const heights = Array.from(cells, (cell, index) => {
    if (!cell) return 0
    const { points, wraps } = textLook(cell.style)
    const value = cell.formula === undefined ? cell.value : cell.result
    const lines =
      wraps && typeof value === 'string' ? linesOf(value, widthOf(row, index + 1, columns, merges) * lettersPerDigit(cell.style)) : 1
    return lines * points * LINE_PER_POINT + PADDING_POINTS
  })
  const needed = Math.max(BODY_POINTS * LINE_PER_POINT + PADDING_POINTS, ...heights)
  return Math.min(ROW_MAX_POINTS, Math.round(needed * 100) / 100)
}

function lettersPerDigit(style: StyleName): number {
  return style === 'head' || style === 'head-right' ? BOLD_LETTERS_PER_DIGIT : LETTERS_PER_DIGIT
}

function linesOf(text: string, width: number): number {
  const perLine = Math.max(1, Math.floor(width))
  if (text.length <= perLine && !text.includes('\n')) return 1
  return text.split('\n').reduce((sum, paragraph) => sum + wrappedLines(paragraph, perLine), 0)
}

/** Lines that a paragraph takes when it breaks between words; a word too long for a line is broken. */
function wrappedLines(paragraph: string, perLine: number): number {
  let lines = 1
  let used = 0
  for (const word of paragraph.split(' ')) {
    const needed = used === 0 ? word.length : used + 1 + word.length
    if (needed <= perLine) {
      used = needed
      continue
    }
    lines += used === 0 ? 0 : 1
    lines += Math.ceil(word.length / perLine) - 1
    used = word.length % perLine
  }
  return lines
}

function widthOf(row: number, column: number, columns: readonly WorkbookColumn[], merges: readonly CellRange[]): number {
  const merge = merges.find(({ top, left }) => top === row && left === column)
  const right = merge?.right ?? column
  return columns.slice(column - 1, right).reduce((sum, { width }) => sum + width, 0)
}
