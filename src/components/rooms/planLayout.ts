import type { Corner } from '../../../shared/schemas/room.ts'

export interface PlanWall {
  from: Corner
  to: Corner
  lengthIn: number
  /** Unit vector along the wall. */
  along: Corner
  /** Unit vector out of the room. */
  outward: Corner
}

export interface PlanLayout {
  width: number
  height: number
  /** Pixels for an inch. */
  scale: number
  toPixels(corner: Corner): Corner
  walls: PlanWall[]
}

interface PlanSpace {
  width: number
  /** The plan is no higher than this. */
  maxHeight: number
  /** Room around the walls for their dimensions. */
  margin: number
}

/** Fits a plan into a given width: one scale for both directions, the room in the middle, as high as it needs. */
export function planLayout(corners: readonly Corner[], { width, maxHeight, margin }: PlanSpace): PlanLayout {
  const xs = corners.map(([x]) => x)
  const ys = corners.map(([, y]) => y)
  const left = Math.min(...xs)
  const top = Math.min(...ys)
  const spanX = Math.max(...xs) - left
  const spanY = Math.max(...ys) - top
  const scale = Math.min((width - 2 * margin) / Math.max(spanX, 1), (maxHeight - 2 * margin) / Math.max(spanY, 1))
  const height = spanY * scale + 2 * margin
  const offsetX = (width - spanX * scale) / 2
  return {
    width,
    height,
    scale,
    toPixels: ([x, y]) => [offsetX + (x - left) * scale, margin + (y - top) * scale],
    walls: planWalls(corners),
  }
}

/** The walls of a closed polygon, each with the way out of the room. */
export function planWalls(corners: readonly Corner[]): PlanWall[] {
  const turnsRight = signedArea(corners) >= 0
  return corners.map((from, index) => {
    const to = corners[(index + 1) % corners.length] ?? from
    const lengthIn = Math.hypot(to[0] - from[0], to[1] - from[1])
    const along: Corner = lengthIn > 0 ? [(to[0] - from[0]) / lengthIn, (to[1] - from[1]) / lengthIn] : [1, 0]
    const outward: Corner = turnsRight ? [along[1], -along[0]] : [-along[1], along[0]]
    return { from, to, lengthIn, along, outward }
  })
}

/** Positive where the corners go round to the right, as `y` runs down the plan. */
function signedArea(corners: readonly Corner[]): number {
  return corners.reduce((sum, [x, y], index) => {
    const [nextX, nextY] = corners[(index + 1) % corners.length] ?? [x, y]
    return sum + (x * nextY - nextX * y) / 2
  }, 0)
}
