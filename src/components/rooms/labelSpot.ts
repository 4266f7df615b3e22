import type { Corner } from '../../../shared/schemas/room.ts'

const STEPS = 24

/** How much nearness to the middle counts beside clearance: enough to settle between equals, as along the axis of a long room. */
const MIDDLE_PULL = 0.02

/** The point inside a polygon that is farthest from every wall, on a coarse grid: where a label has the most room. `null` for a shape with no inside. */
export function labelSpot(corners: readonly Corner[]): { at: Corner; clearIn: number } | null {
  const xs = corners.map(([x]) => x)
  const ys = corners.map(([, y]) => y)
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)]
  const middle: Corner = [(left + right) / 2, (top + bottom) / 2]
  let best: { at: Corner; clearIn: number; worth: number } | null = null
  for (let column = 1; column < STEPS; column += 1) {
    for (let row = 1; row < STEPS; row += 1) {
      const at: Corner = [left + ((right - left) * column) / STEPS, top + ((bottom - top) * row) / STEPS]
      if (!isInside(at, corners)) continue
      const clearIn = distanceToWalls(at, corners)
      const worth = clearIn - MIDDLE_PULL * Math.hypot(at[0] - middle[0], at[1] - middle[1])
      if (!best || worth > best.worth) best = { at, clearIn, worth }
    }
  }
  return best && { at: best.at, clearIn: best.clearIn }
}

function isInside([x, y]: Corner, corners: readonly Corner[]): boolean {
  return corners.reduce((inside, [ax, ay], index) => {
    const [bx, by] = corners[(index + 1) % corners.length] ?? [ax, ay]
    const crosses = ay > y !== by > y && x < ((bx - ax) * (y - ay)) / (by - ay) + ax
    return crosses ? !inside : inside
  }, false)
}

function distanceToWalls([x, y]: Corner, corners: readonly Corner[]): number {
  return corners.reduce((least, [ax, ay], index) => {
    const [bx, by] = corners[(index + 1) % corners.length] ?? [ax, ay]
    const lengthSquared = (bx - ax) ** 2 + (by - ay) ** 2
    const along = lengthSquared === 0 ? 0 : Math.max(0, Math.min(1, ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / lengthSquared))
    return Math.min(least, Math.hypot(x - ax - along * (bx - ax), y - ay - along * (by - ay)))
  }, Infinity)
}
