import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  {
    ...lazyPage(async () => (await import('./RoofRoot')).RoofRoot),
    children: [
      { index: true, ...lazyPage(async () => (await import('./jobs/JobsPage')).JobsPage) },
      {
        path: 'jobs/new',
        ...lazyPage(async () => (await import('./jobs/NewJobPage')).NewJobPage),
      },
      { path: 'jobs/:jobId', ...lazyPage(async () => (await import('./jobs/JobPage')).JobPage) },
      {
        path: 'jobs/:jobId/board',
        ...lazyPage(async () => (await import('./board/BoardPage')).BoardPage),
      },
      {
        path: 'jobs/:jobId/order',
        ...lazyPage(async () => (await import('./orders/NewOrderPage')).NewOrderPage),
      },
      { path: 'shelf', ...lazyPage(async () => (await import('./shelf/ShelfPage')).ShelfPage) },
      {
        path: 'shelf/:profileId',
        ...lazyPage(async () => (await import('./shelf/ShelfProfilePage')).ShelfProfilePage),
      },
      { path: 'orders', ...lazyPage(async () => (await import('./orders/OrdersPage')).OrdersPage) },
      {
        path: 'orders/:orderId',
        ...lazyPage(async () => (await import('./orders/OrderPage')).OrderPage),
      },
      {
        path: 'orders/:orderId/amend',
        ...lazyPage(async () => (await import('./orders/AmendOrderPage')).AmendOrderPage),
      },
      {
        path: 'orders/:orderId/lines/:lineId',
        ...lazyPage(
          async () => (await import('@/pages/strip-sheet/OrderStripSheetPage')).OrderStripSheetPage,
        ),
      },
      {
        path: 'pieces/:code',
        ...lazyPage(async () => (await import('@/pages/piece/PiecePage')).PiecePage),
      },
    ],
  },
]
