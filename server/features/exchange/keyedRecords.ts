import { findUnit } from '../../../shared/catalogue/units.ts'
import type { KeyedLine, KeyedRoom } from '../../../shared/engine/index.ts'
import type { Line } from '../../../shared/schemas/estimate.ts'
import type { Room } from '../../../shared/schemas/room.ts'
import { newId } from '../../db/newId.ts'
import { positionAt } from '../../db/positions.ts'

/** Rooms of a document as records of a house, with the ids that its lines find them by. */
export function roomRecords(rooms: readonly KeyedRoom[], houseId: string): { records: Room[]; idByKey: Map<string, string> } {
  const idByKey = new Map(rooms.map(({ key }) => [key, newId()]))
  const records = rooms.map(({ key, ...fields }, index) => ({
    ...fields,
    id: idByKey.get(key) ?? newId(),
    houseId,
    position: positionAt(index),
    version: 1,
  }))
  return { records, idByKey }
}

/** Lines of a document as records of an estimate. Prices stand as the document has them, the book's side too. */
export function lineRecords(lines: readonly KeyedLine[], estimateId: string, roomIdByKey: ReadonlyMap<string, string>): Line[] {
  return lines.map(({ key: _, roomKey, ...fields }, index) => ({
    ...fields,
    unit: findUnit(fields.unit)?.key ?? fields.unit,
    id: newId(),
    estimateId,
    roomId: roomKey === null ? null : (roomIdByKey.get(roomKey) ?? null),
    position: positionAt(index),
    version: 1,
  }))
}
