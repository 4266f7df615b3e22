import { flushPromises } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createMemoryHistory, createRouter, type Router } from 'vue-router'
import type { Role } from '../../shared/schemas/account.ts'
import { http } from '../../src/api/http.ts'
import { guardRoutes } from '../../src/router/guards.ts'
import { useUndoToast } from '../../src/composables/useUndoToast.ts'
import { navigationProblem } from '../../src/router/navigationProblem.ts'
import type { RouteName } from '../../src/router/routes.ts'
import { routes } from '../../src/router/routes.ts'
import { useSessionStore } from '../../src/stores/session.ts'
import { buildCurrentUser } from '../support/mountInApp.ts'
import { problemAnswer, stubApi } from '../support/stubApi.ts'

let router: Router

beforeEach(() => {
  setActivePinia(createPinia())
  // The pages themselves are no part of this.
  const empty = { render: () => null }
  router = createRouter({ history: createMemoryHistory(), routes: withComponent(routes, empty) })
  guardRoutes(router)
})
afterEach(() => vi.unstubAllGlobals())

function withComponent(list: typeof routes, component: object): typeof routes {
  return list.map((route) => ({ ...route, component, children: withComponent(route.children ?? [], component) })) as typeof routes
}

function serverKnows(role: Role | null) {
  return stubApi({ 'GET /sessions/current': role ? buildCurrentUser(role) : problemAnswer(401, 'signed-out', 'Sign in first.') })
}

describe('without a session', () => {
  it('leads to the sign-in and remembers the page that was wanted', async () => {
    serverKnows(null)
    await router.push('/houses/h1/estimate?by=room')
    expect(router.currentRoute.value).toMatchObject({ name: 'sign-in', query: { next: '/houses/h1/estimate?by=room' } })
  })

  it.each(['/sign-in', '/forgotten-password', '/reset-password?token=x', '/accept-invitation?token=x'])('opens %s', async (path) => {
    serverKnows(null)
    await router.push(path)
    expect(router.currentRoute.value.fullPath).toBe(path)
  })
})

describe('with a session', () => {
  const pages: [path: string, name: RouteName, roles: Role[]][] = [
    ['/', 'houses', ['admin', 'estimator', 'owner']],
    ['/houses/h1/details', 'house-details', ['admin', 'estimator']],
    ['/houses/h1/rooms', 'rooms', ['admin', 'estimator']],
    ['/houses/h1/estimate', 'estimate', ['admin', 'estimator', 'owner']],
    ['/houses/h1/summary', 'summary', ['admin', 'estimator', 'owner']],
    ['/price-book', 'price-book', ['admin', 'estimator']],
    ['/people', 'people', ['admin']],
    ['/outbox', 'outbox', ['admin']],
    ['/account', 'account', ['admin', 'estimator', 'owner']],
  ]
  const visits = pages.flatMap(([path, name, roles]) =>
    (['admin', 'estimator', 'owner'] as const).map((role) => [role, path, roles.includes(role) ? name : 'not-found'] as const),
  )

  it.each(visits)('shows the %s at %s the page %s', async (role, path, name) => {
    serverKnows(role)
    await router.push(path)
    expect(router.currentRoute.value.name).toBe(name)
    expect(router.currentRoute.value.path).toBe(path)
  })

  it.each([
    ['estimator', 'rooms'],
    ['owner', 'summary'],
  ] as const)('opens a house for the %s at its %s', async (role, name) => {
    serverKnows(role)
    await router.push('/houses/h1')
    expect(router.currentRoute.value.name).toBe(name)
  })

  it('asks the server who is signed in only once', async () => {
    const api = serverKnows('admin')
    await router.push('/')
    await router.push('/people')
    expect(api.callsTo('GET /sessions/current')).toHaveLength(1)
  })

  it('says in the tab which page it is', async () => {
    serverKnows('admin')
    await router.push('/people')
    expect(document.title).toBe('People · Quoinbook')
  })

  it('says no such page for an address that nothing stands at', async () => {
    serverKnows('admin')
    await router.push('/nothing/here')
    expect(router.currentRoute.value).toMatchObject({ name: 'not-found', path: '/nothing/here' })
  })
})

describe('when the session ends while a page is open', () => {
  it('leads to the sign-in with a notice and the way back', async () => {
    const api = serverKnows('admin')
    api.answers['GET /people'] = problemAnswer(401, 'signed-out', 'Sign in first.')
    await router.push('/people')
    await http.get('/people').catch(() => {})
    await flushPromises()
    expect(router.currentRoute.value).toMatchObject({ name: 'sign-in', query: { next: '/people' } })
    expect(useSessionStore().notice).toContain('You were signed out')
  })
})

describe('when the server can’t be reached at the first page', () => {
  it('says so in place of the page', async () => {
    vi.spyOn(console, 'warn').mockImplementation(() => {})
    stubApi({ 'GET /sessions/current': new TypeError('Failed to fetch') })
    await router.push('/people').catch(() => {})
    expect(navigationProblem.value).toMatchObject({ wanted: '/people' })
  })
})

describe('when the connection is lost while a page is open', () => {
  it('stays on the page and says why the other one doesn’t open', async () => {
    vi.spyOn(console, 'warn').mockImplementation(() => {})
    serverKnows('admin')
    await router.push('/people')
    stubApi({ 'GET /firm': new TypeError('Failed to fetch') })
    router.addRoute({ path: '/far', component: () => Promise.reject(new TypeError('Failed to fetch dynamically imported module')) })
    await router.push('/far').catch(() => {})
    await flushPromises()
    expect(router.currentRoute.value.path).toBe('/people')
    expect(navigationProblem.value).toBeNull()
    expect(useUndoToast().toasts.value.at(-1)).toMatchObject({ isProblem: true, text: expect.stringContaining('can’t be reached') })
  })
})
