const SHEET_NAME_MAX = 31
const DEFINED_NAME_MAX = 255
/** Columns run to XFD, rows to 1,048,576: a word of up to three letters and digits may be a cell. */
const LIKE_CELL = /^[A-Za-z]{1,3}\d{1,7}$/
const LIKE_ROW_COLUMN = /^(?:[Rr]\d*(?:[Cc]\d*)?|[Cc]\d*)$/
const LIKE_VALUE = /^(?:true|false)$/i

/** What keeps a text from being a sheet's name, in words, or `null`. */
export function sheetNameProblem(name: string): string | null {
  if (name.trim() === '') return 'is blank'
  if (name.length > SHEET_NAME_MAX) return `is longer than ${SHEET_NAME_MAX} characters`
  if (/[\\/?*:[\]]/.test(name)) return String.raw`holds one of \ / ? * : [ ]`
  if (name.startsWith("'") || name.endsWith("'")) return 'begins or ends with an apostrophe'
  if (name.toLowerCase() === 'history') return 'is kept by spreadsheet programs for themselves'
  return null
}

/** What keeps a text from being the name of a cell, in words, or `null`. */
export function definedNameProblem(name: string): string | null {
  if (name.length > DEFINED_NAME_MAX) return `is longer than ${DEFINED_NAME_MAX} characters`
  if (!/^[A-Za-z_][A-Za-z0-9_.]*$/.test(name)) return 'holds something else than letters, digits, dots and underscores'
  if (LIKE_CELL.test(name) || LIKE_ROW_COLUMN.test(name)) return 'looks like a cell'
  if (LIKE_VALUE.test(name)) return 'is a value'
  return null
}
