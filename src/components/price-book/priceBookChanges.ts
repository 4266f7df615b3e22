import type { PriceItem, PriceItemFields, PriceRegion } from '../../../shared/schemas/priceItem.ts'
import { isSame } from '../../composables/mergeFields.ts'
import { FIELD_TITLES, fieldText } from './itemFields.ts'

/** One field before and after, as a person reads it. */
export interface FieldChange {
  title: string
  before: string
  after: string
}

/** What a version does to one item or region. */
export interface BookChange {
  kind: 'added' | 'changed' | 'dropped'
  key: string
  name: string
  /** The region whose own prices these are; `null` for the base row or a region itself. */
  regionName: string | null
  fields: FieldChange[]
}

const FIELDS = Object.keys(FIELD_TITLES) as (keyof PriceItemFields)[]

/** Fields in which two rows of an item differ. */
export function changedFields(before: PriceItemFields, after: PriceItemFields): (keyof PriceItemFields)[] {
  return FIELDS.filter((field) => !isSame(before[field], after[field]))
}

/** What became of the items of one version in the next: changed and dropped ones in the old order, then what was added. */
export function itemChanges(before: readonly PriceItem[], after: readonly PriceItem[], regionName: string | null): BookChange[] {
  const afterByKey = new Map(after.map((item) => [item.key, item]))
  const beforeKeys = new Set(before.map(({ key }) => key))
  const ofOld = before.flatMap((old): BookChange[] => {
    const now = afterByKey.get(old.key)
    const head = { key: old.key, name: old.name, regionName }
    if (!now) return [{ ...head, kind: 'dropped', fields: [] }]
    const fields = changedFields(old, now).map((field) => ({
      title: FIELD_TITLES[field],
      before: fieldText(old, field),
      after: fieldText(now, field),
    }))
    return fields.length > 0 ? [{ ...head, kind: 'changed', fields }] : []
  })
  const added = after
    .filter(({ key }) => !beforeKeys.has(key))
    .map(({ key, name }): BookChange => ({ kind: 'added', key, name, regionName, fields: [] }))
  return [...ofOld, ...added]
}

const REGION_TITLES: Record<Exclude<keyof PriceRegion, 'key' | 'rowVersion'>, string> = {
  name: 'Name',
  materialsFactor: 'Materials factor',
  laborFactor: 'Labor factor',
  salesTaxRule: 'Sales tax rule',
  salesTaxPercent: 'Sales tax, %',
}

/** Regions whose factors or sales tax differ. */
export function regionChanges(before: readonly PriceRegion[], after: readonly PriceRegion[]): BookChange[] {
  return after.flatMap((now): BookChange[] => {
    const old = before.find(({ key }) => key === now.key)
    if (!old) return [{ kind: 'added', key: now.key, name: now.name, regionName: null, fields: [] }]
    const fields = (Object.keys(REGION_TITLES) as (keyof typeof REGION_TITLES)[])
      .filter((field) => old[field] !== now[field])
      .map((field) => ({ title: REGION_TITLES[field], before: String(old[field]), after: String(now[field]) }))
    return fields.length > 0 ? [{ kind: 'changed', key: now.key, name: now.name, regionName: null, fields }] : []
  })
}
