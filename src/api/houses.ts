import { queryOptions } from '@tanstack/vue-query'
import type { House, HouseFields, HousePatch, HouseSummary } from '../../shared/schemas/house.ts'
import type { Region } from '../../shared/schemas/priceItem.ts'
import { http } from './http.ts'

export interface AddedHouse {
  house: House
  estimateId: string
}

export const housesQuery = queryOptions({
  queryKey: ['houses'],
  queryFn: ({ signal }) => http.get<HouseSummary[]>('/houses', { signal }),
})

export function houseQuery(houseId: string) {
  return queryOptions({
    queryKey: ['house', houseId],
    queryFn: ({ signal }) => http.get<House>(`/houses/${houseId}`, { signal }),
  })
}

export function addHouse(fields: HouseFields): Promise<AddedHouse> {
  return http.post<AddedHouse>('/houses', fields)
}

/** Throws a stale `ProblemError` whose `current` is the house as somebody else left it. Outlives a page that is left at once. */
export function updateHouse(house: Pick<House, 'id' | 'version'>, patch: HousePatch): Promise<House> {
  return http.patch<House>(`/houses/${house.id}`, patch, { ifMatch: house.version, keepalive: true })
}

export async function removeHouse(houseId: string): Promise<void> {
  const { version } = await http.get<House>(`/houses/${houseId}`)
  await http.delete(`/houses/${houseId}`, { ifMatch: version })
}

export function restoreHouse(houseId: string): Promise<House> {
  return http.post<House>(`/houses/${houseId}/restore`)
}

/** Reads an estimate document into a house of its own. */
export function importEstimate(document: unknown): Promise<AddedHouse> {
  return http.post<AddedHouse>('/houses/import', document)
}

/** The regions of the newest published version of the price book: where a new house can stand. */
export const regionsQuery = queryOptions({
  queryKey: ['price-book', 'regions', 'newest'],
  queryFn: async ({ signal }) => {
    const versions = await http.get<{ version: number; status: string }[]>('/price-book/versions', { signal })
    const newest = versions.find(({ status }) => status === 'published')
    return newest ? http.get<Region[]>(`/price-book/versions/${newest.version}/regions`, { signal }) : []
  },
})
