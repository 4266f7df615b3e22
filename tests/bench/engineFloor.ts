import type { EstimateInput } from '../../shared/engine/index.ts'
import { MODEL_FORMULAS, MODEL_SYSTEMS, MODEL_TRADES } from './engineModel.ts'

const ROOM_FIGURES = 9

/**
 * The least that computing the model can take: one loop over typed arrays, written by hand for the twelve formulas of the model, with sums by room, system, trade and in all.
 * It takes nothing that anyone could key: no other formula, no error, no order.
 */
export class EngineFloor {
  private readonly count: number
  /** Length, width, wall, base, windows and the rest of each room, in a row. */
  private readonly rooms: Float64Array
  private readonly room: Int32Array
  private readonly formula: Int32Array
  private readonly system: Int32Array
  private readonly trade: Int32Array
  private readonly wasteHundred: Float64Array
  private readonly packageSize: Float64Array
  private readonly low: Float64Array
  private readonly likely: Float64Array
  private readonly high: Float64Array
  private readonly minimum: Float64Array
  private readonly hoursPerUnit: Float64Array
  private readonly amountLow: Float64Array
  private readonly amountLikely: Float64Array
  private readonly amountHigh: Float64Array
  private readonly hours: Float64Array
  private readonly byRoom: Float64Array
  private readonly bySystem = new Float64Array(MODEL_SYSTEMS * 4)
  private readonly byTrade = new Float64Array(MODEL_TRADES * 4)
  private readonly linesOfRoom: Int32Array[]
  readonly total = new Float64Array(4)

  constructor({ rooms, lines }: EstimateInput) {
    this.count = lines.length
    this.rooms = new Float64Array(rooms.length * ROOM_FIGURES)
    this.byRoom = new Float64Array(rooms.length * 4)
    this.room = Int32Array.from(lines, ({ roomKey }) => Number(roomKey?.slice('room-'.length)))
    this.formula = Int32Array.from(lines, ({ quantity }) => MODEL_FORMULAS.findIndex(({ text }) => text === quantity))
    this.system = Int32Array.from(lines, ({ system }) => Number(system.slice('system-'.length)))
    this.trade = Int32Array.from(lines, ({ trade }) => Number(trade.slice('trade-'.length)))
    this.wasteHundred = Float64Array.from(lines, ({ wastePercent }) => 100 + wastePercent)
    this.packageSize = Float64Array.from(lines, ({ packageSize }) => packageSize ?? 0)
    this.low = Float64Array.from(lines, ({ unitPriceE4 }) => unitPriceE4?.low ?? 0)
    this.likely = Float64Array.from(lines, ({ unitPriceE4 }) => unitPriceE4?.likely ?? 0)
    this.high = Float64Array.from(lines, ({ unitPriceE4 }) => unitPriceE4?.high ?? 0)
    this.minimum = Float64Array.from(lines, ({ minimumChargeCents }) => minimumChargeCents)
    this.hoursPerUnit = Float64Array.from(lines, ({ hoursPerUnit }) => hoursPerUnit)
    this.amountLow = new Float64Array(lines.length)
    this.amountLikely = new Float64Array(lines.length)
    this.amountHigh = new Float64Array(lines.length)
    this.hours = new Float64Array(lines.length)
    this.linesOfRoom = rooms.map((_, index) => Int32Array.from([...this.room.keys()].filter((line) => this.room[line] === index)))
    rooms.forEach((room, index) => {
      const windows = room.openings.find(({ kind }) => kind === 'window')?.count ?? 0
      if (room.shape.kind === 'rectangle') this.measureRoom(index, room.shape.lengthIn, room.shape.widthIn, windows)
    })
  }

  /** Everything from the start. */
  recalculate(): void {
    this.total.fill(0)
    this.byRoom.fill(0)
    this.bySystem.fill(0)
    this.byTrade.fill(0)
    for (let line = 0; line < this.count; line += 1) {
      this.work(line)
      this.add(line, 1)
    }
  }

  setPrice(line: number, likelyE4: number): void {
    this.add(line, -1)
    this.low[line] = Math.round(likelyE4 * 0.8)
    this.likely[line] = likelyE4
    this.high[line] = Math.round(likelyE4 * 1.4)
    this.work(line)
    this.add(line, 1)
  }

