import type { RouteObject } from 'react-router-dom'
import { lazyPage } from '@/app/lazy-page'

export const routes: RouteObject[] = [
  { index: true, ...lazyPage(async () => (await import('./OverviewPage')).OverviewPage) },
  { path: 'stocks', ...lazyPage(async () => (await import('./StocksPage')).StocksPage) },
  { path: 'stocks/:stockId', ...lazyPage(async () => (await import('./StockPage')).StockPage) },
  { path: 'brakes', ...lazyPage(async () => (await import('./BrakesPage')).BrakesPage) },
  { path: 'mails', ...lazyPage(async () => (await import('./MailsPage')).MailsPage) },
  { path: 'mails/:mailId', ...lazyPage(async () => (await import('./MailPage')).MailPage) },
  { path: 'audit', ...lazyPage(async () => (await import('./AuditPage')).AuditPage) },
  { path: 'people', ...lazyPage(async () => (await import('./PeoplePage')).PeoplePage) },
]
