import type { Corner } from '../../../shared/schemas/room.ts'

/** Two walls that meet away from a corner that they share; walls count from 1, as they are keyed. */
export interface WallCrossing {
  walls: readonly [number, number]
  at: Corner
}

/** Where the walls of a closed polygon cross, to mark the spot on the plan. Whether the shape may stand is the engine's to say. */
export function wallCrossings(corners: readonly Corner[]): WallCrossing[] {
  const count = corners.length
  const crossings: WallCrossing[] = []
  for (let first = 0; first < count; first += 1) {
    for (let second = first + 2; second < count; second += 1) {
      const areNeighbours = first === 0 && second === count - 1
      if (areNeighbours) continue
      const at = meetingPoint(wallAt(corners, first), wallAt(corners, second))
      if (at) crossings.push({ walls: [first + 1, second + 1], at })
    }
  }
  return crossings
}

type Wall = readonly [Corner, Corner]

function wallAt(corners: readonly Corner[], index: number): Wall {
  return [corners[index] as Corner, corners[(index + 1) % corners.length] as Corner]
}

function meetingPoint([a, b]: Wall, [c, d]: Wall): Corner | null {
  const abx = b[0] - a[0]
  const aby = b[1] - a[1]
  const cdx = d[0] - c[0]
  const cdy = d[1] - c[1]
  const cross = abx * cdy - aby * cdx
  if (cross === 0) return null
  const along = ((c[0] - a[0]) * cdy - (c[1] - a[1]) * cdx) / cross
  const across = ((c[0] - a[0]) * aby - (c[1] - a[1]) * abx) / cross
  const meets = along >= 0 && along <= 1 && across >= 0 && across <= 1
  return meets ? [a[0] + along * abx, a[1] + along * aby] : null
}
