/** A field that two people changed, each to something else. */
export interface FieldConflict {
  /** `shape.lengthIn`; the key itself where the whole value is at odds. */
  path: string
  mine: unknown
  theirs: unknown
}

/**
 * Three-way merge of what two people made of the same fields. A field that only one of them changed takes that change; objects of the same `kind` are
 * merged field by field, lists are one value each. Where both changed one field to different values `merged` holds theirs, which is what stands saved,
 * and `conflicts` names the field with both values, so that nobody's work is overwritten unasked.
 * `mergeFields({a: 1, b: 1}, {a: 2, b: 1}, {a: 1, b: 3})` gives `{a: 2, b: 3}` and no conflict.
 */
export function mergeFields<T extends object>(base: T, mine: T, theirs: T): { merged: T; conflicts: FieldConflict[] } {
  const merged: Record<string, unknown> = { ...(theirs as Record<string, unknown>) }
  const conflicts: FieldConflict[] = []
  for (const key of Object.keys({ ...base, ...mine }) as (keyof T & string)[]) {
    const [was, own, other] = [base[key], mine[key], theirs[key]] as [unknown, unknown, unknown]
    if (isSame(own, was) || isSame(own, other)) continue
    if (isSame(other, was)) {
      merged[key] = own
    } else if (areAlike(was, own, other)) {
      const inner = mergeFields(was as object, own as object, other as object)
      merged[key] = inner.merged
      conflicts.push(...inner.conflicts.map((conflict) => ({ ...conflict, path: `${key}.${conflict.path}` })))
    } else {
      conflicts.push({ path: key, mine: own, theirs: other })
    }
  }
  return { merged: merged as T, conflicts }
}

/** Equal by content: what JSON would tell apart is different, a missing field and an undefined one are the same. */
export function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true
  if (Array.isArray(a) && Array.isArray(b)) return a.length === b.length && a.every((item, index) => isSame(item, b[index]))
  if (!isPlainObject(a) || !isPlainObject(b)) return false
  return Object.keys({ ...a, ...b }).every((key) => isSame(a[key], b[key]))
}

function areAlike(...values: unknown[]): boolean {
  const objects = values.filter(isPlainObject)
  return objects.length === values.length && objects.every(({ kind }) => kind === objects[0]?.kind)
}

function isPlainObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}
