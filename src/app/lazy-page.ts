import type { ComponentType } from 'react'

/**
 * A page as a file of its own, loaded when somebody goes there.
 *
 *     { path: 'roof', ...lazyPage(async () => (await import('./RoofPage')).RoofPage) }
 */
export const lazyPage = (load: () => Promise<ComponentType>) => ({
  lazy: async () => ({ Component: await load() }),
})
