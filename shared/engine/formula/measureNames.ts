import { HOUSE_MEASURES } from '../takeoff/houseMeasureList.ts'
import type { Measure } from '../takeoff/measure.ts'
import { ROOM_MEASURES } from '../takeoff/roomMeasureList.ts'
import { FormulaError, type Span } from './formulaError.ts'
import { FUNCTION_NAMES } from './formulaFunctions.ts'
import { nearestName } from './nearestName.ts'

/** Whose measures a formula's names are: a room's line has its room's and the house's, the house's line the house's, `sum_rooms` each room's. */
export type NameScope = 'room' | 'house' | 'each-room'

const roomNames = new Map(ROOM_MEASURES.map((measure) => [measure.name, measure]))
const houseNames = new Map(HOUSE_MEASURES.map((measure) => [measure.name, measure]))

/** The measure that a name means. Throws, with the nearest name there is, where it means none. */
export function findMeasure(name: string, scope: NameScope, at: Span): Measure {
  const own = scope === 'house' ? undefined : roomNames.get(name)
  const measure = own ?? (scope === 'each-room' ? undefined : houseNames.get(name))
  if (measure) return measure
  if (scope === 'house' && roomNames.has(name)) {
    throw new FormulaError(
      'unknown-name',
      `\`${name}\` is a measure of a room, and this is for the house. Write sum_rooms(${name}), or choose the room.`,
      at,
    )
  }
  if (scope === 'each-room' && houseNames.has(name)) {
    throw new FormulaError('unknown-name', `\`${name}\` is a measure of the house; inside sum_rooms only a room's measures stand.`, at)
  }
  throw new FormulaError('unknown-name', unknownWords(name, scope), at)
}

function unknownWords(name: string, scope: NameScope): string {
  const own = scope === 'house' ? houseNames : roomNames
  const nearest = nearestName(name, [...own.keys(), ...FUNCTION_NAMES])
  return `\`${name}\` is not a measure.${nearest === null ? ` Measures are ${[...own.keys()].slice(0, 4).join(', ')} …` : ` Did you mean \`${nearest}\`?`}`
}
