import type { HouseInput, RoomInput } from '../estimateInput.ts'
import { houseMeasures } from '../takeoff/houseMeasures.ts'
import { MEASURES } from '../takeoff/measureList.ts'
import { ROOM_PLACE, type RoomMeasureName } from '../takeoff/roomMeasureList.ts'
import { isLivedIn } from '../takeoff/roomsMeasure.ts'
import { roofShares } from '../takeoff/roofShares.ts'
import { formatLength } from '../units/formatLength.ts'
import { cellAddress } from './cellAddress.ts'
import { houseMeasureName, roomMeasureName } from './measureNames.ts'
import { MEASURE_COLUMN, ROOM_COLUMN, type RoomsLayout } from './roomsLayout.ts'
import { live, number, text, type SheetDraft } from './sheetDraft.ts'
import type { WorkbookCell } from './workbookModel.ts'

const COLUMN = { title: 2, name: 3, value: 5, unit: 6 } as const
const FEET = 12
const ROOM_MEASURE_NAMES = Object.keys(ROOM_PLACE) as RoomMeasureName[]
const UNIT_WORDS = { area: 'sq ft', length: 'ft', volume: 'cu ft', count: '' } as const

/** Cells of what was keyed for the house, for its measures to point at. */
interface HouseCells {
  length?: string
  width?: string
  cutLength?: string
  cutWidth?: string
  wallHeight?: string
  storeys?: string
  overhang?: string
  /** For each roof group: its rise and its share, a number of percent. */
  roof: { rise: string; share: string }[]
}

/** The house's own dimensions, to be changed, and its measures over them and over the rooms. */
export function setHouseRows(draft: SheetDraft, house: HouseInput, rooms: readonly RoomInput[], layout: RoomsLayout): void {
  draft.setRow(layout.houseRow, 1, [text('House', 'heading'), ...Array.from({ length: COLUMN.unit - 1 }, () => text('', 'heading'))])
  const { cells, nextRow } = setDimensions(draft, layout.houseRow + 1, house)
  draft.setRow(nextRow + 1, COLUMN.title, [
    text('House measure', 'head'),
    text('Name in a formula', 'head'),
    text('', 'head'),
    text('Value', 'head-right'),
    text('', 'head'),
  ])
  const measures = houseMeasures(house, rooms)
  const formulas = { ...houseFormulas(house, cells), ...roomFormulas(rooms, layout) }
  MEASURES.filter(({ scope }) => scope === 'house').forEach(({ name, title, dimension, size }, index) => {
    const row = nextRow + 2 + index
    const value = measures[name]
    const style = dimension === 'count' ? 'count' : 'number'
    draft.setRow(row, COLUMN.title, [text(title, 'label'), text(name), text('')])
    draft.merge(row, COLUMN.name, COLUMN.name + 1)
    draft.set(row, COLUMN.unit, text(size === 100 ? 'squares' : UNIT_WORDS[dimension]))
    if (!value?.ok) {
      draft.set(row, COLUMN.value, text('not known', 'problem'))
      return
    }
    const formula = formulas[name]
    draft.setNamed(
      houseMeasureName(name),
      row,
      COLUMN.value,
      formula === undefined ? number(value.value, style) : live(formula, value.value, style),
    )
  })
}

function setDimensions(
  draft: SheetDraft,
  firstRow: number,
  { footprint, wallHeightIn, storeys, overhangIn, roof }: HouseInput,
): { cells: HouseCells; nextRow: number } {
  const cells: HouseCells = { roof: [] }
  let row = firstRow
  const put = (title: string, keyed: string, cell: WorkbookCell, unit: string): string => {
    draft.setRow(row, COLUMN.title, [text(title, 'label'), text(keyed), text(''), cell, text(unit)])
    row += 1
    return cellAddress(row - 1, COLUMN.value)
  }
  const length = (title: string, inches: number) => put(title, formatLength(inches), number(inches / FEET, 'input-feet'), 'ft')
  if (footprint && footprint.kind !== 'polygon') {
    cells.length = length('Footprint, length', footprint.lengthIn)
    cells.width = length('Footprint, width', footprint.widthIn)
    if (footprint.kind === 'ell') {
      cells.cutLength = length('Footprint, cut length', footprint.cutLengthIn)
      cells.cutWidth = length('Footprint, cut width', footprint.cutWidthIn)
    }
  }
  if (wallHeightIn !== null) cells.wallHeight = length('Outside wall, height of a storey', wallHeightIn)
  cells.storeys = put('Storeys', '', number(storeys, 'input-number'), '')
  if (overhangIn !== null) cells.overhang = length('Roof overhang', overhangIn)
  const shares = roofShares(roof)
  roof.forEach(({ kind, rise }, index) => {
    cells.roof.push({
      rise: put(`Roof ${index + 1}, ${kind}`, `${rise} in 12`, number(rise, 'input-number'), 'in 12'),
      share: put(`Roof ${index + 1}, share of the plan`, '', number((shares?.[index] ?? 0) * 100, 'input-percent'), '%'),
    })
  })
  return { cells, nextRow: row }
}

