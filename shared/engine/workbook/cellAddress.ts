const LETTERS = 26

/** Letters of a column: 1 → `A`, 27 → `AA`, 16384 → `XFD`. */
export function columnLetters(column: number): string {
  let letters = ''
  for (let rest = column; rest > 0; rest = Math.floor((rest - 1) / LETTERS)) {
    letters = String.fromCharCode(65 + ((rest - 1) % LETTERS)) + letters
  }
  return letters
}

/** A cell as formulas on its own sheet write it: row 5, column 2 → `B5`. */
export function cellAddress(row: number, column: number): string {
  return `${columnLetters(column)}${row}`
}

/** A cell that stays when its formula is copied: `$B$5`. */
export function fixedAddress(row: number, column: number): string {
  return `$${columnLetters(column)}$${row}`
}

/** A cell of another sheet: `'Prices used'!$F$7`. Sheet names with a blank need the quotes, and they harm no other. */
export function sheetAddress(sheet: string, row: number, column: number): string {
  return `${quotedSheet(sheet)}!${fixedAddress(row, column)}`
}

/** Part of a column of another sheet: `'Estimate'!$R$6:$R$80`. */
export function sheetColumnRange(sheet: string, column: number, fromRow: number, toRow: number): string {
  return `${quotedSheet(sheet)}!${fixedAddress(fromRow, column)}:${fixedAddress(toRow, column)}`
}

/** A sheet name as formulas quote it: an apostrophe inside is doubled. */
export function quotedSheet(sheet: string): string {
  return `'${sheet.replaceAll("'", "''")}'`
}
