import { roomMeasures } from '../../../shared/engine/takeoff/roomMeasures.ts'
import type { RoomInput } from '../../../shared/engine/estimateInput.ts'
import type { RoomEditor } from './roomEditor.ts'

export interface RoomMark {
  kind: 'fault' | 'unsaved'
  /** What is the matter, short enough for the list. */
  words: string
}

/** What the list says about a room: a field to put right, something unsaved, a measure that can't be had; `null` when all is well. */
export function roomMark(room: RoomInput, editor: RoomEditor | undefined): RoomMark | null {
  if (editor) {
    const status = editor.save.status.value
    if (status === 'conflict') return { kind: 'fault', words: 'changed by two people' }
    const faults = [...editor.problems.value.values()].filter(({ isEmpty }) => !isEmpty).length
    if (faults > 0) return { kind: 'fault', words: faults === 1 ? 'a field to put right' : `${faults} fields to put right` }
    if (status === 'waiting' || status === 'refused') return { kind: 'unsaved', words: 'not saved yet' }
  }
  if (room.ceiling === null) return { kind: 'fault', words: 'no ceiling height' }
  const lacksMeasure = Object.values(roomMeasures(room)).some(({ ok }) => !ok)
  return lacksMeasure ? { kind: 'fault', words: 'a measure is missing' } : null
}
