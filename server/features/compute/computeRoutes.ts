import { computeEstimate, readEstimateDocument } from '../../../shared/engine/index.ts'
import { estimateResultsSchema } from '../../../shared/schemas/results.ts'
import { invalid } from '../../errors/AppError.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { documentBodySchema, DOCUMENT_BODY_LIMIT } from '../exchange/documentBody.ts'

/** The engine on the wire. There is nothing to keep, so there is neither service nor repository. */
export function computeOperations(): Operation[] {
  return [
    operation(
      {
        id: 'computeEstimate',
        method: 'post',
        path: '/compute',
        action: 'estimate.exchange',
        summary:
          'The results of an estimate document; nothing is kept. A line that can’t be computed is named under `errors` and left out of the totals.',
        bodyLimit: DOCUMENT_BODY_LIMIT,
        body: documentBodySchema,
        response: estimateResultsSchema,
      },
      ({ body }) => {
        const read = readEstimateDocument(body)
        if (!read.ok) throw invalid(read.errors)
        return computeEstimate(read.input)
      },
    ),
  ]
}
