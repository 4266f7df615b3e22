import { conflict, invalid } from '../../errors/AppError.ts'

/** Throws unless the new order holds each present id once: 422 for one that stands twice, 409 when somebody added or removed one meanwhile. */
export function checkOrder(present: readonly string[], ordered: readonly string[], noun: 'lines' | 'rooms'): void {
  const known = new Set(present)
  const seen = new Set<string>()
  const problems = ordered.flatMap((id, index) => {
    const isTwice = seen.has(id)
    seen.add(id)
    return isTwice ? [{ path: `ids[${index}]`, code: 'twice', message: 'stands in the order twice' }] : []
  })
  if (problems.length > 0) throw invalid(problems)
  const isSameSet = seen.size === known.size && ordered.every((id) => known.has(id))
  if (!isSameSet)
    throw conflict(`${noun}-changed`, `Somebody added or removed ${noun} in the meantime. Read them again and set the order anew.`)
}
