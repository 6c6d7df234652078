import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Segment } from '#shared/geometry/segment'
import type { Strip } from '#shared/strip/strip.schema'
import { clipPolygon, hatchPolygon } from './clip-polygon'
import { creaseSpans } from './crease-spans'
import type { DisplayItem, Part } from './display-list'
import { partOfCrease } from './strip-figure'
import { path } from './strip-items'
import type { Sheet } from './template-sheet'
import { bordersOn, crossOn, insidePaper, lineOn, onPaper } from './template-sheet'

/** Weights in points. */
const CUT = 1
const CREASE = 0.75
const SLIT = 2
const HATCH = 0.5

/** Half the length of the lines of a mark. */
const MARK = 5

const pathOf = (
  role: 'crease' | 'tabFold' | 'slit' | 'tabHatch',
  line: Segment | undefined,
  weight: number,
  dash?: readonly number[],
  part?: Part,
): DisplayItem[] =>
  line ? [{ ...path(role, [line.from, line.to], weight, part), ...(dash ? { dash } : {}) }] : []

/** Dashed where the sheet folds up, dashed and dotted where it folds down. */
const creases = (layout: StripLayout, strip: Strip, sheet: Sheet): DisplayItem[] =>
  strip.creases.flatMap((crease) =>
    creaseSpans(layout.outline, crease.at).flatMap((span) => {
      const [from, to] = [span.from, span.to].map((along) => ({ along, at: crease.at }))
      const line = from && to && lineOn(sheet, from, to, CREASE)
      const dash = crease.turn > 0 ? [6, 4] : [10, 3, 2, 3]
      return pathOf('crease', line, CREASE, dash, partOfCrease(crease))
    }),
  )

const tabs = (layout: StripLayout, side: Side, sheet: Sheet): DisplayItem[] =>
  layout[side].tabs.flatMap(({ leg, polygon, fold: [from, to] }) => {
    const part = { kind: 'leg', leg } as const
    const seen = clipPolygon(onPaper(sheet, polygon), insidePaper(sheet, HATCH))
    return [
      ...hatchPolygon(seen, 8).flatMap((line) => pathOf('tabHatch', line, HATCH, undefined, part)),
      ...pathOf('tabFold', lineOn(sheet, from, to, CUT), CUT, [9, 4], part),
    ]
  })

const cuts = (layout: StripLayout, side: Side, sheet: Sheet): DisplayItem[] => {
  const { cutAways, slits } = layout[side]
  return [
    ...cutAways.flatMap((polygon) =>
      bordersOn(sheet, polygon, 0.5).map((chain) => ({
        ...path('cutAway', chain, 0.5),
        dash: [1, 3],
      })),
    ),
    ...bordersOn(sheet, layout.outline, CUT).map((chain) => path('outline', chain, CUT)),
    ...slits.flatMap(({ from, to }) => pathOf('slit', lineOn(sheet, from, to, SLIT), SLIT)),
  ]
}

/** A cross where each mark is pricked. */
const marks = (layout: StripLayout, side: Side, sheet: Sheet): DisplayItem[] =>
  layout[side].marks.flatMap(({ at, along }) => {
    const place = { at, along: side === 'left' ? along : layout.blankLength - along }
    return crossOn(sheet, 'mark', sheet.place(place), MARK)
  })

/** What a piece of paper shows of the end: hatched tabs, creases, the cut, slits, marks. */
export const drawTemplateMetal = (
  layout: StripLayout,
  strip: Strip,
  side: Side,
  sheet: Sheet,
): DisplayItem[] => [
  ...tabs(layout, side, sheet),
  ...creases(layout, strip, sheet),
  ...cuts(layout, side, sheet),
  ...marks(layout, side, sheet),
]
