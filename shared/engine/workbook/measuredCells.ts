import type { RoomInput } from '../estimateInput.ts'
import { constantValue } from '../formula/constantValue.ts'
import { mathjsParse } from '../formula/mathjsParse.ts'
import { parseFormula } from '../formula/parseFormula.ts'
import type { FormulaNode } from '../formula/syntaxTree.ts'
import { houseMeasureName, roomMeasureName } from './measureNames.ts'
import { live, number } from './sheetDraft.ts'
import { spreadsheetFormula } from './spreadsheetFormula.ts'
import { HOUSE_NUMBER, type WorkbookLine } from './workbookLines.ts'
import type { WorkbookCell } from './workbookModel.ts'

/** Limits of the spreadsheet programs for one formula ("Excel specifications and limits"): characters, and functions inside one another. */
const FORMULA_CHARS_MAX = 8192
const FORMULA_LEVELS_MAX = 64

/**
 * The measured quantity of each line that counts: the formula over the named measures of the rooms sheet, or the number that was keyed, to be changed.
 * A formula that would pass a spreadsheet's limits stands as its figure.
 */
export function measuredCells(rooms: readonly RoomInput[]): (line: WorkbookLine) => WorkbookCell {
  const eachRoom = rooms.map((_, index) => (measure: string) => roomMeasureName(index + 1, measure))
  const trees = new Map<string, FormulaNode>()

  function treeOf(text: string, scope: 'room' | 'house'): FormulaNode {
    const key = `${scope} ${text}`
    const known = trees.get(key)
    if (known) return known
    const tree = parseFormula(text, scope, mathjsParse)
    trees.set(key, tree)
    return tree
  }

  return ({ line, roomNumber, figures }) => {
    const measured = figures?.measured ?? 0
    const tree = treeOf(line.quantity, roomNumber === HOUSE_NUMBER ? 'house' : 'room')
    if (constantValue(tree) !== null) return number(measured, 'input-quantity')
    const formula = spreadsheetFormula(tree, {
      ofRoom: roomNumber === HOUSE_NUMBER ? null : (eachRoom[roomNumber - 1] ?? null),
      ofHouse: houseMeasureName,
      rooms: eachRoom,
    })
    return fitsInCell(formula) ? live(withoutOuterBrackets(formula), measured, 'number') : number(measured, 'input-quantity')
  }
}

function fitsInCell(formula: string): boolean {
  let level = 0
  let deepest = 0
  for (const character of formula) {
    if (character === '(') level += 1
    else if (character === ')') level -= 1
    deepest = Math.max(deepest, level)
  }
  return formula.length <= FORMULA_CHARS_MAX && deepest < FORMULA_LEVELS_MAX
}

/** `(a*b)` → `a*b`; `(a)+(b)` stays. */
function withoutOuterBrackets(formula: string): string {
  if (!formula.startsWith('(')) return formula
  let level = 0
  for (const [index, character] of [...formula].entries()) {
    if (character === '(') level += 1
    else if (character === ')') level -= 1
    if (level === 0) return index === formula.length - 1 ? formula.slice(1, -1) : formula
  }
  return formula
}
