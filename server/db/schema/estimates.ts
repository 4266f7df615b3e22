import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { EstimateSettings, Totals } from '../../../shared/schemas/estimate.ts'
import { houses } from './houses.ts'
import { priceBookVersions } from './priceBookVersions.ts'

export const estimates = sqliteTable(
  'estimates',
  {
    id: text('id').primaryKey(),
    houseId: text('house_id')
      .notNull()
      .references(() => houses.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    /** Goes up with every write to the house, its rooms or its lines: it stands for all that the estimate is computed from. */
    version: integer('version').notNull().default(1),
    priceBookVersion: integer('price_book_version')
      .notNull()
      .references(() => priceBookVersions.version, { onDelete: 'restrict' }),
    regionKey: text('region_key').notNull(),
    settings: text('settings', { mode: 'json' }).$type<EstimateSettings>().notNull(),
    unknowns: text('unknowns', { mode: 'json' }).$type<unknown[]>().notNull(),
    inspections: text('inspections', { mode: 'json' }).$type<unknown[]>().notNull(),
    /** The engine's answer, kept in the transaction of the write that it follows from. */
    totals: text('totals', { mode: 'json' }).$type<Totals>().notNull(),
    errorCount: integer('error_count').notNull(),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
  },
  // A house's working estimate is its first.
  (table) => [index('estimates_house').on(table.houseId, table.createdAt)],
)
