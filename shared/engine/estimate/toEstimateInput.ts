import type { EstimateWhole, Line } from '../../schemas/estimate.ts'
import type { EstimateInput, LineInput } from '../estimateInput.ts'
import { effectivePrice } from '../pricing/effectivePrice.ts'

/** The app's records as the engine computes them; ids are the keys. */
export function toEstimateInput({ house, rooms, lines, estimate }: EstimateWhole): EstimateInput {
  const { storeys, footprint, wallHeightIn, overhangIn, roof } = house
  return {
    house: { storeys, footprint, wallHeightIn, overhangIn, roof },
    rooms: rooms.map(({ id, name, use, shape, ceiling, openings, deductions }) => ({
      key: id,
      name,
      use,
      shape,
      ceiling,
      openings,
      deductions,
    })),
    lines: lines.map(toLineInput),
    settings: estimate.settings,
  }
}

function toLineInput(line: Line): LineInput {
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
