import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { SALES_TAX_RULES } from '../../../shared/schemas/estimate.ts'
import { priceBookVersions } from './priceBookVersions.ts'

/** Price regions through the versions, by the same rules as price items. */
export const priceRegions = sqliteTable(
  'price_regions',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    key: text('key').notNull(),
    fromVersion: integer('from_version')
      .notNull()
      .references(() => priceBookVersions.version, { onDelete: 'restrict' }),
    untilVersion: integer('until_version'),
    rowVersion: integer('row_version').notNull(),
    name: text('name').notNull(),
    materialsFactor: real('materials_factor').notNull(),
    laborFactor: real('labor_factor').notNull(),
    salesTaxRule: text('sales_tax_rule', { enum: SALES_TAX_RULES }).notNull(),
    salesTaxPercent: real('sales_tax_percent').notNull(),
  },
  (table) => [
    index('price_regions_version').on(table.fromVersion, table.untilVersion),
    uniqueIndex('price_regions_key').on(table.key, table.fromVersion),
  ],
)
