import type { OrderState } from '#shared/orders/order.schema'

/** The states of an order that is neither released nor withdrawn: it can still be changed. */
const BEFORE_RELEASE: readonly OrderState[] = ['submitted', 'question']

export const isBeforeRelease = (state: OrderState): boolean => BEFORE_RELEASE.includes(state)
