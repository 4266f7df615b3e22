import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { estimatePatchSchema, estimateSchema, estimateWholeSchema } from '../../../shared/schemas/estimate.ts'
import { JsonText } from '../../http/answers.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { EstimateService } from './estimateService.ts'

const estimateParams = z.object({ id: idSchema })

export function estimateOperations({ estimates }: { estimates: EstimateService }): Operation[] {
  return [
    operation(
      {
        id: 'readEstimate',
        method: 'get',
        path: '/estimates/:id',
        action: 'estimate.read',
        summary: 'An estimate with its house, rooms and lines. The ETag is its version, which goes up with every write to any of them.',
        params: estimateParams,
        response: estimateWholeSchema,
      },
      ({ user, params, res }) => {
        const { text, version } = estimates.readWholeText(user, params.id)
        setEtag(res, version)
        return new JsonText(text)
      },
    ),
    operation(
      {
        id: 'updateEstimate',
        method: 'patch',
        path: '/estimates/:id',
        action: 'estimate.write',
        summary: 'Changes name and settings; of the settings, what is left out stays.',
        ifMatch: true,
        params: estimateParams,
        body: estimatePatchSchema,
        response: estimateSchema,
      },
      ({ user, params, body, ifMatch, res }) => {
        const estimate = estimates.update(user, params.id, body, ifMatch)
        setEtag(res, estimate.version)
        return estimate
      },
    ),
  ]
}
