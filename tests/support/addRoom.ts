import type { Room, RoomFields } from '../../shared/schemas/room.ts'
import type { TestApp } from './buildTestApp.ts'
import { BUILDER, domainOf } from './domainOf.ts'

/** What a person keys of a room of 12 by 10 feet, 8 feet high, with one door. Name only the field that matters. */
export function keyedRoom(fields: Partial<RoomFields> = {}): RoomFields {
  return {
    name: 'Front bedroom',
    use: 'sleeping',
    shape: { kind: 'rectangle', lengthIn: 144, widthIn: 120 },
    ceiling: { kind: 'flat', heightIn: 96 },
    openings: [{ kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true }],
    deductions: [],
    note: '',
    ...fields,
  }
}

/** A room at the end of a house's rooms. */
export function addRoom(app: TestApp, houseId: string, fields: Partial<RoomFields> = {}): Room {
  return domainOf(app).rooms.add(BUILDER, houseId, keyedRoom(fields))
}
