import { formatLength } from '../../../shared/engine/units/formatLength.ts'
import type { RoomFields } from '../../../shared/schemas/room.ts'
import type { RoomDraft } from './roomDraft.ts'

/** Most old and new ceilings are near it. */
const USUAL_CEILING_IN = 96

type Ceilinged = Pick<RoomFields, 'ceiling'>

/** The form of a room that isn't there yet, its ceiling as high as most of the house's rooms, or as the last one where there are as many of another. */
export function blankDraft(rooms: readonly Ceilinged[]): RoomDraft {
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
    heightText: formatLength(commonestHeight(rooms)),
    lowText: '',
    highText: '',
    openings: [],
    deductions: [],
  }
}

/** A cellar or an attic keyed last should not lower the next bedroom. */
function commonestHeight(rooms: readonly Ceilinged[]): number {
  const counts = new Map<number, number>()
  for (const { ceiling } of rooms) if (ceiling?.kind === 'flat') counts.set(ceiling.heightIn, (counts.get(ceiling.heightIn) ?? 0) + 1)
  return [...counts].reduce((best, [heightIn, count]) => (count >= best.count ? { heightIn, count } : best), {
    heightIn: USUAL_CEILING_IN,
    count: 0,
  }).heightIn
}
