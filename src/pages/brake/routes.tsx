import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  { index: true, ...lazyPage(async () => (await import('./QueuePage')).QueuePage) },
  { path: 'done', ...lazyPage(async () => (await import('./QueuePage')).DonePage) },
  {
    path: 'test-bends',
    ...lazyPage(async () => (await import('./TestBendsPage')).TestBendsPage),
  },
  { path: 'runs/:runId', ...lazyPage(async () => (await import('./RunPage')).RunPage) },
  {
    path: 'runs/:runId/lines/:lineId',
    ...lazyPage(
      async () => (await import('@/pages/strip-sheet/RunStripSheetPage')).RunStripSheetPage,
    ),
  },
  {
    path: 'pieces/:code',
    ...lazyPage(async () => (await import('@/pages/piece/PiecePage')).PiecePage),
  },
]
