import type { Corner, Shape } from '../../schemas/room.ts'
import { PARTS_OF_INCH } from '../units/formatLength.ts'

/**
 * The corners of a shape in order, in inches, closed by itself. A rectangle runs its length along x. An ell is that rectangle less its far corner,
 * cut length along x by cut width along y. A polygon's corners are held to 1/64 in, as every length is; a last corner that repeats the first is left out.
 */
export function shapeOutline(shape: Shape): Corner[] {
  if (shape.kind === 'polygon') return polygonCorners(shape.corners)
  const { lengthIn: length, widthIn: width } = shape
  if (shape.kind === 'rectangle') {
    return [
      [0, 0],
      [length, 0],
      [length, width],
      [0, width],
    ]
  }
  return [
    [0, 0],
    [length, 0],
    [length, width - shape.cutWidthIn],
    [length - shape.cutLengthIn, width - shape.cutWidthIn],
    [length - shape.cutLengthIn, width],
    [0, width],
  ]
}

function polygonCorners(corners: readonly Corner[]): Corner[] {
  const held = corners.map(([x, y]): Corner => [hold(x), hold(y)])
  const first = held[0]
  const last = held.at(-1)
  const isClosedTwice = held.length > 3 && first !== undefined && last !== undefined && isSameCorner(first, last)
  return isClosedTwice ? held.slice(0, -1) : held
}

function hold(inches: number): number {
  return Math.round(inches * PARTS_OF_INCH) / PARTS_OF_INCH
}

export function isSameCorner(a: Corner, b: Corner): boolean {
  return a[0] === b[0] && a[1] === b[1]
}
