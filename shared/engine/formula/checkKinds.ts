import type { Unit } from '../../catalogue/units.ts'
import { FormulaError, PART } from './formulaError.ts'
import { EXPONENT_MAX } from './formulaLimits.ts'
import { kindWords, LITERAL, exactly, POWERS, TRUTH, type Kind, type Quantity } from './kinds.ts'
import { over, times, together, toThePower } from './kindArithmetic.ts'
import { constantValue } from './constantValue.ts'
import type { FormulaNode } from './syntaxTree.ts'

/**
 * What a formula counts. Refuses what no tape measure can mean: sq ft + lineal feet, the square root of a length, a comparison as a quantity.
 *
 * @throws FormulaError
 */
export function checkKinds(node: FormulaNode): Kind {
  switch (node.kind) {
    case 'number':
      return LITERAL
    case 'measure':
      return exactly(POWERS[node.measure.dimension], node.measure.size)
    case 'negate':
    case 'sum-rooms':
      return quantityOf(node.argument)
    case 'arithmetic':
      return arithmeticKind(node)
    case 'comparison':
      commonKind([node.left, node.right])
      return TRUTH
    case 'condition':
      checkKinds(node.test)
      return commonKind([node.yes, node.no])
    case 'call':
      return callKind(node)
  }
}

export function quantityOf(node: FormulaNode): Quantity {
  const kind = checkKinds(node)
  if (kind.kind === 'quantity') return kind
  throw new FormulaError('unit-mismatch', `${PART} gives yes or no, not a quantity. Write condition ? one : other.`, node.at)
}

type Arithmetic = Extract<FormulaNode, { kind: 'arithmetic' }>
type Call = Extract<FormulaNode, { kind: 'call' }>

function arithmeticKind(node: Arithmetic): Quantity {
  const { operator, left, right } = node
  switch (operator) {
    case '+':
    case '-':
      return commonKind([left, right])
    case '*':
      return times(quantityOf(left), quantityOf(right))
    case '/':
      return over(quantityOf(left), quantityOf(right))
    case '^':
      return powerKind(node)
  }
}

function powerKind({ left, right, at }: Arithmetic): Quantity {
  const exponent = constantValue(right)
  if (exponent === null || Math.abs(exponent) > EXPONENT_MAX) {
    throw new FormulaError(
      'not-allowed',
      `${PART} can not be an exponent. Write a number from -${EXPONENT_MAX} to ${EXPONENT_MAX}.`,
      right.at,
    )
  }
  const base = quantityOf(left)
  const kind = toThePower(base, exponent)
  if (kind) return kind
  throw new FormulaError('unit-mismatch', `${PART} takes ${kindWords(base)} to the power of ${exponent}, which is no measure.`, at)
}

function callKind({ name, args, at }: Call): Quantity {
  const [first, decimals] = args
  if (name === 'min' || name === 'max') return commonKind(args)
  if (first === undefined) return LITERAL
  const kind = quantityOf(first)
  if (name === 'round' && decimals) checkDecimals(decimals)
  if (name !== 'sqrt') return kind
  const root = toThePower(kind, 0.5)
  if (root) return root
  throw new FormulaError(
    'unit-mismatch',
    `${PART} takes the square root of ${kindWords(kind)}, which is no measure. Of sq ft it is lineal feet.`,
    at,
  )
}

function checkDecimals(node: FormulaNode): void {
  const decimals = constantValue(node)
  const isCount = decimals !== null && Number.isInteger(decimals) && decimals >= 0 && decimals <= 9
  if (!isCount)
    throw new FormulaError('not-allowed', `${PART} is no count of decimals: round keeps 0 to 9, as round(floor_area, 1).`, node.at)
}

/** The kind of parts that must go together. */
function commonKind(nodes: readonly FormulaNode[]): Quantity {
  return nodes.reduce<Quantity>((kind, node) => {
    const next = quantityOf(node)
    const common = together(kind, next)
    if (common) return common
    throw new FormulaError('unit-mismatch', `${PART} mixes ${kindWords(kind)} with ${kindWords(next)}.`, [nodes[0]?.at[0] ?? 0, node.at[1]])
  }, LITERAL)
}

/**
 * Refuses a formula that counts something else than its item is priced by: sq ft for an item by the lineal foot. What was divided by a literal may be a count, or the larger unit that
 * the division makes: ceil(wall_area / 32) sheets, roof_area / 100 squares, floor_area * 0.33 / 27 cubic yards. What was multiplied by one may be a count: roof_squares * 3 bundles.
 *
 * @throws FormulaError
 */
export function checkUnit(kind: Quantity, unit: Unit, text: string): void {
  const power = POWERS[unit.dimension]
  const isSame = kind.power === power && kind.size === unit.size
  const isRated = kind.fits === 'rated' && power === 0
  const isConverted = kind.fits === 'divided' && (power === 0 || (unit.size !== 1 && kind.power <= power))
  if (kind.fits === 'any' || isSame || isRated || isConverted) return
  throw new FormulaError('unit-mismatch', `This formula gives ${kindWords(kind)}; the item is priced per ${unit.key}.${hint(kind, unit)}`, [
    0,
    text.length,
  ])
}

function hint(kind: Quantity, unit: Unit): string {
  const isOtherSize = kind.power === POWERS[unit.dimension] && kind.size === 1 && unit.size !== 1
  if (!isOtherSize) return ''
  return unit.key === 'square' ? ' Use roof_squares, or divide by 100.' : ` Divide by ${unit.size}.`
}
