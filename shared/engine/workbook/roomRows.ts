import { planFigures } from '../geometry/planFigures.ts'
import type { RoomInput } from '../estimateInput.ts'
import { roomMeasures } from '../takeoff/roomMeasures.ts'
import { formatLength } from '../units/formatLength.ts'
import { roomMeasureName } from './measureNames.ts'
import { ROOM_COLUMN as COLUMN } from './roomsLayout.ts'
import { number, text, type SheetDraft } from './sheetDraft.ts'

const FEET = 12
const SHAPE_WORDS = { rectangle: 'rectangle', ell: 'L', polygon: 'wall runs' } as const

/** A room as it was keyed, its dimensions in feet to be changed. Length and width are named where they can be had. */
export function setRoomRow(draft: SheetDraft, row: number, roomNumber: number, room: RoomInput): void {
  const { shape, ceiling } = room
  const measures = roomMeasures(room)
  const plan = planFigures(shape)
  // An outline by wall runs has no single length and width to change: the box around it is shown.
  const isBox = shape.kind !== 'polygon'
  const feet = (inches: number, isInput: boolean) => number(inches / FEET, isInput ? 'input-feet' : 'feet')
  draft.setRow(row, COLUMN.number, [number(roomNumber, 'count'), text(room.name, 'label'), text(room.use), text(SHAPE_WORDS[shape.kind])])
  draft.setRow(row, COLUMN.length, [feet(plan.lengthIn, isBox), feet(plan.widthIn, isBox)])
  draft.setRow(
    row,
    COLUMN.cutLength,
    shape.kind === 'ell' ? [feet(shape.cutLengthIn, true), feet(shape.cutWidthIn, true)] : [text(''), text('')],
  )
  draft.setRow(row, COLUMN.ceiling, [text(ceiling?.kind ?? ''), text(''), text('')])
  if (ceiling?.kind === 'flat') draft.set(row, COLUMN.low, feet(ceiling.heightIn, true))
  if (ceiling?.kind === 'sloped') draft.setRow(row, COLUMN.low, [feet(ceiling.lowIn, true), feet(ceiling.highIn, true)])
  draft.setRow(row, COLUMN.keyed, [text(keyedText(room)), text(''), text('')])
  draft.merge(row, COLUMN.keyed, COLUMN.last)
  for (const side of ['length', 'width'] as const) {
    if (measures[side]?.ok) draft.names.push({ name: roomMeasureName(roomNumber, side), sheet: draft.name, row, column: COLUMN[side] })
  }
}

function keyedText({ shape, ceiling }: RoomInput): string {
  return `${planText(shape)}, ${heightText(ceiling)}`
}

function planText(shape: RoomInput['shape']): string {
  if (shape.kind === 'polygon') return `${shape.corners.length} wall runs`
  const box = `${formatLength(shape.lengthIn)} × ${formatLength(shape.widthIn)}`
  return shape.kind === 'rectangle' ? box : `${box} less ${formatLength(shape.cutLengthIn)} × ${formatLength(shape.cutWidthIn)}`
}

function heightText(ceiling: RoomInput['ceiling']): string {
  if (ceiling === null) return 'no ceiling height'
  return ceiling.kind === 'flat'
    ? `${formatLength(ceiling.heightIn)} high`
    : `${formatLength(ceiling.lowIn)} to ${formatLength(ceiling.highIn)} high`
}
