import type { Clock } from '../../server/config/clock.ts'

export const TEST_NOW = '2026-03-02T09:00:00.000Z'

/** A clock that stands until the test lets time pass. */
export function steppingClock(start = TEST_NOW): { clock: Clock; advance: (ms: number) => void } {
  let now = Date.parse(start)
  return {
    clock: () => new Date(now),
    advance(ms) {
      now += ms
    },
  }
}
