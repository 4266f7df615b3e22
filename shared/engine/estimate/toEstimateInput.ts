import type { EstimateWhole, Line } from '../../schemas/estimate.ts'
import type { Room } from '../../schemas/room.ts'
import type { EstimateInput, LineInput, RoomInput } from '../estimateInput.ts'
import { effectivePrice } from '../pricing/effectivePrice.ts'

/** The app's records as the engine computes them; ids are the keys. */
export function toEstimateInput({ house, rooms, lines, estimate }: EstimateWhole): EstimateInput {
  const { storeys, footprint, wallHeightIn, overhangIn, roof } = house
  return {
    house: { storeys, footprint, wallHeightIn, overhangIn, roof },
    rooms: rooms.map(toRoomInput),
    lines: lines.map(toLineInput),
    settings: estimate.settings,
  }
}

/** A room's record as the engine computes it. */
export function toRoomInput({ id, name, use, shape, ceiling, openings, deductions }: Room): RoomInput {
  return { key: id, name, use, shape, ceiling, openings, deductions }
}

/** A line's record as the engine computes it, at the price that counts. */
export function toLineInput(line: Omit<Line, 'estimateId' | 'position' | 'version'>): LineInput {
  const { id, roomId, system, trade, unit, quantity, wastePercent, packageSize, basis, minimumChargeCents, hoursPerUnit, evidence } = line
  return {
    key: id,
    roomKey: roomId,
    system,
    trade,
    unit,
    quantity,
    wastePercent,
    packageSize,
    basis,
    unitPriceE4: effectivePrice(line),
    minimumChargeCents,
    hoursPerUnit,
    evidence,
  }
}
