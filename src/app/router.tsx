import { createBrowserRouter, type RouteObject } from 'react-router-dom'
import { ErrorPage } from '@/app/ErrorPage'
import { Landing } from '@/app/Landing'
import { lazyPage } from '@/app/lazy-page'
import { SignedInRoot } from '@/app/SignedInRoot'
import { LoadingPage } from '@/components/LoadingPage'
import { routes as brake } from '@/pages/brake/routes'
import { routes as counter } from '@/pages/counter/routes'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { routes as office } from '@/pages/office/routes'
import { routes as rack } from '@/pages/rack/routes'
import { routes as roof } from '@/pages/roof/routes'
import { PlaceRoute } from '@/pages/shell/PlaceRoute'

/** Every place is guarded by the table of places; its pages are loaded when somebody goes there. */
export const routes: RouteObject[] = [
  {
    // Who comes by a link in a mail is not signed in yet.
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <LoadingPage />,
    children: [
      ...['/welcome/:token', '/reset/:token'].map((path) => ({
        path,
        ...lazyPage(async () => (await import('@/pages/sign-in/SetPasswordPage')).SetPasswordPage),
      })),
      {
        path: '/forgot-password',
        ...lazyPage(
          async () => (await import('@/pages/sign-in/ForgotPasswordPage')).ForgotPasswordPage,
        ),
      },
    ],
  },
  {
    element: <SignedInRoot />,
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <LoadingPage />,
    children: [
      {
        // A page that fails is replaced by the error page; the session and its live events go on.
        errorElement: <ErrorPage />,
        children: [
          { path: '/', element: <Landing /> },
          { path: '/sign-in', element: <Landing /> },
          { path: '/roof', element: <PlaceRoute place="roof" />, children: roof },
          { path: '/brake', element: <PlaceRoute place="brake" />, children: brake },
          { path: '/rack', element: <PlaceRoute place="rack" />, children: rack },
          { path: '/counter', element: <PlaceRoute place="counter" />, children: counter },
          { path: '/office', element: <PlaceRoute place="office" />, children: office },
          {
            path: '/account',
            element: <PlaceRoute />,
            children: [
              {
                index: true,
                ...lazyPage(async () => (await import('@/pages/account/AccountPage')).AccountPage),
              },
              {
                path: 'crew',
                ...lazyPage(async () => (await import('@/pages/account/CrewPage')).CrewPage),
              },
            ],
          },
          { path: '*', element: <NotFoundPage /> },
        ],
      },
    ],
  },
]

export const createRouter = () => createBrowserRouter(routes)