/** Measures of the house itself, where its footprint is a rectangle or an L. */
function houseFormulas(house: HouseInput, cells: HouseCells): Record<string, string | undefined> {
  const { length, width, cutLength, cutWidth } = cells
  if (length === undefined || width === undefined) return {}
  const cut = cutLength && cutWidth ? `-${cutLength}*${cutWidth}` : ''
  const [footprint, perimeter] = [houseMeasureName('footprint_area'), houseMeasureName('outside_perimeter')]
  const walls =
    cells.wallHeight && cells.storeys
      ? { outside_wall_area: `${perimeter}*${cells.wallHeight}*${cells.storeys}+${houseMeasureName('gable_area')}` }
      : {}
  return {
    footprint_area: `${length}*${width}${cut}`,
    outside_perimeter: `2*(${length}+${width})`,
    ...walls,
    ...(cells.overhang ? roofFormulas(house, cells, { footprint, perimeter, overhang: cells.overhang }) : {}),
  }
}

interface RoofParts {
  footprint: string
  perimeter: string
  overhang: string
}

/** An overhang all round a rectangle or an L adds its depth along the perimeter and, at the corners, four squares of it. */
function roofFormulas(
  { roof, footprint: shape }: HouseInput,
  cells: HouseCells,
  { footprint, perimeter, overhang }: RoofParts,
): Record<string, string> {
  const slopes = cells.roof.map(({ rise, share }) => `${share}/100*SQRT(1+(${rise}/12)^2)`)
  const area = {
    roof_area: `(${footprint}+${perimeter}*${overhang}+4*${overhang}^2)*(${slopes.join('+')})`,
    roof_squares: `${houseMeasureName('roof_area')}/100`,
  }
  const [group] = roof
  const isOneRoofOnRectangle = roof.length === 1 && shape?.kind === 'rectangle'
  if (!group || !isOneRoofOnRectangle) return area
  const [long, short] = [`MAX(${cells.length},${cells.width})`, `MIN(${cells.length},${cells.width})`]
  const rake = `${long}+2*${overhang}`
  const rise = cells.roof[0]?.rise ?? '0'
  const allRound = `${perimeter}+8*${overhang}`
  switch (group.kind) {
    case 'gable':
      return { ...area, ridge_length: rake, eave_length: `2*(${rake})`, gable_area: `${short}*${short}/2*${rise}/12` }
    case 'hip':
      return { ...area, ridge_length: `${long}-${short}`, eave_length: allRound }
    case 'shed':
      return { ...area, eave_length: rake, gable_area: `${short}*${short}*${rise}/12+${long}*${short}*${rise}/12` }
    case 'flat':
      return { ...area, eave_length: allRound }
  }
}

/** Measures that add up the rooms. Living area leaves out the rooms that no one lives in, one by one. */
function roomFormulas(rooms: readonly RoomInput[], layout: RoomsLayout): Record<string, string> {
  const columnOf = (measure: RoomMeasureName) =>
    measure === 'length' || measure === 'width'
      ? layout.range('rooms', ROOM_COLUMN[measure])
      : layout.range('measures', MEASURE_COLUMN[measure])
  const sums = ROOM_MEASURE_NAMES.map((measure) => [`sum_${measure}`, `SUM(${columnOf(measure)})`])
  const lived = rooms.flatMap((room, index) => (isLivedIn(room) ? [roomMeasureName(index + 1, 'floor_area')] : []))
  return {
    ...Object.fromEntries(sums),
    living_area: lived.length > 0 ? lived.join('+') : '0',
    windows: `SUM(${columnOf('windows')})`,
    sleeping_rooms: `COUNTIF(${layout.range('rooms', ROOM_COLUMN.use)},"sleeping")`,
  }
}
