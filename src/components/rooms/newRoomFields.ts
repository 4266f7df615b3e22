import type { RoomFields } from '../../../shared/schemas/room.ts'
import { readRoomDraft } from './readRoomDraft.ts'
import type { RoomDraft } from './roomDraft.ts'

/** The room that a form describes, or `null` while something of it is missing or can't be read. */
export function newRoomFields(draft: RoomDraft): RoomFields | null {
  const { fields, problems } = readRoomDraft(draft)
  const { name, use, shape, ceiling, openings, deductions, note } = fields
  const isWhole = problems.length === 0 && name !== undefined && use !== undefined && shape !== undefined && ceiling !== undefined
  return isWhole ? { name, use, shape, ceiling, openings: openings ?? [], deductions: deductions ?? [], note: note ?? '' } : null
}
