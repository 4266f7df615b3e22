import { FormulaError, type Span } from '../formula/formulaError.ts'

/** What keeps a line out of the totals: the field that is at fault, a stable code, words, and for a formula the part that is at fault. */
export interface LineError {
  field: 'quantity' | 'room' | 'unit' | 'unitPrice'
  code: string
  message: string
  at: Span | null
}

export function lineError(field: LineError['field'], code: string, message: string): LineError {
  return { field, code, message, at: null }
}

/** A formula's error is the quantity's; a unit that isn't known, the unit's. Anything else that was thrown is a bug and goes on. */
export function lineErrorOf(thrown: unknown, text: string): LineError {
  if (!(thrown instanceof FormulaError)) throw thrown
  return { field: thrown.code === 'unknown-unit' ? 'unit' : 'quantity', code: thrown.code, message: thrown.wordsFor(text), at: thrown.at }
}
