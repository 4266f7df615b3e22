import { formatLength } from '../../../shared/engine/units/formatLength.ts'

const TITLES: Record<string, string> = {
  name: 'The name',
  address: 'The address',
  regionKey: 'The price region',
  yearBuilt: 'The year built',
  storeys: 'The number of storeys',
  kind: 'The kind of house',
  footprint: 'The footprint',
  'footprint.lengthIn': 'The length of the footprint',
  'footprint.widthIn': 'The width of the footprint',
  'footprint.cutLengthIn': 'The cut length of the footprint',
  'footprint.cutWidthIn': 'The cut width of the footprint',
  wallHeightIn: 'The wall height',
  overhangIn: 'The overhang',
  roof: 'The roof',
  note: 'The note',
}

/** A field of a house in a sentence. */
export function fieldTitle(path: string): string {
  return TITLES[path] ?? 'A field'
}

/** A value of such a field, short enough for a sentence. */
export function conflictValueText(path: string, value: unknown): string {
  if (value === null || value === '') return 'nothing'
  if (typeof value === 'number') return path.endsWith('In') ? formatLength(value) : String(value)
  if (typeof value === 'string') return `“${value}”`
  if (Array.isArray(value)) return value.length === 1 ? 'one part' : `${value.length} parts`
  return 'another shape'
}
