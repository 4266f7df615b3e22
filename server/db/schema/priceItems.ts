import { sql } from 'drizzle-orm'
import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { SYSTEM_KEYS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADE_KEYS } from '../../../shared/catalogue/trades.ts'
import { UNIT_KEYS } from '../../../shared/catalogue/units.ts'
import { priceBookVersions } from './priceBookVersions.ts'

/**
 * A price item through the versions: each row holds from one version until another. A published row never changes, triggers see to that;
 * all that may still happen to it is an end. A draft's rows stand beside the published ones until it is published.
 */
export const priceItems = sqliteTable(
  'price_items',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    key: text('key').notNull(),
    /** `null`: the base row, which the factors of a region apply to; else the region's own prices, taken as they stand. */
    regionKey: text('region_key'),
    fromVersion: integer('from_version')
      .notNull()
      .references(() => priceBookVersions.version, { onDelete: 'restrict' }),
    /** First version without the row; `null` while it has no end. */
    untilVersion: integer('until_version'),
    /** A draft's mark that the item ends with it. Gone once the draft is published. */
    isDropped: integer('is_dropped', { mode: 'boolean' }).notNull().default(false),
    rowVersion: integer('row_version').notNull(),
    name: text('name').notNull(),
    system: text('system', { enum: SYSTEM_KEYS }).notNull(),
    trade: text('trade', { enum: TRADE_KEYS }).notNull(),
    unit: text('unit', { enum: UNIT_KEYS }).notNull(),
    uniformat: text('uniformat').notNull(),
    materialsLowE4: integer('materials_low_e4'),
    materialsLikelyE4: integer('materials_likely_e4'),
    materialsHighE4: integer('materials_high_e4'),
    installedLowE4: integer('installed_low_e4'),
    installedLikelyE4: integer('installed_likely_e4'),
    installedHighE4: integer('installed_high_e4'),
    laborSharePercent: real('labor_share_percent').notNull(),
    wastePercent: real('waste_percent').notNull(),
    packageSize: real('package_size'),
    packageName: text('package_name').notNull(),
    minimumChargeCents: integer('minimum_charge_cents').notNull(),
    hoursPerUnit: real('hours_per_unit').notNull(),
    roomFormula: text('room_formula'),
    houseFormula: text('house_formula'),
    priceDate: text('price_date').notNull(),
    note: text('note').notNull(),
    /** What the search reads besides the name: key, system and trade in words, note. */
    searchWords: text('search_words').notNull(),
  },
  (table) => [
    // The rows of a version: one range of from_version, the end read from the index.
    index('price_items_version').on(table.regionKey, table.fromVersion, table.untilVersion),
    // One item through its versions.
    uniqueIndex('price_items_key')
      .on(table.key, table.fromVersion)
      .where(sql`${table.regionKey} is null`),
    uniqueIndex('price_items_region_key').on(table.key, table.regionKey, table.fromVersion),
    // Rows that a version ended, for what changed in it.
    index('price_items_until').on(table.untilVersion),
  ],
)
