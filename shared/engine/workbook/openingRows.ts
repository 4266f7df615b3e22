import type { Deduction, Opening } from '../../schemas/room.ts'
import { formatLength } from '../units/formatLength.ts'
import { cellAddress } from './cellAddress.ts'
import { DEDUCTION_COLUMN, OPENING_COLUMN } from './roomsLayout.ts'
import { live, number, text, type SheetDraft } from './sheetDraft.ts'

const FEET = 12
const SQ_IN_PER_SQ_FT = 144

/** A row of a table below the rooms, and the room that it belongs to. */
interface OfRoom {
  roomNumber: number
  roomName: string
}

/** A door, window or cased opening, and what it takes from walls and base. */
export function setOpeningRow(draft: SheetDraft, row: number, { roomNumber, roomName }: OfRoom, opening: Opening): void {
  const { kind, widthIn, heightIn, count, fromWalls, fromBase } = opening
  const at = (column: keyof typeof OPENING_COLUMN) => cellAddress(row, OPENING_COLUMN[column])
  const area = (widthIn * heightIn * count) / SQ_IN_PER_SQ_FT
  const takesBase = fromBase && kind !== 'window'
  draft.setRow(row, OPENING_COLUMN.room, [
    number(roomNumber, 'count'),
    text(roomName),
    text(kind),
    text(`${formatLength(widthIn)} × ${formatLength(heightIn)}`),
  ])
  draft.setRow(row, OPENING_COLUMN.width, [
    number(widthIn / FEET, 'input-feet'),
    number(heightIn / FEET, 'input-feet'),
    number(count, 'input-number'),
    text(yesNo(fromWalls), 'input-text'),
    text(yesNo(fromBase), 'input-text'),
    live(`${at('width')}*${at('height')}*${at('count')}`, area, 'number'),
    live(`IF(${at('fromWalls')}="yes",${at('area')},0)`, fromWalls ? area : 0, 'number'),
    live(
      `IF(${at('kind')}="window",0,IF(${at('fromBase')}="yes",${at('width')}*${at('count')},0))`,
      takesBase ? (widthIn * count) / FEET : 0,
      'number',
    ),
  ])
}

/** Cabinets, a tub: what covers wall, floor or base. */
export function setDeductionRow(draft: SheetDraft, row: number, { roomNumber, roomName }: OfRoom, deduction: Deduction): void {
  const { kind, widthIn, heightIn, depthIn, count, fromWalls, fromFloor, fromBase } = deduction
  const at = (column: keyof typeof DEDUCTION_COLUMN) => cellAddress(row, DEDUCTION_COLUMN[column])
  const keyed = `${formatLength(widthIn)} × ${formatLength(heightIn)}, ${formatLength(depthIn)} deep`
  const taken = (flag: 'fromWalls' | 'fromFloor' | 'fromBase', product: string) => `IF(${at(flag)}="yes",${product},0)`
  draft.setRow(row, DEDUCTION_COLUMN.room, [number(roomNumber, 'count'), text(roomName), text(kind), text(keyed)])
  draft.setRow(row, DEDUCTION_COLUMN.width, [
    number(widthIn / FEET, 'input-feet'),
    number(heightIn / FEET, 'input-feet'),
    number(depthIn / FEET, 'input-feet'),
    number(count, 'input-number'),
    text(yesNo(fromWalls), 'input-text'),
    text(yesNo(fromFloor), 'input-text'),
    text(yesNo(fromBase), 'input-text'),
    live(
      taken('fromWalls', `${at('width')}*${at('height')}*${at('count')}`),
      fromWalls ? (widthIn * heightIn * count) / SQ_IN_PER_SQ_FT : 0,
      'number',
    ),
    live(
      taken('fromFloor', `${at('width')}*${at('depth')}*${at('count')}`),
      fromFloor ? (widthIn * depthIn * count) / SQ_IN_PER_SQ_FT : 0,
      'number',
    ),
    live(taken('fromBase', `${at('width')}*${at('count')}`), fromBase ? (widthIn * count) / FEET : 0, 'number'),
  ])
}

function yesNo(flag: boolean): string {
  return flag ? 'yes' : 'no'
}
