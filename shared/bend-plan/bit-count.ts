/** How many bends a made set holds. */
export const bitCount = (bits: number): number => {
  let count = 0
  for (let rest = bits; rest !== 0; rest &= rest - 1) count++
  return count
}
