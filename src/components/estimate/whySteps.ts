import { formatCents, formatUnitPrice } from '../../../shared/engine/index.ts'
import type { LowLikelyHigh } from '../../../shared/schemas/common.ts'
import type { LineRow } from '../../composables/lineRow.ts'
import { bookPrice } from '../../composables/keyedPrice.ts'
import { quantityText } from './cells/figures.ts'

export interface WhyStep {
  title: string
  figure: string
  about?: string
  isResult?: boolean
}

/** Where the book's price of a line is from, in words: `price book 1 for Merrow Valley`. */
export type PriceSource = (kind: 'materials' | 'installed') => string

/** The way from what was measured to the amount, in the order in which the engine takes it; steps that change nothing are left out. */
export function whySteps({ fields, figures, book }: LineRow, sourceOf: PriceSource): WhyStep[] {
  const { measured, quantity, unitPriceE4, amountCents, hours } = figures
  const withWaste = measured * (1 + fields.wastePercent / 100)
  const isPackaged = fields.basis === 'own-hands' && fields.packageSize !== null
  const product = unitPriceE4 === null ? 0 : Math.round((quantity * unitPriceE4.likely) / 100)
  const isMinimum = unitPriceE4 !== null && amountCents.likely > product
  const steps: (WhyStep | false)[] = [
    {
      title: 'Measured',
      figure: `${quantityText(measured)} ${fields.unit}`,
      about: /^[\d.]+$/.test(fields.quantity) ? 'as keyed' : fields.quantity,
    },
    fields.wastePercent > 0 && { title: `With ${fields.wastePercent}% waste`, figure: `${quantityText(withWaste)} ${fields.unit}` },
    isPackaged &&
      fields.packageSize !== null && {
        title: 'In whole packages',
        figure: `${quantityText(quantity)} ${fields.unit}`,
        about: `${quantityText(quantity / fields.packageSize)} of ${quantityText(fields.packageSize)} ${fields.unit}`,
      },
    unitPriceE4 !== null && { title: `× price for one ${fields.unit}`, figure: formatUnitPrice(unitPriceE4.likely), about: priceSource() },
    isMinimum && {
      title: 'Minimum charge',
      figure: formatCents(fields.minimumChargeCents, { cents: true }),
      about: `more than ${formatCents(product, { cents: true })}`,
    },
    {
      title: 'Likely amount',
      figure: formatCents(amountCents.likely, { cents: true }),
      about: `${spread(amountCents)}, each by the same steps`,
      isResult: true,
    },
    hours > 0 && { title: 'Own hours', figure: quantityText(hours), about: `${quantityText(fields.hoursPerUnit)} for one ${fields.unit}` },
  ]
  return steps.filter((step) => step !== false)

  function priceSource(): string {
    if (fields.override !== null) return ownPriceSource(fields.override.reason)
    return sourceOf(fields.basis === 'own-hands' ? 'materials' : 'installed')
  }

  function ownPriceSource(reason: string): string {
    const known = bookPrice({ fields, book })
    return known === null ? `own price: ${reason}` : `own price: ${reason}. The book has ${formatUnitPrice(known.likely)}.`
  }
}

function spread({ low, high }: LowLikelyHigh): string {
  return `from ${formatCents(low, { cents: true })} to ${formatCents(high, { cents: true })}`
}
