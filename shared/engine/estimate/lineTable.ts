import { LINE_MAX_CENTS } from '../../schemas/common.ts'
import type { LineInput } from '../estimateInput.ts'
import type { Evaluate } from '../formula/compileFormula.ts'
import { QUANTITY_MAX } from '../formula/formulaLimits.ts'
import { lineAmountCents } from '../money/lineAmount.ts'
import { hundredthsOf, wholePackages } from '../money/roundQuantity.ts'
import type { LineFormula } from './formulaShelf.ts'
import { LineColumns } from './lineColumns.ts'
import { lineError, type LineError } from './lineError.ts'
import { NO_ROW } from './roomTable.ts'

/** Binary noise below zero is zero. */
const NEARLY_ZERO = -1e-9

/** The lines as columns, and what each comes to. Knows nothing of the other lines, of rooms or of sums. */
export class LineTable {
  readonly columns = new LineColumns()
  readonly inputs: LineInput[] = []
  readonly formulas: LineFormula[] = []
  readonly errors = new Map<number, LineError>()
  private readonly evaluates: Evaluate[] = []

  /** Puts a line in a slot. The row of its room is put in by whoever knows the rooms. */
  put(slot: number, line: LineInput, formula: LineFormula): void {
    const { columns } = this
    const isHired = line.basis === 'hired'
    columns.fit(slot)
    this.inputs[slot] = line
    this.formulas[slot] = formula
    this.evaluates[slot] = formula.evaluate
    columns.wasteHundred[slot] = 100 + line.wastePercent
    columns.packageSize[slot] = isHired ? 0 : (line.packageSize ?? 0)
    columns.lowE4[slot] = line.unitPriceE4?.low ?? NaN
    columns.likelyE4[slot] = line.unitPriceE4?.likely ?? NaN
    columns.highE4[slot] = line.unitPriceE4?.high ?? NaN
    columns.minimumCents[slot] = isHired ? line.minimumChargeCents : 0
    columns.hoursPerUnit[slot] = isHired ? 0 : line.hoursPerUnit
    columns.isHired[slot] = isHired ? 1 : 0
  }

  /**
   * Works a line out: measured × (1 + waste), for own hands up to whole packages, to 2 decimals; × each unit price, to the cent; for hired work at least the minimum charge.
   * 125 sq ft, 10 % waste, boxes of 22.5 at $3.00 → 137.5 → 7 boxes → 157.5 → $472.50. `explain` gives words to a formula without an answer.
   */
  work(slot: number, explain: (slot: number) => LineError): void {
    const { columns } = this
    const row = columns.row[slot] as number
    const evaluate = this.evaluates[slot] as Evaluate
    const answer = row === NO_ROW ? NaN : evaluate(row)
    const isQuantity = answer >= NEARLY_ZERO && answer <= QUANTITY_MAX
    if (!isQuantity) return this.fail(slot, explain(slot))
    const measured = Math.max(answer, 0)
    const hundredths = quantityHundredths(measured, columns.wasteHundred[slot] as number, columns.packageSize[slot] as number)
    columns.measured[slot] = measured
    columns.quantityHundredths[slot] = hundredths
    const highE4 = columns.highE4[slot] as number
    if (highE4 !== highE4) return this.failPriced(slot, NO_PRICE)
    const minimum = columns.minimumCents[slot] as number
    const high = Math.max(minimum, lineAmountCents(hundredths, highE4))
    if (high >= LINE_MAX_CENTS) return this.failPriced(slot, TOO_LARGE)
    columns.lowCents[slot] = Math.max(minimum, lineAmountCents(hundredths, columns.lowE4[slot] as number))
    columns.likelyCents[slot] = Math.max(minimum, lineAmountCents(hundredths, columns.likelyE4[slot] as number))
    columns.highCents[slot] = high
    const hoursPerUnit = columns.hoursPerUnit[slot] as number
    columns.hoursHundredths[slot] = hoursPerUnit === 0 ? 0 : hundredthsOf((hundredths / 100) * hoursPerUnit)
    if (this.errors.size > 0) this.errors.delete(slot)
  }

  private fail(slot: number, error: LineError): void {
    this.columns.measured[slot] = 0
    this.columns.quantityHundredths[slot] = 0
    this.failPriced(slot, error)
  }

  /** An error that leaves the quantity standing. */
  private failPriced(slot: number, error: LineError): void {
    const { columns } = this
    columns.lowCents[slot] = 0
    columns.likelyCents[slot] = 0
    columns.highCents[slot] = 0
    columns.hoursHundredths[slot] = 0
    this.errors.set(slot, error)
  }
}

const NO_PRICE = lineError(
  'unitPrice',
  'no-price',
  'There is no unit price for who does this work. Key one with its reason, or choose the other.',
)
const TOO_LARGE = lineError('quantity', 'too-large', 'This line comes to a billion dollars or more. Check its quantity and its unit price.')

function quantityHundredths(measured: number, wasteHundred: number, packageSize: number): number {
  const needed = (measured * wasteHundred) / 100
  return hundredthsOf(packageSize > 0 ? wholePackages(needed, packageSize) * packageSize : needed)
}
