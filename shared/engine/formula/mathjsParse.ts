import { create, parseDependencies } from 'mathjs/number'
import type { FormulaParser } from './parsedNode.ts'

let parse: FormulaParser | null = null

/**
 * Text to the tree of mathjs. Its parser and nothing else of it: no node of the tree is ever evaluated.
 * A module of its own, so that a page which computes no formula loads none of it.
 */
export const mathjsParse: FormulaParser = (text) => {
  parse ??= create({ ...parseDependencies }).parse as FormulaParser
  return parse(text)
}
