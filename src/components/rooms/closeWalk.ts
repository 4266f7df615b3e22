import { wallCrossings } from './wallCrossings.ts'
import { cornersFromWalk, normalDegrees, unitVector, walkGap, type WallRun, type WallWalk } from './wallRuns.ts'

/** A gap up to this is a tape read a little off: the last walls give way. A wider one is a wall not keyed yet. */
export const ADJUST_WITHIN_IN = 6

/** Nearer than this to a right angle, a component of the gap is no wall of its own. */
const NEGLIGIBLE_IN = 1 / 64

/**
 * Brings a walk back to its first corner. A small gap is taken up by the lengths of the last two walls, which keeps every angle;
 * a wider one is closed by the walls that are missing: straight ahead and round one right angle where that leads home, else in one line.
 * A walk that is closed, or has nothing to close, comes back as it is.
 */
export function closeWalk(walk: WallWalk): WallWalk {
  const { gapIn, isClosed } = walkGap(walk)
  const hasNothingToClose = walk.runs.length < 2 || gapIn <= NEGLIGIBLE_IN
  if (isClosed || hasNothingToClose) return walk
  const adjusted = gapIn <= ADJUST_WITHIN_IN && walk.runs.length > 3 ? withLastTwoAdjusted(walk) : null
  return adjusted ?? withWallsAdded(walk)
}

function withLastTwoAdjusted(walk: WallWalk): WallWalk | null {
  const { end, headingDegrees } = walkGap(walk)
  const [secondLast, last] = walk.runs.slice(-2) as [WallRun, WallRun]
  const lastHeading = headingDegrees - last.turnDegrees
  const [ax, ay] = unitVector(lastHeading - secondLast.turnDegrees)
  const [bx, by] = unitVector(lastHeading)
  const cross = ax * by - ay * bx
  if (Math.abs(cross) < 0.1) return null
  const dx = walk.start[0] - end[0]
  const dy = walk.start[1] - end[1]
  const secondLastLength = secondLast.lengthIn + (dx * by - dy * bx) / cross
  const lastLength = last.lengthIn + (ax * dy - ay * dx) / cross
  if (secondLastLength <= 0 || lastLength <= 0) return null
  return {
    ...walk,
    runs: [...walk.runs.slice(0, -2), { ...secondLast, lengthIn: secondLastLength }, { ...last, lengthIn: lastLength }],
  }
}

function withWallsAdded(walk: WallWalk): WallWalk {
  const straightHome = withOneWall(walk)
  const roundOneCorner = withTwoWalls(walk)
  const isClear = roundOneCorner !== null && wallCrossings(cornersFromWalk(roundOneCorner)).length === 0
  return isClear ? roundOneCorner : straightHome
}

function withTwoWalls(walk: WallWalk): WallWalk | null {
  const { ahead, aside } = wayHome(walk)
  if (ahead <= NEGLIGIBLE_IN || Math.abs(aside) <= NEGLIGIBLE_IN) return null
  return withRuns(walk, [
    { lengthIn: ahead, turnDegrees: aside > 0 ? 90 : -90 },
    { lengthIn: Math.abs(aside), turnDegrees: 0 },
  ])
}

function withOneWall(walk: WallWalk): WallWalk {
  const { ahead, aside } = wayHome(walk)
  const turnHome = (Math.atan2(aside, ahead) * 180) / Math.PI
  const last = walk.runs.at(-1) as WallRun
  const turned = { ...last, turnDegrees: normalDegrees(last.turnDegrees + turnHome) }
  return withRuns({ ...walk, runs: [...walk.runs.slice(0, -1), turned] }, [{ lengthIn: Math.hypot(ahead, aside), turnDegrees: 0 }])
}

/** The first corner as seen by who stands at the end: so far ahead, so far to the right. */
function wayHome(walk: WallWalk): { ahead: number; aside: number } {
  const { end, headingDegrees } = walkGap(walk)
  const [hx, hy] = unitVector(headingDegrees)
  const dx = walk.start[0] - end[0]
  const dy = walk.start[1] - end[1]
  return { ahead: dx * hx + dy * hy, aside: hx * dy - hy * dx }
}

/** The turn at the end of the last wall is the one that faces the first wall again. */
function withRuns(walk: WallWalk, added: readonly WallRun[]): WallWalk {
  const runs = [...walk.runs, ...added]
  const faced = runs.slice(0, -1).reduce((sum, run) => sum + run.turnDegrees, 0)
  const last = runs.at(-1) as WallRun
  return { ...walk, runs: [...runs.slice(0, -1), { ...last, turnDegrees: normalDegrees(-faced) }] }
}
