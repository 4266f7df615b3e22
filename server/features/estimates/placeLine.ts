import type { Database } from '../../db/client.ts'
import { positionAt, positionAtEnd, positionBelowIndex, positionBetween } from '../../db/positions.ts'
import { invalid } from '../../errors/AppError.ts'
import { findLastPosition, findLine, findLineIdsInOrder, findNextPosition, updatePosition } from './lineRepository.ts'

/** The position for a new line below another, or at the end (`null`). Where no gap is left the lines are spread anew. */
export function placeLine(db: Database, estimateId: string, afterLineId: string | null): number {
  if (afterLineId === null) return positionAtEnd(findLastPosition(db, estimateId))
  const above = findLine(db, estimateId, afterLineId)
  if (!above) throw invalid([{ path: 'afterLineId', code: 'unknown-line', message: 'is not a line of this estimate' }])
  const position = positionBetween(above.position, findNextPosition(db, estimateId, above.position))
  if (position !== null) return position
  const ids = findLineIdsInOrder(db, estimateId)
  ids.forEach((id, index) => updatePosition(db, id, positionAt(index)))
  return positionBelowIndex(ids.indexOf(afterLineId))
}
