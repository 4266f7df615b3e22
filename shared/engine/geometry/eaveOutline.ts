import type { Corner, Shape } from '../../schemas/room.ts'
import { cornerAfter, distance, planFigures, signedArea } from './planFigures.ts'
import { shapeOutline } from './shapeOutline.ts'

/** The outline that eaves draw around a footprint. */
export interface EaveOutline {
  areaSqIn: number
  perimeterIn: number
}

/**
 * The footprint grown by an overhang all round, its corners mitred: 42' × 28' with 12" → 44' × 30'.
 * Each corner adds d·tan(φ/2) to both of its walls, φ its turn, so the area is A + P·d + d²·Σ tan(φ/2) and the perimeter P + 2d·Σ tan(φ/2).
 * `null` where an overhang closes a notch that is narrower than twice its depth.
 */
export function eaveOutline(footprint: Shape, overhangIn: number): EaveOutline | null {
  const { areaSqIn, perimeterIn } = planFigures(footprint)
  const corners = anticlockwise(shapeOutline(footprint))
  const mitres = corners.map((corner, index) => mitre(corners.at(index - 1) ?? corner, corner, cornerAfter(corners, index)))
  const isNotchClosed = corners.some((corner, index) => {
    const growth = (mitres[index] ?? 0) + (mitres[(index + 1) % mitres.length] ?? 0)
    return distance(corner, cornerAfter(corners, index)) + growth * overhangIn < 0
  })
  if (isNotchClosed) return null
  const mitreSum = mitres.reduce((sum, length) => sum + length, 0)
  return {
    areaSqIn: areaSqIn + perimeterIn * overhangIn + mitreSum * overhangIn ** 2,
    perimeterIn: perimeterIn + 2 * mitreSum * overhangIn,
  }
}

function anticlockwise(corners: Corner[]): Corner[] {
  return signedArea(corners) < 0 ? [...corners].reverse() : corners
}

/** tan(φ/2) of the turn at a corner: 1 at a right angle, −1 at one that points inwards. Exact there, as sin φ / (1 + cos φ). */
function mitre(before: Corner, corner: Corner, after: Corner): number {
  const [inX, inY] = [corner[0] - before[0], corner[1] - before[1]]
  const [outX, outY] = [after[0] - corner[0], after[1] - corner[1]]
  const lengths = Math.hypot(inX, inY) * Math.hypot(outX, outY)
  return (inX * outY - inY * outX) / (lengths + (inX * outX + inY * outY))
}
