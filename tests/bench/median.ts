/** Median time of a run in milliseconds. Rounds before the first that counts let the compiler settle. */
export function medianMs(run: () => unknown, { rounds, warmUps }: { rounds: number; warmUps: number }): number {
  for (let round = 0; round < warmUps; round += 1) run()
  const times = Array.from({ length: rounds }, () => {
    const start = performance.now()
    run()
    return performance.now() - start
  })
  return median(times)
}

/** Median of figures that belong together, as of alternating runs. */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b)
  const middle = Math.floor(sorted.length / 2)
  const upper = sorted[middle] ?? NaN
  return sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? NaN) + upper) / 2
}

/** Runs several ways in turn, so that a slow moment of the machine meets all of them, and gives the median of each in milliseconds. */
export function mediansInTurn<K extends string>(
  ways: Record<K, () => unknown>,
  { rounds, warmUps }: { rounds: number; warmUps: number },
): Record<K, number> {
  const names = Object.keys(ways) as K[]
  const times = Object.fromEntries(names.map((name) => [name, [] as number[]])) as Record<K, number[]>
  for (let round = -warmUps; round < rounds; round += 1) {
    for (const name of names) {
      const start = performance.now()
      ways[name]()
      const time = performance.now() - start
      if (round >= 0) times[name].push(time)
    }
  }
  return Object.fromEntries(names.map((name) => [name, median(times[name])])) as Record<K, number>
}
