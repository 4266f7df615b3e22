import type { LowLikelyHigh } from '../../schemas/common.ts'

export interface Subtotal {
  amountCents: LowLikelyHigh
  hours: number
  /** All lines of the group, those with an error too. */
  lineCount: number
}

const STRIDE = 4
const LOW = 0
const LIKELY = 1
const HIGH = 2
const HOURS = 3

/** Running sums of the lines by one thing that they have in common, as their room. Whole cents and hundredths of an hour, so that adding and taking away leaves no trace. */
export class GroupSums {
  private readonly ids = new Map<string | null, number>()
  private readonly keys: (string | null)[] = []
  private readonly counts: number[] = []
  private sums = new Float64Array(16 * STRIDE)

  /** The number that a group goes by here. */
  idOf(key: string | null): number {
    const known = this.ids.get(key)
    if (known !== undefined) return known
    const id = this.keys.push(key) - 1
    this.ids.set(key, id)
    this.counts.push(0)
    if (this.keys.length * STRIDE > this.sums.length) this.grow()
    return id
  }

  count(id: number, change: 1 | -1): void {
    this.counts[id] = (this.counts[id] ?? 0) + change
  }

  add(id: number, low: number, likely: number, high: number, hoursHundredths: number): void {
    const { sums } = this
    const at = id * STRIDE
    sums[at + LOW] = (sums[at + LOW] as number) + low
    sums[at + LIKELY] = (sums[at + LIKELY] as number) + likely
    sums[at + HIGH] = (sums[at + HIGH] as number) + high
    sums[at + HOURS] = (sums[at + HOURS] as number) + hoursHundredths
  }

  clear(): void {
    this.sums.fill(0)
  }

  /** Only groups that have a line. */
  subtotals(): Map<string | null, Subtotal> {
    const subtotals = new Map<string | null, Subtotal>()
    this.keys.forEach((key, id) => {
      const lineCount = this.counts[id] ?? 0
      const [low = 0, likely = 0, high = 0, hours = 0] = this.sums.subarray(id * STRIDE, (id + 1) * STRIDE)
      if (lineCount > 0) subtotals.set(key, { amountCents: { low, likely, high }, hours: hours / 100, lineCount })
    })
    return subtotals
  }

  private grow(): void {
    const sums = new Float64Array(this.sums.length * 2)
    sums.set(this.sums)
    this.sums = sums
  }
}
