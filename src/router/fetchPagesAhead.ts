import type { Router } from 'vue-router'
import type { RouteName } from './routes.ts'

/** Has pages at hand before they are asked for, so that they open where there is no signal. One that doesn't come now comes when it is asked for. */
export function fetchPagesAhead(router: Router, names: readonly RouteName[]): void {
  for (const record of router.getRoutes()) {
    const page: unknown = names.includes(record.name as RouteName) ? record.components?.default : null
    // Until it has been opened, a page is the function that fetches it.
    if (typeof page === 'function') void (page as () => Promise<unknown>)().catch(() => {})
  }
}
