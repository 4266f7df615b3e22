import type { Corner } from '../../../shared/schemas/room.ts'

/** One wall as it is walked: its length, then the turn at its end in degrees, right (clockwise on the plan) positive, 0 straight on. */
export interface WallRun {
  lengthIn: number
  turnDegrees: number
}

/** A room as it is walked along its walls. Where it starts and faces is kept, so that editing a wall doesn't turn the drawing. */
export interface WallWalk {
  start: Corner
  headingDegrees: number
  runs: readonly WallRun[]
}

/** A walk that ends this near to where it began has come round: a tape reads no finer over a whole room. */
export const CLOSED_WITHIN_IN = 0.25

/** Every point that a walk comes to, its start first and its end last; `x` to the right, `y` down the plan, in inches. */
export function walkPoints({ start, headingDegrees, runs }: WallWalk): Corner[] {
  let [x, y] = start
  let heading = headingDegrees
  const points: Corner[] = [[x, y]]
  for (const { lengthIn, turnDegrees } of runs) {
    const [dx, dy] = unitVector(heading)
    x += lengthIn * dx
    y += lengthIn * dy
    points.push([x, y])
    heading = normalDegrees(heading + turnDegrees)
  }
  return points
}

/** The corners of the polygon that a walk draws, closed by itself: the end is left out where it has come back to the start. */
export function cornersFromWalk(walk: WallWalk): Corner[] {
  const points = walkPoints(walk)
  return walkGap(walk).isClosed ? points.slice(0, -1) : points
}

/** The walk round a polygon: one run for each of its walls, the last one back to the first corner. */
export function walkFromCorners(corners: readonly Corner[]): WallWalk {
  const walls = corners.map((from, index) => {
    const to = corners[(index + 1) % corners.length] ?? from
    return { lengthIn: Math.hypot(to[0] - from[0], to[1] - from[1]), heading: headingOf(from, to) }
  })
  const runs = walls.map(({ lengthIn, heading }, index) => {
    const next = walls[(index + 1) % walls.length]
    return { lengthIn, turnDegrees: next ? normalDegrees(next.heading - heading) : 0 }
  })
  return { start: corners[0] ?? [0, 0], headingDegrees: walls[0]?.heading ?? 0, runs }
}

/** How far a walk ends from where it began, and which way it faces there. */
export function walkGap(walk: WallWalk): { gapIn: number; isClosed: boolean; end: Corner; headingDegrees: number } {
  const end = walkPoints(walk).at(-1) ?? walk.start
  const gapIn = Math.hypot(walk.start[0] - end[0], walk.start[1] - end[1])
  const headingDegrees = normalDegrees(walk.runs.reduce((sum, run) => sum + run.turnDegrees, walk.headingDegrees))
  return { gapIn, isClosed: walk.runs.length >= 3 && gapIn <= CLOSED_WITHIN_IN, end, headingDegrees }
}

/** Exact for right angles, so that a square room comes back to the very inch it started from. */
export function unitVector(headingDegrees: number): Corner {
  switch (normalDegrees(headingDegrees)) {
    case 0:
      return [1, 0]
    case 90:
      return [0, 1]
    case 180:
      return [-1, 0]
    case -90:
      return [0, -1]
    default: {
      const angle = (headingDegrees * Math.PI) / 180
      return [Math.cos(angle), Math.sin(angle)]
    }
  }
}

/** The same direction as more than -180 and at most 180 degrees. */
export function normalDegrees(degrees: number): number {
  const turned = ((degrees % 360) + 360) % 360
  return turned > 180 ? turned - 360 : turned
}

function headingOf(from: Corner, to: Corner): number {
  return normalDegrees((Math.atan2(to[1] - from[1], to[0] - from[0]) * 180) / Math.PI)
}
