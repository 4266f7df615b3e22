import { queryOptions } from '@tanstack/vue-query'
import type { Firm } from '../../shared/schemas/account.ts'
import { http } from './http.ts'

export const firmQuery = queryOptions({
  queryKey: ['firm'],
  queryFn: ({ signal }) => http.get<Firm>('/firm', { signal }),
  staleTime: Infinity,
})
