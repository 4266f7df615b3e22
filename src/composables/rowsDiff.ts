/** How one list of rows becomes another: some go, some come in one place, all others stay in their order. */
export interface RowsDiff<Row> {
  remove: Row[]
  add: Row[]
  /** Where the first of the added ones comes to stand. */
  addIndex: number
}

/**
 * The rows that go and come between two lists, where the others keep their order; `null` where rows also changed places, and the list has to be taken as a
 * whole. Rows are told apart by identity.
 */
export function rowsDiff<Row>(before: readonly Row[], after: readonly Row[]): RowsDiff<Row> | null {
  const shorter = Math.min(before.length, after.length)
  let start = 0
  while (start < shorter && before[start] === after[start]) start += 1
  let end = 0
  while (end < shorter - start && before[before.length - 1 - end] === after[after.length - 1 - end]) end += 1
  const remove = before.slice(start, before.length - end)
  const add = after.slice(start, after.length - end)
  const goes = new Set(remove)
  return add.some((row) => goes.has(row)) ? null : { remove, add, addIndex: start }
}
