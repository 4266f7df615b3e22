import { and, asc, eq, gt, inArray, isNull, lte, or, sql } from 'drizzle-orm'
import type { WorkbookPriceItem } from '../../../shared/engine/index.ts'
import type { Queryable } from '../../db/client.ts'
import { estimateLines } from '../../db/schema/estimateLines.ts'
import { estimates } from '../../db/schema/estimates.ts'
import { houses } from '../../db/schema/houses.ts'
import { priceItems } from '../../db/schema/priceItems.ts'

/** What a workbook says around the figures of an estimate. */
export interface WorkbookHead {
  houseId: string
  houseName: string
  priceBookVersion: number
  regionKey: string
  /** When the estimate was last changed. */
  updatedAt: string
}

export function findWorkbookHead(db: Queryable, estimateId: string): WorkbookHead | null {
  const row = db
    .select({
      houseId: houses.id,
      houseName: houses.name,
      priceBookVersion: estimates.priceBookVersion,
      regionKey: estimates.regionKey,
      updatedAt: estimates.updatedAt,
    })
    .from(estimates)
    .innerJoin(houses, eq(houses.id, estimates.houseId))
    .where(and(eq(estimates.id, estimateId), isNull(houses.removedAt)))
    .get()
  return row ?? null
}

/** The items that an estimate's lines name, as its version of the book has them; the region's own row before the base row. */
export function findUsedItems(db: Queryable, estimateId: string, { priceBookVersion, regionKey }: WorkbookHead): WorkbookPriceItem[] {
  const usedKeys = db
    .selectDistinct({ key: sql<string>`${estimateLines.itemKey}`.as('key') })
    .from(estimateLines)
    .where(and(eq(estimateLines.estimateId, estimateId), isNull(estimateLines.removedAt)))
  const rows = db
    .select({
      key: priceItems.key,
      name: priceItems.name,
      unit: sql<string>`${priceItems.unit}`,
      priceDate: priceItems.priceDate,
    })
    .from(priceItems)
    .where(
      and(
        inArray(priceItems.key, usedKeys),
        or(isNull(priceItems.regionKey), eq(priceItems.regionKey, regionKey)),
        lte(priceItems.fromVersion, priceBookVersion),
        or(isNull(priceItems.untilVersion), gt(priceItems.untilVersion, priceBookVersion)),
      ),
    )
    // Base rows come first, so that a region's own row takes their place.
    .orderBy(asc(priceItems.regionKey))
    .all()
  return [...new Map(rows.map((row) => [row.key, row])).values()]
}
