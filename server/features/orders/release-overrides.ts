import type { StoredLine } from '#server/features/orders/orders.queries'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import { invalidInput } from '#server/http/errors'
import type { FieldError } from '#shared/http/problem'
import type { OverrideInput } from '#shared/orders/override.schema'

/**
 * The overrides by line.
 *
 * @throws invalid-input where one names a line of another order, a line twice, or no brake of the shop
 */
export function overridesByLine(
  overrides: readonly OverrideInput[],
  lines: readonly StoredLine[],
  brakes: readonly ShopBrake[],
): Map<string, OverrideInput> {
  const byLine = new Map<string, OverrideInput>()
  const errors: FieldError[] = []
  for (const [index, override] of overrides.entries()) {
    const { lineId, brakeId } = override
    const refuse = (field: keyof OverrideInput, message: string) =>
      errors.push({ path: `overrides.${index}.${field}`, message })
    if (!lines.some(({ id }) => id === lineId)) {
      refuse('lineId', 'This order has no such line. Look at the order again.')
    } else if (byLine.has(lineId)) {
      refuse('lineId', 'This line is named twice. Name each line once.')
    }
    if (!brakes.some(({ id }) => id === brakeId)) {
      refuse('brakeId', 'There is no such brake. Choose one of the list.')
    }
    byLine.set(lineId, override)
  }
  if (errors.length > 0) throw invalidInput(errors)
  return byLine
}

/** Where in the request the override of a line stands. */
export const overridePath = (overrides: readonly OverrideInput[], lineId: string): string =>
  `overrides.${overrides.findIndex((each) => each.lineId === lineId)}.lineId`
