import { effectivePrice, type LineInput, type RoomInput } from '../../../shared/engine/index.ts'
import type { Line } from '../../../shared/schemas/estimate.ts'
import type { Room } from '../../../shared/schemas/room.ts'

/** A kept line as the engine takes it. */
export function lineInput(line: Line): LineInput {
  return {
    key: line.id,
    roomKey: line.roomId,
    system: line.system,
    trade: line.trade,
    unit: line.unit,
    quantity: line.quantity,
    wastePercent: line.wastePercent,
    packageSize: line.packageSize,
    basis: line.basis,
    unitPriceE4: effectivePrice(line),
    minimumChargeCents: line.minimumChargeCents,
    hoursPerUnit: line.hoursPerUnit,
    evidence: line.evidence,
  }
}

/** A kept room as the engine takes it. */
export function roomInput({ id, name, use, shape, ceiling, openings, deductions }: Room): RoomInput {
  return { key: id, name, use, shape, ceiling, openings, deductions }
}
