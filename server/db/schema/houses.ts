import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { HOUSE_KINDS, type RoofGroup } from '../../../shared/schemas/house.ts'
import type { Shape } from '../../../shared/schemas/room.ts'

export const houses = sqliteTable(
  'houses',
  {
    id: text('id').primaryKey(),
    name: text('name').notNull(),
    address: text('address').notNull(),
    /** A region of the price book; which row of it counts is the pinned version's to say, hence no foreign key. */
    regionKey: text('region_key').notNull(),
    yearBuilt: integer('year_built'),
    storeys: real('storeys').notNull(),
    kind: text('kind', { enum: HOUSE_KINDS }).notNull(),
    footprint: text('footprint', { mode: 'json' }).$type<Shape>(),
    wallHeightIn: real('wall_height_in'),
    overhangIn: real('overhang_in'),
    roof: text('roof', { mode: 'json' }).$type<RoofGroup[]>().notNull(),
    note: text('note').notNull(),
    version: integer('version').notNull().default(1),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
    removedAt: text('removed_at'),
  },
  // The house list leaves out what was removed.
  (table) => [index('houses_removed').on(table.removedAt)],
)
