/** The contents page of the engine: what the client, the server and the commands compute with. */
export { ENGINE_VERSION } from './engineVersion.ts'
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
export { roofShares } from './takeoff/roofShares.ts'
export { roomMeasures } from './takeoff/roomMeasures.ts'

export { checkFormula, type CheckedFormula } from './formula/checkFormula.ts'
export type { FormulaParser } from './formula/parsedNode.ts'
export { needsNoParser } from './formula/parseFormula.ts'

export { effectivePrice } from './pricing/effectivePrice.ts'
export { regionalPrice, type RegionalPrice } from './pricing/regionalPrice.ts'

export { computeEstimate } from './estimate/computeEstimate.ts'
export { defaultSettings } from './estimate/defaultSettings.ts'
export type { Subtotal } from './estimate/groupSums.ts'
export type { LineFigures } from './estimate/lineFigures.ts'
export { LiveEstimate } from './estimate/liveEstimate.ts'
export { openEstimate } from './estimate/openEstimate.ts'
export { toEstimateInput, toLineInput, toRoomInput } from './estimate/toEstimateInput.ts'

export type { WorkbookContext, WorkbookPriceItem } from './workbook/workbookContext.ts'
export { workbookSheets } from './workbook/workbookSheets.ts'

export type { EstimateDocument } from './document/estimateDocument.ts'
export type { KeyedEstimate } from './document/documentSchema.ts'
export type { KeyedHouse } from './document/houseDocument.ts'
export type { KeyedLine } from './document/lineDocument.ts'
export type { KeyedRoom } from './document/roomDocument.ts'
export { readEstimateDocument, type ReadDocument } from './document/readEstimateDocument.ts'
export { writeEstimateDocument } from './document/writeEstimateDocument.ts'
