import type { EstimateSettings, Totals } from '../../schemas/estimate.ts'
import type { EstimateResults, ResultError } from '../../schemas/results.ts'
import type { EstimateInput, HouseInput, LineInput, RoomInput } from '../estimateInput.ts'
import { explainFailure } from '../formula/explainFailure.ts'
import type { FormulaColumns } from '../formula/formulaColumns.ts'
import type { FormulaParser } from '../formula/parsedNode.ts'
import { toBillionth } from '../money/roundQuantity.ts'
import { HOUSE_MEASURES } from '../takeoff/houseMeasureList.ts'
import type { Measure } from '../takeoff/measure.ts'
import { ROOM_MEASURE_COUNT } from '../takeoff/roomMeasureList.ts'
import { whyNoRoomMeasure } from '../takeoff/whyNoRoomMeasure.ts'
import { addersOf, type Adders } from './adders.ts'
import { estimateTotals } from './estimateTotals.ts'
import { FormulaShelf, type LineFormula } from './formulaShelf.ts'
import type { Subtotal } from './groupSums.ts'
import { HouseFigures } from './houseFigures.ts'
import { lineError, lineErrorOf, type LineError } from './lineError.ts'
import type { LineFigures } from './lineFigures.ts'
import { LineTable } from './lineTable.ts'
import { resultsOf } from './resultsOf.ts'
import { NO_ROW, RoomTable, type RoomPlace } from './roomTable.ts'
import { RunningSums, type SubtotalKind } from './runningSums.ts'
import { totalsProblem } from './totalsProblem.ts'

/** Row that the house's own lines are worked out for: their formulas read no room. */
const HOUSE_ROW = 0

/**
 * An estimate that is kept computed while it is edited: each change works out the lines that it touches and nothing else, and the totals follow by what those changed.
 * However it came to be what it is, its figures are those of computing it afresh.
 */
export class LiveEstimate {
  private readonly columns: FormulaColumns = {
    roomValues: new Float64Array(16 * ROOM_MEASURE_COUNT),
    roomRows: [],
    roomsStamp: 0,
    houseValues: new Float64Array(HOUSE_MEASURES.length).fill(NaN),
  }
  private readonly rooms = new RoomTable(this.columns)
  private readonly house = new HouseFigures(this.columns, this.rooms)
  private readonly lines = new LineTable()
  private readonly sums = new RunningSums()
  private readonly shelf: FormulaShelf
  private readonly slots = new Map<string, number>()
  private readonly freeSlots: number[] = []
  /** Slots in the order of the estimate. */
  private readonly order: number[] = []
  /** Slots of lines that a change of any room may change. */
  private readonly roomDependents = new Set<number>()
  private adders: Adders
  private readonly explain = (slot: number): LineError => this.explainLine(slot)

  constructor({ house, rooms, lines, settings }: EstimateInput, parse: FormulaParser) {
    this.shelf = new FormulaShelf(this.columns, parse)
    this.adders = addersOf(settings)
    this.house.setHouse(house)
    for (const room of rooms) this.rooms.put(room)
    for (const line of lines) this.enter(this.newSlot(line.key, null), line)
    this.recalculate()
  }

  /** Works everything out again from what is keyed. */
  recalculate(): void {
    const { lines, sums, order, explain } = this
    sums.clear()
    for (let index = 0; index < order.length; index += 1) {
      const slot = order[index] as number
      lines.work(slot, explain)
      sums.add(lines.columns, slot, 1)
    }
  }

  setLine(key: string, line: LineInput): void {
    const slot = this.slotOf(key)
    this.leave(slot)
    this.enter(slot, { ...line, key })
    this.workAndAdd(slot)
  }

  /** Adds a line below another; at the end where none is named. */
  addLine(line: LineInput, afterKey?: string | null): void {
    const slot = this.newSlot(line.key, afterKey ?? null)
    this.enter(slot, line)
    this.workAndAdd(slot)
  }

  removeLine(key: string): void {
    const slot = this.slotOf(key)
    this.leave(slot)
    this.lines.errors.delete(slot)
    this.slots.delete(key)
    this.order.splice(this.order.indexOf(slot), 1)
    this.freeSlots.push(slot)
  }

  setRoom(key: string, room: RoomInput): void {
    if (!this.rooms.has(key)) throw new RangeError(`There is no room ${key} in this estimate.`)
    this.roomChanged(this.rooms.put({ ...room, key }))
  }

  /** Adds a room; lines that named it already have it from now on. */
  addRoom(room: RoomInput): void {
    if (this.rooms.has(room.key)) throw new RangeError(`Room ${room.key} is in this estimate already.`)
    this.roomChanged(this.rooms.put(room))
  }

  /** Takes a room away. Its lines stay, each with the error that its room is not there. */
  removeRoom(key: string): void {
    this.roomChanged(this.rooms.remove(key))
  }

  setHouse(house: HouseInput): void {
    this.house.setHouse(house)
    this.recalculate()
  }

  setSettings(settings: EstimateSettings): void {
    this.adders = addersOf(settings)
  }

  line(key: string): LineFigures {
    return this.figuresOf(this.slotOf(key))
  }

  totals(): Totals {
    return estimateTotals(this.sums.direct(), this.adders)
  }

  subtotals(by: SubtotalKind): Map<string | null, Subtotal> {
    return this.sums.subtotals(by)
  }

