import type { EndDepth } from '#shared/ends/end-depth'
import type { EndLayout, HemOpening, Mark, Slit, StripPoint } from '#shared/ends/end-layout'
import type { End, Side } from '#shared/ends/end.schema'
import { beyondBorder } from '#shared/ends/strip-polygon'
import { isLess } from '#shared/geometry/tolerance'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Inches } from '#shared/units/brands'

/** Beyond a thickness, what a neighbor needs to enter a hem. Common practice, no source. */
const ENTRY: Inches = 1 / 32

const marksOf = (at: readonly Inches[], along: readonly Inches[]): Mark[] =>
  at.map((across, index) => {
    const of = index === 0 ? 'edgeA' : index === at.length - 1 ? 'edgeB' : 'crease'
    return { at: across, along: along[index] ?? 0, of, crease: of === 'crease' ? index - 1 : null }
  })

/** Between two tabs the sheet is slit along their crease, from the fold lines to the nearer corner. */
const slitsOf = ({ tabs }: EndDepth): Slit[] =>
  tabs.flatMap((tab) => {
    const next = tabs.find(({ leg }) => leg === tab.leg + 1)
    const [from, mine, theirs] = [tab.points.at(-1), tab.points.at(-2), next?.points[1]]
    if (!from || !mine || !theirs) return []
    return [{ from, to: { at: from.at, along: Math.max(mine.along, theirs.along) } }]
  })

const openingOf = (
  edge: 'A' | 'B',
  hem: Hem | null,
  length: Inches,
  thickness: Inches,
): HemOpening[] => {
  const gap = thickness + ENTRY
  const isNarrow = hem !== null && (hem.style === 'closed' || isLess(hem.gap, gap))
  return isNarrow ? [{ edge, length, gap }] : []
}

/** Over laps open every hem that is narrower than a thickness and 1/32 in., over the lap's length. */
const openingsOf = (profile: Profile, thickness: Inches, end: End): HemOpening[] =>
  end.kind === 'lap' && end.side === 'over'
    ? [
        ...openingOf('A', profile.hemA, end.length, thickness),
        ...openingOf('B', profile.hemB, end.length, thickness),
      ]
    : []

export interface EndToLay {
  readonly profile: Profile
  readonly thickness: Inches
  readonly end: End
  readonly side: Side
  /** Of the marks, across the strip. */
  readonly at: readonly Inches[]
  readonly depth: EndDepth
  /** A place that counts from this end, counted from the blank's left end. */
  readonly onBlank: (point: StripPoint) => StripPoint
}

/** One end as it is laid out with a tape: marks count from this end, polygons from the left. */
export const layEnd = (given: EndToLay): EndLayout => {
  const { profile, thickness, end, side, at, depth, onBlank } = given
  return {
    side,
    marks: marksOf(at, depth.marks),
    tabs: depth.tabs.map(({ leg, length, points }) => {
      const polygon = points.map(onBlank)
      const [from, to] = [polygon[0], polygon.at(-1)]
      if (!from || !to) throw new RangeError(`The tab on leg ${leg} has no fold line.`)
      return { leg, length, polygon, fold: [from, to] }
    }),
    cutAways: beyondBorder(depth.border).map((polygon) => polygon.map(onBlank)),
    slits: slitsOf(depth).map(({ from, to }) => ({ from: onBlank(from), to: onBlank(to) })),
    openings: openingsOf(profile, thickness, end),
  }
}
