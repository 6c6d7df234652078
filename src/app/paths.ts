import type { Place } from '#shared/access/permissions'

/** The parts of a query that are given. */
function query(parts: Record<string, string | undefined>): string {
  const given = Object.entries(parts).filter((part): part is [string, string] => !!part[1])
  return given.length === 0 ? '' : `?${new URLSearchParams(given).toString()}`
}

/** What the drawing board opens with; an empty sheet where nothing is named. */
interface BoardOpening {
  readonly shelf?: string
  /** What is set of a starter, as `printParameters` writes it. */
  readonly set?: string | undefined
  readonly line?: string
  /** The order whose amendment is drawn. */
  readonly order?: string
}

/** Route patterns and the builders of links to them: no address is written anywhere else. */
export const paths = {
  landing: () => '/',
  signIn: () => '/sign-in',
  account: () => '/account',
  crew: () => '/account/crew',
  forgotPassword: () => '/forgot-password',
  place: (place: Place) => `/${place}`,
  /** The history of a piece, shown within the place one stands in. */
  piece: (place: Place, code: string) => `/${place}/pieces/${encodeURIComponent(code)}`,

  roof: {
    home: () => '/roof',
    job: (jobId: string) => `/roof/jobs/${jobId}`,
    newJob: () => '/roof/jobs/new',
    board: (jobId: string, { shelf, set, line, order }: BoardOpening = {}) =>
      `/roof/jobs/${jobId}/board${query({ shelf, set, line, order })}`,
    /** Within a job, what is taken goes to its board, for a new order or for an amendment. */
    shelf: (job?: string, order?: string) => `/roof/shelf${query({ job, order })}`,
    shelfProfile: (profileId: string, { job, order }: { job?: string; order?: string } = {}) =>
      `/roof/shelf/${profileId}${query({ job, order })}`,
    orders: () => '/roof/orders',
    order: (orderId: string) => `/roof/orders/${orderId}`,
    stripSheet: (orderId: string, lineId: string) => `/roof/orders/${orderId}/lines/${lineId}`,
    newOrder: (jobId: string) => `/roof/jobs/${jobId}/order`,
    amendOrder: (orderId: string) => `/roof/orders/${orderId}/amend`,
  },
  brake: {
    queue: () => '/brake',
    done: () => '/brake/done',
    run: (runId: string) => `/brake/runs/${runId}`,
    stripSheet: (runId: string, lineId: string) => `/brake/runs/${runId}/lines/${lineId}`,
    testBends: (stock?: string) => `/brake/test-bends${query({ stock })}`,
  },
  rack: {
    home: () => '/rack',
    order: (orderId: string) => `/rack/orders/${orderId}`,
    bundle: (code: string) => `/rack/bundles/${encodeURIComponent(code)}`,
    piece: (code: string) => `/rack/pieces/${encodeURIComponent(code)}`,
  },
  counter: {
    incoming: () => '/counter',
    /** Incoming orders as a search through all of them. */
    search: (text: string) => `/counter${query({ q: text })}`,
    due: () => '/counter/due',
    order: (orderId: string) => `/counter/orders/${orderId}`,
    stripSheet: (orderId: string, lineId: string) => `/counter/orders/${orderId}/lines/${lineId}`,
    handOff: () => '/counter/hand-off',
    handOffOrder: (orderId: string) => `/counter/hand-off/${orderId}`,
  },
  office: {
    home: () => '/office',
    stocks: () => '/office/stocks',
    stock: (stockId: string) => `/office/stocks/${stockId}`,
    brakes: () => '/office/brakes',
    people: () => '/office/people',
    mails: () => '/office/mails',
    mail: (mailId: string) => `/office/mails/${mailId}`,
    audit: () => '/office/audit',
  },
} as const
