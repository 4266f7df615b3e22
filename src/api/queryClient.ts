import { QueryClient } from '@tanstack/vue-query'
import { ProblemError } from './ProblemError.ts'

const RETRIES_MAX = 2
const FRESH_MS = 30_000

/**
 * What the server knows, as the client last heard it. Query keys begin with a live event's `type` and then its `id`
 * (`['house', id, 'rooms']`, `['estimate', id]`, `['price-book', …]`, `['people']`), so that an event reaches all that hangs on it;
 * lists over all of a kind are named in the plural (`['houses']`).
 */
export const queryClient = new QueryClient({
  defaultOptions: {
    // Reading goes on while the browser thinks itself offline: it may be wrong, and a failure in words is better than waiting without an end.
    queries: { networkMode: 'always', staleTime: FRESH_MS, retry: (failures, error) => failures < RETRIES_MAX && isWorthRetrying(error) },
    // A write that fails for want of a connection says so at once: what was typed is still on the screen.
    mutations: { retry: false, networkMode: 'always' },
  },
})

function isWorthRetrying(error: unknown): boolean {
  return error instanceof ProblemError && (error.isUnreachable || error.status >= 500)
}
