import type { FormulaNode } from '../formula/syntaxTree.ts'

/** Whether a formula can't come out below zero, as far as its form tells: measures never do. */
export function neverNegative(node: FormulaNode): boolean {
  switch (node.kind) {
    case 'number':
      return node.value >= 0
    case 'measure':
    case 'comparison':
      return true
    case 'negate':
      return false
    case 'arithmetic':
      return node.operator !== '-' && neverNegative(node.left) && neverNegative(node.right)
    case 'condition':
      return neverNegative(node.yes) && neverNegative(node.no)
    case 'sum-rooms':
      return neverNegative(node.argument)
    case 'call':
      if (node.name === 'abs' || node.name === 'sqrt') return true
      return node.name === 'max' ? node.args.some(neverNegative) : node.args.every(neverNegative)
  }
}
