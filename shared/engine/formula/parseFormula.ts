import { FORMULA_MAX_CHARS } from '../../schemas/priceItem.ts'
import { checkTokens } from './checkTokens.ts'
import { FormulaError } from './formulaError.ts'
import { findMeasure, type NameScope } from './measureNames.ts'
import type { FormulaParser } from './parsedNode.ts'
import { readTree } from './readTree.ts'
import type { FormulaNode } from './syntaxTree.ts'
import { tokenize, type Token } from './tokens.ts'

/**
 * A formula's text as a tree that holds only what is allowed. Length, signs, brackets and numbers are checked before the parser sees the text;
 * a plain number or a measure's name needs no parser.
 *
 * @throws FormulaError
 */
export function parseFormula(text: string, scope: NameScope, parse: FormulaParser): FormulaNode {
  if (text.length > FORMULA_MAX_CHARS) {
    throw new FormulaError('too-long', `A formula has at most ${FORMULA_MAX_CHARS} characters; this has ${text.length}.`, [
      FORMULA_MAX_CHARS,
      text.length,
    ])
  }
  const tokens = tokenize(text)
  const [first] = tokens
  if (first === undefined)
    throw new FormulaError('bad-syntax', 'No quantity is keyed. Write a number or a measure, as floor_area.', [0, text.length])
  checkTokens(tokens)
  if (tokens.length === 1) return readSingle(first, scope)
  return readTree(parseText(text, tokens, parse), tokens, scope)
}

/** Whether a formula can be read without a parser. */
export function needsNoParser(text: string): boolean {
  return /^\s*(?:\d+(?:\.\d+)?|\.\d+|[A-Za-z_][A-Za-z0-9_]*)\s*$/.test(text)
}

function readSingle({ kind, text, at }: Token, scope: NameScope): FormulaNode {
  if (kind === 'number') return { kind: 'number', value: Number(text), at }
  if (kind === 'name') return { kind: 'measure', measure: findMeasure(text, scope, at), at }
  throw new FormulaError('bad-syntax', `\`${text}\` alone is no quantity.`, at)
}

function parseText(text: string, tokens: readonly Token[], parse: FormulaParser) {
  try {
    // To the parser a line break would end the formula.
    return parse(text.replace(/[^\S ]/g, ' '))
  } catch (error) {
    throw syntaxError(error, text, tokens)
  }
}

function syntaxError(error: unknown, text: string, tokens: readonly Token[]): FormulaError {
  const char = error instanceof Error && 'char' in error && typeof error.char === 'number' ? error.char - 1 : 0
  const token = tokens.find(({ at }) => at[1] > char)
  if (token)
    return new FormulaError(
      'bad-syntax',
      `\`${token.text}\` does not fit here. Something is missing before it, or it is one too many.`,
      token.at,
    )
  const last = tokens.at(-1)?.text ?? ''
  return new FormulaError('bad-syntax', `The formula ends too soon: something is missing after \`${last}\`.`, [
    Math.max(0, text.trimEnd().length - 1),
    text.length,
  ])
}
