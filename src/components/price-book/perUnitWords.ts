/** How a price says what it is for: "per sf", but "each". */
export function perUnitWords(unit: string): string {
  return unit === 'each' ? 'each' : `per ${unit}`
}
