import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import { BASES, EVIDENCE_MARKS, type PriceOverride } from '../../../shared/schemas/estimate.ts'
import { estimates } from './estimates.ts'
import { rooms } from './rooms.ts'

export const estimateLines = sqliteTable(
  'estimate_lines',
  {
    id: text('id').primaryKey(),
    estimateId: text('estimate_id')
      .notNull()
      .references(() => estimates.id, { onDelete: 'cascade' }),
    roomId: text('room_id').references(() => rooms.id, { onDelete: 'restrict' }),
    /** The item by its key in the pinned version of the book; no foreign key, because an imported estimate may bring items of its own. */
    itemKey: text('item_key'),
    system: text('system').notNull(),
    trade: text('trade').notNull(),
    description: text('description').notNull(),
    unit: text('unit').notNull(),
    quantity: text('quantity').notNull(),
    wastePercent: real('waste_percent').notNull(),
    packageSize: real('package_size'),
    basis: text('basis', { enum: BASES }).notNull(),
    override: text('override', { mode: 'json' }).$type<PriceOverride>(),
    minimumChargeCents: integer('minimum_charge_cents').notNull(),
    hoursPerUnit: real('hours_per_unit').notNull(),
    evidence: text('evidence', { enum: EVIDENCE_MARKS }).notNull(),
    note: text('note').notNull(),
    bookMaterials: text('book_materials', { mode: 'json' }).$type<LowLikelyHigh>(),
    bookInstalled: text('book_installed', { mode: 'json' }).$type<LowLikelyHigh>(),
    /** Order within the estimate; gaps leave place between two. */
    position: integer('position').notNull(),
    version: integer('version').notNull().default(1),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
    removedAt: text('removed_at'),
    /** The room that it was removed with, and that brings it back. */
    removedWithRoomId: text('removed_with_room_id'),
  },
  (table) => [
    // An estimate's lines in their order.
    index('estimate_lines_estimate_position').on(table.estimateId, table.removedAt, table.position),
    // The lines that go with a room.
    index('estimate_lines_room').on(table.roomId),
  ],
)
