import type { RoofGroup } from '../../schemas/house.ts'

/** Shares are keyed as percent of the plan; thirds don't sum to 100 exactly. */
const SHARE_TOLERANCE = 0.05

/**
 * The part of the plan that each roof group covers, 0 to 1. Groups without a share split equally what the others leave: [60, –, –] → 0.6, 0.2, 0.2.
 * `null` where the shares don't come to 100 percent.
 */
export function roofShares(roof: readonly RoofGroup[]): number[] | null {
  const keyed = roof.reduce((sum, { sharePercent }) => sum + (sharePercent ?? 0), 0)
  const openCount = roof.filter(({ sharePercent }) => sharePercent === undefined).length
  const left = 100 - keyed
  if (openCount === 0) return Math.abs(left) <= SHARE_TOLERANCE ? roof.map(({ sharePercent }) => (sharePercent ?? 0) / keyed) : null
  if (left <= 0) return null
  return roof.map(({ sharePercent }) => (sharePercent ?? left / openCount) / 100)
}
