/** What time it is: a port, so that tests can say when something happens. */
export interface Clock {
  readonly now: () => Date
}

export const systemClock: Clock = { now: () => new Date() }
