import type { RoomInput } from '../estimateInput.ts'

/** What openings and deductions take from a room, in inches and square inches, each by its own switches. */
export interface TakenFromRoom {
  openingSqIn: number
  fromWallsSqIn: number
  fromFloorSqIn: number
  fromBaseIn: number
  windows: number
  doors: number
}

/** Adds up openings and deductions. All openings count in the opening area; a window takes nothing from the base. */
export function takenFromRoom({ openings, deductions }: Pick<RoomInput, 'openings' | 'deductions'>): TakenFromRoom {
  const taken: TakenFromRoom = { openingSqIn: 0, fromWallsSqIn: 0, fromFloorSqIn: 0, fromBaseIn: 0, windows: 0, doors: 0 }
  for (const { kind, widthIn, heightIn, count, fromWalls, fromBase } of openings) {
    const sqIn = widthIn * heightIn * count
    taken.openingSqIn += sqIn
    if (fromWalls) taken.fromWallsSqIn += sqIn
    if (fromBase && kind !== 'window') taken.fromBaseIn += widthIn * count
    if (kind === 'window') taken.windows += count
    if (kind === 'door') taken.doors += count
  }
  for (const { widthIn, heightIn, depthIn, count, fromWalls, fromFloor, fromBase } of deductions) {
    if (fromWalls) taken.fromWallsSqIn += widthIn * heightIn * count
    if (fromFloor) taken.fromFloorSqIn += widthIn * depthIn * count
    if (fromBase) taken.fromBaseIn += widthIn * count
  }
  return taken
}
