import type { Metal } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'

/**
 * Yield strengths in ksi for metals a brake's table leaves out, from memory: commercial steel 33,
 * annealed stainless 30, 3105-H24 aluminum 22, half-hard copper 28, titanium-zinc 15.
 */
const YIELD: Readonly<Record<Metal, number>> = {
  steel: 33,
  stainless: 30,
  aluminum: 22,
  copper: 28,
  zinc: 15,
}

/** Order in which a stated capacity stands in for one that is not stated. */
const STATED: readonly Metal[] = ['steel', 'aluminum', 'copper', 'stainless', 'zinc']

/**
 * The thickest sheet of a metal this brake bends, in inches; null where it does not bend the metal,
 * undefined where the brake states no capacity at all. A metal that the table leaves out is reckoned
 * from one that is stated: t2 = t1 sqrt(yield1 / yield2).
 */
export const findCapacity = (brake: Brake, metal: Metal): Inches | null | undefined => {
  const table = brake.capacity
  if (table === undefined) return undefined
  const stated = table[metal]
  if (stated !== undefined) return stated
  for (const other of STATED) {
    const thickness = table[other]
    if (typeof thickness === 'number') return thickness * Math.sqrt(YIELD[other] / YIELD[metal])
  }
  return undefined
}
