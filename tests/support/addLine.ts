import type { Line, NewLine } from '../../shared/schemas/estimate.ts'
import type { TestApp } from './buildTestApp.ts'
import { BUILDER, domainOf } from './domainOf.ts'

/** A line at the end of an estimate: a plank floor of 100 square feet for the house as a whole. Name only the field that matters. */
export function addLine(app: TestApp, estimateId: string, fields: Partial<NewLine> = {}): Line {
  return domainOf(app).lines.add(BUILDER, estimateId, { roomId: null, itemKey: 'floor/test-plank', quantity: '100', ...fields }).line
}
