import type { Evidence, Basis, EstimateSettings } from '../../schemas/estimate.ts'
import type { HouseFields, RoofGroup } from '../../schemas/house.ts'
import type { RoomUse } from '../../schemas/room.ts'

/** A length in any notation of the trade, or a number of feet. */
export type DocumentLength = string | number

/** A decimal string of dollars, as `"1250.00"`. */
export type DocumentMoney = string

export interface DocumentRange {
  low: DocumentMoney
  likely: DocumentMoney
  high: DocumentMoney
}

export type DocumentShape =
  | { kind: 'rectangle'; length: DocumentLength; width: DocumentLength }
  | { kind: 'ell'; length: DocumentLength; width: DocumentLength; cutLength: DocumentLength; cutWidth: DocumentLength }
  | { kind: 'polygon'; corners: [DocumentLength, DocumentLength][] }

export type DocumentCeiling = { kind: 'flat'; height: DocumentLength } | { kind: 'sloped'; low: DocumentLength; high: DocumentLength }

export interface DocumentHouse {
  name: string
  address?: string
  region?: string
  yearBuilt?: number | null
  storeys?: number
  kind?: HouseFields['kind']
  footprint?: DocumentShape | null
  wallHeight?: DocumentLength | null
  overhang?: DocumentLength | null
  roof?: RoofGroup[]
  note?: string
}

export interface DocumentOpening {
  kind: 'door' | 'window' | 'cased'
  width: DocumentLength
  height: DocumentLength
  count?: number
  fromWalls?: boolean
  fromBase?: boolean
}

export interface DocumentDeduction {
  kind: 'cabinets' | 'tub' | 'other'
  width: DocumentLength
  height: DocumentLength
  depth: DocumentLength
  count?: number
  fromWalls?: boolean
  fromFloor?: boolean
  fromBase?: boolean
}

export interface DocumentRoom {
  key: string
  name: string
  use?: RoomUse
  shape: DocumentShape
  ceiling?: DocumentCeiling | null
  openings?: DocumentOpening[]
  deductions?: DocumentDeduction[]
  note?: string
}

export interface DocumentLine {
  key: string
  /** Key of a room; left out, the house as a whole. */
  room?: string | null
  /** Key of the price item that the line was made from. */
  item?: string | null
  system: string
  trade?: string
  description: string
  unit: string
  quantity: string | number
  wastePercent?: number
  packageSize?: string | number | null
  basis: Basis
  /** The unit price that counts. `null`: there is none yet. */
  unitPrice: DocumentRange | null
  /** Why `unitPrice` is not the book's. */
  priceReason?: string
  /** The price book's own prices, which a price of one's own stands beside. */
  bookPrice?: { materials: DocumentRange | null; installed: DocumentRange | null }
  minimumCharge?: DocumentMoney
  hoursPerUnit?: number
  evidence?: Evidence
  note?: string
}

export interface DocumentUnknown {
  key: string
  description: string
  system: string
  chance: number
  cost: DocumentRange
}

export interface DocumentInspection {
  key: string
  description: string
  cost: DocumentMoney
  settles: string[]
}

export interface DocumentSettings {
  overheadAndProfitPercent?: number
  /** Without tax there is no percentage to give. */
  salesTax?: { rule: 'none'; percent?: number } | EstimateSettings['salesTax']
  permits?: DocumentMoney
  contingency?: { method: 'percent'; percent: number } | { method: 'fixed'; amount: DocumentMoney }
  ends?: EstimateSettings['ends']
  evidence?: Partial<Record<Evidence, Partial<EstimateSettings['evidence'][Evidence]>>>
  correlation?: Partial<EstimateSettings['correlation']>
  draws?: number
}

/** One JSON form of a whole estimate: exported, imported, computed. */
export interface EstimateDocument {
  format: 'quoinbook.estimate'
  version: 1
  /** Name of the estimate. */
  name?: string
  /** The version of the price book that its prices are from. */
  priceBookVersion?: number
  house: DocumentHouse
  rooms: DocumentRoom[]
  lines: DocumentLine[]
  unknowns?: DocumentUnknown[]
  inspections?: DocumentInspection[]
  settings?: DocumentSettings
}
