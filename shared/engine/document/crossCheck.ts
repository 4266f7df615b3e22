import type { FieldProblem } from '../../schemas/problem.ts'
import type { KeyedEstimate } from './documentSchema.ts'

/** What no field alone can say: keys that are given twice, and keys of rooms and unknowns that there are not. */
export function crossCheck({ rooms, lines, unknowns, inspections }: KeyedEstimate): FieldProblem[] {
  const roomKeys = keysOf(rooms)
  const unknownKeys = keysOf(unknowns)
  return [
    ...tooMuchFormula(lines),
    ...Object.entries({ rooms, lines, unknowns, inspections }).flatMap(([list, things]) => repeatedKeys(list, things)),
    ...lines.flatMap(({ roomKey }, index) => {
      const isThere = roomKey === null || roomKeys.has(roomKey)
      return isThere ? [] : [{ path: `lines[${index}].room`, code: 'unknown-room', message: `${roomKey} is the key of no room` }]
    }),
    ...inspections.flatMap(({ settles }, index) =>
      settles.flatMap((key, place) => {
        const path = `inspections[${index}].settles[${place}]`
        return unknownKeys.has(key) ? [] : [{ path, code: 'unknown-key', message: `${key} is the key of no unknown` }]
      }),
    ),
  ]
}

/** Each distinct formula is parsed, which takes a thousand times longer than computing it: so much is plenty for 10,000 lines, and done in a second. */
const FORMULA_CHARS_MAX = 500_000

function tooMuchFormula(lines: KeyedEstimate['lines']): FieldProblem[] {
  const chars = [...new Set(lines.map(({ quantity }) => quantity))].reduce((sum, { length }) => sum + length, 0)
  if (chars <= FORMULA_CHARS_MAX) return []
  const message = `their distinct formulas have ${chars} characters together; at most ${FORMULA_CHARS_MAX} are taken`
  return [{ path: 'lines', code: 'too-much-formula', message }]
}

interface Keyed {
  key: string
}

function keysOf(things: readonly Keyed[]): Set<string> {
  return new Set(things.map(({ key }) => key))
}

function repeatedKeys(list: string, things: readonly Keyed[]): FieldProblem[] {
  const seen = new Set<string>()
  return things.flatMap(({ key }, index) => {
    const isRepeated = seen.has(key)
    seen.add(key)
    return isRepeated
      ? [{ path: `${list}[${index}].key`, code: 'repeated-key', message: `${key} is given to another of the ${list} already` }]
      : []
  })
}
