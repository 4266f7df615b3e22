import { queryOptions } from '@tanstack/vue-query'
import type { Firm } from '../../shared/schemas/account.ts'
import { http } from './http.ts'

export function readFirm(signal?: AbortSignal): Promise<Firm> {
  return http.get<Firm>('/firm', signal ? { signal } : {})
}

export const firmQuery = queryOptions({
  queryKey: ['firm'],
  queryFn: ({ signal }) => readFirm(signal),
  staleTime: Infinity,
})
