import { isAtMost } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { OpenTools } from './open-tools'
import type { Outline } from './outline'
import { meetsSliding } from './slide'

/** Forward slides tried before the clamp opens. Inches. */
const SLIDES = [0, 0.25, 0.5, 1, 2, 4]

/** The piece is out when its rear is this far in front of the bend line. Inches. */
const OUT = 2

/** How far the clamp opens for a rear, and how far it must come. */
interface WayOut {
  readonly height: Inches
  readonly depth: Inches
  readonly left: Inches
}

const wayOutOf = ({ box }: Outline): WayOut => ({
  height: Math.max(0, box.top),
  depth: Math.max(0, 0 - box.bottom),
  left: box.left,
})

/** The slides, as bits, after which a part of the piece comes out without meeting a tool. */
const slidesOut = (
  part: Outline,
  { height, depth, left }: WayOut,
  { inner, outer }: OpenTools,
  clearance: Inches,
): number => {
  let free = 0
  for (let i = 0; i < SLIDES.length; i++) {
    const slide = SLIDES[i] ?? NaN
    const isStuck =
      meetsSliding(part, inner, slide, 0, clearance) ||
      meetsSliding(part, outer, slide, 0, clearance)
    if (isStuck) break
    const further = Math.max(0, OUT - left - slide)
    const isFree =
      // Seen from the tool, the piece goes down as the inner tool lifts, and up as the outer drops.
      !meetsSliding(part, inner, 0, 0 - height, clearance, slide, 0) &&
      !meetsSliding(part, outer, 0, depth, clearance, slide, 0) &&
      !meetsSliding(part, inner, further, 0, clearance, slide, 0 - height) &&
      !meetsSliding(part, outer, further, 0, clearance, slide, depth)
    if (isFree) free |= 1 << i
  }
  return free
}

/** What was found of a rear: it serves every front. */
const knownRears = new WeakMap<OpenTools, WeakMap<Outline, readonly [Inches, number]>>()

const rearSlidesOut = (rear: Outline, tools: OpenTools, clearance: Inches): number => {
  const known = knownRears.get(tools) ?? new WeakMap<Outline, readonly [Inches, number]>()
  knownRears.set(tools, known)
  const found = known.get(rear)
  if (found?.[0] === clearance) return found[1]
  const slides = slidesOut(rear, wayOutOf(rear), tools, clearance)
  known.set(rear, [clearance, slides])
  return slides
}

/** The piece goes forwards and the tools up and down: a front before them meets nothing. */
const liesBefore = ({ box }: Outline, { inner, outer }: OpenTools, clearance: Inches): boolean =>
  box.left > Math.max(inner.box.right, outer.box.right) + clearance

/**
 * Whether a piece lying in the clamp can be drawn out to the front (and so, backwards, put in):
 * forward a little, the clamp opens by the rear's height above and depth below the sheet, then all
 * the way out. Moves are swept against inner and outer tool.
 */
export const canDrawOut = (
  rear: Outline,
  front: Outline | undefined,
  tools: OpenTools,
  opening: Inches,
  clearance: Inches,
): boolean => {
  const way = wayOutOf(rear)
  if (!isAtMost(way.height + way.depth, opening)) return false
  const slides = rearSlidesOut(rear, tools, clearance)
  if (slides === 0 || front === undefined || liesBefore(front, tools, clearance))
    return slides !== 0
  return (slides & slidesOut(front, way, tools, clearance)) !== 0
}
