import type { HouseInput } from '../estimateInput.ts'
import { HOUSE_PLACE, type FormulaColumns } from '../formula/formulaColumns.ts'
import { ROOMS_HOUSE_MEASURES } from '../takeoff/houseMeasureList.ts'
import type { MeasureValue } from '../takeoff/measure.ts'
import { ownHouseMeasures } from '../takeoff/ownHouseMeasures.ts'
import { roomsMeasure } from '../takeoff/roomsMeasure.ts'
import type { RoomTable } from './roomTable.ts'

/** The house's measures in the column that formulas read. Those that come from its rooms are kept once a formula has asked for them. */
export class HouseFigures {
  private own: Record<string, MeasureValue> = {}
  private readonly asked = new Set<string>()

  constructor(
    private readonly columns: FormulaColumns,
    private readonly rooms: RoomTable,
  ) {}

  setHouse(house: HouseInput): void {
    this.own = ownHouseMeasures(house)
    for (const [name, value] of Object.entries(this.own)) this.write(name, value)
  }

  askFor(names: readonly string[]): void {
    for (const name of names) {
      if (this.asked.has(name)) continue
      this.asked.add(name)
      this.write(name, this.ofRooms(name))
    }
  }

  roomsChanged(): void {
    for (const name of this.asked) this.write(name, this.ofRooms(name))
  }

  measures(): Record<string, MeasureValue> {
    return { ...this.own, ...Object.fromEntries(ROOMS_HOUSE_MEASURES.map(({ name }) => [name, this.ofRooms(name)])) }
  }

  whyNot(name: string): string {
    const value = this.own[name] ?? this.ofRooms(name)
    return value.ok ? '' : value.message
  }

  private ofRooms(name: string): MeasureValue {
    return roomsMeasure(name, this.rooms.rooms, this.columns.roomValues)
  }

  private write(name: string, value: MeasureValue): void {
    this.columns.houseValues[HOUSE_PLACE[name] ?? -1] = value.ok ? value.value : NaN
  }
}
