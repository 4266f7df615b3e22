import { formatLength } from '../../../shared/engine/units/formatLength.ts'
import type { RoomUse } from '../../../shared/schemas/room.ts'
import { ROOM_USE_TITLES } from './roomUses.ts'

const TITLES: Record<string, string> = {
  name: 'Name',
  use: 'Use',
  note: 'Note',
  shape: 'Shape',
  'shape.lengthIn': 'Length',
  'shape.widthIn': 'Width',
  'shape.cutLengthIn': 'Cut length',
  'shape.cutWidthIn': 'Cut width',
  'shape.corners': 'Walls',
  ceiling: 'Ceiling',
  'ceiling.heightIn': 'Ceiling height',
  'ceiling.lowIn': 'Low side of the ceiling',
  'ceiling.highIn': 'High side of the ceiling',
  openings: 'Openings',
  deductions: 'Built in',
}

export function conflictTitle(path: string): string {
  return TITLES[path] ?? path
}

/** A value of a room in a few words, for somebody to choose between two: `12' 6"`, `2 doors, 1 window`. */
export function conflictValue(path: string, value: unknown): string {
  if (value === null || value === undefined || value === '') return 'nothing'
  if (typeof value === 'number') return formatLength(value)
  if (path === 'use') return ROOM_USE_TITLES[value as RoomUse]
  if (path === 'shape.corners' && Array.isArray(value)) return `${value.length} walls`
  if (Array.isArray(value)) return listWords(value as { kind: string; widthIn: number; heightIn: number; count: number }[])
  if (typeof value === 'object') return lengthsWords(value as Record<string, unknown>)
  return `“${String(value)}”`
}

function listWords(rows: readonly { kind: string; widthIn: number; heightIn: number; count: number }[]): string {
  if (rows.length === 0) return 'none'
  return rows
    .map(({ kind, widthIn, heightIn, count }) => `${count} ${kind} ${formatLength(widthIn)} × ${formatLength(heightIn)}`)
    .join(', ')
}

function lengthsWords({ kind, corners, ...lengths }: Record<string, unknown>): string {
  if (Array.isArray(corners)) return `${corners.length} walls`
  const words = Object.values(lengths).filter((length) => typeof length === 'number')
  return `${String(kind)} ${words.map(formatLength).join(' × ')}`
}
