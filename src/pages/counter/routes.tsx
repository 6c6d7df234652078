import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  { index: true, ...lazyPage(async () => (await import('./IncomingPage')).IncomingPage) },
  { path: 'due', ...lazyPage(async () => (await import('./DuePage')).DuePage) },
  { path: 'orders/:orderId', ...lazyPage(async () => (await import('./OrderPage')).OrderPage) },
  {
    path: 'orders/:orderId/lines/:lineId',
    ...lazyPage(
      async () => (await import('@/pages/strip-sheet/OrderStripSheetPage')).OrderStripSheetPage,
    ),
  },
  { path: 'hand-off', ...lazyPage(async () => (await import('./HandOffPage')).HandOffPage) },
  {
    path: 'hand-off/:orderId',
    ...lazyPage(async () => (await import('./HandOffSheetPage')).HandOffSheetPage),
  },
  {
    path: 'pieces/:code',
    ...lazyPage(async () => (await import('@/pages/piece/PiecePage')).PiecePage),
  },
]
