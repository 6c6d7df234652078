import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  { index: true, ...lazyPage(async () => (await import('./RackPage')).RackPage) },
  {
    path: 'orders/:orderId',
    ...lazyPage(async () => (await import('./BundlingPage')).BundlingPage),
  },
  { path: 'bundles/:code', ...lazyPage(async () => (await import('./BundlePage')).BundlePage) },
  {
    path: 'pieces/:code',
    ...lazyPage(async () => (await import('@/pages/piece/PiecePage')).PiecePage),
  },
]
