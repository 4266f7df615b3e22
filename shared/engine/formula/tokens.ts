import { FormulaError, type Span } from './formulaError.ts'

export interface Token {
  kind: 'number' | 'name' | 'sign'
  text: string
  at: Span
}

const TOKEN =
  /\s*(?:(?<number>(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?)|(?<name>[A-Za-z_][A-Za-z0-9_]*)|(?<sign><=|>=|==|!=|[-+*/^(),?:<>]))/y

/** What people write that no formula takes, with what to write instead. */
const INSTEAD: Record<string, string> = {
  '%': 'Percent is a plain number here: write 0.1 for 10 percent.',
  '=': 'Write == to compare.',
  '.': 'A point stands only inside a number, as 12.5, with a digit on both sides.',
  "'": 'A length is a number of feet here: write 12.5.',
  '"': 'A length is a number of feet here: write 12.5.',
  '&': 'Use a condition inside a condition: a ? (b ? 1 : 0) : 0.',
  '|': 'Use a condition inside a condition: a ? 1 : (b ? 1 : 0).',
  '!': 'Write != for "is not".',
  $: 'Write the number alone.',
  '×': 'Write * to multiply.',
  '÷': 'Write / to divide.',
  '−': 'Write - to subtract.',
  '[': 'Use round brackets.',
  '{': 'Use round brackets.',
}

/** The signs, numbers and names of a formula in order. Anything that is none of them is refused here, before a parser sees it. */
export function tokenize(text: string): Token[] {
  const tokens: Token[] = []
  let at = 0
  while (at < text.length) {
    TOKEN.lastIndex = at
    const match = TOKEN.exec(text)
    if (match === null) {
      if (text.slice(at).trim() === '') break
      throw strange(text, at)
    }
    const { number, name, sign = '' } = match.groups ?? {}
    const tokenText = number ?? name ?? sign
    const from = TOKEN.lastIndex - tokenText.length
    tokens.push({
      kind: number === undefined ? (name === undefined ? 'sign' : 'name') : 'number',
      text: tokenText,
      at: [from, TOKEN.lastIndex],
    })
    at = TOKEN.lastIndex
  }
  return tokens
}

function strange(text: string, searchFrom: number): FormulaError {
  const from = searchFrom + text.slice(searchFrom).search(/\S/)
  const sign = String.fromCodePoint(text.codePointAt(from) ?? 0)
  const instead = INSTEAD[sign]
  return new FormulaError('not-allowed', `\`${sign}\` has no place in a formula.${instead ? ` ${instead}` : ''}`, [
    from,
    from + sign.length,
  ])
}
