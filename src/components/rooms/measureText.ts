import type { Dimension } from '../../../shared/catalogue/units.ts'

const UNITS: Partial<Record<Dimension, string>> = { length: 'ft', area: 'sq ft', volume: 'cu ft' }

/** `ft`, `sq ft`, `cu ft`; nothing for a count. */
export function measureUnit(dimension: Dimension): string {
  return UNITS[dimension] ?? ''
}

/** 318.2222 → "318.22"; counts without decimals. */
export function measureText(value: number, dimension: Dimension): string {
  const decimals = dimension in UNITS ? 2 : 0
  return value.toLocaleString('en-US', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })
}
