import { findUnit, type Dimension } from '../../catalogue/units.ts'
import { checkUnit, quantityOf } from './checkKinds.ts'
import { FormulaError, type FormulaCode, type Span } from './formulaError.ts'
import { dimensionOf } from './kinds.ts'
import { mathjsParse } from './mathjsParse.ts'
import { parseFormula } from './parseFormula.ts'

export type CheckedFormula =
  { ok: true; dimension: Dimension | 'any' } | { ok: false; code: FormulaCode; message: string; at: readonly [from: number, to: number] }

/**
 * Whether a formula can stand on a line of that scope and unit, before there are rooms to work it out in. `any`: it has no dimension of its own, as a plain number.
 * Otherwise what is wrong, and where in the text.
 */
export function checkFormula(text: string, { scope, unit }: { scope: 'room' | 'house'; unit: string }): CheckedFormula {
  try {
    const kind = quantityOf(parseFormula(text, scope, mathjsParse))
    const known = findUnit(unit)
    if (known === null)
      throw new FormulaError('unknown-unit', `\`${unit}\` is not a unit that is known here. Write sf, lf, each …`, wholeOf(text))
    checkUnit(kind, known, text)
    return { ok: true, dimension: kind.fits === 'any' ? 'any' : (dimensionOf(kind) ?? 'count') }
  } catch (error) {
    if (error instanceof FormulaError) return { ok: false, code: error.code, message: error.wordsFor(text), at: error.at }
    throw error
  }
}

function wholeOf(text: string): Span {
  return [0, text.length]
}
