import { MEASURES } from '../../shared/engine/index.ts'

export type Measure = (typeof MEASURES)[number]

/** The name under the caret of a formula, as a span of its text. */
export interface NameSpan {
  from: number
  to: number
  name: string
}

/** The name that the caret stands in or right behind; `null` in a number or between signs. */
export function nameAt(text: string, caret: number): NameSpan | null {
  let from = caret
  while (from > 0 && isNameLetter(text[from - 1])) from -= 1
  let to = caret
  while (to < text.length && isNameLetter(text[to])) to += 1
  const name = text.slice(from, caret)
  return /^[a-z_]/i.test(name) ? { from, to, name } : null
}

/** Measures whose name, or a word in it, begins with what is typed; whole beginnings first, the shortest of them before the others. A room's line may use its room's and the house's. */
export function completeMeasure(typed: string, scope: 'room' | 'house', limit: number): Measure[] {
  const start = typed.toLowerCase()
  const own = MEASURES.filter((measure) => measure.scope === scope)
  const ownNames = new Set<string>(own.map(({ name }) => name))
  const unique = [...own, ...MEASURES.filter((measure) => measure.scope === 'house' && !ownNames.has(measure.name))]
  const whole = unique.filter(({ name }) => name.startsWith(start)).sort((a, b) => a.name.length - b.name.length)
  const inside = unique.filter(({ name }) => !name.startsWith(start) && name.split('_').some((word) => word.startsWith(start)))
  const found = [...whole, ...inside]
  const isFinished = found.length === 1 && found[0]?.name === start
  return isFinished ? [] : found.slice(0, limit)
}

/** The measures that a formula names, each once, in the order that it names them. */
export function namesIn(formula: string): string[] {
  const known = new Set<string>(MEASURES.map(({ name }) => name))
  return [...new Set(formula.match(/[a-z_][a-z0-9_]*/gi) ?? [])].filter((name) => known.has(name))
}

function isNameLetter(letter: string | undefined): boolean {
  return letter !== undefined && /[a-z0-9_]/i.test(letter)
}