  setRoomLength(room: number, lengthIn: number): void {
    const at = room * ROOM_FIGURES
    this.measureRoom(room, lengthIn, (this.rooms[at + 1] as number) * 12, this.rooms[at + 6] as number)
    for (const line of this.linesOfRoom[room] as Int32Array) {
      this.add(line, -1)
      this.work(line)
      this.add(line, 1)
    }
  }

  private measureRoom(room: number, lengthIn: number, widthIn: number, windows: number): void {
    const at = room * ROOM_FIGURES
    const perimeterIn = 2 * (lengthIn + widthIn)
    this.rooms[at] = lengthIn / 12
    this.rooms[at + 1] = widthIn / 12
    this.rooms[at + 2] = (lengthIn * widthIn) / 144
    this.rooms[at + 3] = (perimeterIn * 96 - 32 * 80 - 36 * 48 * windows) / 144
    this.rooms[at + 4] = perimeterIn / 12
    this.rooms[at + 5] = (perimeterIn - 32) / 12
    this.rooms[at + 6] = windows
    this.rooms[at + 7] = 1
    this.rooms[at + 8] = (lengthIn * widthIn) / 144
  }

  private work(line: number): void {
    const measured = this.measure(this.formula[line] as number, (this.room[line] as number) * ROOM_FIGURES)
    const needed = (measured * (this.wasteHundred[line] as number)) / 100
    const size = this.packageSize[line] as number
    const hundredths = Math.floor((size > 0 ? Math.ceil(needed / size - 1e-9) * size : needed) * 100 + 0.5 + 5e-8)
    const minimum = this.minimum[line] as number
    this.amountLow[line] = Math.max(minimum, Math.floor((hundredths * (this.low[line] as number) + 5000) / 10_000))
    this.amountLikely[line] = Math.max(minimum, Math.floor((hundredths * (this.likely[line] as number) + 5000) / 10_000))
    this.amountHigh[line] = Math.max(minimum, Math.floor((hundredths * (this.high[line] as number) + 5000) / 10_000))
    this.hours[line] = Math.floor(hundredths * (this.hoursPerUnit[line] as number) + 0.5 + 5e-8)
  }

  private measure(formula: number, at: number): number {
    const { rooms } = this
    switch (formula) {
      case 0:
        return rooms[at + 2] as number
      case 1:
        return rooms[at + 3] as number
      case 2:
        return (rooms[at + 8] as number) * 1.05
      case 3:
        return rooms[at + 5] as number
      case 4:
        return (rooms[at + 4] as number) - 3
      case 5:
        return Math.ceil(((rooms[at + 3] as number) / 350) * 2 - 5e-10)
      case 6:
        return (rooms[at + 6] as number) + (rooms[at + 7] as number)
      case 7:
        return ((rooms[at] as number) + 2) * ((rooms[at + 1] as number) + 2)
      case 8:
        return Math.max(rooms[at + 2] as number, 150)
      case 9:
        return Math.min(rooms[at + 3] as number, 400) + Math.max(rooms[at + 2] as number, 100)
      case 10:
        return Math.sqrt(rooms[at + 2] as number) * 4
      default:
        return 12
    }
  }

  private add(line: number, sign: number): void {
    const low = sign * (this.amountLow[line] as number)
    const likely = sign * (this.amountLikely[line] as number)
    const high = sign * (this.amountHigh[line] as number)
    const hours = sign * (this.hours[line] as number)
    addTo(this.total, 0, low, likely, high, hours)
    addTo(this.byRoom, this.room[line] as number, low, likely, high, hours)
    addTo(this.bySystem, this.system[line] as number, low, likely, high, hours)
    addTo(this.byTrade, this.trade[line] as number, low, likely, high, hours)
  }
}

function addTo(sums: Float64Array, group: number, low: number, likely: number, high: number, hours: number): void {
  const at = group * 4
  sums[at] = (sums[at] as number) + low
  sums[at + 1] = (sums[at + 1] as number) + likely
  sums[at + 2] = (sums[at + 2] as number) + high
  sums[at + 3] = (sums[at + 3] as number) + hours
}
