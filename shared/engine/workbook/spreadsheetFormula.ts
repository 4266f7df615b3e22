import { constantValue } from '../formula/constantValue.ts'
import type { ComparisonOperator, FormulaNode } from '../formula/syntaxTree.ts'
import { neverNegative } from './neverNegative.ts'

/** What a formula's names are called in the workbook. */
export interface FormulaNames {
  /** The name of a room's measure; `null` outside of a room. */
  ofRoom: ((measure: string) => string) | null
  ofHouse(measure: string): string
  /** For `sum_rooms`: the same for each room. */
  rooms: readonly ((measure: string) => string)[]
}

/** Two figures this near are taken for one, as the engine takes them. Written out: not every program reads 1E-9. */
const NEAR = '0.000000001'
const NOISE_DECIMALS = 9

/**
 * A formula's tree as a spreadsheet formula, with a bracket around every step: `-2^2` and `2^3^2` mean one thing here and another there.
 * Uses only functions that Excel, LibreOffice and HyperFormula read alike. `wall_area * 2` in the second room → `(room_2_wall_area*2)`.
 */
export function spreadsheetFormula(node: FormulaNode, names: FormulaNames): string {
  const written = (child: FormulaNode) => spreadsheetFormula(child, names)
  switch (node.kind) {
    case 'number':
      return plainNumber(node.value)
    case 'measure':
      return node.measure.scope === 'room' && names.ofRoom ? names.ofRoom(node.measure.name) : names.ofHouse(node.measure.name)
    case 'negate':
      return `(-${written(node.argument)})`
    case 'arithmetic':
      return `(${written(node.left)}${node.operator}${written(node.right)})`
    case 'comparison':
      return `IF(${comparison(node.operator, written(node.left), written(node.right))},1,0)`
    case 'condition':
      return `IF(${test(node.test, written)},${written(node.yes)},${written(node.no)})`
    case 'call':
      return call(node, written)
    case 'sum-rooms':
      return sumOverRooms(node.argument, names)
  }
}

/** No exponent notation: programs differ on it. */
function plainNumber(value: number): string {
  const [digits = '0', exponent] = String(value).split('e')
  return exponent === undefined ? digits : `(${digits}*10^(${Number(exponent)}))`
}

function test(node: FormulaNode, written: (node: FormulaNode) => string): string {
  if (node.kind === 'comparison') return comparison(node.operator, written(node.left), written(node.right))
  return `${written(node)}<>0`
}

function comparison(operator: ComparisonOperator, left: string, right: string): string {
  switch (operator) {
    case '<':
      return `${left}<=${right}-${NEAR}`
    case '>':
      return `${left}>=${right}+${NEAR}`
    case '<=':
      return `${left}<${right}+${NEAR}`
    case '>=':
      return `${left}>${right}-${NEAR}`
    case '==':
      return `ABS(${left}-${right})<${NEAR}`
    case '!=':
      return `ABS(${left}-${right})>=${NEAR}`
  }
}

function call({ name, args }: FormulaNode & { kind: 'call' }, written: (node: FormulaNode) => string): string {
  const [first, second] = args
  if (!first) throw new RangeError(`${name} needs an argument`)
  switch (name) {
    case 'min':
    case 'max':
    case 'abs':
    case 'sqrt':
      return `${name.toUpperCase()}(${args.map(written).join(',')})`
    case 'ceil':
      return toWhole(first, written, 'ROUNDUP', 'ROUNDDOWN')
    case 'floor':
      return toWhole(first, written, 'ROUNDDOWN', 'ROUNDUP')
    case 'round':
      return rounded(written(first), second)
  }
}

/** Spreadsheets round up and down by size; below zero that is the other way round. */
function toWhole(argument: FormulaNode, written: (node: FormulaNode) => string, above: string, below: string): string {
  const figure = `ROUND(${written(argument)},${NOISE_DECIMALS})`
  if (neverNegative(argument)) return `${above}(${figure},0)`
  return `IF(${written(argument)}<0,${below}(${figure},0),${above}(${figure},0))`
}

/** Half away from zero, rounded behind the noise first. How many decimals is a plain number in every formula that is taken. */
function rounded(figure: string, decimals: FormulaNode | undefined): string {
  const count = decimals === undefined ? 0 : (constantValue(decimals) ?? 0)
  return `ROUND(ROUND(${figure},${count + NOISE_DECIMALS}),${count})`
}

/** A measure alone has its sum on the rooms sheet already; anything else is written once a room. */
function sumOverRooms(argument: FormulaNode, names: FormulaNames): string {
  if (argument.kind === 'measure' && argument.measure.scope === 'room') return names.ofHouse(`sum_${argument.measure.name}`)
  const parts = names.rooms.map((ofRoom) => spreadsheetFormula(argument, { ...names, ofRoom }))
  return `(${parts.join('+')})`
}
