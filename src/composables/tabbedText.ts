/**
 * A block of cells as spreadsheets put it on the clipboard: tabs between cells, line ends between rows, a cell that holds either (or a quote at its start)
 * in quotes with its own quotes doubled.
 */
export function parseTabbedText(text: string): string[][] {
  const rows: string[][] = []
  let row: string[] = []
  let at = 0
  const source = text.replace(/\r\n?/g, '\n')
  const end = source.endsWith('\n') ? source.length - 1 : source.length
  if (end === 0) return []
  for (;;) {
    const cell = readCell(source, at, end)
    row.push(cell.text)
    at = cell.next + 1
    const isRowEnd = cell.next >= end || source[cell.next] === '\n'
    if (isRowEnd) {
      rows.push(row)
      row = []
    }
    if (cell.next >= end) return rows
  }
}

/** Cells as tab-separated text that a spreadsheet, or this grid, reads back as the same cells. */
export function formatTabbedText(rows: readonly (readonly string[])[]): string {
  return rows.map((row) => row.map(quoteCell).join('\t')).join('\n')
}

/** The same block as an HTML table, for programs that take that rather than text. */
export function formatHtmlTable(rows: readonly (readonly string[])[]): string {
  const body = rows.map((row) => `<tr>${row.map((cell) => `<td>${escapeHtml(cell)}</td>`).join('')}</tr>`).join('')
  return `<table>${body}</table>`
}

/** A text that a spreadsheet would run as a formula gets an apostrophe in front, and then it does not. */
export function guardText(text: string): string {
  return /^[=+\-@\t\r]/.test(text) ? `'${text}` : text
}

/** The text as it was before `guardText`. */
export function unguardText(text: string): string {
  return /^'[=+\-@\t\r]/.test(text) ? text.slice(1) : text
}

function readCell(source: string, start: number, end: number): { text: string; next: number } {
  if (source[start] === '"') {
    const quoted = readQuoted(source, start, end)
    if (quoted) return quoted
  }
  let next = start
  while (next < end && source[next] !== '\t' && source[next] !== '\n') next += 1
  return { text: source.slice(start, next), next }
}

/** `null` when the quote is part of the text (`"` for inches, say) and closes nothing. */
function readQuoted(source: string, start: number, end: number): { text: string; next: number } | null {
  let text = ''
  for (let at = start + 1; at < end; at += 1) {
    const isQuote = source[at] === '"'
    if (!isQuote) text += source[at]
    else if (source[at + 1] === '"') {
      text += '"'
      at += 1
    } else {
      const isClosed = at + 1 >= end || source[at + 1] === '\t' || source[at + 1] === '\n'
      return isClosed ? { text, next: at + 1 } : null
    }
  }
  return null
}

function quoteCell(cell: string): string {
  return /[\t\n\r]|^"/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell
}

function escapeHtml(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;')
}
