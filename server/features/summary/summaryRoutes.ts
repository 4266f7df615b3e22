import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { estimateSummarySchema } from '../../../shared/schemas/estimateSummary.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { SummaryService } from './summaryService.ts'

export function summaryOperations({ summaries }: { summaries: SummaryService }): Operation[] {
  return [
    operation(
      {
        id: 'readEstimateSummary',
        method: 'get',
        path: '/estimates/:id/summary',
        action: 'estimate.read',
        summary: 'What an owner reads of an estimate: totals, what they are made of, how sure they are, and the cautions that apply.',
        params: z.object({ id: idSchema }),
        response: estimateSummarySchema,
      },
      ({ user, params, res }) => {
        const summary = summaries.read(user, params.id)
        setEtag(res, summary.estimateVersion)
        return summary
      },
    ),
  ]
}
