import type { RoomUse } from '../../../shared/schemas/room.ts'
import type { RoomMark } from './roomMark.ts'

/** A room as the list shows it. */
export interface RoomEntry {
  id: string
  name: string
  use: RoomUse
  /** "125.00 sq ft"; empty while it can't be had. */
  areaText: string
  mark: RoomMark | null
}
