import type { RoomUse } from '../../../shared/schemas/room.ts'

export const ROOM_USE_TITLES: Record<RoomUse, string> = {
  sleeping: 'Sleeping',
  living: 'Living',
  dining: 'Dining',
  kitchen: 'Kitchen',
  bath: 'Bath',
  hall: 'Hall or stair',
  laundry: 'Laundry',
  storage: 'Storage',
  cellar: 'Cellar',
  attic: 'Attic',
  other: 'Other',
}

export const ROOM_USE_OPTIONS = (Object.keys(ROOM_USE_TITLES) as RoomUse[]).map((value) => ({ value, label: ROOM_USE_TITLES[value] }))

const USES_BY_WORD: readonly [RegExp, RoomUse][] = [
  [/\b(bath|toilet|powder|shower|washroom|wc)/, 'bath'],
  [/\bbed|nursery|sleep|guest room/, 'sleeping'],
  [/\bkitchen|kitchenette/, 'kitchen'],
  [/\bdin(ing|ette)|breakfast/, 'dining'],
  [/\bliving|family|parlou?r|sitting|\bden\b|lounge|sun ?room|study|office/, 'living'],
  [/\bhall|stair|landing|entry|foyer|vestibule|corridor/, 'hall'],
  [/\blaundry|utility|mud ?room/, 'laundry'],
  [/\bcloset|pantry|stor(e|age)|linen|garage|shed/, 'storage'],
  [/\bcellar|basement|crawl/, 'cellar'],
  [/\battic|loft/, 'attic'],
]

/** What a room is most likely for, by its name; `null` when the name doesn't tell. "Rear bedroom" → sleeping. */
export function guessUse(name: string): RoomUse | null {
  const words = name.toLowerCase()
  return USES_BY_WORD.find(([pattern]) => pattern.test(words))?.[1] ?? null
}
