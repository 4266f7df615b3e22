import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { addedHouseSchema } from '../../../shared/schemas/house.ts'
import { FileAnswer } from '../../http/answers.ts'
import { setEtag } from '../../http/etag.ts'
import { fileTitle } from '../../http/fileTitle.ts'
import { operation, type Operation } from '../../http/operation.ts'
import { documentBodySchema, DOCUMENT_BODY_LIMIT } from './documentBody.ts'
import type { ExchangeService } from './exchangeService.ts'

export function exchangeOperations({ exchange }: { exchange: ExchangeService }): Operation[] {
  return [
    operation(
      {
        id: 'exportEstimate',
        method: 'get',
        path: '/estimates/:id/document',
        action: 'estimate.exchange',
        summary: 'An estimate as an estimate document, to keep, to compute or to import elsewhere.',
        params: z.object({ id: idSchema }),
        response: documentBodySchema,
      },
      ({ user, params, res }) => {
        const { document, houseName, version } = exchange.exportDocument(user, params.id)
        setEtag(res, version)
        return new FileAnswer(
          Buffer.from(`${JSON.stringify(document, null, 2)}\n`),
          'application/json',
          `${fileTitle(houseName)}, estimate.json`,
        )
      },
    ),
    operation(
      {
        id: 'importEstimate',
        method: 'post',
        path: '/houses/import',
        action: 'estimate.exchange',
        summary: 'Makes a house and its estimate of an estimate document, all of it or nothing.',
        status: 201,
        bodyLimit: DOCUMENT_BODY_LIMIT,
        body: documentBodySchema,
        response: addedHouseSchema,
      },
      ({ user, body, res }) => {
        const added = exchange.importDocument(user, body)
        setEtag(res, added.house.version)
        return added
      },
    ),
  ]
}
