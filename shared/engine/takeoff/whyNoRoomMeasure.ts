import { checkShape } from '../geometry/checkShape.ts'
import type { RoomInput } from '../estimateInput.ts'
import type { RoomMeasureName } from './roomMeasureList.ts'

const NEEDS_CEILING: ReadonlySet<string> = new Set<RoomMeasureName>(['ceiling_area', 'wall_area_gross', 'wall_area', 'volume', 'height'])

/** Why a measure of a room can't be had, in words. Only for one that can't. */
export function whyNoRoomMeasure({ shape, ceiling }: RoomInput, name: string): string {
  const [fault] = checkShape(shape)
  if (fault) return fault.message
  if (ceiling === null && NEEDS_CEILING.has(name)) return 'No ceiling height is keyed.'
  switch (name) {
    case 'wall_area':
      return 'Openings and deductions take more than all of the walls. Check their sizes and counts, or switch some off for the walls.'
    case 'base_length':
      return 'Doors and deductions take more than the whole perimeter. Check their widths and counts, or switch some off for the base.'
    default:
      return 'Deductions take more than the whole floor. Check their sizes and counts, or switch some off for the floor.'
  }
}
