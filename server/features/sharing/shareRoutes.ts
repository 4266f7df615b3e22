import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { houseShareSchema, newHouseShareSchema } from '../../../shared/schemas/sharing.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { ShareService } from './shareService.ts'

const houseParams = z.object({ id: idSchema })
const shareParams = z.object({ id: idSchema, userId: idSchema })

export function shareOperations({ shares }: { shares: ShareService }): Operation[] {
  return [
    operation(
      {
        id: 'listShares',
        method: 'get',
        path: '/houses/:id/shares',
        action: 'house.share',
        summary: 'The owners that a house is shared with.',
        params: houseParams,
        response: z.array(houseShareSchema),
      },
      ({ user, params }) => shares.list(user, params.id),
    ),
    operation(
      {
        id: 'shareHouse',
        method: 'post',
        path: '/houses/:id/shares',
        action: 'house.share',
        summary: 'Opens a house to an owner.',
        status: 201,
        params: houseParams,
        body: newHouseShareSchema,
        response: houseShareSchema,
      },
      ({ user, params, body }) => shares.share(user, params.id, body.userId),
    ),
    operation(
      {
        id: 'unshareHouse',
        method: 'delete',
        path: '/houses/:id/shares/:userId',
        action: 'house.share',
        summary: 'Closes a house to an owner again.',
        status: 204,
        params: shareParams,
      },
      ({ user, params }) => shares.unshare(user, params.id, params.userId),
    ),
  ]
}
