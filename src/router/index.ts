import { createRouter, createWebHistory, type Router } from 'vue-router'
import { guardRoutes } from './guards.ts'
import { routes } from './routes.ts'

/** The router of the app; Pinia must be installed before it is made. */
export function createAppRouter(): Router {
  const router = createRouter({
    history: createWebHistory(),
    routes,
    scrollBehavior: (_to, _from, savedPosition) => savedPosition ?? { top: 0 },
  })
  guardRoutes(router)
  return router
}
