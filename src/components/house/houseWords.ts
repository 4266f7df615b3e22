import { HOUSE_KINDS, ROOF_KINDS, STOREYS_MAX, type HouseFields } from '../../../shared/schemas/house.ts'

const KIND_WORDS: Record<HouseFields['kind'], string> = {
  detached: 'detached house',
  'semi-detached': 'semi-detached house',
  row: 'row house',
  'split-level': 'split-level house',
  manufactured: 'manufactured house',
  other: 'another kind of house',
}

/** "row house, built 1978" */
export function houseKindWords({ kind, yearBuilt }: Pick<HouseFields, 'kind' | 'yearBuilt'>): string {
  return yearBuilt === null ? KIND_WORDS[kind] : `${KIND_WORDS[kind]}, built ${yearBuilt}`
}

/** Where a house is, kind and year; what its name says already is not said again. "Merrow Mills · row house, built 1978" */
export function houseAbout(house: Pick<HouseFields, 'name' | 'address' | 'kind' | 'yearBuilt'>): string {
  return [addressBeyondName(house), houseKindWords(house)].filter(Boolean).join(' · ')
}

/** Many houses are called by their address: what is left of it then. */
function addressBeyondName({ name, address }: Pick<HouseFields, 'name' | 'address'>): string {
  const rest = address.startsWith(name) ? address.slice(name.length) : address
  const isSameWord = rest !== address && /^[\p{L}\p{N}]/u.test(rest)
  return isSameWord ? address : rest.replace(/^[\s,]+/, '')
}

export const HOUSE_KIND_OPTIONS = HOUSE_KINDS.map((kind) => ({ value: kind, label: capitalized(KIND_WORDS[kind]) }))
export const ROOF_KIND_OPTIONS = ROOF_KINDS.map((kind) => ({ value: kind, label: capitalized(kind) }))
/** By halves, as an attic that is lived in counts. */
export const STOREY_OPTIONS = Array.from({ length: STOREYS_MAX * 2 - 1 }, (_, index) => 1 + index / 2).map((storeys) => ({
  value: storeys,
  label: String(storeys),
}))

/** A house of which nothing is known yet. */
export function blankHouse(regionKey: string): HouseFields {
  return {
    name: '',
    address: '',
    regionKey,
    yearBuilt: null,
    storeys: 1,
    kind: 'detached',
    footprint: null,
    wallHeightIn: null,
    overhangIn: null,
    roof: [],
    note: '',
  }
}

function capitalized(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
