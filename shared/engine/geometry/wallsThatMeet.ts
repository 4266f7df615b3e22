import type { Corner } from '../../schemas/room.ts'
import { cornerAfter } from './planFigures.ts'

/**
 * Pairs of walls that cross, touch or lie on one another where they have no corner in common, and neighbours that fold back on each other.
 * Wall 0 runs from corner 0 to corner 1. Exact for corners held to 1/64 in.
 */
export function wallsThatMeet(corners: readonly Corner[]): [number, number][] {
  const pairs: [number, number][] = []
  const count = corners.length
  for (let one = 0; one < count; one += 1) {
    for (let other = one + 1; other < count; other += 1) {
      if (doMeet(corners, one, other)) pairs.push([one, other])
    }
  }
  return pairs
}

function doMeet(corners: readonly Corner[], one: number, other: number): boolean {
  const count = corners.length
  const [a, b] = wall(corners, one)
  const [c, d] = wall(corners, other)
  if (other === one + 1) return foldsBack(a, b, d)
  if (one === 0 && other === count - 1) return foldsBack(c, a, b)
  return segmentsMeet(a, b, c, d)
}

function wall(corners: readonly Corner[], index: number): [Corner, Corner] {
  return [corners[index] ?? [0, 0], cornerAfter(corners, index)]
}

/** Whether the wall from `middle` to `end` runs back along the wall that came from `start`. */
function foldsBack(start: Corner, middle: Corner, end: Corner): boolean {
  const isOnOneLine = turn(start, middle, end) === 0
  const along = (middle[0] - start[0]) * (end[0] - middle[0]) + (middle[1] - start[1]) * (end[1] - middle[1])
  return isOnOneLine && along < 0
}

function segmentsMeet(a: Corner, b: Corner, c: Corner, d: Corner): boolean {
  const cSide = turn(a, b, c)
  const dSide = turn(a, b, d)
  const aSide = turn(c, d, a)
  const bSide = turn(c, d, b)
  const isCrossing = cSide * dSide < 0 && aSide * bSide < 0
  return (
    isCrossing ||
    (cSide === 0 && isBetween(a, b, c)) ||
    (dSide === 0 && isBetween(a, b, d)) ||
    (aSide === 0 && isBetween(c, d, a)) ||
    (bSide === 0 && isBetween(c, d, b))
  )
}

/** Sign of the turn from `a` over `b` to `c`: 1 left, −1 right, 0 straight. */
function turn(a: Corner, b: Corner, c: Corner): number {
  return Math.sign((b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]))
}

function isBetween(a: Corner, b: Corner, point: Corner): boolean {
  const [x, y] = point
  return Math.min(a[0], b[0]) <= x && x <= Math.max(a[0], b[0]) && Math.min(a[1], b[1]) <= y && y <= Math.max(a[1], b[1])
}
