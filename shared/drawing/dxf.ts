import type { EndLayout, StripLayout, StripPoint } from '#shared/ends/end-layout'
import { boundsOf } from '#shared/geometry/bounds'
import type { Vector } from '#shared/geometry/vector'
import type { FoldedSection } from '#shared/strip/folded-section'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import { creaseSpans } from './crease-spans'

export interface DxfDrawing {
  readonly layout: StripLayout
  readonly strip: Strip
  /** Drawn beside the strip at the same scale. */
  readonly section: FoldedSection
}

/** Layers with their color number and line type, in the order of the file. */
const LAYERS = {
  OUTLINE: { color: 7, line: 'CONTINUOUS' },
  'CREASE-UP': { color: 5, line: 'DASHED' },
  'CREASE-DOWN': { color: 1, line: 'DASHED' },
  HEM: { color: 6, line: 'DASHED' },
  SLIT: { color: 1, line: 'CONTINUOUS' },
  'TAB-FOLD': { color: 3, line: 'DASHED' },
  'MARK-TEXT': { color: 8, line: 'CONTINUOUS' },
  SECTION: { color: 7, line: 'CONTINUOUS' },
} as const

export type DxfLayer = keyof typeof LAYERS

export const DXF_LAYERS = Object.keys(LAYERS) as readonly DxfLayer[]

/** A group of the format: its code and its value. */
type Group = readonly [code: number, value: string | number]

/** Between the strip's right end and the section. */
const SECTION_GAP: Inches = 6
const TEXT_HEIGHT: Inches = 0.25

/** A hundred-millionth of an inch, without an exponent and without -0. */
const figure = (value: number): string => {
  const text = value.toFixed(8).replace(/\.?0+$/, '')
  return text === '-0' ? '0' : text
}

const point = (code: number, { x, y }: Vector): Group[] => [
  [code, figure(x)],
  [code + 10, figure(y)],
  [code + 20, '0'],
]

const line = (layer: DxfLayer, from: Vector, to: Vector): Group[] => [
  [0, 'LINE'],
  [8, layer],
  ...point(10, from),
  ...point(11, to),
]

const closedPolyline = (layer: DxfLayer, corners: readonly Vector[]): Group[] => [
  [0, 'POLYLINE'],
  [8, layer],
  [66, 1],
  ...point(10, { x: 0, y: 0 }),
  [70, 1],
  ...corners.flatMap((corner): Group[] => [[0, 'VERTEX'], [8, layer], ...point(10, corner)]),
  [0, 'SEQEND'],
  [8, layer],
]

const text = (at: Vector, words: string): Group[] => [
  [0, 'TEXT'],
  [8, 'MARK-TEXT'],
  ...point(10, at),
  [40, figure(TEXT_HEIGHT)],
  [1, words],
]

const onSheet = ({ along, at }: StripPoint): Vector => ({ x: along, y: at })

const layerOf = ({ fold, turn }: Crease): DxfLayer =>
  typeof fold === 'string' ? 'HEM' : turn > 0 ? 'CREASE-UP' : 'CREASE-DOWN'

/** `90 up`, `45 down`, `hem up`: degrees of bend, the left side being up. */
const creaseWords = ({ fold, turn }: Crease): string => {
  const amount = typeof fold === 'string' ? 'hem' : figure(Math.abs(turn))
  return `${amount} ${turn > 0 ? 'up' : 'down'}`
}

/** What is left of each crease; its words stand over the middle of the longest stretch. */
const creases = ({ layout, strip }: DxfDrawing): Group[] =>
  strip.creases.flatMap((crease) => {
    const spans = creaseSpans(layout.outline, crease.at).toSorted(
      (a, b) => b.to - b.from - (a.to - a.from),
    )
    const [longest] = spans
    const words = longest && {
      x: (longest.from + longest.to) / 2,
      y: crease.at + TEXT_HEIGHT / 4,
    }
    return [
      ...spans.flatMap(({ from, to }) =>
        line(layerOf(crease), { x: from, y: crease.at }, { x: to, y: crease.at }),
      ),
      ...(words ? text(words, creaseWords(crease)) : []),
    ]
  })

const endLines = ({ tabs, slits }: EndLayout): Group[] => [
  ...tabs.flatMap(({ fold: [from, to] }) => line('TAB-FOLD', onSheet(from), onSheet(to))),
  ...slits.flatMap(({ from, to }) => line('SLIT', onSheet(from), onSheet(to))),
]

const sectionBeside = ({ layout, section }: DxfDrawing): Group[] => {
  const { minX, minY } = boundsOf(section.outline)
  const shift = { x: layout.blankLength + SECTION_GAP - minX, y: 0 - minY }
  return closedPolyline(
    'SECTION',
    section.outline.map(({ x, y }) => ({ x: x + shift.x, y: y + shift.y })),
  )
}

const tables = (): Group[] => [
  [0, 'SECTION'],
  [2, 'TABLES'],
  [0, 'TABLE'],
  [2, 'LTYPE'],
  [70, 2],
  [0, 'LTYPE'],
  [2, 'CONTINUOUS'],
  [70, 0],
  [3, 'Solid line'],
  [72, 65],
  [73, 0],
  [40, '0'],
  [0, 'LTYPE'],
  [2, 'DASHED'],
  [70, 0],
  [3, 'Dashes'],
  [72, 65],
  [73, 2],
  [40, '0.75'],
  [49, '0.5'],
  [49, '-0.25'],
  [0, 'ENDTAB'],
  [0, 'TABLE'],
  [2, 'LAYER'],
  [70, DXF_LAYERS.length],
  ...DXF_LAYERS.flatMap((name): Group[] => [
    [0, 'LAYER'],
    [2, name],
    [70, 0],
    [62, LAYERS[name].color],
    [6, LAYERS[name].line],
  ]),
  [0, 'ENDTAB'],
  [0, 'ENDSEC'],
]

const header = (): Group[] => [
  [0, 'SECTION'],
  [2, 'HEADER'],
  [9, '$ACADVER'],
  [1, 'AC1009'],
  // Inches, for readers that ask for the unit.
  [9, '$INSUNITS'],
  [70, 1],
  [0, 'ENDSEC'],
]

/**
 * A dressed strip as an ASCII DXF (release 12, which opens most widely), full size in inches. The
 * strip lies left side up: x along the piece from the blank's left end, y across it from edge A.
 * `OUTLINE` is what is left when everything is cut away, `SECTION` the folded piece's border beside
 * it; both are closed polylines. Creases are lines as far as metal stands on both sides of them, with
 * their degrees of bend.
 *
 * It carries no words of a person's, so that nothing can be smuggled into the file.
 */
export const toDxf = (drawing: DxfDrawing): string => {
  const { layout } = drawing
  const groups: Group[] = [
    ...header(),
    ...tables(),
    [0, 'SECTION'],
    [2, 'ENTITIES'],
    ...closedPolyline('OUTLINE', layout.outline.map(onSheet)),
    ...creases(drawing),
    ...endLines(layout.left),
    ...endLines(layout.right),
    ...sectionBeside(drawing),
    [0, 'ENDSEC'],
    [0, 'EOF'],
  ]
  return groups.map(([code, value]) => `${String(code).padStart(3)}\n${value}\n`).join('')
}
