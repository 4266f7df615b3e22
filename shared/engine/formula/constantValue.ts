import type { FormulaNode } from './syntaxTree.ts'

/** The value of a number with or without a sign, which is all that an exponent may be; `null` for anything else. */
export function constantValue(node: FormulaNode): number | null {
  if (node.kind === 'number') return node.value
  if (node.kind !== 'negate') return null
  const value = constantValue(node.argument)
  return value === null ? null : -value
}
