import type { Action } from '../../../shared/access/permissions.ts'
import type { House, HouseSummary } from '../../../shared/schemas/house.ts'
import type { RouteName } from '../../router/routes.ts'

export type StageState = 'empty' | 'under-way' | 'done'

export interface HouseStage {
  name: RouteName
  title: string
  state: StageState
  /** The state in words, under the title. */
  says: string
  action: Action
}

/** The courses of the corner, from the foundation up: the order in which the work goes. What hasn't been read yet counts as empty. */
export function houseStages(house: House | undefined, summary: HouseSummary | undefined): HouseStage[] {
  return [
    { name: 'house-details', title: 'Details', action: 'house.write', ...detailsState(house) },
    { name: 'rooms', title: 'Rooms', action: 'room.write', ...roomsState(summary) },
    { name: 'estimate', title: 'Estimate', action: 'estimate.write', ...estimateState(summary) },
    { name: 'summary', title: 'Summary', action: 'estimate.read', ...summaryState(summary) },
  ]
}

type Standing = Pick<HouseStage, 'state' | 'says'>

function detailsState(house: House | undefined): Standing {
  if (!house) return { state: 'empty', says: '' }
  const measured = [house.footprint !== null, house.wallHeightIn !== null, house.roof.length > 0]
  if (measured.every(Boolean)) return { state: 'done', says: 'measured' }
  if (measured.some(Boolean)) return { state: 'under-way', says: 'in part' }
  return { state: 'empty', says: 'to measure' }
}

function roomsState(summary: HouseSummary | undefined): Standing {
  if (!summary) return { state: 'empty', says: '' }
  return summary.roomCount === 0 ? { state: 'empty', says: 'none yet' } : { state: 'done', says: counted(summary.roomCount, 'room') }
}

function estimateState(summary: HouseSummary | undefined): Standing {
  if (!summary) return { state: 'empty', says: '' }
  if (summary.lineCount === 0) return { state: 'empty', says: 'no lines' }
  if (summary.errorCount > 0) return { state: 'under-way', says: counted(summary.errorCount, 'error') }
  return { state: 'done', says: counted(summary.lineCount, 'line') }
}

function summaryState(summary: HouseSummary | undefined): Standing {
  if (!summary) return { state: 'empty', says: '' }
  if (summary.lineCount === 0) return { state: 'empty', says: 'no lines' }
  if (summary.errorCount > 0) return { state: 'under-way', says: `${summary.errorCount} left out` }
  return { state: 'done', says: 'ready' }
}

function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`
}
