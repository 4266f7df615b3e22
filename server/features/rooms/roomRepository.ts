import { and, asc, desc, eq, gt, isNull } from 'drizzle-orm'
import type { Room } from '../../../shared/schemas/room.ts'
import type { Queryable } from '../../db/client.ts'
import { rooms } from '../../db/schema/rooms.ts'

const columns = {
  id: rooms.id,
  houseId: rooms.houseId,
  name: rooms.name,
  use: rooms.use,
  shape: rooms.shape,
  ceiling: rooms.ceiling,
  openings: rooms.openings,
  deductions: rooms.deductions,
  note: rooms.note,
  position: rooms.position,
  version: rooms.version,
}

const isPresent = (houseId: string) => and(eq(rooms.houseId, houseId), isNull(rooms.removedAt))

/** The rooms of a house in their order. */
export function findRooms(db: Queryable, houseId: string): Room[] {
  return db.select(columns).from(rooms).where(isPresent(houseId)).orderBy(asc(rooms.position), asc(rooms.id)).all()
}

/** A room of the house that is not removed. */
export function findRoom(db: Queryable, houseId: string, id: string): Room | null {
  return (
    db
      .select(columns)
      .from(rooms)
      .where(and(isPresent(houseId), eq(rooms.id, id)))
      .get() ?? null
  )
}

/** A room, removed or not. */
export function findRoomEvenRemoved(db: Queryable, houseId: string, id: string): { room: Room; removedAt: string | null } | null {
  const row = db
    .select({ room: columns, removedAt: rooms.removedAt })
    .from(rooms)
    .where(and(eq(rooms.houseId, houseId), eq(rooms.id, id)))
    .get()
  return row ?? null
}

export function findLastRoomPosition(db: Queryable, houseId: string): number | null {
  const row = db.select({ position: rooms.position }).from(rooms).where(isPresent(houseId)).orderBy(desc(rooms.position)).limit(1).get()
  return row?.position ?? null
}

/** Position of the room below another. */
export function findNextRoomPosition(db: Queryable, houseId: string, after: number): number | null {
  const row = db
    .select({ position: rooms.position })
    .from(rooms)
    .where(and(isPresent(houseId), gt(rooms.position, after)))
    .orderBy(asc(rooms.position))
    .limit(1)
    .get()
  return row?.position ?? null
}

export function updateRoomPosition(db: Queryable, id: string, position: number): void {
  db.update(rooms).set({ position }).where(eq(rooms.id, id)).run()
}

export function insertRoom(db: Queryable, room: Room, at: string): void {
  db.insert(rooms)
    .values({ ...room, createdAt: at, updatedAt: at })
    .run()
}

export function updateRoom(db: Queryable, room: Room, at: string): void {
  db.update(rooms)
    .set({ ...room, updatedAt: at })
    .where(eq(rooms.id, room.id))
    .run()
}

/** Marks a room as removed, or takes the mark away (`null`). */
export function markRoomRemoved(db: Queryable, { id, version }: Pick<Room, 'id' | 'version'>, at: string, removedAt: string | null): void {
  db.update(rooms).set({ version, removedAt, updatedAt: at }).where(eq(rooms.id, id)).run()
}
