import { HOUSE_SYSTEMS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADES } from '../../../shared/catalogue/trades.ts'
import type { LiveEstimate } from '../../../shared/engine/index.ts'
import type { SummaryPart } from '../../../shared/schemas/estimateSummary.ts'
import type { Room } from '../../../shared/schemas/room.ts'

interface Titled {
  key: string | null
  title: string
}

/** What each house system comes to, in the order of the catalogue. */
export function systemParts(live: LiveEstimate): SummaryPart[] {
  return partsOf(live, 'system', HOUSE_SYSTEMS)
}

export function tradeParts(live: LiveEstimate): SummaryPart[] {
  return partsOf(live, 'trade', TRADES)
}

/** What the house as a whole comes to and then each room, in their order. */
export function roomParts(live: LiveEstimate, rooms: readonly Room[]): SummaryPart[] {
  return partsOf(live, 'room', [{ key: null, title: 'House as a whole' }, ...rooms.map(({ id, name }) => ({ key: id, title: name }))])
}

function partsOf(live: LiveEstimate, by: 'system' | 'trade' | 'room', titles: readonly Titled[]): SummaryPart[] {
  const subtotals = live.subtotals(by)
  const known = new Set(titles.map(({ key }) => key))
  // An imported line may name a system or a trade that is not in the catalogue: it comes last, by its key.
  const others = [...subtotals.keys()].filter((key) => !known.has(key)).map((key) => ({ key, title: String(key) }))
  return [...titles, ...others].flatMap(({ key, title }) => {
    const subtotal = subtotals.get(key)
    const hasLines = subtotal !== undefined && subtotal.lineCount > 0
    return hasLines ? [{ key, title, amountCents: subtotal.amountCents, hours: subtotal.hours, lineCount: subtotal.lineCount }] : []
  })
}
