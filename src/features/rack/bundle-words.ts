import type { Bundle, BundlePiece } from '#shared/bundles/bundles.contract'

/** As staff say it: the second bundle of an order is B2. */
export const bundleMark = ({ number }: Pick<Bundle, 'number'>): string => `B${number}`

/** How many of each name, in the order in which they first come. */
export function countByName(
  pieces: readonly Pick<BundlePiece, 'name'>[],
): { readonly name: string; readonly count: number }[] {
  const counts = new Map<string, number>()
  for (const { name } of pieces) counts.set(name, (counts.get(name) ?? 0) + 1)
  return [...counts].map(([name, count]) => ({ name, count }))
}
