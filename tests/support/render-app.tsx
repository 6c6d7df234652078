import { QueryClientProvider } from '@tanstack/react-query'
import { render } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { onTestFinished } from 'vitest'
import { createQueryClient } from '@/app/query-client'
import { routes } from '@/app/router'
import { fakeEventSource } from './fake-event-source'

/** The whole client at an address, on the faked edge: `fakeApi` must have been set up. */
export function renderApp(address: string) {
  const live = fakeEventSource()
  const client = createQueryClient()
  // What still waits to be tried again must not reach into the next test.
  onTestFinished(() => client.clear())
  const router = createMemoryRouter(routes, { initialEntries: [address] })
  render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return { user: userEvent.setup(), live, client, router }
}
