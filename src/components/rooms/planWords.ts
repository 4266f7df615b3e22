import { formatLength } from '../../../shared/engine/units/formatLength.ts'
import type { Corner, Deduction, Opening } from '../../../shared/schemas/room.ts'
import { DEDUCTION_TITLES, OPENING_TITLES } from './commonSizes.ts'
import { drawnLength } from './drawnLength.ts'
import { wallCrossings } from './wallCrossings.ts'
import { walkFromCorners } from './wallRuns.ts'

interface PlanInWords {
  name: string
  corners: readonly Corner[]
  /** The last wall is drawn to close the plan and hasn't been keyed. */
  isOpen: boolean
  openings: readonly Opening[]
  deductions: readonly Deduction[]
  /** Pieces that fit on no wall. */
  unplacedCount: number
}

/** The plan for who can't see it: its walls in order with their turns, where walls cross, and what stands in them. */
export function planWords({ name, corners, isOpen, openings, deductions, unplacedCount }: PlanInWords): string {
  const runs = walkFromCorners(corners).runs
  const walls = runs.map(({ lengthIn, turnDegrees }, index) => {
    const isLast = index === runs.length - 1
    const length = `wall ${index + 1} ${drawnLength(lengthIn)}`
    if (isLast) return isOpen ? `${length}, not keyed, drawn to close the plan` : `${length}, back to the first corner`
    return `${length}, ${turnWords(turnDegrees)}`
  })
  const crossings = wallCrossings(corners).map(({ walls: [one, other] }) => `Wall ${one} crosses wall ${other}.`)
  const pieces = [
    ...openings.map(({ kind, widthIn, heightIn, count }) => pieceWords(OPENING_TITLES[kind], widthIn, heightIn, count)),
    ...deductions.map(({ kind, widthIn, heightIn, count }) => pieceWords(DEDUCTION_TITLES[kind], widthIn, heightIn, count)),
  ]
  return [
    `Plan of ${name || 'the room'}, ${corners.length} walls: ${walls.join('; ')}.`,
    ...crossings,
    pieces.length > 0 ? `In the walls: ${pieces.join('; ')}.` : 'No openings keyed.',
    ...(unplacedCount > 0
      ? [`${unplacedCount} of these ${unplacedCount === 1 ? 'is' : 'are'} wider than the wall that is left, and not drawn.`]
      : []),
  ].join(' ')
}

function turnWords(degrees: number): string {
  const size = Math.round(Math.abs(degrees) * 10) / 10
  if (size === 0) return 'straight on'
  const side = degrees > 0 ? 'right' : 'left'
  return size === 90 ? `turn ${side}` : `turn ${side} by ${size}°`
}

function pieceWords(title: string, widthIn: number, heightIn: number, count: number): string {
  const times = count > 1 ? `${count} × ` : ''
  return `${times}${title.toLowerCase()} ${formatLength(widthIn)} wide, ${formatLength(heightIn)} high`
}
