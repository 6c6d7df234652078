import { isAtMost, isLess } from '#shared/geometry/tolerance'
import type { GoodsSettings } from '#shared/roof-line/goods-settings.schema'
import type { Inches } from '#shared/units/brands'

export type FastenerSettings = Pick<
  GoodsSettings,
  'fastenerSpacing' | 'fastenerStart' | 'fastenerEnd'
>

/**
 * Where the fasteners of a line stand, inches from its low or left end: the first at
 * `fastenerStart`, the next every `fastenerSpacing`, and a last one `fastenerEnd` before the other
 * end where the spacing falls short of that. A line too short for both ends' distances has one
 * mark, in its middle.
 *
 * The marks depend on the line alone and not on its pieces, laps or legs, so that every leg is
 * marked alike and the fasteners of both lie in one row up the roof.
 */
export const fastenerMarks = (length: Inches, settings: FastenerSettings): Inches[] => {
  const { fastenerSpacing, fastenerStart, fastenerEnd } = settings
  const last = length - fastenerEnd
  if (isLess(last, fastenerStart)) return [length / 2]
  const marks: Inches[] = []
  for (let count = 0; ; count += 1) {
    // Multiplied and not added up, so that a long line keeps its marks exact.
    const mark = fastenerStart + count * fastenerSpacing
    if (!isAtMost(mark, last)) break
    marks.push(mark)
  }
  return isLess(marks.at(-1) ?? 0, last) ? [...marks, last] : marks
}
