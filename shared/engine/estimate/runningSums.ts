import type { DirectSums } from './estimateTotals.ts'
import { GroupSums, type Subtotal } from './groupSums.ts'
import type { LineColumns } from './lineColumns.ts'

export type SubtotalKind = 'room' | 'system' | 'trade'

/** All sums over the lines, kept by adding and taking away one line at a time. Whole cents and hundredths of an hour, so they stay exact. */
export class RunningSums {
  private readonly groups = { room: new GroupSums(), system: new GroupSums(), trade: new GroupSums() }
  /** Own hands low, likely, high; hired low, likely, high. */
  private readonly cents = new Float64Array(6)
  private hoursHundredths = 0

  /** Puts a line in its groups. */
  enter(lines: LineColumns, slot: number, roomKey: string | null, system: string, trade: string): void {
    const { room, system: systems, trade: trades } = this.groups
    room.count((lines.roomGroup[slot] = room.idOf(roomKey)), 1)
    systems.count((lines.systemGroup[slot] = systems.idOf(system)), 1)
    trades.count((lines.tradeGroup[slot] = trades.idOf(trade)), 1)
  }

  /** Takes a line out of its groups; what it came to must be taken away before. */
  leave(lines: LineColumns, slot: number): void {
    this.groups.room.count(lines.roomGroup[slot] as number, -1)
    this.groups.system.count(lines.systemGroup[slot] as number, -1)
    this.groups.trade.count(lines.tradeGroup[slot] as number, -1)
  }

  /** Adds what a line comes to, or with −1 takes it away. */
  add(lines: LineColumns, slot: number, sign: 1 | -1): void {
    const low = sign * (lines.lowCents[slot] as number)
    const likely = sign * (lines.likelyCents[slot] as number)
    const high = sign * (lines.highCents[slot] as number)
    this.change(lines, slot, low, likely, high, sign * (lines.hoursHundredths[slot] as number))
  }

  /** Adds what a line that stays in its groups came to more than before. */
  change(lines: LineColumns, slot: number, low: number, likely: number, high: number, hours: number): void {
    const { cents } = this
    const at = lines.isHired[slot] === 1 ? 3 : 0
    cents[at] = (cents[at] as number) + low
    cents[at + 1] = (cents[at + 1] as number) + likely
    cents[at + 2] = (cents[at + 2] as number) + high
    this.hoursHundredths += hours
    this.groups.room.add(lines.roomGroup[slot] as number, low, likely, high, hours)
    this.groups.system.add(lines.systemGroup[slot] as number, low, likely, high, hours)
    this.groups.trade.add(lines.tradeGroup[slot] as number, low, likely, high, hours)
  }

  clear(): void {
    this.cents.fill(0)
    this.hoursHundredths = 0
    this.groups.room.clear()
    this.groups.system.clear()
    this.groups.trade.clear()
  }

  direct(): DirectSums {
    const [ownLow = 0, ownLikely = 0, ownHigh = 0, hiredLow = 0, hiredLikely = 0, hiredHigh = 0] = this.cents
    return {
      ownHandsCents: { low: ownLow, likely: ownLikely, high: ownHigh },
      hiredCents: { low: hiredLow, likely: hiredLikely, high: hiredHigh },
    }
  }

  hours(): number {
    return this.hoursHundredths / 100
  }

  subtotals(by: SubtotalKind): Map<string | null, Subtotal> {
    return this.groups[by].subtotals()
  }
}
