import { SYSTEM_KEYS } from '../../../shared/catalogue/houseSystems.ts'
import { TRADE_KEYS } from '../../../shared/catalogue/trades.ts'
import { findUnit } from '../../../shared/catalogue/units.ts'
import type { Line } from '../../../shared/schemas/estimate.ts'
import type { FieldProblem } from '../../../shared/schemas/problem.ts'
import { invalid } from '../../errors/AppError.ts'

const systemKeys: readonly string[] = SYSTEM_KEYS
const tradeKeys: readonly string[] = TRADE_KEYS

type Checked = Pick<Line, 'itemKey' | 'system' | 'trade' | 'unit' | 'override'>

/**
 * The line with its unit by the catalogue's spelling. Throws 422 for what no line can be given; what a line brought along from an import may stay.
 * A formula that can't be computed is not among that: it stays as typed, is marked, and the totals leave the line out.
 */
export function checkedLine<T extends Checked>(line: T, before: Checked | null = null): T {
  const hasNew = (field: keyof Checked) => line[field] !== before?.[field]
  const unit = findUnit(line.unit)
  const isOwnLine = line.itemKey === null
  const problems: FieldProblem[] = []
  if (hasNew('system') && !systemKeys.includes(line.system))
    problems.push({ path: 'system', code: 'unknown-system', message: 'is not a house system' })
  if (hasNew('trade') && !tradeKeys.includes(line.trade)) problems.push({ path: 'trade', code: 'unknown-trade', message: 'is not a trade' })
  if (hasNew('unit') && !unit)
    problems.push({ path: 'unit', code: 'unknown-unit', message: 'is not a unit that is known here; write sf, lf, each …' })
  const losesPrice = isOwnLine && line.override === null && (hasNew('itemKey') || hasNew('override'))
  if (losesPrice)
    problems.push({ path: 'override', code: 'missing', message: 'is missing: a line of your own needs a price and its reason' })
  if (problems.length > 0) throw invalid(problems)
  return { ...line, unit: unit?.key ?? line.unit }
}

/** The fields that a line of the estimator's own can't do without. Throws 422 that names each missing one. */
export function requireOwnLineFields({ description, unit, override }: Partial<Pick<Line, 'description' | 'unit' | 'override'>>) {
  const isComplete = description !== undefined && unit !== undefined && override !== undefined && override !== null
  if (isComplete) return { description, unit, override }
  const missing = Object.entries({ description, unit, override }).filter(([, value]) => value === undefined || value === null)
  throw invalid(missing.map(([path]) => ({ path, code: 'missing', message: 'is missing: a line without a price item needs it' })))
}
