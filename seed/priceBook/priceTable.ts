import type { SystemKey } from '../../shared/catalogue/houseSystems.ts'
import type { TradeKey } from '../../shared/catalogue/trades.ts'
import { priceItemFieldsSchema, type PriceItemFields } from '../../shared/schemas/priceItem.ts'
import { readPrice, readTable, type TableRow } from './textTable.ts'

/** What all rows of one table have in common. */
export interface TableDefaults {
  system: SystemKey
  trade: TradeKey
  priceDate: string
}

/**
 * Price items written as a table of text, so that prices can be read down a column and compared.
 * The first line names the columns; cells are parted by `|`; a line without a `|` is the note of the row above it.
 * Prices are dollars, `low likely high`; an empty price cell says that nobody does it that way. Minimum charges are dollars.
 * `22.5 box` in the package column: a box covers 22.5 of the unit.
 *
 * @throws Error that names the row which can't be read.
 */
export function priceTable(defaults: TableDefaults, table: string): PriceItemFields[] {
  return readTable(table).map((row) => readItem(defaults, row))
}

function readItem(defaults: TableDefaults, { cell, notes }: TableRow): PriceItemFields {
  const [packageSize, ...packageWords] = cell('package').split(' ')
  const item = priceItemFieldsSchema.safeParse({
    ...defaults,
    key: cell('key'),
    name: cell('name'),
    unit: cell('unit'),
    uniformat: cell('uniformat'),
    materials: readPrice(cell('own hands')),
    installed: readPrice(cell('hired')),
    laborSharePercent: Number(cell('labor %')),
    wastePercent: Number(cell('waste %')),
    packageSize: packageSize ? Number(packageSize) : null,
    packageName: packageWords.join(' '),
    minimumChargeCents: Math.round(Number(cell('minimum')) * 100),
    hoursPerUnit: Number(cell('hours')),
    roomFormula: cell('room formula') || null,
    houseFormula: cell('house formula') || null,
    note: notes.join(' '),
  })
  if (!item.success) throw new Error(`Price table row ${cell('key')}: ${item.error.message}`)
  return item.data
}
