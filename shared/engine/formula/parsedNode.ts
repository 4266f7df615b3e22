/** The part of the parser's node that is read here. */
export interface ParsedNode {
  type: string
  args?: ParsedNode[]
  condition?: ParsedNode
  content?: ParsedNode
  falseExpr?: ParsedNode
  trueExpr?: ParsedNode
}

/** Text to the parser's tree. Throws an error with `char`, counted from 1, where the text is no expression. */
export type FormulaParser = (text: string) => ParsedNode
