import type { LineRow } from './lineRow.ts'

/** The lines of an estimate in their order, found by key or by id. */
export interface LineList {
  /** In order. The array is the list's own: read it, don't keep it. */
  rows(): readonly LineRow[]
  find(key: string): LineRow | undefined
  findById(id: string): LineRow | undefined
  /** Below the line `afterKey`; first when `null`; last when there is no such line. */
  insertAfter(row: LineRow, afterKey: string | null): void
  remove(key: string): void
  /** Lines that `keys` leaves out stay behind the one that they stood behind. */
  reorder(keys: readonly string[]): void
  /** The line right above, or `null` for the first. */
  keyBefore(key: string): string | null
  /** Id of the nearest line above that the server has; `null` when there is none. */
  savedIdAbove(key: string): string | null
  keys(): string[]
  /** Tells the list that a line got its id. */
  named(row: LineRow): void
}

export function createLineList(initial: readonly LineRow[]): LineList {
  let rows = [...initial]
  const byKey = new Map(rows.map((row) => [row.key, row]))
  const byId = new Map(rows.flatMap((row) => (row.id === null ? [] : [[row.id, row]])))

  function insertAfter(row: LineRow, afterKey: string | null): void {
    const at = afterKey === null ? 0 : placeBelow(afterKey)
    rows.splice(at, 0, row)
    byKey.set(row.key, row)
    if (row.id !== null) byId.set(row.id, row)
  }

  function placeBelow(key: string): number {
    const above = byKey.get(key)
    return above ? rows.indexOf(above) + 1 : rows.length
  }

  function remove(key: string): void {
    const row = byKey.get(key)
    if (!row) return
    rows.splice(rows.indexOf(row), 1)
    byKey.delete(key)
    if (row.id !== null) byId.delete(row.id)
  }

  function reorder(keys: readonly string[]): void {
    const isNamed = new Set(keys)
    const followers = new Map<string | null, LineRow[]>()
    let above: string | null = null
    for (const row of rows) {
      if (isNamed.has(row.key)) above = row.key
      else followers.set(above, [...(followers.get(above) ?? []), row])
    }
    const named = keys.flatMap((key) => byKey.get(key) ?? [])
    rows = [...(followers.get(null) ?? []), ...named.flatMap((row) => [row, ...(followers.get(row.key) ?? [])])]
  }

  return {
    rows: () => rows,
    find: (key) => byKey.get(key),
    findById: (id) => byId.get(id),
    insertAfter,
    remove,
    reorder,
    keyBefore(key) {
      const row = byKey.get(key)
      return row ? (rows[rows.indexOf(row) - 1]?.key ?? null) : null
    },
    savedIdAbove(key) {
      const row = byKey.get(key)
      for (let at = (row ? rows.indexOf(row) : rows.length) - 1; at >= 0; at -= 1) {
        const above = rows[at]
        if (above && above.id !== null && !above.isRemovedAtServer) return above.id
      }
      return null
    },
    keys: () => rows.map((row) => row.key),
    named(row) {
      if (row.id !== null) byId.set(row.id, row)
    },
  }
}
