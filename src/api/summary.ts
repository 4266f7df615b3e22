import { queryOptions } from '@tanstack/vue-query'
import type { EstimateSummary } from '../../shared/schemas/estimateSummary.ts'
import { http } from './http.ts'

export function summaryQuery(estimateId: string) {
  return queryOptions({
    queryKey: ['estimate', estimateId, 'summary'],
    queryFn: ({ signal }) => http.get<EstimateSummary>(`/estimates/${estimateId}/summary`, { signal }),
  })
}
