import type { Measure } from '../takeoff/measure.ts'
import type { FunctionName } from './formulaFunctions.ts'
import type { Span } from './formulaError.ts'

export type ArithmeticOperator = '+' | '-' | '*' | '/' | '^'
export type ComparisonOperator = '<' | '<=' | '>' | '>=' | '==' | '!='

/** A formula that has passed the list of what is allowed: nothing else can be in it. */
export type FormulaNode =
  | { kind: 'number'; value: number; at: Span }
  | { kind: 'measure'; measure: Measure; at: Span }
  | { kind: 'negate'; argument: FormulaNode; at: Span }
  | { kind: 'arithmetic'; operator: ArithmeticOperator; left: FormulaNode; right: FormulaNode; at: Span }
  | { kind: 'comparison'; operator: ComparisonOperator; left: FormulaNode; right: FormulaNode; at: Span }
  | { kind: 'condition'; test: FormulaNode; yes: FormulaNode; no: FormulaNode; at: Span }
  | { kind: 'call'; name: FunctionName; args: readonly FormulaNode[]; at: Span }
  | { kind: 'sum-rooms'; argument: FormulaNode; at: Span }

/** Whether a node, or any below it, is such that `isSought`. */
export function someNode(node: FormulaNode, isSought: (node: FormulaNode) => boolean): boolean {
  return isSought(node) || childrenOf(node).some((child) => someNode(child, isSought))
}

export function childrenOf(node: FormulaNode): readonly FormulaNode[] {
  switch (node.kind) {
    case 'number':
    case 'measure':
      return []
    case 'negate':
    case 'sum-rooms':
      return [node.argument]
    case 'arithmetic':
    case 'comparison':
      return [node.left, node.right]
    case 'condition':
      return [node.test, node.yes, node.no]
    case 'call':
      return node.args
  }
}
