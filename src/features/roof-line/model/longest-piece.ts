import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { Stock } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import type { CheckedPlan } from '@/features/drawing/check/check-drawing'

export interface LongestPiece {
  readonly stock: Inches
  /** The longest brake that bends the piece, or the longest of the shop where none does. */
  readonly brake: { readonly name: string; readonly length: Inches } | null
  /** The least of both. */
  readonly length: Inches
}

/** How long a piece the shop makes of a stock: the least of what its stock and its brakes take. */
export function longestPiece(
  { longestPiece: stock }: Stock,
  brakes: readonly ShopBrake[],
  plans: readonly CheckedPlan[],
): LongestPiece {
  const bending = brakes.filter(({ id }) =>
    plans.some(({ brakeId, plan }) => brakeId === id && plan.feasible),
  )
  const asked = bending.length > 0 ? bending : brakes
  const [longest] = asked
    .map(({ brake: { name, length } }) => ({ name, length }))
    .toSorted((a, b) => b.length - a.length)
  return {
    stock,
    brake: longest ?? null,
    length: Math.min(stock, longest?.length ?? stock),
  }
}
