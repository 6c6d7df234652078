/**
 * Labels in a column: moved apart as little as may be so that neighbors stand at least `step`
 * apart, in their order, within `from` and `to`. `wanted` rises. Undefined where they find no room.
 */
export const spread = (
  wanted: readonly number[],
  step: number,
  from: number,
  to: number,
): number[] | undefined => {
  if (wanted.length > 0 && (wanted.length - 1) * step > to - from + 1e-9) return undefined
  // Groups of neighbors that touch: each stands where its members want to be on average.
  const groups: { first: number; count: number; sum: number }[] = []
  const startOf = ({ count, sum }: { count: number; sum: number }): number => {
    const middle = sum / count
    const start = middle - ((count - 1) * step) / 2
    return Math.min(Math.max(start, from), to - (count - 1) * step)
  }
  wanted.forEach((at, index) => {
    groups.push({ first: index, count: 1, sum: at })
    for (;;) {
      const [before, last] = [groups.at(-2), groups.at(-1)]
      if (!before || !last) return
      if (startOf(before) + before.count * step <= startOf(last) + 1e-9) return
      groups.splice(-2, 2, {
        first: before.first,
        count: before.count + last.count,
        sum: before.sum + last.sum,
      })
    }
  })
  return groups.flatMap((group) => {
    const start = startOf(group)
    return Array.from({ length: group.count }, (_, index) => start + index * step)
  })
}
