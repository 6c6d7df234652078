import type { OrderLine } from '#shared/orders/order.schema'
import type { OverrideInput } from '#shared/orders/override.schema'

/** Whether every line that needs an override has its brake and its reason. */
export const isComplete = (
  lines: readonly OrderLine[],
  overrides: readonly OverrideInput[],
): boolean =>
  lines.every(({ id }) =>
    overrides.some(
      ({ lineId, brakeId, reason }) => lineId === id && brakeId !== '' && reason.trim() !== '',
    ),
  )
