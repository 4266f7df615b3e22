import type { Room } from '../../shared/schemas/room.ts'

/** A bedroom of 12' 6" by 10', 8' high, with a door and two windows; say what matters to the test. */
export function buildKeyedRoom(own: Partial<Room> = {}): Room {
  return {
    id: 'room-1',
    houseId: 'house-1',
    position: 0,
    version: 1,
    name: 'Front bedroom',
    use: 'sleeping',
    shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 },
    ceiling: { kind: 'flat', heightIn: 96 },
    openings: [
      { kind: 'door', widthIn: 32, heightIn: 80, count: 1, fromWalls: true, fromBase: true },
      { kind: 'window', widthIn: 36, heightIn: 48, count: 2, fromWalls: true, fromBase: true },
    ],
    deductions: [],
    note: '',
    ...own,
  }
}
