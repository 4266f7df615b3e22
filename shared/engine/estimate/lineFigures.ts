import type { Dimension } from '../../catalogue/units.ts'
import type { LowLikelyHigh } from '../../schemas/common.ts'

/** What a line comes to. With an error its amounts and hours are 0 and it stays out of every total: read `error` first. */
export interface LineFigures {
  /** What the formula gave, before waste and packages. */
  measured: number
  /** As priced: with waste, in whole packages, to 2 decimals. */
  quantity: number
  amountCents: LowLikelyHigh
  /** Own-hands hours, to 2 decimals. */
  hours: number
  error: { code: string; message: string; at?: readonly [from: number, to: number] } | null
  unitPriceE4: LowLikelyHigh | null
  /** What the formula counts; `any` for a plain number, `null` where it can't be read. */
  formulaDimension: Dimension | 'any' | null
}
