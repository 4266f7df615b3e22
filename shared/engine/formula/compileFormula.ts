import { bounded, divide, isBelow, isEqual, power, roundDown, roundTo, roundUp, squareRoot } from './arithmetic.ts'
import { constantValue } from './constantValue.ts'
import { measureReader, type FormulaColumns } from './formulaColumns.ts'
import type { ComparisonOperator, FormulaNode } from './syntaxTree.ts'

/** A formula worked out for the room whose row is given; NaN where it has no answer. */
export type Evaluate = (row: number) => number

/** A checked formula as closures over the columns: no tree is walked and nothing is looked up when it is worked out. */
export function compileFormula(node: FormulaNode, columns: FormulaColumns): Evaluate {
  switch (node.kind) {
    case 'number': {
      const { value } = node
      return () => value
    }
    case 'measure':
      return measureReader(node.measure, columns)
    case 'negate': {
      const argument = compileFormula(node.argument, columns)
      return (row) => -argument(row)
    }
    case 'arithmetic':
      return compileArithmetic(node, columns)
    case 'comparison':
      return compileComparison(node.operator, compileFormula(node.left, columns), compileFormula(node.right, columns))
    case 'condition':
      return compileCondition(node, columns)
    case 'call':
      return compileCall(node, columns)
    case 'sum-rooms':
      return compileSum(node, columns)
  }
}

type NodeOf<K extends FormulaNode['kind']> = Extract<FormulaNode, { kind: K }>

function compileArithmetic({ operator, left: leftNode, right: rightNode }: NodeOf<'arithmetic'>, columns: FormulaColumns): Evaluate {
  const left = compileFormula(leftNode, columns)
  const literal = constantValue(rightNode)
  // A literal on the right is by far the most frequent, and one call less.
  if (literal !== null) return withLiteral(operator, left, literal)
  const right = compileFormula(rightNode, columns)
  switch (operator) {
    case '+':
      return (row) => left(row) + right(row)
    case '-':
      return (row) => left(row) - right(row)
    case '*':
      return (row) => bounded(left(row) * right(row))
    case '/':
      return (row) => divide(left(row), right(row))
    case '^':
      return (row) => power(left(row), right(row))
  }
}

function withLiteral(operator: NodeOf<'arithmetic'>['operator'], left: Evaluate, literal: number): Evaluate {
  switch (operator) {
    case '+':
      return (row) => left(row) + literal
    case '-':
      return (row) => left(row) - literal
    case '*':
      return (row) => bounded(left(row) * literal)
    case '/':
      return (row) => divide(left(row), literal)
    case '^':
      return (row) => power(left(row), literal)
  }
}

function compileComparison(operator: ComparisonOperator, left: Evaluate, right: Evaluate): Evaluate {
  switch (operator) {
    case '<':
      return (row) => isBelow(left(row), right(row))
    case '>':
      return (row) => isBelow(right(row), left(row))
    case '>=':
      return (row) => 1 - isBelow(left(row), right(row))
    case '<=':
      return (row) => 1 - isBelow(right(row), left(row))
    case '==':
      return (row) => isEqual(left(row), right(row))
    case '!=':
      return (row) => 1 - isEqual(left(row), right(row))
  }
}

function compileCondition(node: NodeOf<'condition'>, columns: FormulaColumns): Evaluate {
  const test = compileFormula(node.test, columns)
  const yes = compileFormula(node.yes, columns)
  const no = compileFormula(node.no, columns)
  return (row) => {
    const answer = test(row)
    if (answer !== answer) return NaN
    return answer === 0 ? no(row) : yes(row)
  }
}

function compileCall({ name, args }: NodeOf<'call'>, columns: FormulaColumns): Evaluate {
  const [first = () => NaN, ...rest] = args.map((argument) => compileFormula(argument, columns))
  switch (name) {
    case 'min':
      return rest.reduce((least, next) => (row) => Math.min(least(row), next(row)), first)
    case 'max':
      return rest.reduce((most, next) => (row) => Math.max(most(row), next(row)), first)
    case 'abs':
      return (row) => Math.abs(first(row))
    case 'ceil':
      return (row) => roundUp(first(row))
    case 'floor':
      return (row) => roundDown(first(row))
    case 'round': {
      const decimals = rest[0]?.(0) ?? 0
      return (row) => roundTo(first(row), decimals)
    }
    case 'sqrt':
      return (row) => squareRoot(first(row))
  }
}

function compileSum({ argument }: NodeOf<'sum-rooms'>, columns: FormulaColumns): Evaluate {
  const each = compileFormula(argument, columns)
  let sum = NaN
  let summedAt = -1
  // The same for every line: summed once after each change of a room, however many lines ask.
  return () => {
    if (summedAt !== columns.roomsStamp) {
      sum = sumOver(columns.roomRows, each)
      summedAt = columns.roomsStamp
    }
    return sum
  }
}

function sumOver(rows: readonly number[], each: Evaluate): number {
  if (rows.length === 0) return NaN
  let sum = 0
  for (const row of rows) sum += each(row)
  return sum
}
