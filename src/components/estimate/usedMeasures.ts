import { houseMeasures, MEASURES, roomMeasures } from '../../../shared/engine/index.ts'
import type { LineFields } from '../../../shared/schemas/estimate.ts'
import type { House } from '../../../shared/schemas/house.ts'
import type { Room } from '../../../shared/schemas/room.ts'
import { namesIn } from '../../composables/measureCompletion.ts'
import { quantityText } from './cells/figures.ts'

export interface UsedMeasure {
  name: string
  figure: string
  /** What it measures; or why it can't be had. */
  about: string
}

const UNIT_WORDS = { length: 'ft', area: 'sq ft', volume: 'cu ft', count: '' } as const

/** The measures that a line's formula names, with their values: the room's own first, as the engine reads them. */
export function usedMeasures(
  { quantity, roomId }: Pick<LineFields, 'quantity' | 'roomId'>,
  house: House,
  rooms: readonly Room[],
): UsedMeasure[] {
  const names = namesIn(quantity)
  if (names.length === 0) return []
  const inputs = rooms.map((room) => ({ ...room, key: room.id }))
  const room = inputs.find(({ key }) => key === roomId)
  const own = room ? roomMeasures(room) : {}
  const ofHouse = houseMeasures(house, inputs)
  return names.map((name) => {
    const isOwn = name in own
    const value = own[name] ?? ofHouse[name]
    const measure = MEASURES.find((known) => known.name === name && known.scope === (isOwn ? 'room' : 'house'))
    const unit = measure ? UNIT_WORDS[measure.dimension] : ''
    const isHad = value?.ok === true
    return {
      name,
      figure: isHad ? `${quantityText(value.value)} ${measure?.size === 100 ? 'squares' : unit}`.trim() : 'not known',
      about: isHad || value === undefined ? (measure?.title ?? '') : value.message,
    }
  })
}
