import type { Deduction, Opening } from '../../../shared/schemas/room.ts'

/** Something that takes up part of a wall: each opening or deduction as often as it is counted. */
export interface WallPiece {
  kind: Opening['kind'] | Deduction['kind']
  widthIn: number
  /** Out from the wall; 0 for an opening. */
  depthIn: number
}

export interface PlacedPiece extends WallPiece {
  /** From 0, in the order of the corners. */
  wall: number
  /** From the wall's first corner to the piece's near edge. */
  fromIn: number
}

/** More pieces than this make no clearer plan. */
const DRAWN_MAX = 120

/** The pieces of a room, each as often as it is counted. */
export function wallPieces(openings: readonly Opening[], deductions: readonly Deduction[]): WallPiece[] {
  const pieces = [
    ...openings.flatMap(({ kind, widthIn, count }) => repeated({ kind, widthIn, depthIn: 0 }, count)),
    ...deductions.flatMap(({ kind, widthIn, depthIn, count }) => repeated({ kind, widthIn, depthIn }, count)),
  ]
  return pieces.slice(0, DRAWN_MAX)
}

/**
 * Gives each piece a place along the walls. Where it really stands isn't kept, so it goes to the wall with the most room left (the first of equals)
 * and the pieces of a wall are spread evenly. What fits on no wall is handed back, because it may be a slip of the key.
 */
export function placeOnWalls(
  pieces: readonly WallPiece[],
  wallLengthsIn: readonly number[],
): { placed: PlacedPiece[]; unplaced: WallPiece[] } {
  const onWall: WallPiece[][] = wallLengthsIn.map(() => [])
  const roomLeft = [...wallLengthsIn]
  const unplaced: WallPiece[] = []
  for (const piece of pieces) {
    const wall = roomLeft.indexOf(Math.max(...roomLeft))
    const left = roomLeft[wall]
    if (left === undefined || left < piece.widthIn) {
      unplaced.push(piece)
      continue
    }
    onWall[wall]?.push(piece)
    roomLeft[wall] = left - piece.widthIn
  }
  const placed = onWall.flatMap((piecesHere, wall) => spread(piecesHere, wall, roomLeft[wall] ?? 0))
  return { placed, unplaced }
}

function spread(pieces: readonly WallPiece[], wall: number, freeIn: number): PlacedPiece[] {
  const between = freeIn / (pieces.length + 1)
  let fromIn = 0
  return pieces.map((piece) => {
    fromIn += between
    const placed = { ...piece, wall, fromIn }
    fromIn += piece.widthIn
    return placed
  })
}

function repeated(piece: WallPiece, count: number): WallPiece[] {
  return Array.from({ length: Math.min(count, DRAWN_MAX) }, () => piece)
}
