import { HOUSE_MEASURES } from './houseMeasureList.ts'
import type { Measure } from './measure.ts'
import { ROOM_MEASURES } from './roomMeasureList.ts'

/** All names that formulas may use, with what they measure: a room's, then the house's. */
export const MEASURES: readonly Measure[] = [...ROOM_MEASURES, ...HOUSE_MEASURES]
