import type { OrderState, OrderSummary } from '#shared/orders/order.schema'

/** Whatever is not picked up whole and not withdrawn, in the order of the work. */
export const OPEN_STATES = [
  'question',
  'submitted',
  'released',
  'inWork',
  'ready',
  'partPickedUp',
] as const satisfies readonly OrderState[]

export const isIncoming = ({ state }: OrderSummary): boolean =>
  state === 'submitted' || state === 'question'

/** Some of it lies on the rack, or has been there: what the counter may be asked for. */
export const isAtCounter = ({ state, progress }: OrderSummary): boolean =>
  progress.bundled > 0 || state === 'partPickedUp'

/** Soonest needed first; of one day the older order first. */
export const bySoonest = (
  one: Pick<OrderSummary, 'neededBy' | 'number'>,
  other: Pick<OrderSummary, 'neededBy' | 'number'>,
): number => one.neededBy.localeCompare(other.neededBy) || one.number - other.number
