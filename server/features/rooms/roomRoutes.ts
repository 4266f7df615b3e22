import { z } from 'zod'
import { idSchema, orderSchema } from '../../../shared/schemas/common.ts'
import { newRoomSchema, removedRoomSchema, roomPatchSchema, roomSchema } from '../../../shared/schemas/room.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { RoomService } from './roomService.ts'

const houseParams = z.object({ houseId: idSchema })
const roomParams = z.object({ houseId: idSchema, roomId: idSchema })

export function roomOperations({ rooms }: { rooms: RoomService }): Operation[] {
  return [
    operation(
      {
        id: 'listRooms',
        method: 'get',
        path: '/houses/:houseId/rooms',
        action: 'house.read',
        summary: 'The rooms of a house, in their order.',
        params: houseParams,
        response: z.array(roomSchema),
      },
      ({ user, params }) => rooms.list(user, params.houseId),
    ),
    operation(
      {
        id: 'addRoom',
        method: 'post',
        path: '/houses/:houseId/rooms',
        action: 'room.write',
        summary: 'Adds a room: below `afterRoomId`, or at the end.',
        status: 201,
        headers: { 'Idempotency-Key': 'Makes a repeat answer as the first time.' },
        params: houseParams,
        body: newRoomSchema,
        response: roomSchema,
      },
      ({ user, params, body, res }) => {
        const room = rooms.add(user, params.houseId, body)
        setEtag(res, room.version)
        return room
      },
    ),
    operation(
      {
        id: 'updateRoom',
        method: 'patch',
        path: '/houses/:houseId/rooms/:roomId',
        action: 'room.write',
        summary: 'Changes a room. The lines that are measured by it follow.',
        ifMatch: true,
        params: roomParams,
        body: roomPatchSchema,
        response: roomSchema,
      },
      ({ user, params, body, ifMatch, res }) => {
        const room = rooms.update(user, params.houseId, params.roomId, body, ifMatch)
        setEtag(res, room.version)
        return room
      },
    ),
    operation(
      {
        id: 'removeRoom',
        method: 'delete',
        path: '/houses/:houseId/rooms/:roomId',
        action: 'room.write',
        summary: 'Removes a room with the lines that are measured by it; says which. Restoring the room brings them back.',
        ifMatch: true,
        params: roomParams,
        response: removedRoomSchema,
      },
      ({ user, params, ifMatch }) => rooms.remove(user, params.houseId, params.roomId, ifMatch),
    ),
    operation(
      {
        id: 'restoreRoom',
        method: 'post',
        path: '/houses/:houseId/rooms/:roomId/restore',
        action: 'room.write',
        summary: 'Brings a removed room back, and the lines that were removed with it.',
        params: roomParams,
        response: roomSchema,
      },
      ({ user, params, res }) => {
        const room = rooms.restore(user, params.houseId, params.roomId)
        setEtag(res, room.version)
        return room
      },
    ),
    operation(
      {
        id: 'orderRooms',
        method: 'put',
        path: '/houses/:houseId/rooms/order',
        action: 'room.write',
        summary: 'Puts the rooms in another order; takes the id of every room, once.',
        params: houseParams,
        body: orderSchema,
        response: z.array(roomSchema),
      },
      ({ user, params, body }) => rooms.order(user, params.houseId, body.ids),
    ),
  ]
}
