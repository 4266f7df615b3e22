import { queryOptions } from '@tanstack/vue-query'
import type { HouseShare } from '../../shared/schemas/sharing.ts'
import { http } from './http.ts'

/** An active account with the role of owner. */
export interface Owner {
  id: string
  name: string
  email: string
}

export const ownersQuery = queryOptions({
  queryKey: ['people', 'owners'],
  queryFn: ({ signal }) => http.get<Owner[]>('/owners', { signal }),
})

export function sharesQuery(houseId: string) {
  return queryOptions({
    queryKey: ['house', houseId, 'shares'],
    queryFn: ({ signal }) => http.get<HouseShare[]>(`/houses/${houseId}/shares`, { signal }),
  })
}

export function shareHouse(houseId: string, userId: string): Promise<HouseShare> {
  return http.post<HouseShare>(`/houses/${houseId}/shares`, { userId })
}

export function unshareHouse(houseId: string, userId: string): Promise<void> {
  return http.delete(`/houses/${houseId}/shares/${userId}`)
}
