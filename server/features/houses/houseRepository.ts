import { and, desc, eq, isNull, sql } from 'drizzle-orm'
import type { House, HouseSummary } from '../../../shared/schemas/house.ts'
import type { Queryable } from '../../db/client.ts'
import { estimates } from '../../db/schema/estimates.ts'
import { houses } from '../../db/schema/houses.ts'
import { houseShares } from '../../db/schema/houseShares.ts'

const columns = {
  id: houses.id,
  name: houses.name,
  address: houses.address,
  regionKey: houses.regionKey,
  yearBuilt: houses.yearBuilt,
  storeys: houses.storeys,
  kind: houses.kind,
  footprint: houses.footprint,
  wallHeightIn: houses.wallHeightIn,
  overhangIn: houses.overhangIn,
  roof: houses.roof,
  note: houses.note,
  version: houses.version,
  createdAt: houses.createdAt,
  updatedAt: houses.updatedAt,
}

/** A house that is not removed. */
export function findHouse(db: Queryable, id: string): House | null {
  return (
    db
      .select(columns)
      .from(houses)
      .where(and(eq(houses.id, id), isNull(houses.removedAt)))
      .get() ?? null
  )
}

/** A house, removed or not. */
export function findHouseEvenRemoved(db: Queryable, id: string): { house: House; removedAt: string | null } | null {
  const row = db.select({ house: columns, removedAt: houses.removedAt }).from(houses).where(eq(houses.id, id)).get()
  return row ?? null
}

/** Houses in the list, the one that was worked on last first: all, or those that are shared with one owner. */
export function findHouseSummaries(db: Queryable, sharedWithId: string | null): HouseSummary[] {
  const rows = db
    .select({
      id: houses.id,
      name: houses.name,
      address: houses.address,
      regionKey: houses.regionKey,
      yearBuilt: houses.yearBuilt,
      kind: houses.kind,
      estimateId: estimates.id,
      roomCount: sql<number>`(select count(*) from rooms r where r.house_id = ${houses.id} and r.removed_at is null)`,
      lineCount: sql<number>`(select count(*) from estimate_lines l where l.estimate_id = ${estimates.id} and l.removed_at is null)`,
      errorCount: estimates.errorCount,
      totals: estimates.totals,
      updatedAt: estimates.updatedAt,
    })
    .from(houses)
    .innerJoin(
      estimates,
      sql`${estimates.id} = (select w.id from estimates w where w.house_id = ${houses.id} order by w.created_at, w.id limit 1)`,
    )
    .where(and(isNull(houses.removedAt), sharedWithId === null ? undefined : isSharedHouse(sharedWithId)))
    .orderBy(desc(estimates.updatedAt), houses.name)
    .all()
  return rows.map(({ totals, ...house }) => ({ ...house, totalCents: totals.totalCents }))
}

function isSharedHouse(userId: string) {
  return sql`exists (select 1 from ${houseShares} where ${houseShares.houseId} = ${houses.id} and ${houseShares.userId} = ${userId})`
}

export function isSharedWith(db: Queryable, houseId: string, userId: string): boolean {
  const share = db
    .select({ houseId: houseShares.houseId })
    .from(houseShares)
    .where(and(eq(houseShares.houseId, houseId), eq(houseShares.userId, userId)))
    .get()
  return share !== undefined
}

export function insertHouse(db: Queryable, house: House): void {
  db.insert(houses).values(house).run()
}

export function updateHouse(db: Queryable, house: House): void {
  db.update(houses).set(house).where(eq(houses.id, house.id)).run()
}

/** Marks the house as removed, or takes the mark away (`null`). */
export function markHouseRemoved(db: Queryable, house: Pick<House, 'id' | 'version' | 'updatedAt'>, removedAt: string | null): void {
  db.update(houses).set({ removedAt, version: house.version, updatedAt: house.updatedAt }).where(eq(houses.id, house.id)).run()
}
