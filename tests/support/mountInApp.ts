import { VueQueryPlugin } from '@tanstack/vue-query'
import { flushPromises, mount, type VueWrapper } from '@vue/test-utils'
import { createPinia, setActivePinia, type Pinia } from 'pinia'
import type { Component } from 'vue'
import { createMemoryHistory, createRouter, type Router } from 'vue-router'
import type { CurrentUser, Role } from '../../shared/schemas/account.ts'
import { queryClient } from '../../src/api/queryClient.ts'
import { guardRoutes } from '../../src/router/guards.ts'
import { routes } from '../../src/router/routes.ts'
import { useSessionStore } from '../../src/stores/session.ts'

export function buildCurrentUser(role: Role, overrides: Partial<CurrentUser> = {}): CurrentUser {
  return { id: `${role}-1`, email: `${role}@alderfinch.example`, name: `The ${role}`, role, ...overrides }
}

export interface MountedInApp {
  wrapper: VueWrapper
  router: Router
  session: ReturnType<typeof useSessionStore>
}

interface InAppOptions {
  /** Who is signed in; nobody unless told. */
  role?: Role
  props?: Record<string, unknown>
  /** The address that the app stands at. */
  at?: string
  /** Names of components that are no part of the test and stay empty. */
  leaveOut?: readonly string[]
}

/** Mounts a component in the app's own surroundings: its routes, its session and a fresh cache of what the server said. */
export async function mountInApp(
  component: Component,
  { role, props = {}, at = '/sign-in', leaveOut = [] }: InAppOptions = {},
): Promise<MountedInApp> {
  const pinia = freshPinia(role)
  const router = createRouter({ history: createMemoryHistory(), routes })
  guardRoutes(router)
  await router.push(at)
  const wrapper = mount(component, {
    props,
    global: {
      plugins: [pinia, router, [VueQueryPlugin, { queryClient }]],
      stubs: Object.fromEntries(leaveOut.map((name) => [name, true])),
    },
    attachTo: document.body,
  })
  await flushPromises()
  return { wrapper, router, session: useSessionStore() }
}

function freshPinia(role: Role | undefined): Pinia {
  const pinia = createPinia()
  setActivePinia(pinia)
  queryClient.clear()
  const session = useSessionStore()
  if (role) session.enter(buildCurrentUser(role))
  else session.leave('')
  return pinia
}
