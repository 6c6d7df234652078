import type { CutRun, EndCut } from '#shared/ends/end-cut'
import type { StripPoint } from '#shared/ends/end-layout'
import type { End, Side } from '#shared/ends/end.schema'
import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'

/** A free edge is trimmed back by this over an under lap. Common practice, no source. */
const TRIM: Inches = 0.125

/** The outer corners of a tab are taken back by this. Common practice, no source. */
const TAB_CORNER: Inches = 0.25

/** A tab laid out from the cut it stands on; `along` counts from the end into the piece. */
export interface TabShape {
  readonly leg: number
  readonly length: Inches
  /** From the cut near edge A round the tab's outside to the cut near edge B. */
  readonly points: readonly StripPoint[]
}

/** What an end takes off a blank, measured from the outermost of cut and tabs. */
export interface EndDepth {
  /** The end's border from edge A to edge B; two points share an `at` where it steps. */
  readonly border: readonly StripPoint[]
  /** `along` of each mark: the cut, whatever a lap's reliefs and tabs do to the border. */
  readonly marks: readonly Inches[]
  readonly tabs: readonly TabShape[]
  /** How far tabs stand out beyond the outermost of the cut. */
  readonly standsOut: Inches
}

/** A run's part of the cut, on the strip. */
interface Span {
  readonly from: StripPoint
  readonly to: StripPoint
}

const slopeOf = ({ from, to }: Span): number => (to.along - from.along) / (to.at - from.at)

const cutAt = (span: Span, at: Inches): Inches =>
  span.from.along + slopeOf(span) * (at - span.from.at)

const shortened = (span: Span, from: Inches, to: Inches): Span => ({
  from: { at: from, along: cutAt(span, from) },
  to: { at: to, along: cutAt(span, to) },
})

/**
 * A tab on the cut of its leg, from crease to crease or edge: as tall over its fold line as it is
 * long, sides along the piece, the outer corners taken back by 1/4 in. and by no more than a
 * quarter of its length or width.
 */
const tabShape = (leg: number, length: Inches, span: Span): TabShape => {
  const { from, to } = span
  const rise = length * Math.hypot(1, slopeOf(span))
  const corner = Math.min(TAB_CORNER, length / 4, (to.at - from.at) / 4)
  const top = (at: Inches): StripPoint => ({ at, along: cutAt(span, at) - rise })
  const [near, far] = [top(from.at), top(to.at)]
  return {
    leg,
    length,
    points: [
      from,
      { at: near.at, along: near.along + corner },
      top(near.at + corner),
      top(far.at - corner),
      { at: far.at, along: far.along + corner },
      to,
    ],
  }
}

/** How far a leg's free edges are trimmed for an under lap; a narrow leg keeps half of itself. */
const trimOf = ({ from, to }: Span): Inches => Math.min(TRIM, (to.at - from.at) / 4)

interface SpanBorder {
  readonly border: readonly StripPoint[]
  readonly tab: TabShape | null
}

const spanBorder = (run: CutRun, span: Span, end: End, cut: EndCut): SpanBorder => {
  const { of } = run
  const lap = end.kind === 'lap' && end.side === 'under' ? end.length : 0
  const deeper = ({ at, along }: StripPoint): StripPoint => ({ at, along: along + lap })
  if (typeof of !== 'number') return { border: [deeper(span.from), deeper(span.to)], tab: null }
  const trimA = lap > 0 && cut.runs[0] === run ? trimOf(span) : 0
  const trimB = lap > 0 && cut.runs.at(-1) === run ? trimOf(span) : 0
  const kept = shortened(span, span.from.at + trimA, span.to.at - trimB)
  const asked = end.tabs.find(({ leg }) => leg === of)
  const tab = asked === undefined ? null : tabShape(of, asked.length, kept)
  return {
    border: [
      ...(trimA > 0 ? [deeper(span.from), deeper(kept.from)] : []),
      ...(tab === null ? [kept.from, kept.to] : tab.points.slice(1, -1)),
      ...(trimB > 0 ? [deeper(kept.to), deeper(span.to)] : []),
    ],
    tab,
  }
}

/**
 * Lays the cut of an end on the strip: the border from edge A to edge B with the reliefs of an
 * under lap and with tabs, and the marks. `at` is the place of each mark across the strip. Inches;
 * `along` counts from the outermost of cut and tabs, which is 0, into the piece: at a right end it
 * is the greatest t less t, at a left end t less the least.
 *
 * Nothing is checked here: ask `endProblems` first.
 */
export const endDepth = (cut: EndCut, at: readonly Inches[], end: End, side: Side): EndDepth => {
  const outward = cut.marks.map((t) => (side === 'right' ? t : -t))
  const tip = Math.max(...outward)
  const points = outward.map((t, index) => ({ at: at[index] ?? 0, along: tip - t }))
  const spans = cut.runs.flatMap((run, index) => {
    const [from, to] = [points[index], points[index + 1]]
    return from && to ? [spanBorder(run, { from, to }, end, cut)] : []
  })
  const border = spans.flatMap((span) => span.border)
  const standsOut = 0 - Math.min(0, ...border.map(({ along }) => along))
  const placed = ({ at: across, along }: StripPoint): StripPoint => ({
    at: across,
    along: Math.abs(along + standsOut) <= TOLERANCE ? 0 : along + standsOut,
  })
  return {
    border: border.map(placed),
    marks: points.map((point) => placed(point).along),
    tabs: spans.flatMap(({ tab }) => (tab ? [{ ...tab, points: tab.points.map(placed) }] : [])),
    standsOut,
  }
}
