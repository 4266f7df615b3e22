import { HOUSE_SYSTEMS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADES } from '../../../shared/catalogue/trades.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import type { PriceItem, PriceItemFields } from '../../../shared/schemas/priceItem.ts'
import type { priceItems } from '../../db/schema/priceItems.ts'

export type PriceItemRow = typeof priceItems.$inferSelect
type NewPriceItemRow = typeof priceItems.$inferInsert

/** The columns that an item's fields are kept in. */
export function columnsOfItem(fields: PriceItemFields) {
  return {
    key: fields.key,
    name: fields.name,
    system: fields.system,
    trade: fields.trade,
    unit: fields.unit,
    uniformat: fields.uniformat,
    materialsLowE4: fields.materials?.low ?? null,
    materialsLikelyE4: fields.materials?.likely ?? null,
    materialsHighE4: fields.materials?.high ?? null,
    installedLowE4: fields.installed?.low ?? null,
    installedLikelyE4: fields.installed?.likely ?? null,
    installedHighE4: fields.installed?.high ?? null,
    laborSharePercent: fields.laborSharePercent,
    wastePercent: fields.wastePercent,
    packageSize: fields.packageSize,
    packageName: fields.packageName,
    minimumChargeCents: fields.minimumChargeCents,
    hoursPerUnit: fields.hoursPerUnit,
    roomFormula: fields.roomFormula,
    houseFormula: fields.houseFormula,
    priceDate: fields.priceDate,
    note: fields.note,
    searchWords: searchWordsOf(fields),
  } satisfies Partial<NewPriceItemRow>
}

/** The item that a row holds. */
export function itemOfRow(row: PriceItemRow): PriceItem {
  return {
    key: row.key,
    name: row.name,
    system: row.system,
    trade: row.trade,
    unit: row.unit,
    uniformat: row.uniformat,
    materials: rangeOf(row.materialsLowE4, row.materialsLikelyE4, row.materialsHighE4),
    installed: rangeOf(row.installedLowE4, row.installedLikelyE4, row.installedHighE4),
    laborSharePercent: row.laborSharePercent,
    wastePercent: row.wastePercent,
    packageSize: row.packageSize,
    packageName: row.packageName,
    minimumChargeCents: row.minimumChargeCents,
    hoursPerUnit: row.hoursPerUnit,
    roomFormula: row.roomFormula,
    houseFormula: row.houseFormula,
    priceDate: row.priceDate,
    note: row.note,
    rowVersion: row.rowVersion,
  }
}

function rangeOf(low: number | null, likely: number | null, high: number | null): LowLikelyHigh | null {
  return low === null || likely === null || high === null ? null : { low, likely, high }
}

const systemTitles = new Map<string, string>(HOUSE_SYSTEMS.map(({ key, title }) => [key, title]))
const tradeTitles = new Map<string, string>(TRADES.map(({ key, title }) => [key, title]))

/** What people may type for an item besides its name. */
function searchWordsOf({ key, system, trade, note }: PriceItemFields): string {
  return [key, systemTitles.get(system), trade, tradeTitles.get(trade), note].join(' ')
}
