import type { LowLikelyHigh } from '../../schemas/common.ts'
import type { EstimateSettings, EstimateWhole, Line } from '../../schemas/estimate.ts'
import type { House } from '../../schemas/house.ts'
import type { Ceiling, Deduction, Opening, Room, Shape } from '../../schemas/room.ts'
import { effectivePrice } from '../pricing/effectivePrice.ts'
import { formatLength } from '../units/formatLength.ts'
import { DOCUMENT_FORMAT, DOCUMENT_VERSION } from './documentSchema.ts'
import type {
  DocumentCeiling,
  DocumentDeduction,
  DocumentHouse,
  DocumentInspection,
  DocumentLine,
  DocumentOpening,
  DocumentRange,
  DocumentRoom,
  DocumentSettings,
  DocumentShape,
  DocumentUnknown,
  EstimateDocument,
} from './estimateDocument.ts'

/** The estimate document of an estimate in the app. Reading it again gives the same figures, and loses nothing that was keyed. */
export function writeEstimateDocument({ estimate, house, rooms, lines }: EstimateWhole): EstimateDocument {
  return {
    format: DOCUMENT_FORMAT,
    version: DOCUMENT_VERSION,
    name: estimate.name,
    priceBookVersion: estimate.priceBookVersion,
    house: writeHouse(house),
    rooms: rooms.map(writeRoom),
    lines: lines.map(writeLine),
    unknowns: estimate.unknowns as DocumentUnknown[],
    inspections: estimate.inspections as DocumentInspection[],
    settings: writeSettings(estimate.settings),
  }
}

function writeHouse(house: House): DocumentHouse {
  const { name, address, regionKey, yearBuilt, storeys, kind, footprint, wallHeightIn, overhangIn, roof, note } = house
  return {
    name,
    address,
    region: regionKey,
    yearBuilt,
    storeys,
    kind,
    footprint: footprint && writeShape(footprint),
    wallHeight: wallHeightIn === null ? null : formatLength(wallHeightIn),
    overhang: overhangIn === null ? null : formatLength(overhangIn),
    roof,
    note,
  }
}

function writeRoom({ id, name, use, shape, ceiling, openings, deductions, note }: Room): DocumentRoom {
  return {
    key: id,
    name,
    use,
    shape: writeShape(shape),
    ceiling: ceiling && writeCeiling(ceiling),
    openings: openings.map(writeOpening),
    deductions: deductions.map(writeDeduction),
    note,
  }
}

function writeShape(shape: Shape): DocumentShape {
  if (shape.kind === 'polygon') return { kind: 'polygon', corners: shape.corners.map(([x, y]) => [formatLength(x), formatLength(y)]) }
  const length = formatLength(shape.lengthIn)
  const width = formatLength(shape.widthIn)
  if (shape.kind === 'rectangle') return { kind: 'rectangle', length, width }
  return { kind: 'ell', length, width, cutLength: formatLength(shape.cutLengthIn), cutWidth: formatLength(shape.cutWidthIn) }
}

function writeCeiling(ceiling: Ceiling): DocumentCeiling {
  if (ceiling.kind === 'flat') return { kind: 'flat', height: formatLength(ceiling.heightIn) }
  return { kind: 'sloped', low: formatLength(ceiling.lowIn), high: formatLength(ceiling.highIn) }
}

function writeOpening({ widthIn, heightIn, ...rest }: Opening): DocumentOpening {
  return { ...rest, width: formatLength(widthIn), height: formatLength(heightIn) }
}

function writeDeduction({ widthIn, heightIn, depthIn, ...rest }: Deduction): DocumentDeduction {
  return { ...rest, width: formatLength(widthIn), height: formatLength(heightIn), depth: formatLength(depthIn) }
}

function writeLine(line: Line): DocumentLine {
  const price = effectivePrice(line)
  return {
    key: line.id,
    room: line.roomId,
    item: line.itemKey,
    system: line.system,
    trade: line.trade,
    description: line.description,
    unit: line.unit,
    quantity: line.quantity,
    wastePercent: line.wastePercent,
    packageSize: line.packageSize,
    basis: line.basis,
    unitPrice: price && writeUnitPrices(price),
    ...(line.override && { priceReason: line.override.reason }),
    bookPrice: {
      materials: line.book.materials && writeUnitPrices(line.book.materials),
      installed: line.book.installed && writeUnitPrices(line.book.installed),
    },
    minimumCharge: dollars(line.minimumChargeCents, 2),
    hoursPerUnit: line.hoursPerUnit,
    evidence: line.evidence,
    note: line.note,
  }
}

function writeSettings({ permitsCents, contingency, ...rest }: EstimateSettings): DocumentSettings {
  return {
    ...rest,
    permits: dollars(permitsCents, 2),
    contingency: contingency.method === 'percent' ? contingency : { method: 'fixed', amount: dollars(contingency.amountCents, 2) },
  }
}

function writeUnitPrices({ low, likely, high }: LowLikelyHigh): DocumentRange {
  return { low: dollars(low, 4), likely: dollars(likely, 4), high: dollars(high, 4) }
}

/** 24,000 ten-thousandths → `"2.40"`, 1,525 → `"0.1525"`; cents → `"1250.00"`. Two decimals at least. */
function dollars(scaled: number, decimals: 2 | 4): string {
  const digits = String(scaled).padStart(decimals + 1, '0')
  return `${digits.slice(0, -decimals)}.${digits.slice(-decimals).replace(/(?<=..)0+$/, '')}`
}
