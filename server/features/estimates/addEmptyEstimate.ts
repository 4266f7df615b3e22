import type { EstimateSettings, Totals } from '../../../shared/schemas/estimate.ts'
import type { Queryable } from '../../db/client.ts'
import { newId } from '../../db/newId.ts'
import { insertEstimate } from './estimateRepository.ts'

export interface NewEstimate {
  /** Left out, a new one is made. */
  id?: string
  houseId: string
  /** Left out, it is called the working estimate. */
  name?: string
  regionKey: string
  priceBookVersion: number
  settings: EstimateSettings
  unknowns?: unknown[]
  inspections?: unknown[]
  at: string
}

const NOTHING = { low: 0, likely: 0, high: 0 }
const NO_TOTALS: Totals = {
  directCents: NOTHING,
  overheadAndProfitCents: NOTHING,
  salesTaxCents: NOTHING,
  permitsCents: NOTHING,
  contingencyCents: NOTHING,
  totalCents: NOTHING,
}

/** Adds the working estimate of a new house and gives its id. It is not computed yet: the keeper's refresh makes it version 1. */
export function addEmptyEstimate(
  tx: Queryable,
  { id = newId(), name = 'Working estimate', unknowns = [], inspections = [], at, ...given }: NewEstimate,
): string {
  insertEstimate(tx, { ...given, id, name, unknowns, inspections, version: 0, totals: NO_TOTALS, errorCount: 0 }, at)
  return id
}
