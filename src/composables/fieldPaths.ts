/** The value at a path of names joined by dots, `shape.lengthIn`; `undefined` where there is nothing. */
export function fieldAt(value: unknown, path: string): unknown {
  return path.split('.').reduce<unknown>((inner, name) => (isObject(inner) ? inner[name] : undefined), value)
}

/** A copy with the value at the path replaced; the rest is shared with the original. */
export function withFieldAt<T extends object>(object: T, path: string, value: unknown): T {
  const [name, ...rest] = path.split('.') as [string, ...string[]]
  const inner = (object as Record<string, unknown>)[name]
  const next = rest.length > 0 && isObject(inner) ? withFieldAt(inner, rest.join('.'), value) : value
  return { ...object, [name]: next }
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null
}
