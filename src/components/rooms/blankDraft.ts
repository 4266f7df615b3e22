import { formatLength } from '../../../shared/engine/index.ts'
import type { RoomFields } from '../../../shared/schemas/room.ts'
import type { RoomDraft } from './roomDraft.ts'

/** Most old and new ceilings are near it. */
const USUAL_CEILING_IN = 96

/** The form of a room that isn't there yet. The ceiling is taken from the last room: rooms of one storey mostly share it. */
export function blankDraft(lastRoom: Pick<RoomFields, 'ceiling'> | null): RoomDraft {
  const heightIn = lastRoom?.ceiling?.kind === 'flat' ? lastRoom.ceiling.heightIn : USUAL_CEILING_IN
  return {
    name: '',
    use: 'other',
    note: '',
    shapeKind: 'rectangle',
    lengthText: '',
    widthText: '',
    cutLengthText: '',
    cutWidthText: '',
    walk: { start: [0, 0], headingDegrees: 0, runs: [] },
    ceilingKind: 'flat',
    heightText: formatLength(heightIn),
    lowText: '',
    highText: '',
    openings: [],
    deductions: [],
  }
}
