import { and, asc, eq, isNull, sql } from 'drizzle-orm'
import type { Estimate, Totals } from '../../../shared/schemas/estimate.ts'
import type { Database, Queryable } from '../../db/client.ts'
import { placeholders, prepared } from '../../db/prepared.ts'
import { estimates } from '../../db/schema/estimates.ts'
import { houses } from '../../db/schema/houses.ts'

/** What most writes need to know of an estimate: whose it is and which prices it is pinned to. */
export type EstimateHead = Pick<Estimate, 'id' | 'houseId' | 'version' | 'priceBookVersion' | 'regionKey'>

const headColumns = {
  id: estimates.id,
  houseId: estimates.houseId,
  version: estimates.version,
  priceBookVersion: estimates.priceBookVersion,
  regionKey: estimates.regionKey,
}

const columns = {
  ...headColumns,
  name: estimates.name,
  settings: estimates.settings,
  unknowns: estimates.unknowns,
  inspections: estimates.inspections,
  totals: estimates.totals,
  errorCount: estimates.errorCount,
}

const headQuery = prepared((db) =>
  db
    .select(headColumns)
    .from(estimates)
    .innerJoin(houses, eq(houses.id, estimates.houseId))
    .where(and(eq(estimates.id, sql.placeholder('id')), isNull(houses.removedAt)))
    .prepare(),
)

/** The head of an estimate whose house is not removed. */
export function findEstimateHead(db: Database, id: string): EstimateHead | null {
  return headQuery(db).get({ id }) ?? null
}

/** The working estimate of a house: its first. */
export function findWorkingEstimate(db: Queryable, houseId: string): Estimate | null {
  return (
    db
      .select(columns)
      .from(estimates)
      .where(eq(estimates.houseId, houseId))
      .orderBy(asc(estimates.createdAt), asc(estimates.id))
      .limit(1)
      .get() ?? null
  )
}

export function findEstimate(db: Queryable, id: string): Estimate | null {
  return db.select(columns).from(estimates).where(eq(estimates.id, id)).get() ?? null
}

export function insertEstimate(db: Queryable, estimate: Estimate, at: string): void {
  db.insert(estimates)
    .values({ ...estimate, createdAt: at, updatedAt: at })
    .run()
}

/** Keeps what a person or the price book set of an estimate. Version and totals follow by `updateTotals`. */
export function updateEstimateFields(db: Queryable, id: string, fields: Partial<Pick<Estimate, 'name' | 'settings' | 'regionKey'>>): void {
  db.update(estimates).set(fields).where(eq(estimates.id, id)).run()
}

const totalsQuery = prepared((db) =>
  db
    .update(estimates)
    .set(placeholders(['version', 'totals', 'errorCount', 'updatedAt']))
    .where(eq(estimates.id, sql.placeholder('id')))
    .prepare(),
)

/** Keeps the engine's answer, with the version that it is of. */
export function updateTotals(
  db: Database,
  id: string,
  kept: { version: number; totals: Totals; errorCount: number; updatedAt: string },
): void {
  totalsQuery(db).run({ ...kept, id, totals: JSON.stringify(kept.totals) })
}
