import { FUNCTION_NAMES } from './formulaFunctions.ts'
import { FormulaError, PART, type Span } from './formulaError.ts'
import { FORMULA_MAX_DEPTH, LITERAL_MAX } from './formulaLimits.ts'
import type { Token } from './tokens.ts'

/** Refuses what a parser would stumble over or read in its own way: brackets that don't pair or nest too deep, operands side by side, numbers too large. */
export function checkTokens(tokens: readonly Token[]): void {
  checkBrackets(tokens)
  checkColons(tokens)
  tokens.forEach((token, index) => {
    const next = tokens[index + 1]
    checkNumber(token)
    checkName(token, next)
    if (next) checkNeighbours(token, next)
  })
}

function checkBrackets(tokens: readonly Token[]): void {
  const open: Span[] = []
  for (const { text, at } of tokens) {
    if (text === '(') open.push(at)
    if (open.length > FORMULA_MAX_DEPTH) throw new FormulaError('too-deep', `Brackets nest more than ${FORMULA_MAX_DEPTH} deep.`, at)
    if (text === ')' && open.pop() === undefined) throw new FormulaError('bad-syntax', `The bracket at place ${at[0] + 1} closes none.`, at)
  }
  const unclosed = open.at(-1)
  if (unclosed) throw new FormulaError('bad-syntax', `The bracket at place ${unclosed[0] + 1} is not closed.`, unclosed)
}

/** To the parser a colon alone is a range of numbers. */
function checkColons(tokens: readonly Token[]): void {
  let open = 0
  for (const { text, at } of tokens) {
    if (text === '?') open += 1
    if (text === ':') open -= 1
    if (open < 0) throw new FormulaError('bad-syntax', `${PART} stands only after a condition and ?, as height > 8 ? 2 : 1.`, at)
  }
}

function checkNumber({ kind, text, at }: Token): void {
  if (kind === 'number' && !(Number(text) <= LITERAL_MAX))
    throw new FormulaError('too-large', `${text} is too large a number for a quantity.`, at)
}

/** `2 width`, `12 6`, `(a)(b)`: what was meant is anybody's guess. */
function checkNeighbours(token: Token, next: Token): void {
  const ends = token.kind !== 'sign' || token.text === ')'
  const begins = next.kind !== 'sign' || next.text === '('
  const isCall = token.kind === 'name' && next.text === '('
  if (ends && begins && !isCall) {
    throw new FormulaError('not-allowed', `There is no sign between \`${token.text}\` and \`${next.text}\`. To multiply, write *.`, [
      token.at[0],
      next.at[1],
    ])
  }
}

/** A function is followed by its bracket, and nothing else is. */
function checkName({ kind, text, at }: Token, next: Token | undefined): void {
  if (kind !== 'name') return
  const isCall = next?.text === '('
  const isFunction = FUNCTION_NAMES.includes(text)
  if (isCall && !isFunction)
    throw new FormulaError('unknown-name', `\`${text}\` is not a function here. There are ${FUNCTION_NAMES.join(', ')}.`, at)
  if (isFunction && !isCall) throw new FormulaError('bad-syntax', `\`${text}\` is a function: write ${text}(…).`, at)
}
