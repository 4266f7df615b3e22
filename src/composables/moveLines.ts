/**
 * The order of all lines after some of them went one place up (-1) or down (1) past the next line that is shown in their group; `null` where there is none.
 * `all` and the result are keys of every line; `shown` are those of the group, in order; the moved ones stay together.
 */
export function moveLines(all: readonly string[], moved: readonly string[], step: -1 | 1, shown: readonly string[]): string[] | null {
  const isMoved = new Set(moved)
  const places = shown.flatMap((key, at) => (isMoved.has(key) ? [at] : []))
  const edge = step === -1 ? places[0] : places.at(-1)
  const neighbour = edge === undefined ? undefined : shown[edge + step]
  if (neighbour === undefined) return null
  const rest = all.filter((key) => !isMoved.has(key))
  const block = shown.filter((key) => isMoved.has(key))
  const at = rest.indexOf(neighbour) + (step === 1 ? 1 : 0)
  return [...rest.slice(0, at), ...block, ...rest.slice(at)]
}
