import { planFigures } from '../geometry/planFigures.ts'
import type { RoomInput } from '../estimateInput.ts'
import { roomMeasures } from '../takeoff/roomMeasures.ts'
import { cellAddress } from './cellAddress.ts'
import { roomMeasureName } from './measureNames.ts'
import { DEDUCTION_COLUMN, MEASURE_COLUMN as COLUMN, OPENING_COLUMN, ROOM_COLUMN, type RoomsLayout } from './roomsLayout.ts'
import { live, number, text, type SheetDraft } from './sheetDraft.ts'

const SQ_IN_PER_SQ_FT = 144

type MeasureName = Exclude<keyof typeof COLUMN, 'number' | 'name' | 'plan_area'>

/** What a room measures: formulas over its keyed row and the tables of openings and deductions. Each measure that can be had is named. */
export function setMeasureRow(draft: SheetDraft, roomNumber: number, room: RoomInput, layout: RoomsLayout): void {
  const row = layout.measures.firstRow + roomNumber - 1
  const keyedRow = layout.rooms.firstRow + roomNumber - 1
  const measures = roomMeasures(room)
  draft.setRow(row, COLUMN.number, [number(roomNumber, 'count'), text(room.name, 'label')])
  setPlan(draft, row, keyedRow, room, measures.perimeter?.ok === true)
  const formulas = measureFormulas(row, keyedRow, room, layout)
  for (const [measure, formula] of Object.entries(formulas) as [MeasureName, string | null][]) {
    const value = measures[measure]
    if (!value?.ok) {
      draft.set(row, COLUMN[measure], text('not known', 'problem'))
      continue
    }
    const style = measure === 'windows' || measure === 'doors' ? 'count' : 'number'
    const cell = formula === null ? number(value.value, style) : live(formula, value.value, style)
    draft.setNamed(roomMeasureName(roomNumber, measure), row, COLUMN[measure], cell)
  }
}

/** The plan before deductions: by length and width where there are such, else the figure of the outline. */
function setPlan(draft: SheetDraft, row: number, keyedRow: number, { shape }: RoomInput, isSound: boolean): void {
  if (!isSound) {
    draft.set(row, COLUMN.plan_area, text('not known', 'problem'))
    return
  }
  const area = planFigures(shape).areaSqIn / SQ_IN_PER_SQ_FT
  const at = (column: number) => cellAddress(keyedRow, column)
  const box = `${at(ROOM_COLUMN.length)}*${at(ROOM_COLUMN.width)}`
  const cut = shape.kind === 'ell' ? `-${at(ROOM_COLUMN.cutLength)}*${at(ROOM_COLUMN.cutWidth)}` : ''
  draft.set(row, COLUMN.plan_area, shape.kind === 'polygon' ? number(area, 'number') : live(`${box}${cut}`, area, 'number'))
}

/** `null` where only the figure can stand. */
function measureFormulas(
  row: number,
  keyedRow: number,
  { shape, ceiling }: RoomInput,
  layout: RoomsLayout,
): Record<MeasureName, string | null> {
  const at = (column: keyof typeof COLUMN) => cellAddress(row, COLUMN[column])
  const keyed = (column: keyof typeof ROOM_COLUMN) => cellAddress(keyedRow, ROOM_COLUMN[column])
  const openings = (column: keyof typeof OPENING_COLUMN, ...more: string[]) =>
    `SUMIFS(${[layout.range('openings', OPENING_COLUMN[column]), layout.range('openings', OPENING_COLUMN.room), at('number'), ...more].join(',')})`
  const deductions = (column: keyof typeof DEDUCTION_COLUMN) =>
    `SUMIFS(${[layout.range('deductions', DEDUCTION_COLUMN[column]), layout.range('deductions', DEDUCTION_COLUMN.room), at('number')].join(',')})`
  const kind = (word: string) => [layout.range('openings', OPENING_COLUMN.kind), `"${word}"`]
  const isSloped = ceiling?.kind === 'sloped'
  // A sloped ceiling rises across the width of a rectangle, and across the shorter side of the box around anything else.
  const run = shape.kind === 'rectangle' ? keyed('width') : `MIN(${keyed('length')},${keyed('width')})`
  return {
    height: isSloped ? `(${keyed('low')}+${keyed('high')})/2` : keyed('low'),
    floor_area: `${at('plan_area')}-${deductions('floor')}`,
    ceiling_area: isSloped ? `${at('plan_area')}*SQRT(1+((${keyed('high')}-${keyed('low')})/${run})^2)` : at('plan_area'),
    // A corner cut out of a rectangle takes nothing from the perimeter.
    perimeter: shape.kind === 'polygon' ? null : `2*(${keyed('length')}+${keyed('width')})`,
    wall_area_gross: `${at('perimeter')}*${at('height')}`,
    opening_area: openings('area'),
    wall_area: `${at('wall_area_gross')}-${openings('walls')}-${deductions('walls')}`,
    base_length: `${at('perimeter')}-${openings('base')}-${deductions('base')}`,
    volume: `${at('plan_area')}*${at('height')}`,
    windows: openings('count', ...kind('window')),
    doors: openings('count', ...kind('door')),
  }
}
