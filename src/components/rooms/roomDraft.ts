import { formatLength } from '../../../shared/engine/units/formatLength.ts'
import { shapeOutline } from '../../../shared/engine/geometry/shapeOutline.ts'
import type { Ceiling, Deduction, Opening, RoomFields, RoomUse, Shape } from '../../../shared/schemas/room.ts'
import { normalDegrees, walkFromCorners, type WallWalk } from './wallRuns.ts'

export type Turn = 'right' | 'left' | 'straight' | 'right-by' | 'left-by'

export interface RunDraft {
  id: number
  lengthText: string
  turn: Turn
  /** Degrees, for the turns that are not square. */
  angleText: string
}

export interface OpeningDraft {
  id: number
  kind: Opening['kind']
  widthText: string
  heightText: string
  countText: string
  fromWalls: boolean
  fromBase: boolean
  /** What stands while the texts can't be read; `null` for a row that never could. */
  kept: Opening | null
}

export interface DeductionDraft {
  id: number
  kind: Deduction['kind']
  widthText: string
  heightText: string
  depthText: string
  countText: string
  fromWalls: boolean
  fromFloor: boolean
  fromBase: boolean
  kept: Deduction | null
}

/**
 * A room as it stands in the form: each length as the text that was typed, readable or not, and what was keyed for the shapes and ceilings that are
 * not chosen now, so that changing one's mind loses nothing. Plain data, so that it can be laid by and taken up again.
 */
export interface RoomDraft {
  name: string
  use: RoomUse
  note: string
  shapeKind: Shape['kind']
  lengthText: string
  widthText: string
  cutLengthText: string
  cutWidthText: string
  walk: { start: WallWalk['start']; headingDegrees: number; runs: RunDraft[] }
  ceilingKind: Ceiling['kind'] | 'none'
  heightText: string
  lowText: string
  highText: string
  openings: OpeningDraft[]
  deductions: DeductionDraft[]
}

let lastRowId = 0

/** An id for a row of a form, to tell rows apart while they are keyed; it goes nowhere else. */
export function newRowId(): number {
  lastRowId += 1
  return lastRowId
}

export function draftFromRoom(room: RoomFields): RoomDraft {
  return {
    name: room.name,
    use: room.use,
    note: room.note,
    ...shapeDraft(room.shape),
    ...ceilingDraft(room.ceiling),
    openings: room.openings.map(openingDraft),
    deductions: room.deductions.map(deductionDraft),
  }
}

/** Rows that can be read hand over what stands for them later. */
export function openingDraft(opening: Opening): OpeningDraft {
  const { kind, widthIn, heightIn, count, fromWalls, fromBase } = opening
  return {
    id: newRowId(),
    kind,
    widthText: formatLength(widthIn),
    heightText: formatLength(heightIn),
    countText: String(count),
    fromWalls,
    fromBase,
    kept: opening,
  }
}

export function deductionDraft(deduction: Deduction): DeductionDraft {
  const { kind, widthIn, heightIn, depthIn, count, fromWalls, fromFloor, fromBase } = deduction
  return {
    id: newRowId(),
    kind,
    widthText: formatLength(widthIn),
    heightText: formatLength(heightIn),
    depthText: formatLength(depthIn),
    countText: String(count),
    fromWalls,
    fromFloor,
    fromBase,
    kept: deduction,
  }
}

type ShapeDraft = Pick<RoomDraft, 'shapeKind' | 'lengthText' | 'widthText' | 'cutLengthText' | 'cutWidthText' | 'walk'>

export function shapeDraft(shape: Shape): ShapeDraft {
  const texts = { lengthText: '', widthText: '', cutLengthText: '', cutWidthText: '' }
  if (shape.kind !== 'polygon') {
    texts.lengthText = formatLength(shape.lengthIn)
    texts.widthText = formatLength(shape.widthIn)
  }
  if (shape.kind === 'ell') {
    texts.cutLengthText = formatLength(shape.cutLengthIn)
    texts.cutWidthText = formatLength(shape.cutWidthIn)
  }
  return { shapeKind: shape.kind, ...texts, walk: walkDraft(walkFromCorners(shapeOutline(shape))) }
}

export function walkDraft({ start, headingDegrees, runs }: WallWalk): RoomDraft['walk'] {
  return {
    start,
    headingDegrees,
    runs: runs.map(({ lengthIn, turnDegrees }) => ({ id: newRowId(), lengthText: formatLength(lengthIn), ...turnDraft(turnDegrees) })),
  }
}

/** A wall that waits to be keyed. Most corners turn right as one walks with the wall to the left. */
export function blankRun(): RunDraft {
  return { id: newRowId(), lengthText: '', turn: 'right', angleText: '' }
}

function turnDraft(degrees: number): Pick<RunDraft, 'turn' | 'angleText'> {
  const turned = Math.round(normalDegrees(degrees) * 1000) / 1000
  if (turned === 0) return { turn: 'straight', angleText: '' }
  if (turned === 90) return { turn: 'right', angleText: '' }
  if (turned === -90) return { turn: 'left', angleText: '' }
  return { turn: turned > 0 ? 'right-by' : 'left-by', angleText: String(Math.abs(turned)) }
}

export function ceilingDraft(ceiling: Ceiling | null): Pick<RoomDraft, 'ceilingKind' | 'heightText' | 'lowText' | 'highText'> {
  return {
    ceilingKind: ceiling?.kind ?? 'none',
    heightText: ceiling?.kind === 'flat' ? formatLength(ceiling.heightIn) : '',
    lowText: ceiling?.kind === 'sloped' ? formatLength(ceiling.lowIn) : '',
    highText: ceiling?.kind === 'sloped' ? formatLength(ceiling.highIn) : '',
  }
}
