import type { LowLikelyHigh } from '../schemas/common.ts'
import type { Basis, EstimateSettings, Evidence } from '../schemas/estimate.ts'
import type { RoofGroup } from '../schemas/house.ts'
import type { Ceiling, Deduction, Opening, Shape } from '../schemas/room.ts'

/** What the engine computes from: plain data, lengths in inches, amounts in cents, unit prices in ten-thousandths of a dollar. */
export interface EstimateInput {
  house: HouseInput
  rooms: readonly RoomInput[]
  lines: readonly LineInput[]
  settings: EstimateSettings
}

export interface HouseInput {
  storeys: number
  footprint: Shape | null
  wallHeightIn: number | null
  overhangIn: number | null
  roof: readonly RoofGroup[]
}

export interface RoomInput {
  /** Unique in the estimate: the room's id in the app, its key in an estimate document. */
  key: string
  name: string
  use: string
  shape: Shape
  ceiling: Ceiling | null
  openings: readonly Opening[]
  deductions: readonly Deduction[]
}

export interface LineInput {
  key: string
  /** `null`: the house as a whole. */
  roomKey: string | null
  system: string
  trade: string
  unit: string
  /** A number, or a formula over the measures. */
  quantity: string | number
  wastePercent: number
  packageSize: number | null
  basis: Basis
  /** Price that counts: the override if there is one, else the book's for the basis. `null`: none, an error at the line. */
  unitPriceE4: LowLikelyHigh | null
  minimumChargeCents: number
  hoursPerUnit: number
  evidence: Evidence
}
