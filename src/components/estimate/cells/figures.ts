import { formatCents } from '../../../../shared/engine/index.ts'

const quantityFormat = new Intl.NumberFormat('en-US', { maximumFractionDigits: 2 })

/** A quantity as it is priced: at most 2 decimals, thousands parted. */
export function quantityText(quantity: number): string {
  return quantityFormat.format(quantity)
}

/** An amount of a line: with cents. */
export function amountText(cents: number): string {
  return formatCents(cents, { cents: true })
}

export function hoursText(hours: number): string {
  return hours === 0 ? '' : quantityFormat.format(hours)
}
