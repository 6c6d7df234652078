import type { Place } from '#shared/access/permissions'

/** Route patterns and the builders of links to them: no address is written anywhere else. */
export const paths = {
  landing: () => '/',
  signIn: () => '/sign-in',
  account: () => '/account',
  place: (place: Place) => `/${place}`,

  roof: {
    home: () => '/roof',
    job: (jobId: string) => `/roof/jobs/${jobId}`,
    newJob: () => '/roof/jobs/new',
    board: (jobId: string) => `/roof/jobs/${jobId}/board`,
    shelf: () => '/roof/shelf',
    shelfProfile: (profileId: string) => `/roof/shelf/${profileId}`,
    orders: () => '/roof/orders',
    order: (orderId: string) => `/roof/orders/${orderId}`,
    newOrder: (jobId: string) => `/roof/jobs/${jobId}/order`,
    amendOrder: (orderId: string) => `/roof/orders/${orderId}/amend`,
    piece: (code: string) => `/roof/pieces/${encodeURIComponent(code)}`,
  },
  brake: {
    queue: () => '/brake',
    done: () => '/brake/done',
    run: (runId: string) => `/brake/runs/${runId}`,
  },
  rack: {
    home: () => '/rack',
    order: (orderId: string) => `/rack/orders/${orderId}`,
    bundle: (code: string) => `/rack/bundles/${encodeURIComponent(code)}`,
    piece: (code: string) => `/rack/pieces/${encodeURIComponent(code)}`,
  },
  counter: {
    incoming: () => '/counter',
    order: (orderId: string) => `/counter/orders/${orderId}`,
    handOff: () => '/counter/hand-off',
    handOffOrder: (orderId: string) => `/counter/hand-off/${orderId}`,
  },
  office: {
    home: () => '/office',
    stocks: () => '/office/stocks',
    brakes: () => '/office/brakes',
    people: () => '/office/people',
  },
} as const
