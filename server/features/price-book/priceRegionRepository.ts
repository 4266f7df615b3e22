import { and, asc, eq, gt, isNull, lt, lte, or, sql } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { PriceRegion, Region } from '../../../shared/schemas/priceItem.ts'
import type { Queryable } from '../../db/client.ts'
import { priceRegions } from '../../db/schema/priceRegions.ts'

const columns = {
  key: priceRegions.key,
  name: priceRegions.name,
  materialsFactor: priceRegions.materialsFactor,
  laborFactor: priceRegions.laborFactor,
  salesTaxRule: priceRegions.salesTaxRule,
  salesTaxPercent: priceRegions.salesTaxPercent,
  rowVersion: priceRegions.rowVersion,
}

const ofDraft = alias(priceRegions, 'of_draft')

/** A later row of the same region that holds in the version: there is one in the draft alone, before it ends the older row. */
function laterRow(version: number) {
  return sql`select 1 from ${priceRegions} as ${sql.identifier('of_draft')} where ${ofDraft.key} = ${priceRegions.key}
    and ${ofDraft.fromVersion} = ${version} and ${priceRegions.fromVersion} < ${version}`
}

/** Regions of a version, the draft's as it stands. */
export function findRegions(db: Queryable, version: number, key?: string): PriceRegion[] {
  return db
    .select(columns)
    .from(priceRegions)
    .where(
      and(
        lte(priceRegions.fromVersion, version),
        or(isNull(priceRegions.untilVersion), gt(priceRegions.untilVersion, version)),
        key === undefined ? undefined : eq(priceRegions.key, key),
        sql`not exists (${laterRow(version)})`,
      ),
    )
    .orderBy(asc(priceRegions.id))
    .all()
}

export function findRegion(db: Queryable, version: number, key: string): PriceRegion | null {
  return findRegions(db, version, key)[0] ?? null
}

export function insertRegion(db: Queryable, fromVersion: number, region: Region, rowVersion: number): void {
  db.insert(priceRegions)
    .values({ ...region, fromVersion, rowVersion })
    .run()
}

/** Keeps a region's row in the draft: its own is changed, an older one stays and gets a successor. */
export function saveDraftRegion(db: Queryable, draftVersion: number, region: PriceRegion): void {
  const own = and(eq(priceRegions.key, region.key), eq(priceRegions.fromVersion, draftVersion))
  const { changes } = db.update(priceRegions).set(region).where(own).run()
  if (changes === 0) insertRegion(db, draftVersion, region, region.rowVersion)
}

export function deleteRegionsOfDraft(db: Queryable, draftVersion: number): void {
  db.delete(priceRegions).where(eq(priceRegions.fromVersion, draftVersion)).run()
}

/** Ends the rows that the draft replaces. */
export function endReplacedRegions(db: Queryable, draftVersion: number): void {
  db.update(priceRegions)
    .set({ untilVersion: draftVersion })
    .where(and(isNull(priceRegions.untilVersion), lt(priceRegions.fromVersion, draftVersion), sql`exists (${laterRow(draftVersion)})`))
    .run()
}
