import type { FieldProblem } from '../../schemas/problem.ts'
import type { Corner, Shape } from '../../schemas/room.ts'
import { formatLength } from '../units/formatLength.ts'
import { cornerAfter, signedArea } from './planFigures.ts'
import { isSameCorner, shapeOutline } from './shapeOutline.ts'
import { wallsThatMeet } from './wallsThatMeet.ts'

/** What keeps a shape from being a plan, each with the path of the field in the shape: a cut as large as the room, walls that cross, corners in one place. Empty when it is one. */
export function checkShape(shape: Shape): FieldProblem[] {
  if (shape.kind === 'rectangle') return []
  if (shape.kind === 'polygon') return checkCorners(shapeOutline(shape))
  return [
    ...checkCut('cutLengthIn', 'length', shape.cutLengthIn, shape.lengthIn),
    ...checkCut('cutWidthIn', 'width', shape.cutWidthIn, shape.widthIn),
  ]
}

function checkCut(path: string, side: string, cutIn: number, wholeIn: number): FieldProblem[] {
  if (cutIn < wholeIn) return []
  const message = `The cut's ${side}, ${formatLength(cutIn)}, takes all of the room's ${side}, ${formatLength(wholeIn)}. Write less than that, or key a rectangle.`
  return [{ path, code: 'cut-too-large', message }]
}

function checkCorners(corners: Corner[]): FieldProblem[] {
  const repeated = corners.flatMap((corner, index) => (isSameCorner(corner, cornerAfter(corners, index)) ? [index] : []))
  if (repeated.length > 0) return repeated.map((index) => sameCorner(index, corners.length))
  // Corners all in one line fold back too; that they hold no floor says more.
  if (signedArea(corners) === 0 && corners.length === 3) return [noFloor()]
  const meeting = wallsThatMeet(corners)
  if (meeting.length > 0) return meeting.map(crossing)
  return signedArea(corners) === 0 ? [noFloor()] : []
}

function sameCorner(index: number, count: number): FieldProblem {
  const next = (index + 1) % count
  const message = `Corners ${index + 1} and ${next + 1} are in the same place. Leave one of them out.`
  return { path: `corners[${next}]`, code: 'same-corner', message }
}

function crossing([one, other]: [number, number]): FieldProblem {
  const message = `Wall ${one + 1} meets wall ${other + 1}. Key the corners in the order that one comes to them, walking round the room once.`
  return { path: `corners[${other}]`, code: 'walls-cross', message }
}

function noFloor(): FieldProblem {
  return {
    path: 'corners',
    code: 'no-area',
    message: 'The corners lie in one line and enclose no floor. Key the corners of the room in order.',
  }
}
