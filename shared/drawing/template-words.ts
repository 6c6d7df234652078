import type { StripLayout } from '#shared/ends/end-layout'
import type { Bounds } from '#shared/geometry/bounds'
import { grow, widthOf } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import { between } from '#shared/geometry/vector'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import { metalOf } from './clearance'
import { creaseSpans } from './crease-spans'
import type { DisplayItem, Part, Point, Role } from './display-list'
import type { TemplateWords } from './end-template'
import type { LabelSpace, PlacedLabel } from './label-space'
import { letterPlaces, linesOfLabel, middleOfLabel, textPlaces } from './label-space'
import { penFor } from './pen'
import type { Label } from './placement'
import { placeLabels } from './placement'
import { partOfCrease } from './strip-figure'
import { path, text } from './strip-items'
import type { Join } from './template-joins'
import type { Sheet } from './template-sheet'
import { showsMetal } from './template-sheet'
import { POINTS_PER_INCH } from './template-tiles'
import { textWidth } from './text-box'

interface Words extends Label<PlacedLabel> {
  readonly role: Role
  readonly part?: Part
  readonly bold: boolean
}

const SIZE = 11

/** Parts of a line, from its middle outwards. */
const ALONG = [0.5, 0.42, 0.58, 0.34, 0.66, 0.27, 0.73, 0.13, 0.87, 0.06, 0.94]

const joinWords = (space: LabelSpace, joins: readonly Join[]): Words[] =>
  joins.map(({ letter, line }) => ({
    role: 'edge',
    bold: true,
    weight: 10,
    streams: [
      textPlaces(
        space,
        letter,
        SIZE * 1.3,
        ALONG.map((part) => between(line.from, line.to, part)),
      ),
    ],
  }))

/** The visible stretch of a line across the paper. */
const stretchOf = (box: Bounds, from: Point, to: Point): readonly [Point, Point] | undefined => {
  const [minX, maxX] = [Math.max(box.minX, from.x), Math.min(box.maxX, to.x)]
  if (from.y < box.minY || from.y > box.maxY || maxX <= minX) return undefined
  return [
    { x: minX, y: from.y },
    { x: maxX, y: from.y },
  ]
}

/** The letters of the edges, outside along what is seen of them. */
const edgeWords = (layout: StripLayout, sheet: Sheet, space: LabelSpace): Words[] =>
  (['A', 'B'] as const).flatMap((edge) => {
    const at = edge === 'A' ? 0 : layout.stripWidth
    // Where metal stands beside the edge.
    const [span] = creaseSpans(layout.outline, edge === 'A' ? NEAR : layout.stripWidth - NEAR)
    const seen =
      span &&
      stretchOf(
        sheet.box,
        sheet.place({ along: span.from, at }),
        sheet.place({ along: span.to, at }),
      )
    if (!seen) return []
    const out = { x: 0, y: edge === 'A' ? 1 : -1 }
    return {
      role: 'edge' as const,
      part: { kind: 'edge' as const, edge },
      bold: true,
      weight: 8,
      streams: [0.5, 0.3, 0.7].map((part) =>
        letterPlaces(space, edge, between(seen[0], seen[1], part), out),
      ),
    }
  })

/** A hair inside an edge, in inches. */
const NEAR = 1e-6

/** `90° ↑`: the turn beside its crease; that of a hem goes without saying. */
const creaseWords = (
  layout: StripLayout,
  strip: Strip,
  words: TemplateWords,
  sheet: Sheet,
  space: LabelSpace,
): Words[] =>
  strip.creases.flatMap((crease) =>
    creaseSpans(layout.outline, crease.at).flatMap((span) => {
      if (typeof crease.fold === 'string') return []
      const seen = stretchOf(
        sheet.box,
        sheet.place({ along: span.from, at: crease.at }),
        sheet.place({ along: span.to, at: crease.at }),
      )
      if (!seen) return []
      const size = SIZE * 0.8
      return {
        role: 'angleText' as const,
        part: partOfCrease(crease),
        bold: false,
        weight: 2,
        streams: [
          textPlaces(
            space,
            turnWords(crease, words),
            size,
            ALONG.flatMap((part) =>
              [-1, 1].map((side) => {
                const { x, y } = between(seen[0], seen[1], part)
                return { x, y: y + side * (size * 0.55 + 5) }
              }),
            ),
          ),
        ],
      }
    }),
  )

