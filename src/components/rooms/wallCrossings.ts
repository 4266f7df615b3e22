import { wallsThatMeet } from '../../../shared/engine/geometry/wallsThatMeet.ts'
import type { Corner } from '../../../shared/schemas/room.ts'

/** Two walls that meet where they have no corner in common; walls count from 1, as they are keyed. */
export interface WallCrossing {
  walls: readonly [number, number]
  at: Corner
}

type Wall = readonly [Corner, Corner]

/** Where the walls of a closed polygon meet and shouldn't, to mark the spot on the plan. Which walls they are is the engine's to say. */
export function wallCrossings(corners: readonly Corner[]): WallCrossing[] {
  return wallsThatMeet(corners).map(([one, other]) => ({
    walls: [one + 1, other + 1],
    at: meetingPoint(wallAt(corners, one), wallAt(corners, other)),
  }))
}

function wallAt(corners: readonly Corner[], index: number): Wall {
  return [corners[index] as Corner, corners[(index + 1) % corners.length] as Corner]
}

/** Of walls that lie on one another, an end of one that lies on the other. */
function meetingPoint([a, b]: Wall, [c, d]: Wall): Corner {
  const [abX, abY, cdX, cdY] = [b[0] - a[0], b[1] - a[1], d[0] - c[0], d[1] - c[1]]
  const cross = abX * cdY - abY * cdX
  if (cross === 0) return [a, b].find((end) => liesOn(end, c, d)) ?? c
  const along = ((c[0] - a[0]) * cdY - (c[1] - a[1]) * cdX) / cross
  return [a[0] + along * abX, a[1] + along * abY]
}

function liesOn([x, y]: Corner, c: Corner, d: Corner): boolean {
  return x >= Math.min(c[0], d[0]) && x <= Math.max(c[0], d[0]) && y >= Math.min(c[1], d[1]) && y <= Math.max(c[1], d[1])
}
