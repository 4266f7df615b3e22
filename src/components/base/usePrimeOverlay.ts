import { defineAsyncComponent, getCurrentInstance, type App, type Component } from 'vue'

const LOADERS = {
  dialog: () => import('primevue/dialog').then((part) => part.default),
  drawer: () => import('primevue/drawer').then((part) => part.default),
} satisfies Record<string, () => Promise<Component>>

type Name = keyof typeof LOADERS
type Overlay<N extends Name> = Awaited<ReturnType<(typeof LOADERS)[N]>>

const loaded: { [N in Name]?: Overlay<N> } = {}

/**
 * A part of PrimeVue that lies over the page, loaded together with PrimeVue itself when it is first shown: most pages are read and keyed
 * without one, and stay light. Called in a component's setup.
 */
export function usePrimeOverlay<N extends Name>(name: N): Overlay<N> {
  const app = getCurrentInstance()?.appContext.app
  return loaded[name] ?? (defineAsyncComponent(() => loadOverlay(name, app)) as Overlay<N>)
}

/** Has an overlay at hand before it is asked for, so that it opens at once, and where the connection is lost meanwhile. */
export async function loadOverlay<N extends Name>(name: N, app: App | undefined): Promise<Overlay<N>> {
  const [{ installPrimeVue }, overlay] = await Promise.all([import('../../assets/installPrimeVue.ts'), LOADERS[name]()])
  if (app) installPrimeVue(app)
  loaded[name] = overlay as (typeof loaded)[N]
  return overlay as Overlay<N>
}
