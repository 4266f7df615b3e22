/** The name that a misspelt one is most like: fewest letters to change, no more than a third of it. `null`: none is near. */
export function nearestName(typed: string, names: readonly string[]): string | null {
  const wanted = typed.toLowerCase()
  const allowed = Math.max(1, Math.floor(wanted.length / 3))
  let nearest: string | null = null
  let fewest = allowed + 1
  for (const name of names) {
    const changes = lettersToChange(wanted, name)
    if (changes < fewest) {
      fewest = changes
      nearest = name
    }
  }
  return nearest
}

/** Levenshtein's distance, by one row of his table at a time. */
function lettersToChange(from: string, to: string): number {
  let row = Array.from({ length: to.length + 1 }, (_, index) => index)
  for (let i = 1; i <= from.length; i += 1) {
    const next = [i]
    for (let j = 1; j <= to.length; j += 1) {
      const swap = (row[j - 1] ?? 0) + (from[i - 1] === to[j - 1] ? 0 : 1)
      next.push(Math.min(swap, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1))
    }
    row = next
  }
  return row[to.length] ?? 0
}
