import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { PriceItemFields, Region } from '../../schemas/priceItem.ts'
import { divideRounded } from '../money/divideRounded.ts'
import { exactDecimal, type ExactDecimal } from '../money/exactDecimal.ts'

export interface RegionalPrice {
  materials: LowLikelyHigh | null
  installed: LowLikelyHigh | null
  minimumChargeCents: number
}

type PricedItem = Pick<PriceItemFields, 'materials' | 'installed' | 'minimumChargeCents' | 'laborSharePercent'>
type Factors = Pick<Region, 'materialsFactor' | 'laborFactor'>

/**
 * What a base price comes to in a region. Materials go by the materials factor; installed prices and the minimum charge by labor share × labor factor + the rest × materials factor.
 * Each figure is rounded once, half up, to a ten-thousandth of a dollar (the minimum to the cent).
 * $5.80 installed, 45 % labor, factors 1.10 for materials and 1.20 for labor → × 1.145 → $6.641.
 */
export function regionalPrice(item: PricedItem, { materialsFactor, laborFactor }: Factors): RegionalPrice {
  const materials = exactDecimal(materialsFactor)
  const installed = blend(exactDecimal(item.laborSharePercent), exactDecimal(laborFactor), materials)
  return {
    materials: item.materials && scaleRange(item.materials, materials),
    installed: item.installed && scaleRange(item.installed, installed),
    minimumChargeCents: scale(item.minimumChargeCents, installed),
  }
}

function blend(laborPercent: ExactDecimal, labor: ExactDecimal, materials: ExactDecimal): ExactDecimal {
  const hundred = 100n * 10n ** BigInt(laborPercent.scale)
  const common = Math.max(labor.scale, materials.scale)
  const laborPart = laborPercent.digits * labor.digits * 10n ** BigInt(common - labor.scale)
  const materialsPart = (hundred - laborPercent.digits) * materials.digits * 10n ** BigInt(common - materials.scale)
  return { digits: laborPart + materialsPart, scale: common + laborPercent.scale + 2 }
}

function scaleRange({ low, likely, high }: LowLikelyHigh, factor: ExactDecimal): LowLikelyHigh {
  return { low: scale(low, factor), likely: scale(likely, factor), high: scale(high, factor) }
}

function scale(amount: number, factor: ExactDecimal): number {
  return Number(divideRounded(BigInt(amount) * factor.digits, 10n ** BigInt(factor.scale)))
}
