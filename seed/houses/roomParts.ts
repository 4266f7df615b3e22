import { parseLength } from '../../shared/engine/index.ts'
import type { Ceiling, Corner, Deduction, Opening, RoomFields, RoomUse, Shape } from '../../shared/schemas/room.ts'

/** A room of a demo house: what a person keys, and the name that its lines call it by. */
export interface DemoRoom extends RoomFields {
  key: string
}

/** Lengths are written as the trade writes them and read by the same parser as the app's. */
function inches(text: string): number {
  const length = parseLength(text)
  if (!length.ok) throw new Error(length.message)
  return length.inches
}

export function rectangle(length: string, width: string): Shape {
  return { kind: 'rectangle', lengthIn: inches(length), widthIn: inches(width) }
}

export function ell(length: string, width: string, cutLength: string, cutWidth: string): Shape {
  return { kind: 'ell', lengthIn: inches(length), widthIn: inches(width), cutLengthIn: inches(cutLength), cutWidthIn: inches(cutWidth) }
}

export function polygon(...corners: [x: string, y: string][]): Shape {
  return { kind: 'polygon', corners: corners.map(([x, y]): Corner => [offset(x), offset(y)]) }
}

/** A corner may stand at zero, which is no length. */
function offset(text: string): number {
  return text === '0' ? 0 : inches(text)
}

export function flat(height: string): Ceiling {
  return { kind: 'flat', heightIn: inches(height) }
}

export function sloped(low: string, high: string): Ceiling {
  return { kind: 'sloped', lowIn: inches(low), highIn: inches(high) }
}

function opening(kind: Opening['kind'], width: string, height: string, count: number): Opening {
  return { kind, widthIn: inches(width), heightIn: inches(height), count, fromWalls: true, fromBase: true }
}

export function door(width: string, height: string, count = 1): Opening {
  return opening('door', width, height, count)
}

export function window(width: string, height: string, count = 1): Opening {
  return opening('window', width, height, count)
}

export function cased(width: string, height: string, count = 1): Opening {
  return opening('cased', width, height, count)
}

/** Cabinets that the floor and the base stop at. */
export function cabinets(width: string, height: string, depth: string): Deduction {
  return deduction('cabinets', width, height, depth)
}

/** A tub that the floor and the base stop at. */
export function tub(width: string, height: string, depth: string): Deduction {
  return deduction('tub', width, height, depth)
}

/** A chimney breast, a built-in: wall that isn't painted and floor that isn't laid. */
export function builtIn(width: string, height: string, depth: string): Deduction {
  return deduction('other', width, height, depth)
}

function deduction(kind: Deduction['kind'], width: string, height: string, depth: string): Deduction {
  return {
    kind,
    widthIn: inches(width),
    heightIn: inches(height),
    depthIn: inches(depth),
    count: 1,
    fromWalls: true,
    fromFloor: true,
    fromBase: true,
  }
}

interface RoomRest {
  openings?: Opening[]
  deductions?: Deduction[]
  note?: string
}

export function room(key: string, name: string, use: RoomUse, shape: Shape, ceiling: Ceiling | null, rest: RoomRest = {}): DemoRoom {
  return { key, name, use, shape, ceiling, openings: rest.openings ?? [], deductions: rest.deductions ?? [], note: rest.note ?? '' }
}

/** Outside lengths of the house, by the same notation. */
export function outside(length: string): number {
  return inches(length)
}
