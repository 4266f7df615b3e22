import { compile, type EvalFunction } from 'mathjs'
import { roomMeasures, type EstimateInput, type LineInput } from '../../shared/engine/index.ts'

interface Sums {
  low: number
  likely: number
  high: number
  hours: number
}

/** The model as one would write it with mathjs: each distinct formula compiled once, a scope object a room, sums in maps. */
export class EngineMathjs {
  private readonly scopes: Map<string, Record<string, number>>
  private readonly lines: { line: LineInput; formula: EvalFunction; scope: Record<string, number> }[]
  total: Sums = nothing()

  constructor({ rooms, lines }: EstimateInput) {
    this.scopes = new Map(
      rooms.map((room) => {
        const figures = Object.entries(roomMeasures(room)).flatMap(([name, value]) => (value.ok ? [[name, value.value] as const] : []))
        return [room.key, Object.fromEntries(figures)]
      }),
    )
    const compiled = new Map<string, EvalFunction>()
    this.lines = lines.map((line) => {
      const text = String(line.quantity)
      const formula = compiled.get(text) ?? compile(text)
      compiled.set(text, formula)
      return { line, formula, scope: this.scopes.get(line.roomKey ?? '') ?? {} }
    })
  }

  recalculate(): void {
    const groups = { room: new Map<string, Sums>(), system: new Map<string, Sums>(), trade: new Map<string, Sums>() }
    this.total = nothing()
    for (const { line, formula, scope } of this.lines) {
      const needed = (Number(formula.evaluate(scope)) * (100 + line.wastePercent)) / 100
      const size = line.packageSize ?? 0
      const hundredths = Math.floor((size > 0 ? Math.ceil(needed / size - 1e-9) * size : needed) * 100 + 0.5 + 5e-8)
      const amounts = {
        low: amount(hundredths, line.unitPriceE4?.low ?? 0, line.minimumChargeCents),
        likely: amount(hundredths, line.unitPriceE4?.likely ?? 0, line.minimumChargeCents),
        high: amount(hundredths, line.unitPriceE4?.high ?? 0, line.minimumChargeCents),
        hours: Math.floor(hundredths * line.hoursPerUnit + 0.5 + 5e-8),
      }
      add(this.total, amounts)
      add(groupOf(groups.room, line.roomKey ?? ''), amounts)
      add(groupOf(groups.system, line.system), amounts)
      add(groupOf(groups.trade, line.trade), amounts)
    }
  }
}

function nothing(): Sums {
  return { low: 0, likely: 0, high: 0, hours: 0 }
}

function amount(hundredths: number, priceE4: number, minimum: number): number {
  return Math.max(minimum, Math.floor((hundredths * priceE4 + 5000) / 10_000))
}

function groupOf(groups: Map<string, Sums>, key: string): Sums {
  const known = groups.get(key)
  if (known) return known
  const sums = nothing()
  groups.set(key, sums)
  return sums
}

function add(sums: Sums, amounts: Sums): void {
  sums.low += amounts.low
  sums.likely += amounts.likely
  sums.high += amounts.high
  sums.hours += amounts.hours
}
