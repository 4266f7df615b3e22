import { parseLength } from '../../shared/engine/index.ts'

/**
 * The number that a cell of somebody else's spreadsheet means: `$1,234.50`, `1 234,50`, `1.234,50`, `(40)` is refused, `12' 6"` is 12.5 (feet).
 * A lone comma is a decimal comma unless three digits follow it. `null` where it is no number.
 */
export function readPastedNumber(text: string): number | null {
  const bare = text.trim().replace(/^[$€£]\s*|\s*[$€£]$/g, '')
  if (/['"′″’”]/.test(bare)) return readFeet(bare)
  const digits = bare.replace(/(?<=\d)[\s\u00a0\u202f](?=\d{3}(\D|$))/g, '')
  const isNumber = /^[+-]?(\d[\d.,]*|[.,]\d+)$/.test(digits)
  if (!isNumber) return null
  const value = Number(plainDecimal(digits))
  return Number.isFinite(value) ? value : null
}

function readFeet(text: string): number | null {
  const length = parseLength(text)
  return length.ok ? length.inches / 12 : null
}

function plainDecimal(digits: string): string {
  const lastComma = digits.lastIndexOf(',')
  const lastPoint = digits.lastIndexOf('.')
  if (lastComma === -1) return hasThousandsPoints(digits) ? digits.replaceAll('.', '') : digits
  if (lastPoint === -1) return hasThousandsCommas(digits) ? digits.replaceAll(',', '') : digits.replace(',', '.')
  return lastComma > lastPoint ? digits.replaceAll('.', '').replace(',', '.') : digits.replaceAll(',', '')
}

/** More than one group, or one of exactly three digits, as in 1,250. */
function hasThousandsCommas(digits: string): boolean {
  return /^[+-]?[1-9]\d{0,2}(,\d{3})+$/.test(digits)
}

/** One point is a decimal point here; two or more part thousands. */
function hasThousandsPoints(digits: string): boolean {
  return /^[+-]?[1-9]\d{0,2}(\.\d{3}){2,}$/.test(digits)
}
