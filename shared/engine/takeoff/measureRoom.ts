import { checkShape } from '../geometry/checkShape.ts'
import { planFigures } from '../geometry/planFigures.ts'
import { slopeFactor } from '../geometry/slopeFactor.ts'
import type { RoomInput } from '../estimateInput.ts'
import { ROOM_MEASURE_COUNT, ROOM_PLACE } from './roomMeasureList.ts'
import { takenFromRoom } from './takenFromRoom.ts'

const SQ_IN_PER_SQ_FT = 144
const CU_IN_PER_CU_FT = 1728

/**
 * Measures a room into its row of the engine's columns, in feet, square feet and cubic feet; NaN for what can't be had (`whyNoRoomMeasure` says why).
 *
 * Walls are perimeter × height, less openings and what covers them. A sloped ceiling rises across the width (the shorter side of the box around an L or a polygon):
 * `height` is then the mean of low and high, which gives a rectangle's walls and volume exactly, and the ceiling is the floor × √(1 + (rise / width)²).
 * Example: 12' 6" × 10', 8' high, a door 2' 8" × 6' 8" and two windows 3' × 4' → floor 125, walls 360 gross, openings 41.78, walls 318.22, base 42.33.
 */
export function measureRoom(room: RoomInput, values: Float64Array, row = 0): void {
  const { shape, ceiling } = room
  const taken = takenFromRoom(room)
  values[row + ROOM_PLACE.windows] = taken.windows
  values[row + ROOM_PLACE.doors] = taken.doors
  values[row + ROOM_PLACE.opening_area] = taken.openingSqIn / SQ_IN_PER_SQ_FT
  if (checkShape(shape).length > 0) {
    leaveShapeOut(values, row)
    return
  }
  const plan = planFigures(shape)
  const isSloped = ceiling?.kind === 'sloped'
  const heightIn = ceiling === null ? NaN : isSloped ? (ceiling.lowIn + ceiling.highIn) / 2 : ceiling.heightIn
  const ceilingFactor = ceiling === null ? NaN : isSloped ? slopeFactor(ceiling.highIn - ceiling.lowIn, plan.slopeRunIn) : 1
  const wallsSqIn = plan.perimeterIn * heightIn
  values[row + ROOM_PLACE.floor_area] = notBelowZero(plan.areaSqIn - taken.fromFloorSqIn) / SQ_IN_PER_SQ_FT
  values[row + ROOM_PLACE.ceiling_area] = (plan.areaSqIn * ceilingFactor) / SQ_IN_PER_SQ_FT
  values[row + ROOM_PLACE.perimeter] = plan.perimeterIn / 12
  values[row + ROOM_PLACE.wall_area_gross] = wallsSqIn / SQ_IN_PER_SQ_FT
  values[row + ROOM_PLACE.wall_area] = notBelowZero(wallsSqIn - taken.fromWallsSqIn) / SQ_IN_PER_SQ_FT
  values[row + ROOM_PLACE.base_length] = notBelowZero(plan.perimeterIn - taken.fromBaseIn) / 12
  values[row + ROOM_PLACE.volume] = (plan.areaSqIn * heightIn) / CU_IN_PER_CU_FT
  values[row + ROOM_PLACE.length] = plan.lengthIn / 12
  values[row + ROOM_PLACE.width] = plan.widthIn / 12
  values[row + ROOM_PLACE.height] = heightIn / 12
}

const FROM_SHAPE = [...Array(ROOM_MEASURE_COUNT).keys()].filter(
  (place) => place !== ROOM_PLACE.windows && place !== ROOM_PLACE.doors && place !== ROOM_PLACE.opening_area,
)

function leaveShapeOut(values: Float64Array, row: number): void {
  for (const place of FROM_SHAPE) values[row + place] = NaN
}

function notBelowZero(rest: number): number {
  return rest >= 0 ? rest : NaN
}
