import { and, asc, desc, eq, gt, isNull, sql } from 'drizzle-orm'
import type { Line } from '../../../shared/schemas/estimate.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { placeholders, prepared } from '../../db/prepared.ts'
import { estimateLines } from '../../db/schema/estimateLines.ts'

type LineRow = typeof estimateLines.$inferSelect

/** A line of the estimate that is not removed. */
export function findLine(db: Database, estimateId: string, id: string): Line | null {
  const row = findRow(db, estimateId, id)
  return row && row.removedAt === null ? lineOfRow(row) : null
}

/** A line, removed or not. */
export function findLineEvenRemoved(db: Database, estimateId: string, id: string): { line: Line; removedAt: string | null } | null {
  const row = findRow(db, estimateId, id)
  return row ? { line: lineOfRow(row), removedAt: row.removedAt } : null
}

const rowQuery = prepared((db) =>
  db
    .select()
    .from(estimateLines)
    .where(and(eq(estimateLines.id, sql.placeholder('id')), eq(estimateLines.estimateId, sql.placeholder('estimateId'))))
    .prepare(),
)

function findRow(db: Database, estimateId: string, id: string): LineRow | null {
  return rowQuery(db).get({ id, estimateId }) ?? null
}

const isPresent = (estimateId: string) => and(eq(estimateLines.estimateId, estimateId), isNull(estimateLines.removedAt))

/** The lines of an estimate in their order. */
export function findLines(db: Queryable, estimateId: string): Line[] {
  return db
    .select()
    .from(estimateLines)
    .where(isPresent(estimateId))
    .orderBy(asc(estimateLines.position), asc(estimateLines.id))
    .all()
    .map(lineOfRow)
}

export function findLineIdsInOrder(db: Queryable, estimateId: string): string[] {
  return db
    .select({ id: estimateLines.id })
    .from(estimateLines)
    .where(isPresent(estimateId))
    .orderBy(asc(estimateLines.position), asc(estimateLines.id))
    .all()
    .map(({ id }) => id)
}

export function countLines(db: Queryable, estimateId: string): number {
  const row = db
    .select({ count: sql<number>`count(*)` })
    .from(estimateLines)
    .where(isPresent(estimateId))
    .get()
  return row?.count ?? 0
}

export function findLastPosition(db: Queryable, estimateId: string): number | null {
  const row = db
    .select({ position: estimateLines.position })
    .from(estimateLines)
    .where(isPresent(estimateId))
    .orderBy(desc(estimateLines.position))
    .limit(1)
    .get()
  return row?.position ?? null
}

/** Position of the line below another. */
export function findNextPosition(db: Queryable, estimateId: string, after: number): number | null {
  const row = db
    .select({ position: estimateLines.position })
    .from(estimateLines)
    .where(and(isPresent(estimateId), gt(estimateLines.position, after)))
    .orderBy(asc(estimateLines.position))
    .limit(1)
    .get()
  return row?.position ?? null
}

export function updatePosition(db: Queryable, id: string, position: number): void {
  db.update(estimateLines).set({ position }).where(eq(estimateLines.id, id)).run()
}

const KEPT_COLUMNS = [
  'roomId',
  'itemKey',
  'system',
  'trade',
  'description',
  'unit',
  'quantity',
  'wastePercent',
  'packageSize',
  'basis',
  'override',
  'minimumChargeCents',
  'hoursPerUnit',
  'evidence',
  'note',
  'bookMaterials',
  'bookInstalled',
  'position',
  'version',
  'updatedAt',
] as const satisfies (keyof LineRow)[]

const ADDED_COLUMNS = ['id', 'estimateId', 'createdAt'] as const satisfies (keyof LineRow)[]

const updateQuery = prepared((db) =>
  db
    .update(estimateLines)
    .set(placeholders(KEPT_COLUMNS))
    .where(eq(estimateLines.id, sql.placeholder('id')))
    .prepare(),
)

const insertQuery = prepared((db) =>
  db
    .insert(estimateLines)
    .values(placeholders([...KEPT_COLUMNS, ...ADDED_COLUMNS]))
    .prepare(),
)

export function insertLine(db: Database, line: Line, at: string): void {
  insertQuery(db).run({ ...boundLine(line), createdAt: at, updatedAt: at })
}

export function updateLine(db: Database, line: Line, at: string): void {
  updateQuery(db).run({ ...boundLine(line), updatedAt: at })
}

/** What the placeholders are filled with: a bare one knows nothing of its column's JSON mode. */
function boundLine(line: Line) {
  const { override, bookMaterials, bookInstalled, ...plain } = rowOfLine(line)
  return { ...plain, override: jsonOrNull(override), bookMaterials: jsonOrNull(bookMaterials), bookInstalled: jsonOrNull(bookInstalled) }
}

function jsonOrNull(value: object | null): string | null {
  return value && JSON.stringify(value)
}

/** Marks a line as removed, or takes the mark away (`null`). */
export function markLineRemoved(db: Queryable, line: Pick<Line, 'id' | 'version'>, at: string, removedAt: string | null): void {
  db.update(estimateLines)
    .set({ version: line.version, removedAt, removedWithRoomId: null, updatedAt: at })
    .where(eq(estimateLines.id, line.id))
    .run()
}

/** Marks the lines of a room as removed with it and gives their ids. */
export function removeLinesOfRoom(db: Queryable, roomId: string, at: string): string[] {
  return db
    .update(estimateLines)
    .set({ removedAt: at, removedWithRoomId: roomId, updatedAt: at, version: sql`${estimateLines.version} + 1` })
    .where(and(eq(estimateLines.roomId, roomId), isNull(estimateLines.removedAt)))
    .returning({ id: estimateLines.id })
    .all()
    .map(({ id }) => id)
}

/** Brings back the lines that were removed with a room, and no other. */
export function restoreLinesOfRoom(db: Queryable, roomId: string, at: string): string[] {
  return db
    .update(estimateLines)
    .set({ removedAt: null, removedWithRoomId: null, updatedAt: at, version: sql`${estimateLines.version} + 1` })
    .where(and(eq(estimateLines.roomId, roomId), eq(estimateLines.removedWithRoomId, roomId)))
    .returning({ id: estimateLines.id })
    .all()
    .map(({ id }) => id)
}

function lineOfRow(row: LineRow): Line {
  const { bookMaterials, bookInstalled, createdAt: _c, updatedAt: _u, removedAt: _r, removedWithRoomId: _w, ...line } = row
  return { ...line, book: { materials: bookMaterials, installed: bookInstalled } }
}

function rowOfLine({ book, ...line }: Line): Omit<LineRow, 'createdAt' | 'updatedAt' | 'removedAt' | 'removedWithRoomId'> {
  return { ...line, bookMaterials: book.materials, bookInstalled: book.installed }
}
