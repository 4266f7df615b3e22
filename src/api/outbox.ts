import { queryOptions } from '@tanstack/vue-query'
import type { OutboxMessage } from '../../shared/schemas/account.ts'
import { http } from './http.ts'

export const outboxQuery = queryOptions({
  queryKey: ['outbox'],
  queryFn: ({ signal }) => http.get<OutboxMessage[]>('/outbox', { signal }),
  staleTime: 0,
})
