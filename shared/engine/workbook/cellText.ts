/** Longest text of a cell, in characters: the limit of the spreadsheet programs. */
export const CELL_TEXT_MAX = 32_767
/** Most line feeds in a cell. */
export const CELL_LINE_FEEDS_MAX = 253

const FORMULA_STARTS = new Set(['=', '+', '-', '@', '\t', '\r'])
/** Most texts are such: they need no second look. */
const PLAIN = /^[ -~]*$/
/** Control characters that XML 1.0 can't hold, and halves of surrogate pairs. */
const UNWRITABLE = /(?![\t\n])\p{Cc}|\p{Surrogate}|[\uFFFE\uFFFF]/gu

/**
 * Text as a cell can hold it: no characters that XML refuses, at most 253 line feeds, at most 32,767 characters
 * ("Excel specifications and limits"). Never cuts a surrogate pair in two.
 */
export function cellText(text: string): string {
  if (text.length <= CELL_TEXT_MAX && PLAIN.test(text)) return text
  // XML readers turn a carriage return into a line feed anyway; done here, the stored text is the read text.
  const writable = text.replace(/\r\n?/g, '\n').replace(UNWRITABLE, '')
  const parts = writable.split('\n')
  const folded =
    parts.length - 1 > CELL_LINE_FEEDS_MAX
      ? [...parts.slice(0, CELL_LINE_FEEDS_MAX), parts.slice(CELL_LINE_FEEDS_MAX).join(' ')].join('\n')
      : writable
  if (folded.length <= CELL_TEXT_MAX) return folded
  return folded.slice(0, CELL_TEXT_MAX).replace(/[\uD800-\uDBFF]$/, '')
}

/** Whether a spreadsheet would take the text for a formula if somebody typed it: `= + - @`, tab or CR first. */
export function looksLikeFormula(text: string): boolean {
  return FORMULA_STARTS.has(text.charAt(0))
}
