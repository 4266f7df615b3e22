import type { LiveEstimate } from '../../../shared/engine/index.ts'

/** As many as a firm has under the pen at once; one of 300 lines holds about a hundred kilobytes. */
const KEPT = 20

/** Estimates that were written last, compiled and ready for the next change. Each is known by its version: a stale one is never given. */
export function createLiveEstimateCache() {
  const kept = new Map<string, { version: number; live: LiveEstimate }>()

  return {
    /** Hands the estimate out and forgets it: who changes it puts it back once the change is committed. */
    take(id: string, version: number): LiveEstimate | null {
      const entry = kept.get(id)
      kept.delete(id)
      return entry?.version === version ? entry.live : null
    },

    put(id: string, version: number, live: LiveEstimate): void {
      kept.delete(id)
      kept.set(id, { version, live })
      const [oldest] = kept.keys()
      if (kept.size > KEPT && oldest !== undefined) kept.delete(oldest)
    },
  }
}
