import type { RoomFields } from '../../../shared/schemas/room.ts'
import { ceilingDraft, deductionDraft, draftFromRoom, openingDraft, shapeDraft, type RoomDraft } from './roomDraft.ts'

export type RoomKey = keyof RoomFields

export const ROOM_KEYS: readonly RoomKey[] = ['name', 'use', 'shape', 'ceiling', 'openings', 'deductions', 'note']

/** What the form holds for one field of a room, as text to compare: whether anything was keyed there since. */
export function draftPartText(draft: RoomDraft, key: RoomKey): string {
  return JSON.stringify(draftPart(draft, key), (name, value: unknown) => (name === 'id' || name === 'kept' ? undefined : value))
}

function draftPart(draft: RoomDraft, key: RoomKey): unknown {
  switch (key) {
    case 'shape':
      return [draft.shapeKind, draft.lengthText, draft.widthText, draft.cutLengthText, draft.cutWidthText, draft.walk]
    case 'ceiling':
      return [draft.ceilingKind, draft.heightText, draft.lowText, draft.highText]
    default:
      return draft[key]
  }
}

/** Puts a value that came from elsewhere into the form. */
export function setDraftPart(draft: RoomDraft, key: RoomKey, fields: RoomFields): void {
  if (key === 'shape') Object.assign(draft, shapeDraft(fields.shape))
  else if (key === 'ceiling') Object.assign(draft, ceilingDraft(fields.ceiling))
  else if (key === 'openings') draft.openings = fields.openings.map(openingDraft)
  else if (key === 'deductions') draft.deductions = fields.deductions.map(deductionDraft)
  else Object.assign(draft, { [key]: draftFromRoom(fields)[key] })
}
