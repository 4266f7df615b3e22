import type { EstimateSettings } from '../../shared/schemas/estimate.ts'
import type { HouseFields } from '../../shared/schemas/house.ts'
import type { DemoLine } from './lineTable.ts'
import type { DemoRoom } from './roomParts.ts'

/** An event that may turn out to cost, in the form of the estimate document. */
interface DemoUnknown {
  key: string
  description: string
  system: string
  chance: number
  cost: { low: string; likely: string; high: string }
}

/** An inspection that would settle it, in the form of the estimate document. */
interface DemoInspection {
  key: string
  description: string
  cost: string
  settles: string[]
}

/** A whole demo house as it was walked, keyed and priced. Ids are made from its key. */
export interface DemoHouse {
  key: string
  house: HouseFields
  rooms: DemoRoom[]
  lines: DemoLine[]
  /** What differs from the firm's defaults and the region's tax rule. */
  settings: Pick<EstimateSettings, 'overheadAndProfitPercent' | 'permitsCents' | 'contingency'>
  unknowns: DemoUnknown[]
  inspections: DemoInspection[]
  /** Day of the walk-through. */
  walkedOn: string
  /** Whether the demo's owner may read it. */
  isShared: boolean
}