  /** Own-hands hours of all lines. */
  hours(): number {
    return this.sums.hours()
  }

  errors(): ResultError[] {
    const { errors } = this.lines
    const ofTotals = totalsProblem(this.totals())
    if (errors.size === 0) return ofTotals
    const ofLines = this.order.flatMap((slot, index) => {
      const error = errors.get(slot)
      return error ? [{ path: `lines[${index}].${error.field}`, code: error.code, message: error.message }] : []
    })
    return [...ofLines, ...ofTotals]
  }

  results(): EstimateResults {
    return resultsOf({
      house: this.house.measures(),
      rooms: this.rooms.rooms.map(({ room }) => room),
      lines: this.order.map((slot) => ({ key: this.lines.inputs[slot]?.key ?? '', figures: this.figuresOf(slot) })),
      totals: this.totals(),
      errors: this.errors(),
    })
  }

  private slotOf(key: string): number {
    const slot = this.slots.get(key)
    if (slot === undefined) throw new RangeError(`There is no line ${key} in this estimate.`)
    return slot
  }

  private newSlot(key: string, afterKey: string | null): number {
    if (this.slots.has(key)) throw new RangeError(`Line ${key} is in this estimate already.`)
    const index = afterKey === null ? this.order.length : this.order.indexOf(this.slotOf(afterKey)) + 1
    const slot = this.freeSlots.pop() ?? this.slots.size
    this.order.splice(index, 0, slot)
    this.slots.set(key, slot)
    return slot
  }

  /** Puts a line in its slot, its room and its groups; it is not worked out yet. */
  private enter(slot: number, line: LineInput): void {
    const formula = this.shelf.formulaOf(line)
    this.house.askFor(formula.roomsMeasures)
    this.lines.put(slot, line, formula)
    this.lines.columns.row[slot] = this.takePlace(slot, line.roomKey)
    if (formula.dependsOnRooms) this.roomDependents.add(slot)
    this.sums.enter(this.lines.columns, slot, line.roomKey, line.system, line.trade)
  }

  private takePlace(slot: number, roomKey: string | null): number {
    if (roomKey === null) return HOUSE_ROW
    const place = this.rooms.placeOf(roomKey)
    place.slots.add(slot)
    return place.measured?.row ?? NO_ROW
  }

  /** Takes away what a line came to, and the line from its room and groups. */
  private leave(slot: number): void {
    const roomKey = this.inputAt(slot).roomKey
    this.sums.add(this.lines.columns, slot, -1)
    this.sums.leave(this.lines.columns, slot)
    this.roomDependents.delete(slot)
    if (roomKey !== null) this.rooms.placeOf(roomKey).slots.delete(slot)
  }

  private workAndAdd(slot: number): void {
    this.lines.work(slot, this.explain)
    this.sums.add(this.lines.columns, slot, 1)
  }

  private workAgain(slot: number): void {
    const { columns } = this.lines
    const low = columns.lowCents[slot] as number
    const likely = columns.likelyCents[slot] as number
    const high = columns.highCents[slot] as number
    const hours = columns.hoursHundredths[slot] as number
    this.lines.work(slot, this.explain)
    this.sums.change(
      columns,
      slot,
      (columns.lowCents[slot] as number) - low,
      (columns.likelyCents[slot] as number) - likely,
      (columns.highCents[slot] as number) - high,
      (columns.hoursHundredths[slot] as number) - hours,
    )
  }

  private roomChanged({ measured, slots }: RoomPlace): void {
    const row = measured?.row ?? NO_ROW
    this.house.roomsChanged()
    for (const slot of slots) {
      this.lines.columns.row[slot] = row
      this.workAgain(slot)
    }
    for (const slot of this.roomDependents) if (!slots.has(slot)) this.workAgain(slot)
  }

  private inputAt(slot: number): LineInput {
    return this.lines.inputs[slot] as LineInput
  }

  private figuresOf(slot: number): LineFigures {
    const { columns, errors, formulas } = this.lines
    const error = errors.get(slot) ?? null
    return {
      measured: toBillionth(columns.measured[slot] as number),
      quantity: (columns.quantityHundredths[slot] as number) / 100,
      amountCents: {
        low: columns.lowCents[slot] as number,
        likely: columns.likelyCents[slot] as number,
        high: columns.highCents[slot] as number,
      },
      hours: (columns.hoursHundredths[slot] as number) / 100,
      error: error && { code: error.code, message: error.message, ...(error.at && { at: error.at }) },
      unitPriceE4: this.inputAt(slot).unitPriceE4,
      formulaDimension: formulas[slot]?.dimension ?? null,
    }
  }

  /** Why a line has no quantity. */
  private explainLine(slot: number): LineError {
    const formula = this.lines.formulas[slot] as LineFormula
    const row = this.lines.columns.row[slot] as number
    if (row === NO_ROW)
      return lineError('room', 'unknown-room', 'The room of this line is not in the house. Choose a room, or the house as a whole.')
    if (formula.error) return formula.error
    const whyNoMeasure = ({ scope, name }: Measure, at: number): string =>
      scope === 'house' ? this.house.whyNot(name) : whyNoRoomMeasure(this.rooms.roomAt(at), name)
    const failure = explainFailure(formula.node, row, { columns: this.columns, whyNoMeasure, roomName: (at) => this.rooms.roomAt(at).name })
    return lineErrorOf(failure, String(this.inputAt(slot).quantity))
  }
}
