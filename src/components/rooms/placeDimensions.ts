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
const LINE_CLEARANCE = 7
/** Out from the wall. */
const STEPS_OUT = 3

interface Space {
  /** Of the nearest dimension line, from its wall's inner face. */
  nearest: number
  /** Of the walls, outward from their inner face. */
  thickness: number
}

/**
 * How far from its wall each dimension stands: as near as it can without its words meeting a wall or another dimension, outside the room if there is
 * any way. In the notch of an L there is none: there it goes out to the rest of the room's dimensions on that side, and stands in line with them.
 * Where nothing is clear it stands nearest.
 */
export function placeDimensions(walls: readonly DimensionedWall[], { nearest, thickness }: Space): PlacedDimension[] {
  const places: PlacedDimension[] = walls.map((wall) => placeAt(wall, nearest))
  const taken: { words: Corner[]; line: Segment }[] = []
  for (const { wall, index } of longestFirst(walls)) {
    const others = walls.filter((other) => other !== wall)
    const isClear = (place: PlacedDimension) => {
      const words = wordPoints(wall, place.textOffset)
      const line = lineAt(wall, place.offset)
      return (
        words.every((point) => others.every((other) => distanceToSegment(point, other) >= thickness + WALL_CLEARANCE)) &&
        others.every((other) => !doCross(line, other)) &&
        taken.every((other) => !doCross(line, other.line) && areApart(words, other.words) && isOffLine(words, other.line)) &&
        taken.every((other) => isOffLine(other.words, line))
      )
    }
    const steps = Array.from({ length: STEPS_OUT + 1 }, (_, step) => nearest + step * STEP)
    const inLine = reachOut(wall, walls) + nearest
    const place = [...steps, inLine, -(nearest + STEP)].map((offset) => placeAt(wall, offset)).find(isClear)
    if (place) places[index] = place
    const { offset, textOffset } = places[index]!
    taken.push({ words: wordPoints(wall, textOffset), line: lineAt(wall, offset) })
  }
  return places
}

type Segment = Pick<DimensionedWall, 'from' | 'to'>

function lineAt({ from, to, outward }: DimensionedWall, offset: number): Segment {
  const out = ([x, y]: Corner): Corner => [x + outward[0] * offset, y + outward[1] * offset]
  return { from: out(from), to: out(to) }
}

/** How far the room reaches beyond a wall, on the wall's outer side. */
function reachOut({ from, outward }: DimensionedWall, walls: readonly DimensionedWall[]): number {
  return Math.max(...walls.map((other) => (other.from[0] - from[0]) * outward[0] + (other.from[1] - from[1]) * outward[1]))
}

function areApart(some: readonly Corner[], others: readonly Corner[]): boolean {
  return some.every((point) => others.every((other) => distance(point, other) >= CLEARANCE))
}

function isOffLine(words: readonly Corner[], line: Segment): boolean {
  return words.every((point) => distanceToSegment(point, line) >= LINE_CLEARANCE)
}

/** Whether one line goes through the other; to meet at an end is no crossing. */
function doCross(one: Segment, other: Segment): boolean {
  return isParted(one, other) && isParted(other, one)
}

function isParted({ from, to }: Segment, by: Segment): boolean {
  return sideOf(from, by) * sideOf(to, by) < -1e-9
}

function sideOf([x, y]: Corner, { from, to }: Segment): number {
  return Math.sign((to[0] - from[0]) * (y - from[1]) - (to[1] - from[1]) * (x - from[0]))
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

function distanceToSegment(point: Corner, { from, to }: Segment): number {
  const lengthSquared = (to[0] - from[0]) ** 2 + (to[1] - from[1]) ** 2
  const dot = (point[0] - from[0]) * (to[0] - from[0]) + (point[1] - from[1]) * (to[1] - from[1])
  const along = lengthSquared === 0 ? 0 : Math.max(0, Math.min(1, dot / lengthSquared))
  return distance(point, [from[0] + along * (to[0] - from[0]), from[1] + along * (to[1] - from[1])])
}

function distance(one: Corner, other: Corner): number {
  return Math.hypot(one[0] - other[0], one[1] - other[1])
}
