import { formatCents, formatUnitPrice } from '../../../shared/engine/index.ts'
import type { Contingency, EstimateSettings, LineFields, PriceOverride } from '../../../shared/schemas/estimate.ts'
import type { Room } from '../../../shared/schemas/room.ts'
import { BASIS_WORDS, roomName } from '../../composables/lineCells.ts'

const TITLES: Partial<Record<keyof LineFields | keyof EstimateSettings, string>> = {
  roomId: 'Room',
  system: 'House system',
  trade: 'Trade',
  description: 'Description',
  unit: 'Unit',
  quantity: 'Quantity',
  wastePercent: 'Waste',
  packageSize: 'Package',
  basis: 'By',
  override: 'Own price',
  minimumChargeCents: 'Minimum charge',
  hoursPerUnit: 'Hours a unit',
  evidence: 'Known',
  note: 'Note',
  overheadAndProfitPercent: 'Overhead and profit',
  salesTax: 'Sales tax',
  permitsCents: 'Permits',
  contingency: 'Contingency',
}

/** What a field of a line, or a setting, is called on the page. */
export function fieldTitle(path: string): string {
  return TITLES[path as keyof typeof TITLES] ?? path
}

/** A field's value as a person reads it. */
export function fieldText(path: string, value: unknown, rooms: readonly Room[]): string {
  switch (path) {
    case 'roomId':
      return roomName(value as string | null, rooms)
    case 'basis':
      return BASIS_WORDS[value as LineFields['basis']]
    case 'override':
      return overrideText(value as PriceOverride | null)
    case 'minimumChargeCents':
    case 'permitsCents':
      return formatCents(value as number, { cents: true })
    case 'wastePercent':
    case 'overheadAndProfitPercent':
      return `${String(value)}%`
    case 'salesTax':
      return taxText(value as EstimateSettings['salesTax'])
    case 'contingency':
      return contingencyText(value as Contingency)
    default:
      return value === null || value === '' ? 'nothing' : String(value)
  }
}

function overrideText(override: PriceOverride | null): string {
  if (override === null) return 'the book’s price'
  const { low, likely, high } = override.price
  return `${formatUnitPrice(low)} · ${formatUnitPrice(likely)} · ${formatUnitPrice(high)}: ${override.reason}`
}

function taxText({ rule, percent }: EstimateSettings['salesTax']): string {
  return rule === 'none' ? 'none' : `${percent}% on ${rule.replace('-', ' ')}`
}

function contingencyText(contingency: Contingency): string {
  return contingency.method === 'percent' ? `${contingency.percent}%` : formatCents(contingency.amountCents)
}
