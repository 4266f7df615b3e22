import type { Totals } from '../../schemas/estimate.ts'
import type { EstimateResults, ResultError } from '../../schemas/results.ts'
import { ENGINE_VERSION } from '../engineVersion.ts'
import type { RoomInput } from '../estimateInput.ts'
import { toBillionth } from '../money/roundQuantity.ts'
import type { MeasureValue } from '../takeoff/measure.ts'
import { roomMeasures } from '../takeoff/roomMeasures.ts'
import type { LineFigures } from './lineFigures.ts'

interface Computed {
  house: Record<string, MeasureValue>
  rooms: readonly RoomInput[]
  lines: readonly { key: string; figures: LineFigures }[]
  totals: Totals
  errors: ResultError[]
}

/** The results form of the estimate document. A measure that can't be had is left out, and so is a line with an error, which `errors` names. */
export function resultsOf({ house, rooms, lines, totals, errors }: Computed): EstimateResults {
  return {
    engine: ENGINE_VERSION,
    house: figuresOf(house),
    rooms: Object.fromEntries(rooms.map((room) => [room.key, figuresOf(roomMeasures(room))])),
    lines: lines.flatMap(({ key, figures: { measured, quantity, amountCents, hours, error } }) =>
      error ? [] : [{ key, measured, quantity, amountCents, hours }],
    ),
    totals,
    errors,
  }
}

function figuresOf(measures: Record<string, MeasureValue>): Record<string, number> {
  const entries = Object.entries(measures).flatMap(([name, value]) => (value.ok ? [[name, toBillionth(value.value)] as const] : []))
  return Object.fromEntries(entries)
}
