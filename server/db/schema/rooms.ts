import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { ROOM_USES, type Ceiling, type Deduction, type Opening, type Shape } from '../../../shared/schemas/room.ts'
import { houses } from './houses.ts'

export const rooms = sqliteTable(
  'rooms',
  {
    id: text('id').primaryKey(),
    houseId: text('house_id')
      .notNull()
      .references(() => houses.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    use: text('use', { enum: ROOM_USES }).notNull(),
    shape: text('shape', { mode: 'json' }).$type<Shape>().notNull(),
    ceiling: text('ceiling', { mode: 'json' }).$type<Ceiling>(),
    openings: text('openings', { mode: 'json' }).$type<Opening[]>().notNull(),
    deductions: text('deductions', { mode: 'json' }).$type<Deduction[]>().notNull(),
    note: text('note').notNull(),
    /** Order within the house; gaps leave place between two. */
    position: integer('position').notNull(),
    version: integer('version').notNull().default(1),
    createdAt: text('created_at').notNull(),
    updatedAt: text('updated_at').notNull(),
    removedAt: text('removed_at'),
  },
  // A house's rooms in their order.
  (table) => [index('rooms_house_position').on(table.houseId, table.removedAt, table.position)],
)
