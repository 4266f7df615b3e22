import { loadMathjs } from '#mathjs'
import type { FormulaParser } from './parsedNode.ts'

let parse: FormulaParser | null = null

/**
 * Text to the tree of mathjs. Its parser and nothing else of it: no node of the tree is ever evaluated.
 * A module of its own, so that a page which computes no formula loads none of it.
 */
export const mathjsParse: FormulaParser = (text) => {
  parse ??= makeParser()
  return parse(text)
}

function makeParser(): FormulaParser {
  const { create, parseDependencies } = loadMathjs()
  return create({ ...parseDependencies }).parse as FormulaParser
}
