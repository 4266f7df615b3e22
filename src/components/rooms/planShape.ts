import { shapeOutline } from '../../../shared/engine/geometry/shapeOutline.ts'
import type { Corner, Shape } from '../../../shared/schemas/room.ts'
import { walkGap, walkPoints, type WallWalk } from './wallRuns.ts'

/** What there is to draw of a room, whole or still being keyed. */
export interface PlanShape {
  corners: readonly Corner[]
  /** The wall from the last corner to the first hasn't been keyed: it is drawn dashed. */
  isOpen: boolean
}

/** The outline of a keyed shape, or as many walls as have been keyed; `null` before there is a wall to draw. */
export function planShape(shape: Shape | null, walk: WallWalk | null): PlanShape | null {
  const isOpen = walk !== null && !walkGap(walk).isClosed
  if (shape) return { corners: shapeOutline(shape), isOpen }
  if (walk === null || walk.runs.length === 0) return null
  return { corners: walkPoints(walk), isOpen }
}
