import type { Shape } from '../../../shared/schemas/room.ts'

export type FootprintKind = Shape['kind'] | 'none'

export interface FootprintSizes {
  lengthIn: number | null
  widthIn: number | null
  cutLengthIn: number | null
  cutWidthIn: number | null
}

/** The lengths of a footprint as its fields show them. */
export function footprintSizes(shape: Shape | null): FootprintSizes {
  const blank: FootprintSizes = { lengthIn: null, widthIn: null, cutLengthIn: null, cutWidthIn: null }
  if (shape === null || shape.kind === 'polygon') return blank
  const { kind: _, ...sizes } = shape
  return { ...blank, ...sizes }
}

/** The footprint that the fields describe; `null` while one of its lengths is still missing. */
export function footprintShape(kind: 'rectangle' | 'ell', sizes: FootprintSizes): Shape | null {
  const { lengthIn, widthIn, cutLengthIn, cutWidthIn } = sizes
  if (lengthIn === null || widthIn === null) return null
  if (kind === 'rectangle') return { kind, lengthIn, widthIn }
  if (cutLengthIn === null || cutWidthIn === null) return null
  return { kind, lengthIn, widthIn, cutLengthIn, cutWidthIn }
}
