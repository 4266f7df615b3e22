import { toLineInput, type LiveEstimate } from '../../../shared/engine/index.ts'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import { LINES_MAX, type Line, type LinePatch, type NewLine, type OrderedLines, type SavedLine } from '../../../shared/schemas/estimate.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Queryable, type Transaction } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { positionAt } from '../../db/positions.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, invalid, notFound, stale } from '../../errors/AppError.ts'
import { findRoom } from '../rooms/roomRepository.ts'
import { checkOrder } from '../rooms/checkOrder.ts'
import { checkedLine } from './checkLine.ts'
import type { EstimateKeeper } from './estimateKeeper.ts'
import type { EstimateHead } from './estimateRepository.ts'
import type { LineMaker } from './lineMaker.ts'
import { placeLine } from './placeLine.ts'
import * as repository from './lineRepository.ts'
import { openEstimateHead } from './openEstimateHead.ts'

interface LineParts {
  db: Database
  clock: Clock
  keeper: EstimateKeeper
  maker: LineMaker
}

export type LineService = ReturnType<typeof createLineService>

/** The lines of an estimate. Each write keeps the totals that follow from it and answers with them. */
export function createLineService({ db, clock, keeper, maker }: LineParts) {
  interface LineChange {
    action: string
    before: Line | null
    after: Line | null
    change?: (live: LiveEstimate) => void
  }

  /** Ends every write: totals, version and the audit row, in the write's transaction. */
  function finish(tx: Transaction, user: CurrentUser, head: EstimateHead, { action, before, after, change }: LineChange) {
    const kept = keeper.refresh(head, change)
    const id = (after ?? before)?.id ?? head.id
    recordAudit(tx, { actorId: user.id, what: 'line', id, action, before, after, at: clock() })
    return kept
  }

  return {
    /** Adds a line. What is left out comes along with its item. */
    add(user: CurrentUser, estimateId: string, { afterLineId, ...fields }: NewLine): SavedLine {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, estimateId)
        const isFull = repository.countLines(tx, estimateId) >= LINES_MAX
        if (isFull) throw conflict('too-many-lines', `An estimate holds at most ${LINES_MAX.toLocaleString('en-US')} lines.`)
        checkRoom(tx, head, fields.roomId)
        const position = placeLine(db, estimateId, afterLineId ?? null)
        const made = checkedLine(maker.make(tx, head, fields))
        const line: Line = { ...made, id: newId(), estimateId, position, version: 1 }
        repository.insertLine(db, line, clock().toISOString())
        const kept = finish(tx, user, head, { action: 'add', before: null, after: line, change: (live) => live.addLine(toLineInput(line)) })
        return { line, ...kept }
      })
    },

    /** Changes a line. Another item fills it anew. Throws 412 with the line as it stands when somebody was quicker. */
    update(user: CurrentUser, estimateId: string, lineId: string, patch: LinePatch, ifMatch: number): SavedLine {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, estimateId)
        const before = lineOf(db, estimateId, lineId)
        if (before.version !== ifMatch) throw stale(before)
        if (patch.roomId !== undefined && patch.roomId !== before.roomId) checkRoom(tx, head, patch.roomId)
        const line = checkedLine({ ...maker.change(tx, head, before, patch), version: before.version + 1 }, before)
        repository.updateLine(db, line, clock().toISOString())
        const kept = finish(tx, user, head, {
          action: 'update',
          before,
          after: line,
          change: (live) => live.setLine(lineId, toLineInput(line)),
        })
        return { line, ...kept }
      })
    },

    /** Marks a line as removed; `restore` takes the mark away. */
    remove(user: CurrentUser, estimateId: string, lineId: string, ifMatch: number): SavedLine {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, estimateId)
        const before = lineOf(db, estimateId, lineId)
        if (before.version !== ifMatch) throw stale(before)
        const line = { ...before, version: before.version + 1 }
        const at = clock().toISOString()
        repository.markLineRemoved(tx, line, at, at)
        const kept = finish(tx, user, head, { action: 'remove', before, after: null, change: (live) => live.removeLine(lineId) })
        return { line, ...kept }
      })
    },

    /** Brings a removed line back where it stood. */
    restore(user: CurrentUser, estimateId: string, lineId: string): SavedLine {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, estimateId)
        const found = repository.findLineEvenRemoved(db, estimateId, lineId)
        if (!found) throw notFound('line')
        if (found.removedAt === null) throw conflict('not-removed', 'The line was not removed, or somebody has restored it already.')
        const hasLostRoom = found.line.roomId !== null && findRoom(tx, head.houseId, found.line.roomId) === null
        if (hasLostRoom) throw conflict('room-removed', 'The room of this line was removed. Restore the room first.')
        const line = { ...found.line, version: found.line.version + 1 }
        repository.markLineRemoved(tx, line, clock().toISOString(), null)
        const kept = finish(tx, user, head, {
          action: 'restore',
          before: null,
          after: line,
          change: (live) => live.addLine(toLineInput(line)),
        })
        return { line, ...kept }
      })
    },

    /** Puts the lines in another order; the figures stay. */
    order(user: CurrentUser, estimateId: string, ids: readonly string[]): OrderedLines {
      return inWriteTransaction(db, (tx) => {
        const head = openEstimateHead(db, user, estimateId)
        const before = repository.findLineIdsInOrder(tx, estimateId)
        checkOrder(before, ids, 'lines')
        const lines = ids.map((id, index) => ({ id, position: positionAt(index) }))
        for (const { id, position } of lines) repository.updatePosition(tx, id, position)
        const kept = keeper.refresh(head, () => {})
        recordAudit(tx, { actorId: user.id, what: 'estimate', id: estimateId, action: 'order-lines', before, after: ids, at: clock() })
        return { lines, ...kept }
      })
    },
  }
}

function lineOf(db: Database, estimateId: string, lineId: string): Line {
  const line = repository.findLine(db, estimateId, lineId)
  if (!line) throw notFound('line')
  return line
}

function checkRoom(tx: Queryable, head: EstimateHead, roomId: string | null): void {
  const isUnknown = roomId !== null && findRoom(tx, head.houseId, roomId) === null
  if (isUnknown) throw invalid([{ path: 'roomId', code: 'unknown-room', message: 'is not a room of this house' }])
}
