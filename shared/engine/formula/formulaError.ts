/** From and to, in characters of the formula's text; `to` is the first that is not part of it. */
export type Span = readonly [from: number, to: number]

export type FormulaCode =
  | 'bad-syntax'
  | 'divides-by-zero'
  | 'negative'
  | 'no-measure'
  | 'not-allowed'
  | 'not-finite'
  | 'too-deep'
  | 'too-large'
  | 'too-long'
  | 'unit-mismatch'
  | 'unknown-name'
  | 'unknown-unit'

/** Stands in a message for the part of the formula that is at fault. */
export const PART = '{part}'
const PART_MAX = 40

/** What is wrong with a formula, and where. Caught where the formula is read or computed; it never leaves the engine. */
export class FormulaError extends Error {
  constructor(
    readonly code: FormulaCode,
    message: string,
    readonly at: Span,
  ) {
    super(message)
    this.name = 'FormulaError'
  }

  /** The message with the part of the text that is at fault in it. */
  wordsFor(text: string): string {
    const part = text.slice(...this.at).trim()
    return this.message.replace(PART, () => `\`${part.length > PART_MAX ? `${part.slice(0, PART_MAX)}…` : part}\``)
  }
}
