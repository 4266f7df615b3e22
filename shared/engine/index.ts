/** The contents page of the engine: what the client, the server and the commands compute with. */
export type { Dimension } from '../catalogue/units.ts'
export type { EstimateInput, HouseInput, LineInput, RoomInput } from './estimateInput.ts'

export { formatCents, formatUnitPrice } from './money/formatMoney.ts'
export { parseCents, parseUnitPriceE4 } from './money/parseMoney.ts'
export { formatLength } from './units/formatLength.ts'
export { parseLength, type ParsedLength } from './units/parseLength.ts'

export { checkShape } from './geometry/checkShape.ts'
export { shapeOutline } from './geometry/shapeOutline.ts'

export type { Measure, MeasureValue } from './takeoff/measure.ts'
export { houseMeasures } from './takeoff/houseMeasures.ts'
export { MEASURES } from './takeoff/measureList.ts'
export { roomMeasures } from './takeoff/roomMeasures.ts'

export { effectivePrice } from './pricing/effectivePrice.ts'
export { regionalPrice, type RegionalPrice } from './pricing/regionalPrice.ts'

export { defaultSettings } from './estimate/defaultSettings.ts'
export { toEstimateInput } from './estimate/toEstimateInput.ts'
