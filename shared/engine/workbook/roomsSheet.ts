import type { HouseInput, RoomInput } from '../estimateInput.ts'
import { setHouseRows } from './houseRows.ts'
import { setMeasureRow } from './measureRows.ts'
import { setDeductionRow, setOpeningRow } from './openingRows.ts'
import { setRoomRow } from './roomRows.ts'
import { RoomsLayout } from './roomsLayout.ts'
import { SheetDraft, text } from './sheetDraft.ts'
import { SHEET_TITLES } from './sheetTitles.ts'
import type { NamedCell, WorkbookSheet } from './workbookModel.ts'

const WIDTHS = [6, 25, 11, 16, 10, 10, 10, 10, 10, 10, 10, 10, 10, 10]
const ROOM_HEADS = [
  ['No.', 'Room', 'Use', 'Shape', 'Length, ft', 'Width, ft', 'Cut length, ft', 'Cut width, ft'],
  ['Ceiling', 'Height or low, ft', 'High, ft', 'As keyed', '', ''],
].flat()
const MEASURE_HEADS = [
  ['No.', 'Room', 'Height, ft', 'Plan, sq ft', 'Floor, sq ft', 'Ceiling, sq ft', 'Perimeter, ft', 'Walls gross, sq ft'],
  ['Openings, sq ft', 'Walls net, sq ft', 'Base, ft', 'Volume, cu ft', 'Windows', 'Doors'],
].flat()
const OPENING_HEADS = [
  ['Room', '', 'Opening', 'As keyed', 'Width, ft', 'Height, ft', 'Count', 'Off walls', 'Off base'],
  ['Area, sq ft', 'Off walls, sq ft', 'Off base, ft', '', ''],
].flat()
const DEDUCTION_HEADS = [
  ['Room', '', 'Covers', 'As keyed', 'Width, ft', 'Height, ft', 'Depth, ft', 'Count'],
  ['Off walls', 'Off floor', 'Off base', 'Off walls, sq ft', 'Off floor, sq ft', 'Off base, ft'],
].flat()
const TEXT_HEADS = new Set(['Room', 'Use', 'As keyed', 'Shape', 'Ceiling', 'Opening', 'Covers', '', 'Off walls', 'Off base', 'Off floor'])

/** What was keyed and what it measures: rooms, their openings and deductions, the house. Quantities on the estimate point here by name. */
export function roomsSheet(house: HouseInput, rooms: readonly RoomInput[]): { sheet: WorkbookSheet; names: NamedCell[] } {
  const draft = new SheetDraft(SHEET_TITLES.rooms)
  const layout = new RoomsLayout(rooms)
  draft.set(1, 1, text('Rooms', 'title'))
  draft.set(2, 1, text('Dimensions in feet; tinted ones may be changed, and the quantities that rest on them follow.', 'subtitle'))
  setHeads(draft, layout.rooms, 'As keyed', ROOM_HEADS)
  rooms.forEach((room, index) => setRoomRow(draft, layout.rooms.firstRow + index, index + 1, room))
  setHeads(draft, layout.measures, 'What they measure', MEASURE_HEADS)
  rooms.forEach((room, index) => setMeasureRow(draft, index + 1, room, layout))

  setHeads(draft, layout.openings, 'Doors, windows and openings', OPENING_HEADS)
  const ofRooms = rooms.map(({ name }, index) => ({ roomNumber: index + 1, roomName: name }))
  const openings = rooms.flatMap((room, index) => room.openings.map((opening) => ({ ofRoom: ofRooms[index], opening })))
  openings.forEach(({ ofRoom, opening }, index) => ofRoom && setOpeningRow(draft, layout.openings.firstRow + index, ofRoom, opening))

  setHeads(draft, layout.deductions, 'Cabinets, tubs and what else covers walls or floor', DEDUCTION_HEADS)
  const deductions = rooms.flatMap((room, index) => room.deductions.map((deduction) => ({ ofRoom: ofRooms[index], deduction })))
  deductions.forEach(
    ({ ofRoom, deduction }, index) => ofRoom && setDeductionRow(draft, layout.deductions.firstRow + index, ofRoom, deduction),
  )

  setHouseRows(draft, house, rooms, layout)
  const sheet = draft.finish({
    widths: WIDTHS,
    frozen: { rows: 0, columns: 2 },
    print: { orientation: 'landscape', titleRows: null },
  })
  return { sheet, names: draft.names }
}

function setHeads(draft: SheetDraft, { headingRow }: { headingRow: number }, heading: string, heads: readonly string[]): void {
  draft.setRow(headingRow, 1, [text(heading, 'heading'), ...heads.slice(1).map(() => text('', 'heading'))])
  draft.setRow(
    headingRow + 1,
    1,
    heads.map((head) => text(head, TEXT_HEADS.has(head) ? 'head' : 'head-right')),
  )
}
