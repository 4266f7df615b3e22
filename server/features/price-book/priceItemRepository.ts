import { and, asc, eq, gt, isNull, lt, lte, or, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { SystemKey } from '../../../shared/catalogue/houseSystems.ts'
import type { PriceItem } from '../../../shared/schemas/priceItem.ts'
import type { Queryable } from '../../db/client.ts'
import { priceItems } from '../../db/schema/priceItems.ts'
import { itemOfRow } from './priceItemRow.ts'

/** A version of the book to read, and whether it is the draft. */
export interface BookVersion {
  version: number
  isDraft: boolean
}

export interface ItemFilter {
  /** `null`: the base rows. */
  regionKey: string | null
  key?: string | undefined
  system?: SystemKey | undefined
  /** Beginnings of words, all of which must be met; best matches first then. */
  words?: readonly string[] | undefined
  limit?: number | undefined
}

/** Items of one version: a range of `from_version` in the index, and for the draft what it puts in place of older rows. */
export function findItems(db: Queryable, book: BookVersion, filter: ItemFilter): PriceItem[] {
  const { words, limit } = filter
  const isSearch = words !== undefined && words.length > 0
  const items = db.select({ row: priceItems }).from(priceItems).$dynamic()
  const query = isSearch
    ? items
        .innerJoin(sql`price_items_search`, sql`price_items_search.rowid = ${priceItems.id}`)
        .where(and(isInVersion(book, filter), sql`price_items_search match ${matchOf(words)}`))
        .orderBy(sql`price_items_search.rank`)
    : items.where(isInVersion(book, filter)).orderBy(asc(priceItems.name), asc(priceItems.key))
  const found = limit === undefined ? query.all() : query.limit(limit).all()
  return found.map(({ row }) => itemOfRow(row))
}

export function findItem(db: Queryable, book: BookVersion, regionKey: string | null, key: string): PriceItem | null {
  return findItems(db, book, { regionKey, key })[0] ?? null
}

function isInVersion({ version, isDraft }: BookVersion, { regionKey, key, system }: ItemFilter): SQL | undefined {
  return and(
    regionKey === null ? isNull(priceItems.regionKey) : eq(priceItems.regionKey, regionKey),
    lte(priceItems.fromVersion, version),
    or(isNull(priceItems.untilVersion), gt(priceItems.untilVersion, version)),
    key === undefined ? undefined : eq(priceItems.key, key),
    system === undefined ? undefined : eq(priceItems.system, system),
    isDraft ? and(eq(priceItems.isDropped, false), isNotReplacedIn(version)) : undefined,
  )
}

const ofDraft = alias(priceItems, 'of_draft')

/** The draft's own row for the item that an outer query is at. */
function rowOfDraft(draftVersion: number): SQL {
  return sql`select 1 from ${priceItems} as ${sql.identifier('of_draft')} where ${ofDraft.key} = ${priceItems.key}
    and ${ofDraft.regionKey} is ${priceItems.regionKey} and ${ofDraft.fromVersion} = ${draftVersion}`
}

/** Rows older than the draft count while the draft has none of its own for the same item. */
function isNotReplacedIn(draftVersion: number): SQL {
  return sql`(${priceItems.fromVersion} = ${draftVersion} or not exists (${rowOfDraft(draftVersion)}))`
}

/** Words in the search's own notation: each a beginning, all of them wanted. They hold letters and digits alone. */
function matchOf(words: readonly string[]): string {
  return words.map((word) => `"${word}"*`).join(' ')
}

/** The row that holds in the draft for one item, with how it came there; `null` when the draft has none. */
export function findDraftRow(db: Queryable, draftVersion: number, regionKey: string | null, key: string) {
  const rows = db
    .select()
    .from(priceItems)
    .where(and(isSame(regionKey, key), lte(priceItems.fromVersion, draftVersion), isNull(priceItems.untilVersion)))
    .all()
  const own = rows.find((row) => row.fromVersion === draftVersion) ?? null
  const older = rows.find((row) => row.fromVersion < draftVersion) ?? null
  return { own, older }
}

function isSame(regionKey: string | null, key: string): SQL | undefined {
  return and(eq(priceItems.key, key), regionKey === null ? isNull(priceItems.regionKey) : eq(priceItems.regionKey, regionKey))
}

/** Regions that have a row of their own for the item in the draft. */
export function findRegionsOfItem(db: Queryable, draftVersion: number, key: string): string[] {
  const rows = db
    .selectDistinct({ regionKey: priceItems.regionKey })
    .from(priceItems)
    .where(and(eq(priceItems.key, key), lte(priceItems.fromVersion, draftVersion), isNull(priceItems.untilVersion)))
    .all()
  return rows.flatMap(({ regionKey }) => (regionKey === null ? [] : [regionKey]))
}

export function insertItemRow(db: Queryable, row: typeof priceItems.$inferInsert): void {
  db.insert(priceItems).values(row).run()
}

export function updateItemRow(db: Queryable, id: number, columns: Partial<typeof priceItems.$inferInsert>): void {
  db.update(priceItems).set(columns).where(eq(priceItems.id, id)).run()
}

export function deleteItemRow(db: Queryable, id: number): void {
  db.delete(priceItems).where(eq(priceItems.id, id)).run()
}

export function deleteItemsOfDraft(db: Queryable, draftVersion: number): void {
  db.delete(priceItems).where(eq(priceItems.fromVersion, draftVersion)).run()
}

/** Ends the rows that the draft replaces or drops, and clears its drop marks away. */
export function endReplacedItems(db: Queryable, draftVersion: number): void {
  db.update(priceItems)
    .set({ untilVersion: draftVersion })
    .where(and(isNull(priceItems.untilVersion), lt(priceItems.fromVersion, draftVersion), sql`exists (${rowOfDraft(draftVersion)})`))
    .run()
  db.delete(priceItems)
    .where(and(eq(priceItems.fromVersion, draftVersion), eq(priceItems.isDropped, true)))
    .run()
}
