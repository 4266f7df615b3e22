import { needsNoParser, type FormulaParser } from '../../shared/engine/index.ts'

let parse: FormulaParser | null = null
let loading: Promise<void> | null = null
const missed = new Set<() => void>()

/** Fetches the parser of formulas, once. A plain number or a measure's name is read without it, so a page may never need it. */
export function loadFormulaParser(): Promise<void> {
  loading ??= import('../../shared/engine/formula/mathjsParse.ts').then(({ mathjsParse }) => {
    parse = mathjsParse
    for (const tell of missed) tell()
    missed.clear()
  })
  return loading
}

export function needsFormulaParser(formulas: Iterable<string>): boolean {
  for (const formula of formulas) if (!needsNoParser(formula)) return true
  return false
}

/** A parser that reads as soon as it is there; before that it sends for it, refuses, and calls `onReady` when the formula can be read. */
export function lazyFormulaParser(onReady: () => void): FormulaParser {
  return (text) => {
    if (parse !== null) return parse(text)
    missed.add(onReady)
    void loadFormulaParser()
    throw new Error('The parser of formulas is on its way.')
  }
}
