import { desc, eq, sql } from 'drizzle-orm'
import type { PriceBookVersion } from '../../../shared/schemas/priceItem.ts'
import type { Queryable } from '../../db/client.ts'
import { priceBookVersions } from '../../db/schema/priceBookVersions.ts'

/** How many items a version holds: the draft's drop marks are no items, and an item that it changes counts once. */
const itemCount = sql<number>`(
  select count(distinct i.key) from price_items i
  where i.region_key is null and i.from_version <= price_book_versions.version
    and (i.until_version is null or i.until_version > price_book_versions.version)
    and not exists (select 1 from price_items d where d.key = i.key and d.region_key is null
      and d.from_version = price_book_versions.version and d.is_dropped = 1)
)`

/** Rows that a version adds, changes or drops. */
const changeCount = sql<number>`(
  (select count(*) from price_items i where i.from_version = price_book_versions.version)
  + (select count(*) from price_items i where i.until_version = price_book_versions.version
      and not exists (select 1 from price_items s where s.key = i.key and s.region_key is i.region_key
        and s.from_version = price_book_versions.version))
  + (select count(*) from price_regions r where r.from_version = price_book_versions.version)
)`

const columns = {
  version: priceBookVersions.version,
  status: priceBookVersions.status,
  note: priceBookVersions.note,
  effectiveDate: priceBookVersions.effectiveDate,
  publishedAt: priceBookVersions.publishedAt,
  publishedBy: priceBookVersions.publishedBy,
  itemCount,
  changeCount,
}

/** All versions, newest first. */
export function findVersions(db: Queryable): PriceBookVersion[] {
  return db.select(columns).from(priceBookVersions).orderBy(desc(priceBookVersions.version)).all()
}

export function findVersion(db: Queryable, version: number): PriceBookVersion | null {
  return db.select(columns).from(priceBookVersions).where(eq(priceBookVersions.version, version)).get() ?? null
}

/** What stands of a version without counting its rows. */
export function findVersionHead(db: Queryable, version: number) {
  return db.select().from(priceBookVersions).where(eq(priceBookVersions.version, version)).get() ?? null
}

export function findDraftVersion(db: Queryable): number | null {
  const row = db.select({ version: priceBookVersions.version }).from(priceBookVersions).where(eq(priceBookVersions.status, 'draft')).get()
  return row?.version ?? null
}

export function findNewestVersion(db: Queryable, status: 'published' | 'any'): number | null {
  const row = db
    .select({ newest: sql<number | null>`max(${priceBookVersions.version})` })
    .from(priceBookVersions)
    .where(status === 'any' ? undefined : eq(priceBookVersions.status, status))
    .get()
  return row?.newest ?? null
}

export function insertDraft(db: Queryable, version: number, at: string): void {
  db.insert(priceBookVersions).values({ version, status: 'draft', note: '', createdAt: at }).run()
}

export function deleteVersion(db: Queryable, version: number): void {
  db.delete(priceBookVersions).where(eq(priceBookVersions.version, version)).run()
}

export function markPublished(
  db: Queryable,
  version: number,
  published: { note: string; effectiveDate: string; publishedAt: string; publishedBy: string },
): void {
  db.update(priceBookVersions)
    .set({ ...published, status: 'published' })
    .where(eq(priceBookVersions.version, version))
    .run()
}
