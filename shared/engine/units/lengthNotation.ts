const FRACTION_SIGNS: Record<string, string> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
}

/**
 * A length in plain signs: one kind of foot mark, inch mark, dash and space, fractions as `1/2`, lower case, single spaces.
 * `12′ 6½″` → `12' 6 1/2"`. Phones and word processors put curly quotes and primes where a tape measure has plain marks.
 */
export function plainNotation(text: string): string {
  return text
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞]/g, (sign) => ` ${FRACTION_SIGNS[sign]}`)
    .replace(/[′‘’ʹʼ`´＇]/g, "'")
    .replace(/[″“”ʺ＂]/g, '"')
    .replace(/[⁄∕]/g, '/')
    .replace(/[‐‑‒–—−]/g, '-')
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase()
}
