import type { Corner } from '../../../shared/schemas/room.ts'

/** A wall in pixels, with what is written along it. */
export interface DimensionedWall {
  from: Corner
  to: Corner
  outward: Corner
  text: string
}

export interface PlacedDimension {
  /** Of the dimension line, from the wall's inner face. */
  offset: number
  /** Of the words, which stand off the line where the wall is shorter than they are. */
  textOffset: number
}

const CHARACTER_WIDTH = 6.8
const STEP = 14
/** Nearer than this the words of two dimensions, or words and a wall, run into each other. */
const CLEARANCE = 12
const WALL_CLEARANCE = 6
/** Out from the wall, then inside the room. */
const STEPS = [0, 1, 2, 3, -1]

interface Space {
  /** Of the nearest dimension line, from its wall's inner face. */
  nearest: number
  /** Of the walls, outward from their inner face. */
  thickness: number
}

/**
 * How far from its wall each dimension stands: as near as it can without its words meeting a wall or the words of a longer wall, outside the room
 * if there is any way. Where nothing is clear it stands nearest.
 */
export function placeDimensions(walls: readonly DimensionedWall[], { nearest, thickness }: Space): PlacedDimension[] {
  const places: PlacedDimension[] = walls.map((wall) => placeAt(wall, nearest))
  const taken: Corner[] = []
  for (const { wall, index } of longestFirst(walls)) {
    const others = walls.filter((other) => other !== wall)
    const isClear = ({ textOffset }: PlacedDimension) =>
      wordPoints(wall, textOffset).every(
        (point) =>
          taken.every((other) => distance(point, other) >= CLEARANCE) &&
          others.every((other) => distanceToWall(point, other) >= thickness + WALL_CLEARANCE),
      )
    const place = STEPS.map((steps) => placeAt(wall, steps < 0 ? steps * (nearest + STEP) : nearest + steps * STEP)).find(isClear)
    if (place) places[index] = place
    taken.push(...wordPoints(wall, (place ?? placeAt(wall, nearest)).textOffset))
  }
  return places
}

/** A long wall's dimension has its place; a short one's can go round it. */
function longestFirst(walls: readonly DimensionedWall[]): { wall: DimensionedWall; index: number }[] {
  return walls
    .map((wall, index) => ({ wall, index }))
    .sort((one, other) => distance(other.wall.from, other.wall.to) - distance(one.wall.from, one.wall.to))
}

/** Pixels that a dimension's words take up along the wall. */
export function wordsWidth(text: string): number {
  return text.length * CHARACTER_WIDTH
}

function placeAt(wall: DimensionedWall, offset: number): PlacedDimension {
  const fits = wordsWidth(wall.text) + 6 <= distance(wall.from, wall.to)
  return { offset, textOffset: fits ? offset : offset + Math.sign(offset) * 13 }
}

function wordPoints({ from, to, outward, text }: DimensionedWall, textOffset: number): Corner[] {
  const length = distance(from, to) || 1
  const along: Corner = [(to[0] - from[0]) / length, (to[1] - from[1]) / length]
  const middle: Corner = [(from[0] + to[0]) / 2 + outward[0] * textOffset, (from[1] + to[1]) / 2 + outward[1] * textOffset]
  return [-0.5, -0.25, 0, 0.25, 0.5].map((part) => [
    middle[0] + along[0] * wordsWidth(text) * part,
    middle[1] + along[1] * wordsWidth(text) * part,
  ])
}

function distanceToWall(point: Corner, { from, to }: DimensionedWall): number {
  const lengthSquared = (to[0] - from[0]) ** 2 + (to[1] - from[1]) ** 2
  const dot = (point[0] - from[0]) * (to[0] - from[0]) + (point[1] - from[1]) * (to[1] - from[1])
  const along = lengthSquared === 0 ? 0 : Math.max(0, Math.min(1, dot / lengthSquared))
  return distance(point, [from[0] + along * (to[0] - from[0]), from[1] + along * (to[1] - from[1])])
}

function distance(one: Corner, other: Corner): number {
  return Math.hypot(one[0] - other[0], one[1] - other[1])
}
