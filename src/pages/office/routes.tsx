import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  { index: true, ...lazyPage(async () => (await import('./OfficePage')).OfficePage) },
]
