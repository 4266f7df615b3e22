import type { Dimension } from '../../../shared/catalogue/units.ts'

const UNITS: Partial<Record<Dimension, string>> = { length: 'ft', area: 'sq ft', volume: 'cu ft' }

/** `ft`, `sq ft`, `cu ft`; `squares` for a hundred square feet; nothing for a count. */
export function measureUnit(dimension: Dimension, size: number): string {
  return size === 1 ? (UNITS[dimension] ?? '') : 'squares'
}

/** 318.2222 → "318.22"; counts without decimals. */
export function measureText(value: number, dimension: Dimension): string {
  const decimals = dimension in UNITS ? 2 : 0
  return value.toLocaleString('en-US', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })
}
