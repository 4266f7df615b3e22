import { formatUnitPrice } from '../../../shared/engine/index.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import type { PriceItemFields, PriceItemPatch } from '../../../shared/schemas/priceItem.ts'
import { cellText, ENDS, parseEnd, parseSingle, type CellField, type EndName, type RangeName, type SingleField } from './itemFields.ts'

/** What was keyed into a cell and can't be saved yet, with the reason in words. */
export interface HeldEdit {
  text: string
  problem: string
}
export type HeldEdits = Readonly<Partial<Record<CellField, HeldEdit>>>

export interface KeyedCell {
  /** Cells of the row that stay as keyed, unsaved. */
  held: HeldEdits
  /** What can be saved now; `null` when nothing can or nothing changed. */
  patch: PriceItemPatch | null
}

/**
 * Takes what was keyed into one cell. A price is three figures that must go up in order, so an end that is at odds with the others is held until
 * they fit: keying 5 over a likely of 4 holds the 5, keying 6 as likely then saves both.
 */
export function keyCell(item: PriceItemFields, held: HeldEdits, field: CellField, text: string): KeyedCell {
  const [name, end] = field.split('.') as [string, EndName | undefined]
  return end === undefined ? keySingle(item, held, field as SingleField, text) : keyEnd(item, held, name as RangeName, end, text)
}

function keySingle(item: PriceItemFields, held: HeldEdits, field: SingleField, text: string): KeyedCell {
  const others = without(held, [field])
  const parsed = parseSingle(field, text)
  if (!parsed.ok) return { held: { ...others, [field]: { text, problem: parsed.message } }, patch: null }
  const isChanged = parsed.value !== item[field]
  return { held: others, patch: isChanged ? { [field]: parsed.value } : null }
}

function keyEnd(item: PriceItemFields, held: HeldEdits, range: RangeName, end: EndName, text: string): KeyedCell {
  const fields = ENDS.map((each) => `${range}.${each}` as const)
  const keyed = new Map<CellField, string>(fields.flatMap((field) => (held[field] ? [[field, held[field].text] as const] : [])))
  keyed.set(`${range}.${end}`, text)
  const others = without(held, fields)
  const checked = checkRange(item, range, keyed)
  if (checked.ok) {
    const isChanged = JSON.stringify(checked.value) !== JSON.stringify(item[range])
    return { held: others, patch: isChanged ? { [range]: checked.value } : null }
  }
  const stillHeld = [...keyed].map(([field, own]) => [
    field,
    { text: own, problem: checked.problems[field] ?? 'waits for the other two figures of its price' },
  ])
  return { held: { ...others, ...Object.fromEntries(stillHeld) }, patch: null }
}

type CheckedRange = { ok: true; value: LowLikelyHigh | null } | { ok: false; problems: Partial<Record<CellField, string>> }

function checkRange(item: PriceItemFields, range: RangeName, keyed: ReadonlyMap<CellField, string>): CheckedRange {
  const problems: Partial<Record<CellField, string>> = {}
  const figures: Partial<Record<EndName, number | null>> = {}
  for (const end of ENDS) {
    const field = `${range}.${end}` as const
    const parsed = parseEnd(keyed.get(field) ?? cellText(item, field))
    if (parsed.ok) figures[end] = parsed.value
    else problems[field] = parsed.message
  }
  if (Object.keys(problems).length > 0) return { ok: false, problems }
  const { low = null, likely = null, high = null } = figures
  if (low === null && likely === null && high === null) return checkNone(item, range, keyed)
  if (low === null || likely === null || high === null) {
    return { ok: false, problems: sameFor(keyed, 'low, likely and high go together: fill in all three, or clear all three') }
  }
  const order = orderProblems(range, { low, likely, high }, keyed)
  return Object.keys(order).length > 0 ? { ok: false, problems: order } : { ok: true, value: { low, likely, high } }
}

function checkNone(item: PriceItemFields, range: RangeName, keyed: ReadonlyMap<CellField, string>): CheckedRange {
  const other = range === 'materials' ? item.installed : item.materials
  if (other !== null) return { ok: true, value: null }
  return { ok: false, problems: sameFor(keyed, 'an item needs a materials price, an installed price or both') }
}

function orderProblems(
  range: RangeName,
  { low, likely, high }: LowLikelyHigh,
  keyed: ReadonlyMap<CellField, string>,
): Partial<Record<CellField, string>> {
  const problems: Partial<Record<CellField, string>> = {}
  const say = (end: EndName, words: string) => {
    if (keyed.has(`${range}.${end}`)) problems[`${range}.${end}`] = words
  }
  if (low > likely) {
    say('low', `low must be at most likely, ${formatUnitPrice(likely)}`)
    say('likely', `likely must be at least low, ${formatUnitPrice(low)}`)
  }
  if (likely > high) {
    say('high', `high must be at least likely, ${formatUnitPrice(likely)}`)
    say('likely', `likely must be at most high, ${formatUnitPrice(high)}`)
  }
  const isOutOfOrder = low > likely || likely > high
  const isUnsaid = isOutOfOrder && Object.keys(problems).length === 0
  return isUnsaid ? sameFor(keyed, 'low, likely and high must go up in that order') : problems
}

function sameFor(keyed: ReadonlyMap<CellField, string>, words: string): Partial<Record<CellField, string>> {
  return Object.fromEntries([...keyed.keys()].map((field) => [field, words]))
}

function without(held: HeldEdits, fields: readonly CellField[]): HeldEdits {
  return Object.fromEntries(Object.entries(held).filter(([field]) => !fields.includes(field as CellField)))
}
