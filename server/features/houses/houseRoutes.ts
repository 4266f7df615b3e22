import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { addedHouseSchema, houseFieldsSchema, housePatchSchema, houseSchema, houseSummarySchema } from '../../../shared/schemas/house.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { HouseService } from './houseService.ts'

const houseParams = z.object({ id: idSchema })

export function houseOperations({ houses }: { houses: HouseService }): Operation[] {
  return [
    operation(
      {
        id: 'listHouses',
        method: 'get',
        path: '/houses',
        action: 'house.read',
        summary: 'Houses with the totals of their working estimates, the last worked on first. An owner gets those shared with them.',
        response: z.array(houseSummarySchema),
      },
      ({ user }) => houses.list(user),
    ),
    operation(
      {
        id: 'addHouse',
        method: 'post',
        path: '/houses',
        action: 'house.write',
        summary: 'Adds a house with its working estimate, pinned to the newest published price book.',
        status: 201,
        body: houseFieldsSchema,
        response: addedHouseSchema,
      },
      ({ user, body, res }) => {
        const added = houses.add(user, body)
        setEtag(res, added.house.version)
        return added
      },
    ),
    operation(
      {
        id: 'readHouse',
        method: 'get',
        path: '/houses/:id',
        action: 'house.read',
        summary: 'A house.',
        params: houseParams,
        response: houseSchema,
      },
      ({ user, params, res }) => {
        const house = houses.read(user, params.id)
        setEtag(res, house.version)
        return house
      },
    ),
    operation(
      {
        id: 'updateHouse',
        method: 'patch',
        path: '/houses/:id',
        action: 'house.write',
        summary: 'Changes a house. Another region re-reads the book’s prices of its lines, at the version that the estimate is pinned to.',
        ifMatch: true,
        params: houseParams,
        body: housePatchSchema,
        response: houseSchema,
      },
      ({ user, params, body, ifMatch, res }) => {
        const house = houses.update(user, params.id, body, ifMatch)
        setEtag(res, house.version)
        return house
      },
    ),
    operation(
      {
        id: 'removeHouse',
        method: 'delete',
        path: '/houses/:id',
        action: 'house.write',
        summary: 'Removes a house. It is marked, not deleted, and can be restored.',
        status: 204,
        ifMatch: true,
        params: houseParams,
      },
      ({ user, params, ifMatch }) => houses.remove(user, params.id, ifMatch),
    ),
    operation(
      {
        id: 'restoreHouse',
        method: 'post',
        path: '/houses/:id/restore',
        action: 'house.write',
        summary: 'Brings a removed house back as it was.',
        params: houseParams,
        response: houseSchema,
      },
      ({ user, params, res }) => {
        const house = houses.restore(user, params.id)
        setEtag(res, house.version)
        return house
      },
    ),
  ]
}
