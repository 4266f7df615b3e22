import type { RouteLocationNormalized, Router } from 'vue-router'
import { readFirm } from '../api/firm.ts'
import { onSignedOut, ProblemError } from '../api/http.ts'
import { useUndoToast } from '../composables/useUndoToast.ts'
import { useSessionStore } from '../stores/session.ts'
import { navigationProblem } from './navigationProblem.ts'
import { arrive, startOnTheWay } from './navigationProgress.ts'

const SIGNED_OUT_NOTICE = 'You were signed out. Sign in to go on where you were.'

/** Sends people who aren't signed in to the sign-in and back, and keeps from each role the pages that aren't theirs. */
export function guardRoutes(router: Router): void {
  const session = useSessionStore()

  router.beforeEach((to, from) => {
    if (to.path !== from.path) startOnTheWay()
  })

  router.beforeEach(async (to) => {
    if (to.meta.isPublic) return true
    await session.load()
    if (!session.isSignedIn) return signInAnd(to)
    if (to.meta.action && !session.may(to.meta.action)) return missing(to)
    if (to.name === 'house') return { name: firstHousePage(session.may('room.write')), params: to.params, replace: true }
    return true
  })

  router.onError(async (error: unknown, to, from) => {
    arrive()
    const lostConnection = from.matched.length > 0 ? await whyUnreachable() : null
    // Whoever stands on a page, with words half typed, stays on it while there is no connection.
    if (lostConnection) useUndoToast().sayProblem(lostConnection)
    else navigationProblem.value = { error, wanted: to.fullPath }
  })

  router.afterEach((to) => {
    arrive()
    navigationProblem.value = null
    document.title = to.meta.title ? `${to.meta.title} · Quoinbook` : 'Quoinbook'
  })

  onSignedOut(() => {
    if (!session.isSignedIn) return
    session.leave(SIGNED_OUT_NOTICE)
    void router.push(signInAnd(router.currentRoute.value))
  })
}

/** Tells a lost connection from a part of the app that is no longer there. */
async function whyUnreachable(): Promise<ProblemError | null> {
  const reason: unknown = await readFirm().catch((error: unknown) => error)
  return reason instanceof ProblemError && reason.isUnreachable ? reason : null
}

function signInAnd(wanted: RouteLocationNormalized) {
  return { name: 'sign-in', query: wanted.path === '/' ? {} : { next: wanted.fullPath } }
}

/** The address stays as it was typed. */
function missing(to: RouteLocationNormalized) {
  return { name: 'not-found', params: { pathMatch: to.path.slice(1).split('/') }, query: to.query, hash: to.hash }
}

function firstHousePage(mayKeyRooms: boolean) {
  return mayKeyRooms ? 'rooms' : 'summary'
}
