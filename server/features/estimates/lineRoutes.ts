import type { Response } from 'express'
import { z } from 'zod'
import { idSchema, orderSchema } from '../../../shared/schemas/common.ts'
import { linePatchSchema, newLineSchema, orderedLinesSchema, savedLineSchema, type SavedLine } from '../../../shared/schemas/estimate.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { LineService } from './lineService.ts'

const estimateParams = z.object({ id: idSchema })
const lineParams = z.object({ id: idSchema, lineId: idSchema })

export function lineOperations({ lines }: { lines: LineService }): Operation[] {
  return [
    operation(
      {
        id: 'addLine',
        method: 'post',
        path: '/estimates/:id/lines',
        action: 'estimate.write',
        summary:
          'Adds a line. What is left out comes along with its price item; without an item it needs description, unit and a price of its own.',
        status: 201,
        headers: { 'Idempotency-Key': 'Makes a repeat answer as the first time.' },
        params: estimateParams,
        body: newLineSchema,
        response: savedLineSchema,
      },
      ({ user, params, body, res }) => tagged(res, lines.add(user, params.id, body)),
    ),
    operation(
      {
        id: 'updateLine',
        method: 'patch',
        path: '/estimates/:id/lines/:lineId',
        action: 'estimate.write',
        summary: 'Changes a line. Another item fills it anew; a formula that can’t be computed is kept and marked.',
        ifMatch: true,
        params: lineParams,
        body: linePatchSchema,
        response: savedLineSchema,
      },
      ({ user, params, body, ifMatch, res }) => tagged(res, lines.update(user, params.id, params.lineId, body, ifMatch)),
    ),
    operation(
      {
        id: 'removeLine',
        method: 'delete',
        path: '/estimates/:id/lines/:lineId',
        action: 'estimate.write',
        summary: 'Removes a line. It is marked, not deleted, and can be restored.',
        ifMatch: true,
        params: lineParams,
        response: savedLineSchema,
      },
      ({ user, params, ifMatch }) => lines.remove(user, params.id, params.lineId, ifMatch),
    ),
    operation(
      {
        id: 'restoreLine',
        method: 'post',
        path: '/estimates/:id/lines/:lineId/restore',
        action: 'estimate.write',
        summary: 'Brings a removed line back where it stood.',
        params: lineParams,
        response: savedLineSchema,
      },
      ({ user, params, res }) => tagged(res, lines.restore(user, params.id, params.lineId)),
    ),
    operation(
      {
        id: 'orderLines',
        method: 'put',
        path: '/estimates/:id/lines/order',
        action: 'estimate.write',
        summary: 'Puts the lines in another order; takes the id of every line, once.',
        params: estimateParams,
        body: orderSchema,
        response: orderedLinesSchema,
      },
      ({ user, params, body }) => lines.order(user, params.id, body.ids),
    ),
  ]
}

function tagged(res: Response, saved: SavedLine): SavedLine {
  setEtag(res, saved.line.version)
  return saved
}