const turnWords = (crease: Crease, words: TemplateWords): string =>
  `${words.angle(crease.turn)} ${crease.turn > 0 ? '↑' : '↓'}`

/** What the piece is called, large, where there is room for it on the metal or beside it. */
const markWords = (words: TemplateWords, sheet: Sheet, space: LabelSpace): Words => {
  const size = Math.min(14, (14 * widthOf(sheet.box) * 0.7) / textWidth(words.mark, 14))
  const { maxX, maxY } = sheet.box
  const steps = Array.from({ length: 19 }, (_, index) => (index + 1) / 20)
  const places = steps.flatMap((down) =>
    steps.map((along) => ({ x: maxX * along, y: maxY * down })),
  )
  const fromMiddle = ({ x, y }: Point) => Math.hypot(x - maxX / 2, y - maxY / 2)
  return {
    role: 'word',
    bold: true,
    weight: 6,
    streams: [
      textPlaces(
        space,
        words.mark,
        size,
        places.toSorted((a, b) => fromMiddle(a) - fromMiddle(b)),
      ),
    ],
  }
}

const drawWords = (label: PlacedLabel, { role, part, bold }: Words): DisplayItem[] => {
  const at = middleOfLabel(label)
  return [
    ...linesOfLabel(label).map((points) => path(role, points, 0.5, part)),
    ...(label.radius === undefined
      ? []
      : [
          {
            kind: 'circle' as const,
            role,
            center: at,
            radius: label.radius,
            width: 0.75,
            filled: false,
            ...(part ? { part } : {}),
          },
        ]),
    text(role, label.text, at, label.size, part, bold),
  ]
}

/** All that is written on a piece of paper, clear of its lines. */
export const drawTemplateWords = (
  layout: StripLayout,
  strip: Strip,
  words: TemplateWords,
  sheet: Sheet,
  joins: readonly Join[],
  drawn: readonly DisplayItem[],
): DisplayItem[] => {
  const { box } = sheet
  const lines = drawn.flatMap((item) =>
    item.kind === 'path' ? segmentsOf(item.points, item.closed) : [],
  )
  const space: LabelSpace = {
    metal: metalOf(lines, 0.5),
    frame: grow(box, -2),
    pen: penFor(box.maxX, box.maxY, SIZE),
  }
  const labels = [
    ...joinWords(space, joins),
    ...edgeWords(layout, sheet, space),
    ...(showsMetal(layout, sheet) ? [markWords(words, sheet, space)] : []),
    ...creaseWords(layout, strip, words, sheet, space),
  ]
  return placeLabels(labels).flatMap((label, index) => {
    const meaning = labels[index]
    return label && meaning ? drawWords(label, meaning) : []
  })
}

/** The lines by which a print is checked: 6 in., and 150 mm for who measures so. */
const CHECKS: readonly { readonly length: number; readonly name: string }[] = [
  { length: 6 * POINTS_PER_INCH, name: '6 in.' },
  { length: (150 / 25.4) * POINTS_PER_INCH, name: '150 mm' },
]

/** Room that the check lines need below a tile; points. */
export const CHECKS_HEIGHT = 44

const CHECK_TEXT = 8

/** The check lines one below the other, each with what to measure over it. */
export const drawChecks = (words: TemplateWords, top: number, width: number): DisplayItem[] =>
  CHECKS.flatMap(({ length, name }, index) => {
    const y = top + 18.5 + index * 20.5
    const [from, to] = [2, 2 + length]
    const content = words.check(name)
    const size = Math.min(1, (width - 12) / textWidth(content, CHECK_TEXT)) * CHECK_TEXT
    const lines = [
      [
        { x: from, y },
        { x: to, y },
      ],
      ...[from, to].map((x) => [
        { x, y: y - 4 },
        { x, y: y + 4 },
      ]),
    ]
    return [
      text('word', content, { x: from + 6 + textWidth(content, size) / 2, y: y - 8 }, size),
      ...lines.map((points) => path('mark', points, 0.5)),
    ]
  })
