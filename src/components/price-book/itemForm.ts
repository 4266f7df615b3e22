import { z } from 'zod'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import { priceItemFieldsSchema, type PriceItemFields, type PriceItemPatch } from '../../../shared/schemas/priceItem.ts'
import { isSame } from '../../composables/mergeFields.ts'

type Nullable<T> = { [K in keyof T]: T[K] | null }

/** What the fields of the form hold: a figure that isn't keyed is `null`, and so is an end of a price. */
export interface ItemFormValues extends Omit<
  PriceItemFields,
  'materials' | 'installed' | 'laborSharePercent' | 'wastePercent' | 'minimumChargeCents' | 'hoursPerUnit' | 'roomFormula' | 'houseFormula'
> {
  materials: Nullable<LowLikelyHigh>
  installed: Nullable<LowLikelyHigh>
  laborSharePercent: number | null
  wastePercent: number | null
  minimumChargeCents: number | null
  hoursPerUnit: number | null
  roomFormula: string
  houseFormula: string
}

/** The form's values as the schema of an item takes them: a price with no figure is none, a blank formula is none. */
export const itemFormSchema = z.preprocess((values) => fieldsOfForm(values as ItemFormValues), priceItemFieldsSchema)

export function formOfItem(item: PriceItemFields): ItemFormValues {
  return {
    key: item.key,
    name: item.name,
    system: item.system,
    trade: item.trade,
    unit: item.unit,
    uniformat: item.uniformat,
    materials: { ...(item.materials ?? NO_PRICE) },
    installed: { ...(item.installed ?? NO_PRICE) },
    laborSharePercent: item.laborSharePercent,
    wastePercent: item.wastePercent,
    packageSize: item.packageSize,
    packageName: item.packageName,
    minimumChargeCents: item.minimumChargeCents,
    hoursPerUnit: item.hoursPerUnit,
    roomFormula: item.roomFormula ?? '',
    houseFormula: item.houseFormula ?? '',
    priceDate: item.priceDate,
    note: item.note,
  }
}

/** A form for an item that there isn't yet. */
export function emptyItemForm(priceDate: string): ItemFormValues {
  return {
    key: '',
    name: '',
    system: 'floors',
    trade: 'general',
    unit: 'sf',
    uniformat: '',
    materials: { ...NO_PRICE },
    installed: { ...NO_PRICE },
    laborSharePercent: 50,
    wastePercent: 0,
    packageSize: null,
    packageName: '',
    minimumChargeCents: 0,
    hoursPerUnit: 0,
    roomFormula: '',
    houseFormula: '',
    priceDate,
    note: '',
  }
}

/** The fields that the form changes, or `null` when it changes none. */
export function itemPatch(before: PriceItemFields, after: PriceItemFields): PriceItemPatch | null {
  const { key: _, ...fields } = after
  const changed = Object.entries(fields).filter(([field, value]) => !isSame(value, before[field as keyof PriceItemFields]))
  return changed.length > 0 ? (Object.fromEntries(changed) as PriceItemPatch) : null
}

const NO_PRICE = { low: null, likely: null, high: null }

function fieldsOfForm(values: ItemFormValues): unknown {
  return {
    ...values,
    materials: priceOf(values.materials),
    installed: priceOf(values.installed),
    laborSharePercent: values.laborSharePercent ?? undefined,
    wastePercent: values.wastePercent ?? undefined,
    minimumChargeCents: values.minimumChargeCents ?? undefined,
    hoursPerUnit: values.hoursPerUnit ?? undefined,
    roomFormula: values.roomFormula.trim() === '' ? null : values.roomFormula,
    houseFormula: values.houseFormula.trim() === '' ? null : values.houseFormula,
  }
}

/** Left out rather than `null`, a missing end is named as missing. */
function priceOf({ low, likely, high }: Nullable<LowLikelyHigh>): unknown {
  const isNone = low === null && likely === null && high === null
  return isNone ? null : { low: low ?? undefined, likely: likely ?? undefined, high: high ?? undefined }
}
