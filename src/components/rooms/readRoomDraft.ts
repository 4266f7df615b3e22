import { checkShape } from '../../../shared/engine/geometry/checkShape.ts'
import { parseLength } from '../../../shared/engine/units/parseLength.ts'
import { NAME_MAX, NOTE_MAX } from '../../../shared/schemas/common.ts'
import {
  OPENING_COUNT_MAX,
  ROOM_CORNERS_MAX,
  type Ceiling,
  type Corner,
  type Deduction,
  type Opening,
  type RoomFields,
  type Shape,
} from '../../../shared/schemas/room.ts'
import type { DeductionDraft, OpeningDraft, RoomDraft, RunDraft } from './roomDraft.ts'
import { wallCrossings } from './wallCrossings.ts'
import { cornersFromWalk, walkGap, type WallRun, type WallWalk } from './wallRuns.ts'

/** What is wrong with a field of the form, by the field's own name: `length`, `run-7-length`, `opening-3-width`, `shape`. */
export interface DraftProblem {
  field: string
  message: string
  /** Nothing keyed yet: said once the field has been left, and no fault until then. */
  isEmpty: boolean
}

export interface DraftReading {
  /** What can be saved. A shape or ceiling that can't be read is left out; an opening that can't be read stays as it was. */
  fields: Partial<RoomFields>
  problems: DraftProblem[]
  /** The wall runs up to the first that can't be read, when the room is keyed by them. */
  walk: WallWalk | null
  /** The shape as keyed, also one that may not stand because its walls cross; `null` while a length is missing. */
  shape: Shape | null
}

const SHAPE_FIELDS: Record<string, string> = { cutLengthIn: 'cutLength', cutWidthIn: 'cutWidth' }

const NOT_CLOSED = 'The straight line home would cross a wall. Key the walls that are missing.'

type Length = { inches: number } | { problem: DraftProblem }

/** Reads the form: what it says, and in words what can't be read. */
export function readRoomDraft(draft: RoomDraft): DraftReading {
  const problems: DraftProblem[] = []
  const { shape, walk } = readShape(draft, problems)
  const shapeFaults = shape ? readShapeFaults(shape, walk) : []
  problems.push(...shapeFaults)
  const ceiling = readCeiling(draft, problems)
  const fields: Partial<RoomFields> = {
    use: draft.use,
    openings: draft.openings.flatMap((row) => readOpening(row, problems) ?? row.kept ?? []),
    deductions: draft.deductions.flatMap((row) => readDeduction(row, problems) ?? row.kept ?? []),
  }
  if (shape && shapeFaults.length === 0) fields.shape = shape
  if (ceiling !== undefined) fields.ceiling = ceiling
  const name = draft.name.trim()
  if (name === '') problems.push({ field: 'name', message: 'is empty', isEmpty: true })
  else if (name.length > NAME_MAX) problems.push(fault('name', `is longer than ${NAME_MAX} characters`))
  else fields.name = name
  if (draft.note.length > NOTE_MAX) problems.push(fault('note', `is longer than ${NOTE_MAX} characters`))
  else fields.note = draft.note
  return { fields, problems, walk, shape }
}

function readShapeFaults(shape: Shape, walk: WallWalk | null): DraftProblem[] {
  const faults = checkShape(shape).map(({ path, message }) => fault(SHAPE_FIELDS[path] ?? 'shape', message))
  if (faults.length > 0 && walk && onlyClosingCrosses(walk)) return [{ field: 'shape', message: NOT_CLOSED, isEmpty: true }]
  // Of walls that meet in many places, the first is enough to go on with.
  return faults.filter(({ field }, index) => faults.findIndex((other) => other.field === field) === index)
}

/** Whoever is still keying walls has done nothing wrong when the straight line home crosses one of them. */
function onlyClosingCrosses(walk: WallWalk): boolean {
  const crossings = wallCrossings(cornersFromWalk(walk))
  return !walkGap(walk).isClosed && crossings.length > 0 && crossings.every(({ walls }) => walls.includes(walk.runs.length + 1))
}

export function readOpening(row: OpeningDraft, problems: DraftProblem[] = []): Opening | null {
  const { kind, fromWalls, fromBase } = row
  const widthIn = keep(readLength(row.widthText, `opening-${row.id}-width`), problems)
  const heightIn = keep(readLength(row.heightText, `opening-${row.id}-height`), problems)
  const count = readCount(row.countText, `opening-${row.id}-count`, problems)
  if (widthIn === null || heightIn === null || count === null) return null
  return { kind, widthIn, heightIn, count, fromWalls, fromBase }
}

export function readDeduction(row: DeductionDraft, problems: DraftProblem[] = []): Deduction | null {
  const { kind, fromWalls, fromFloor, fromBase } = row
  const widthIn = keep(readLength(row.widthText, `deduction-${row.id}-width`), problems)
  const heightIn = keep(readLength(row.heightText, `deduction-${row.id}-height`), problems)
  const depthIn = keep(readLength(row.depthText, `deduction-${row.id}-depth`), problems)
  const count = readCount(row.countText, `deduction-${row.id}-count`, problems)
  if (widthIn === null || heightIn === null || depthIn === null || count === null) return null
  return { kind, widthIn, heightIn, depthIn, count, fromWalls, fromFloor, fromBase }
}

