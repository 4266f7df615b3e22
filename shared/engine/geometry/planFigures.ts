import type { Corner, Shape } from '../../schemas/room.ts'
import { shapeOutline } from './shapeOutline.ts'

/** What a plan measures, in inches and square inches. Length and width are those of the box around it. */
export interface PlanFigures {
  areaSqIn: number
  perimeterIn: number
  lengthIn: number
  widthIn: number
  /** The side that a sloped ceiling rises across: a rectangle's width as keyed, the shorter side of the box around anything else. */
  slopeRunIn: number
}

/** Area, perimeter and extent of a plan: 12' 6" × 10' → 18,000 sq in, 540 in, 150 in, 120 in. */
export function planFigures(shape: Shape): PlanFigures {
  if (shape.kind === 'polygon') return polygonFigures(shapeOutline(shape))
  const { lengthIn, widthIn } = shape
  const cutSqIn = shape.kind === 'ell' ? shape.cutLengthIn * shape.cutWidthIn : 0
  const slopeRunIn = shape.kind === 'rectangle' ? widthIn : Math.min(lengthIn, widthIn)
  // A corner cut out of a rectangle takes area and no perimeter: two walls move inwards.
  return { areaSqIn: lengthIn * widthIn - cutSqIn, perimeterIn: 2 * (lengthIn + widthIn), lengthIn, widthIn, slopeRunIn }
}

function polygonFigures(corners: readonly Corner[]): PlanFigures {
  const xs = corners.map(([x]) => x)
  const ys = corners.map(([, y]) => y)
  const lengthIn = Math.max(...xs) - Math.min(...xs)
  const widthIn = Math.max(...ys) - Math.min(...ys)
  const perimeterIn = corners.reduce((sum, corner, index) => sum + distance(corner, cornerAfter(corners, index)), 0)
  return { areaSqIn: Math.abs(signedArea(corners)), perimeterIn, lengthIn, widthIn, slopeRunIn: Math.min(lengthIn, widthIn) }
}

/** Area by the shoelace formula, positive when the corners run counter-clockwise with y upward. Exact for lengths held to 1/64 in. */
export function signedArea(corners: readonly Corner[]): number {
  const twice = corners.reduce((sum, [x, y], index) => {
    const [nextX, nextY] = cornerAfter(corners, index)
    return sum + (x * nextY - nextX * y)
  }, 0)
  return twice / 2
}

export function cornerAfter(corners: readonly Corner[], index: number): Corner {
  return corners[(index + 1) % corners.length] ?? [0, 0]
}

export function distance(a: Corner, b: Corner): number {
  return Math.hypot(b[0] - a[0], b[1] - a[1])
}
