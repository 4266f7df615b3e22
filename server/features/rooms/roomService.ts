import { checkShape, toRoomInput, type LiveEstimate } from '../../../shared/engine/index.ts'
import type { CurrentUser } from '../../../shared/schemas/account.ts'
import type { NewRoom, RemovedRoom, Room, RoomPatch } from '../../../shared/schemas/room.ts'
import type { Clock } from '../../config/clock.ts'
import { inWriteTransaction, type Database, type Queryable, type Transaction } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { positionAt } from '../../db/positions.ts'
import { recordAudit } from '../../db/recordAudit.ts'
import { conflict, invalid, notFound, stale } from '../../errors/AppError.ts'
import type { EstimateKeeper } from '../estimates/estimateKeeper.ts'
import { findWorkingEstimate } from '../estimates/estimateRepository.ts'
import { removeLinesOfRoom, restoreLinesOfRoom } from '../estimates/lineRepository.ts'
import { openHouse } from '../houses/houseAccess.ts'
import { checkOrder } from './checkOrder.ts'
import { placeRoom } from './placeRoom.ts'
import * as repository from './roomRepository.ts'

export type RoomService = ReturnType<typeof createRoomService>

/** The rooms of a house. A change of one is a change of every line that is measured by it, so the estimate's totals follow. */
export function createRoomService({ db, clock, keeper }: { db: Database; clock: Clock; keeper: EstimateKeeper }) {
  function refresh(tx: Transaction, houseId: string, change?: (live: LiveEstimate) => void): void {
    const estimate = findWorkingEstimate(tx, houseId)
    if (estimate) keeper.refresh(estimate, change)
  }

  function audit(tx: Queryable, user: CurrentUser, id: string, action: string, before: unknown, after: unknown): void {
    recordAudit(tx, { actorId: user.id, what: 'room', id, action, before, after, at: clock() })
  }

  return {
    list(user: CurrentUser, houseId: string): Room[] {
      openHouse(db, user, houseId)
      return repository.findRooms(db, houseId)
    },

    add(user: CurrentUser, houseId: string, { afterRoomId, ...fields }: NewRoom): Room {
      checkRoomShape(fields)
      return inWriteTransaction(db, (tx) => {
        openHouse(tx, user, houseId)
        const position = placeRoom(tx, houseId, afterRoomId ?? null)
        const room: Room = { ...fields, id: newId(), houseId, position, version: 1 }
        repository.insertRoom(tx, room, clock().toISOString())
        refresh(tx, houseId, (live) => live.addRoom(toRoomInput(room)))
        audit(tx, user, room.id, 'add', null, room)
        return room
      })
    },

    /** Changes a room. Throws 412 with the room as it stands when somebody was quicker. */
    update(user: CurrentUser, houseId: string, roomId: string, patch: RoomPatch, ifMatch: number): Room {
      checkRoomShape(patch)
      return inWriteTransaction(db, (tx) => {
        const before = roomOf(tx, user, houseId, roomId)
        if (before.version !== ifMatch) throw stale(before)
        const after: Room = { ...before, ...patch, version: before.version + 1 }
        repository.updateRoom(tx, after, clock().toISOString())
        refresh(tx, houseId, (live) => live.setRoom(roomId, toRoomInput(after)))
        audit(tx, user, roomId, 'update', before, after)
        return after
      })
    },

    /** Marks a room and the lines that are measured by it as removed; `restore` brings all of them back. */
    remove(user: CurrentUser, houseId: string, roomId: string, ifMatch: number): RemovedRoom {
      return inWriteTransaction(db, (tx) => {
        const before = roomOf(tx, user, houseId, roomId)
        if (before.version !== ifMatch) throw stale(before)
        const room: Room = { ...before, version: before.version + 1 }
        const at = clock().toISOString()
        repository.markRoomRemoved(tx, room, at, at)
        const removedLineIds = removeLinesOfRoom(tx, roomId, at)
        refresh(tx, houseId)
        audit(tx, user, roomId, 'remove', { room: before, lineIds: removedLineIds }, null)
        return { room, removedLineIds }
      })
    },

    restore(user: CurrentUser, houseId: string, roomId: string): Room {
      return inWriteTransaction(db, (tx) => {
        openHouse(tx, user, houseId)
        const found = repository.findRoomEvenRemoved(tx, houseId, roomId)
        if (!found) throw notFound('room')
        if (found.removedAt === null) throw conflict('not-removed', 'The room was not removed, or somebody has restored it already.')
        const room: Room = { ...found.room, version: found.room.version + 1 }
        const at = clock().toISOString()
        repository.markRoomRemoved(tx, room, at, null)
        const lineIds = restoreLinesOfRoom(tx, roomId, at)
        refresh(tx, houseId)
        audit(tx, user, roomId, 'restore', null, { room, lineIds })
        return room
      })
    },

    /** Puts the rooms in another order and gives them in it. */
    order(user: CurrentUser, houseId: string, ids: readonly string[]): Room[] {
      return inWriteTransaction(db, (tx) => {
        openHouse(tx, user, houseId)
        const before = repository.findRooms(tx, houseId).map(({ id }) => id)
        checkOrder(before, ids, 'rooms')
        ids.forEach((id, index) => repository.updateRoomPosition(tx, id, positionAt(index)))
        refresh(tx, houseId, () => {})
        recordAudit(tx, { actorId: user.id, what: 'house', id: houseId, action: 'order-rooms', before, after: ids, at: clock() })
        return repository.findRooms(tx, houseId)
      })
    },
  }
}

function roomOf(tx: Queryable, user: CurrentUser, houseId: string, roomId: string): Room {
  openHouse(tx, user, houseId)
  const room = repository.findRoom(tx, houseId, roomId)
  if (!room) throw notFound('room')
  return room
}

/** An outline that no room can have, walls that cross for instance, is refused at its place. */
function checkRoomShape({ shape }: RoomPatch): void {
  const problems = shape ? checkShape(shape) : []
  if (problems.length > 0)
    throw invalid(problems.map((problem) => ({ ...problem, path: problem.path === '' ? 'shape' : `shape.${problem.path}` })))
}