function readShape(draft: RoomDraft, problems: DraftProblem[]): { shape: Shape | null; walk: WallWalk | null } {
  if (draft.shapeKind === 'polygon') return readPolygon(draft.walk, problems)
  const lengthIn = keep(readLength(draft.lengthText, 'length'), problems)
  const widthIn = keep(readLength(draft.widthText, 'width'), problems)
  if (draft.shapeKind === 'rectangle') {
    return { shape: lengthIn === null || widthIn === null ? null : { kind: 'rectangle', lengthIn, widthIn }, walk: null }
  }
  const cutLengthIn = keep(readLength(draft.cutLengthText, 'cutLength'), problems)
  const cutWidthIn = keep(readLength(draft.cutWidthText, 'cutWidth'), problems)
  const isWhole = lengthIn !== null && widthIn !== null && cutLengthIn !== null && cutWidthIn !== null
  return { shape: isWhole ? { kind: 'ell', lengthIn, widthIn, cutLengthIn, cutWidthIn } : null, walk: null }
}

/** The walk, when every wall of it can be read; `null` otherwise. */
export function readWalk({ start, headingDegrees, runs }: RoomDraft['walk']): WallWalk | null {
  const read = keyedRuns(runs).map((run) => readRun(run, []))
  return read.every((run) => run !== null) ? { start, headingDegrees, runs: read } : null
}

function readPolygon(
  { start, headingDegrees, runs }: RoomDraft['walk'],
  problems: DraftProblem[],
): { shape: Shape | null; walk: WallWalk } {
  const read = keyedRuns(runs).map((run) => readRun(run, problems))
  const firstUnread = read.indexOf(null)
  const readable = (firstUnread === -1 ? read : read.slice(0, firstUnread)) as WallRun[]
  const walk = { start, headingDegrees, runs: readable }
  const corners: Corner[] = cornersFromWalk(walk)
  const isWhole = firstUnread === -1 && corners.length >= 3
  if (firstUnread === -1 && !isWhole) problems.push({ field: 'shape', message: 'A room needs at least three walls.', isEmpty: true })
  if (corners.length > ROOM_CORNERS_MAX) {
    problems.push(fault('shape', `A room has at most ${ROOM_CORNERS_MAX} corners here. Key it as two rooms.`))
    return { shape: null, walk }
  }
  return { shape: isWhole ? { kind: 'polygon', corners } : null, walk }
}

/** A row that waits at the end for the next wall is no wall yet. */
function keyedRuns(runs: readonly RunDraft[]): readonly RunDraft[] {
  const last = runs.findLastIndex(({ lengthText }) => lengthText.trim() !== '')
  return runs.slice(0, last + 1)
}

function readRun(run: RunDraft, problems: DraftProblem[]): WallRun | null {
  const lengthIn = keep(readLength(run.lengthText, `run-${run.id}-length`), problems)
  const turnDegrees = readTurn(run, problems)
  return lengthIn === null || turnDegrees === null ? null : { lengthIn, turnDegrees }
}

function readTurn({ id, turn, angleText }: RunDraft, problems: DraftProblem[]): number | null {
  if (turn === 'straight') return 0
  if (turn === 'right') return 90
  if (turn === 'left') return -90
  const text = angleText.replace('°', '').trim()
  if (text === '') return keep({ problem: { field: `run-${id}-angle`, message: 'is empty', isEmpty: true } }, problems)
  const degrees = /^\d+(?:[.,]\d+)?$/.test(text) ? Number(text.replace(',', '.')) : NaN
  const isTurn = degrees > 0 && degrees < 180
  if (!isTurn)
    return keep(
      { problem: fault(`run-${id}-angle`, `\`${angleText.trim()}\` is no turn. Write degrees between 0 and 180, as \`45\`.`) },
      problems,
    )
  return turn === 'right-by' ? degrees : -degrees
}

function readCeiling(draft: RoomDraft, problems: DraftProblem[]): Ceiling | null | undefined {
  if (draft.ceilingKind === 'none') return null
  if (draft.ceilingKind === 'flat') {
    const heightIn = keep(readLength(draft.heightText, 'height'), problems)
    return heightIn === null ? undefined : { kind: 'flat', heightIn }
  }
  const lowIn = keep(readLength(draft.lowText, 'low'), problems)
  const highIn = keep(readLength(draft.highText, 'high'), problems)
  return lowIn === null || highIn === null ? undefined : { kind: 'sloped', lowIn, highIn }
}

function readLength(text: string, field: string): Length {
  if (text.trim() === '') return { problem: { field, message: 'is empty', isEmpty: true } }
  const parsed = parseLength(text)
  return parsed.ok ? { inches: parsed.inches } : { problem: fault(field, parsed.message) }
}

function readCount(text: string, field: string, problems: DraftProblem[]): number | null {
  const count = /^\d+$/.test(text.trim()) ? Number(text) : NaN
  if (count >= 1 && count <= OPENING_COUNT_MAX) return count
  problems.push(fault(field, `\`${text.trim()}\` is no count. Write a whole number from 1 to ${OPENING_COUNT_MAX}.`))
  return null
}

function keep(length: Length, problems: DraftProblem[]): number | null {
  if ('inches' in length) return length.inches
  problems.push(length.problem)
  return null
}

function fault(field: string, message: string): DraftProblem {
  return { field, message, isEmpty: false }
}
