import type { Deduction, Opening } from '../../../shared/schemas/room.ts'

export const OPENING_TITLES: Record<Opening['kind'], string> = { door: 'Door', window: 'Window', cased: 'Cased opening' }
export const DEDUCTION_TITLES: Record<Deduction['kind'], string> = { cabinets: 'Cabinets', tub: 'Tub', other: 'Other' }

export const OPENING_KIND_OPTIONS = (Object.keys(OPENING_TITLES) as Opening['kind'][]).map((value) => ({
  value,
  label: OPENING_TITLES[value],
}))
export const DEDUCTION_KIND_OPTIONS = (Object.keys(DEDUCTION_TITLES) as Deduction['kind'][]).map((value) => ({
  value,
  label: DEDUCTION_TITLES[value],
}))

/** The sizes that most houses have, one press each. */
export const COMMON_OPENINGS: readonly Opening[] = [
  opening('door', 30, 80),
  opening('door', 32, 80),
  opening('door', 36, 80),
  opening('window', 30, 48),
  opening('window', 36, 48),
  opening('window', 36, 60),
  opening('cased', 48, 80),
]

/** Flooring stops at a tub; under cabinets it is often laid through, so that stays a switch to turn on. */
export const COMMON_DEDUCTIONS: readonly Deduction[] = [
  { kind: 'cabinets', widthIn: 96, heightIn: 36, depthIn: 24, count: 1, fromWalls: true, fromFloor: false, fromBase: true },
  { kind: 'tub', widthIn: 60, heightIn: 20, depthIn: 30, count: 1, fromWalls: true, fromFloor: true, fromBase: true },
  { kind: 'other', widthIn: 36, heightIn: 80, depthIn: 24, count: 1, fromWalls: true, fromFloor: false, fromBase: true },
]

function opening(kind: Opening['kind'], widthIn: number, heightIn: number): Opening {
  return { kind, widthIn, heightIn, count: 1, fromWalls: true, fromBase: true }
}
