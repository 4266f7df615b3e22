import type { RouteRecordRaw } from 'vue-router'
import type { Action } from '../../shared/access/permissions.ts'

declare module 'vue-router' {
  interface RouteMeta {
    /** Stands in the browser's tab, before the app's name. */
    title?: string
    /** Open to anyone, signed in or not. */
    isPublic?: boolean
    /** Who may not do this is told that there is no such page. */
    action?: Action
    /** The page takes the height of the window and scrolls inside, as one with a grid does. */
    fillsWindow?: boolean
  }
}

/** Names of the pages. A misspelt one is a type error. */
export type RouteName =
  | 'sign-in'
  | 'forgotten-password'
  | 'reset-password'
  | 'accept-invitation'
  | 'houses'
  | 'house'
  | 'house-details'
  | 'rooms'
  | 'estimate'
  | 'summary'
  | 'price-book'
  | 'people'
  | 'outbox'
  | 'account'
  | 'not-found'

type NamedRoute = RouteRecordRaw & { name?: RouteName }

const doorstepRoutes: NamedRoute[] = [
  {
    name: 'sign-in',
    path: '/sign-in',
    component: () => import('../views/SignInView.vue'),
    meta: { title: 'Sign in', isPublic: true },
  },
  {
    name: 'forgotten-password',
    path: '/forgotten-password',
    component: () => import('../views/ForgottenPasswordView.vue'),
    meta: { title: 'Forgotten password', isPublic: true },
  },
  {
    name: 'reset-password',
    path: '/reset-password',
    component: () => import('../views/ResetPasswordView.vue'),
    meta: { title: 'New password', isPublic: true },
  },
  {
    name: 'accept-invitation',
    path: '/accept-invitation',
    component: () => import('../views/AcceptInvitationView.vue'),
    meta: { title: 'Accept the invitation', isPublic: true },
  },
]

const houseRoutes: NamedRoute[] = [
  {
    name: 'house-details',
    path: 'details',
    component: () => import('../views/HouseDetailsView.vue'),
    meta: { title: 'Details', action: 'house.write' },
  },
  {
    name: 'rooms',
    path: 'rooms',
    component: () => import('../views/RoomsView.vue'),
    meta: { title: 'Rooms', action: 'room.write' },
  },
  {
    name: 'estimate',
    path: 'estimate',
    component: () => import('../views/EstimateView.vue'),
    meta: { title: 'Estimate', action: 'estimate.read', fillsWindow: true },
  },
  {
    name: 'summary',
    path: 'summary',
    component: () => import('../views/SummaryView.vue'),
    meta: { title: 'Summary', action: 'estimate.read' },
  },
]

const signedInRoutes: NamedRoute[] = [
  {
    name: 'houses',
    path: '',
    component: () => import('../views/HouseListView.vue'),
    meta: { title: 'Houses', action: 'house.read' },
  },
  {
    name: 'house',
    path: 'houses/:houseId',
    component: () => import('../components/layout/TheHouseFrame.vue'),
    meta: { action: 'house.read' },
    children: houseRoutes,
  },
  {
    name: 'price-book',
    path: 'price-book',
    component: () => import('../views/PriceBookView.vue'),
    meta: { title: 'Price book', action: 'price-book.read', fillsWindow: true },
  },
  {
    name: 'people',
    path: 'people',
    component: () => import('../views/PeopleView.vue'),
    meta: { title: 'People', action: 'person.read' },
  },
  {
    name: 'outbox',
    path: 'outbox',
    component: () => import('../views/OutboxView.vue'),
    meta: { title: 'Outbox', action: 'outbox.read' },
  },
  {
    name: 'account',
    path: 'account',
    component: () => import('../views/AccountView.vue'),
    meta: { title: 'Your account', action: 'account.self' },
  },
  {
    name: 'not-found',
    path: ':pathMatch(.*)*',
    component: () => import('../views/NotFoundView.vue'),
    meta: { title: 'No such page' },
  },
]

/** The sitemap: the doorstep for anyone, all else inside the shell for those who are signed in. */
export const routes: RouteRecordRaw[] = [
  ...doorstepRoutes,
  { path: '/', component: () => import('../components/layout/TheAppShell.vue'), children: signedInRoutes },
]
