import { isZero } from './arithmetic.ts'
import { compileFormula } from './compileFormula.ts'
import type { FormulaColumns } from './formulaColumns.ts'
import { FormulaError, PART } from './formulaError.ts'
import { QUANTITY_MAX } from './formulaLimits.ts'
import { childrenOf, type FormulaNode } from './syntaxTree.ts'
import type { Measure } from '../takeoff/measure.ts'

/** What an explanation needs to know besides the figures. */
export interface Explainer {
  columns: FormulaColumns
  /** Why a measure can't be had, for the room whose row is given. */
  whyNoMeasure: (measure: Measure, row: number) => string
  roomName: (row: number) => string
}

/** Why a formula has no answer, or none that is a quantity: the innermost part that has none, with its span. Only for one that fails. */
export function explainFailure(node: FormulaNode, row: number, explainer: Explainer): FormulaError {
  const value = compileFormula(node, explainer.columns)(row)
  // A formula that is one measure needs not be told which.
  if (node.kind === 'measure' && Number.isNaN(value))
    return new FormulaError('no-measure', explainer.whyNoMeasure(node.measure, row), node.at)
  if (Number.isNaN(value)) return explainNaN(node, row, explainer)
  if (value < 0) return new FormulaError('negative', `The formula gives ${shown(value)}; a quantity is zero or more.`, node.at)
  return new FormulaError('too-large', `The formula gives ${shown(value)}; a quantity is at most ${shown(QUANTITY_MAX)}.`, node.at)
}

function explainNaN(node: FormulaNode, row: number, explainer: Explainer): FormulaError {
  const isNaNHere = (part: FormulaNode) => Number.isNaN(compileFormula(part, explainer.columns)(row))
  if (node.kind === 'measure')
    return new FormulaError('no-measure', `${PART} can not be had. ${explainer.whyNoMeasure(node.measure, row)}`, node.at)
  if (node.kind === 'sum-rooms') return explainSum(node, explainer)
  const culprit = partsWorkedOut(node, row, explainer.columns).find(isNaNHere)
  return culprit ? explainNaN(culprit, row, explainer) : explainStep(node, row, explainer.columns)
}

/** A condition works out the one end that it takes. */
function partsWorkedOut(node: FormulaNode, row: number, columns: FormulaColumns): readonly FormulaNode[] {
  if (node.kind !== 'condition') return childrenOf(node)
  const answer = compileFormula(node.test, columns)(row)
  return [node.test, answer === 0 ? node.no : node.yes]
}

function explainSum({ argument, at }: Extract<FormulaNode, { kind: 'sum-rooms' }>, explainer: Explainer): FormulaError {
  const each = compileFormula(argument, explainer.columns)
  const failing = explainer.columns.roomRows.find((row) => Number.isNaN(each(row)))
  if (failing === undefined) return new FormulaError('no-measure', 'No rooms are keyed yet.', at)
  const reason = explainNaN(argument, failing, explainer)
  return new FormulaError(reason.code, `${explainer.roomName(failing)}: ${reason.message}`, reason.at)
}

/** A step that fails although all that goes into it is there. */
function explainStep(node: FormulaNode, row: number, columns: FormulaColumns): FormulaError {
  if (node.kind === 'arithmetic' && node.operator === '/' && isZero(compileFormula(node.right, columns)(row))) {
    return new FormulaError('divides-by-zero', `${PART} is zero here, and the formula divides by it.`, node.right.at)
  }
  if (node.kind === 'arithmetic' && node.operator === '^' && isZero(compileFormula(node.left, columns)(row))) {
    return new FormulaError('divides-by-zero', `${PART} is a negative power of zero.`, node.at)
  }
  if (node.kind === 'call' && node.name === 'sqrt')
    return new FormulaError('not-finite', `${PART} takes the square root of less than zero.`, node.at)
  return new FormulaError('not-finite', `${PART} has no finite answer.`, node.at)
}

function shown(value: number): string {
  return value.toLocaleString('en-US', { maximumFractionDigits: 2 })
}
