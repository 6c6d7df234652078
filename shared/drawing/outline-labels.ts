import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { dimensionAt, dimensionLines } from './dimension-labels'
import { metalReach } from './crease-spans'
import type { DisplayItem, Part, Point, Role } from './display-list'
import type { LabelSpace, PlacedLabel } from './label-space'
import {
  fanOf,
  isFree,
  letterPlaces,
  linesOfLabel,
  middleOfLabel,
  ringOf,
  textPlaces,
} from './label-space'
import type { DrawnCrease } from './outline-items'
import { endsIn } from './outline-items'
import type { OutlineView } from './outline-view'
import { toFrame, windowOf, xIn, yOf } from './outline-view'
import type { Label } from './placement'
import { later, Stream } from './placement'
import { filledPath, path, text } from './strip-items'
import { TEXT_HEIGHT, textWidth } from './text-box'

/** A number or word of the figure that may find no room. */
export interface OutlineNumber {
  readonly of:
    'at' | 'along' | 'turn' | 'tab' | 'opening' | 'length' | 'width' | 'edge' | 'end' | 'hand'
  readonly text: string
  readonly part: Part | null
}

export interface OutlineLabel extends Label<PlacedLabel> {
  readonly meaning: OutlineNumber
  /** The crease it stands on, by its place in the strip's list. */
  readonly crease?: number
  readonly draw: (label: PlacedLabel) => readonly DisplayItem[]
}

/** Who gives way to whom. */
const WEIGHT = { run: 9, edge: 8, end: 7, hand: 6, tab: 5, opening: 4, turn: 3 }

const drawLabel =
  (role: Role, part?: Part, bold = false) =>
  (label: PlacedLabel): DisplayItem[] => {
    const lines = linesOfLabel(label)
    const at = middleOfLabel(label)
    const lineRole = role === 'edge' ? 'edge' : 'dimension'
    return [
      ...(label.isDimension ? dimensionLines(lines) : lines).map((points) =>
        path(lineRole, points, 1, part),
      ),
      ...(label.radius === undefined
        ? []
        : [
            {
              kind: 'circle' as const,
              role,
              center: at,
              radius: label.radius,
              width: 1,
              filled: false,
              ...(part ? { part } : {}),
            },
          ]),
      text(role, label.text, at, label.size, part, bold),
    ]
  }

/** Over the strip and below it, from its ends inwards. */
const beside = (view: OutlineView, xs: readonly number[]): Point[] =>
  [view.yB - view.text * 1.1, view.yA + view.text * 1.1].flatMap((y) => xs.map((x) => ({ x, y })))

/** Parts of an edge beside which its letter may stand, from the one end. */
const ALONG_EDGE = [0.12, 0.3, 0.5, 0.7, 0.88]

/**
 * The letters of the edges: before the edge's own end on the whole strip; beside an enlarged end,
 * where its columns stand there, over the edge from the break on.
 */
export const edgeLabels = (
  layout: StripLayout,
  view: OutlineView,
  space: LabelSpace,
  enlarged: Side | undefined,
): OutlineLabel[] =>
  (['A', 'B'] as const).flatMap((edge) => {
    const at = edge === 'A' ? 0 : layout.stripWidth
    const reach = metalReach(layout.outline, at)
    if (reach === undefined) return []
    const y = yOf(view, at)
    const window = windowOf(view, enlarged ?? 'left')
    const from = xIn(view, window, Math.max(reach.from, window.from))
    const to = xIn(view, window, Math.min(reach.to, window.to))
    const [near, far] = enlarged === 'left' ? [to, from] : [from, to]
    const part: Part = { kind: 'edge', edge }
    const over = (cost: number) => () =>
      ALONG_EDGE.map((share) =>
        letterPlaces(
          space,
          edge,
          { x: near + (far - near) * share, y },
          { x: 0, y: edge === 'A' ? 1 : -1 },
          cost,
        ),
      )
    const last = windowOf(view, 'right')
    const end = xIn(view, last, Math.min(reach.to, last.to))
    return {
      meaning: { of: 'edge', text: edge, part },
      weight: WEIGHT.edge,
      streams:
        enlarged === undefined
          ? [
              letterPlaces(space, edge, { x: from, y }, { x: -1, y: 0 }),
              later(1, () => [letterPlaces(space, edge, { x: end, y }, { x: 1, y: 0 }, 1)]),
              later(3, over(3)),
            ]
          : over(0)(),
      draw: drawLabel('edge', part, true),
    }
  })

/** Length and width of the blank. */
export const blankLabels = (
  layout: StripLayout,
  view: OutlineView,
  space: LabelSpace,
  texts: { readonly length: string; readonly width: string },
): OutlineLabel[] => {
  const xLeft = xIn(view, windowOf(view, 'left'), 0)
  const xRight = xIn(view, windowOf(view, 'right'), layout.blankLength)
  const offsets = [0.9, 1.9, 2.9].map((rows) => rows * view.text + 2)
  const along = (normal: Point, from: Point, to: Point, content: string, cost: number) =>
    offsets.map((offset, row) =>
      dimensionAt(space, { text: content, from, to }, normal, offset, cost + row),
    )
  const corners = {
    aLeft: { x: xLeft, y: view.yA },
    aRight: { x: xRight, y: view.yA },
    bLeft: { x: xLeft, y: view.yB },
    bRight: { x: xRight, y: view.yB },
  }
  return [
    {
      meaning: { of: 'length', text: texts.length, part: null },
      weight: WEIGHT.run,
      streams: [
        ...along({ x: 0, y: 1 }, corners.aLeft, corners.aRight, texts.length, 0),
        ...along({ x: 0, y: -1 }, corners.bLeft, corners.bRight, texts.length, 2),
      ],
      draw: drawLabel('dimensionText'),
    },
    {
      meaning: { of: 'width', text: texts.width, part: null },
      weight: WEIGHT.run,
      streams: [
        ...along({ x: 1, y: 0 }, corners.aRight, corners.bRight, texts.width, 0),
        ...along({ x: -1, y: 0 }, corners.aLeft, corners.bLeft, texts.width, 2),
      ],
      draw: drawLabel('dimensionText'),
    },
  ]
}

/** What an end is, over its tip or below it. */
export const endLabel = (
  view: OutlineView,
  space: LabelSpace,
  side: Side,
  content: string,
): OutlineLabel => {
  const window = windowOf(view, side)
  const [from, to] = [xIn(view, window, window.from), xIn(view, window, window.to)]
  const sizes = [1, 0.85, 0.7].map((part) => view.text * part)
  return {
    meaning: { of: 'end', text: content, part: null },
    weight: WEIGHT.end,
    streams: sizes.map((size, index) => {
      const half = textWidth(content, size) / 2
      const [tip, inner] = side === 'left' ? [from + half, to - half] : [to - half, from + half]
      const xs = [0, 0.2, 0.4, 0.6, 0.8, 1].map((part) => tip + (inner - tip) * part)
      return textPlaces(space, content, size, beside(view, xs), index * 2)
    }),
    draw: drawLabel('word'),
  }
}

/** The hand, large, on the metal where it is plain, else beside it. */
export const handLabel = (view: OutlineView, space: LabelSpace, content: string): OutlineLabel => {
  const size = view.text * 1.6
  const rows = [0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8, 0.1, 0.9]
  const places = view.windows.flatMap((window) => {
    const [from, to] = [xIn(view, window, window.from), xIn(view, window, window.to)]
    return rows.map((part) => ({
      x: (from + to) / 2,
      y: view.yA + (view.yB - view.yA) * part,
    }))
  })
  return {
    meaning: { of: 'hand', text: content, part: null },
    weight: WEIGHT.hand,
    streams: [
      textPlaces(space, content, size, places),
      textPlaces(
        space,
        content,
        view.text,
        beside(
          view,
          places.map(({ x }) => x),
        ),
        3,
      ),
    ],
    draw: drawLabel('edge', undefined, true),
  }
}

const TAB_FAN = fanOf(15)

/** How far each tab stands out, and each opening goes in. */
export const workLabels = (
  layout: StripLayout,
  view: OutlineView,
  space: LabelSpace,
  texts: {
    readonly tab: (length: number) => string
    readonly opening: (length: number) => string
  },
): OutlineLabel[] =>
  endsIn(layout, view).flatMap(({ end, window }) => {
    const out = end.side === 'left' ? -1 : 1
    const tabs = end.tabs.map(({ leg, length, polygon }): OutlineLabel => {
      const points = polygon.map((point) => toFrame(view, window, point))
      const tip = points.reduce((a, b) => (b.x * out > a.x * out + 1e-6 ? b : a))
      const side = points.filter(({ x }) => Math.abs(x - tip.x) < 1e-6)
      const y = side.reduce((sum, point) => sum + point.y, 0) / side.length
      const part: Part = { kind: 'leg', leg }
      const content = texts.tab(length)
      return {
        meaning: { of: 'tab', text: content, part },
        weight: WEIGHT.tab,
        streams: [
          ringOf(space, {
            text: content,
            size: view.text * 0.9,
            anchor: { x: tip.x, y },
            first: { x: out, y: 0 },
            fan: TAB_FAN,
            gaps: [0.5, 1, 1.8, 3, 4.5].map((rows) => rows * view.text),
            leaderFrom: view.text,
            widest: 90,
            cost: 0,
            costPerTurn: 0.02,
            costPerGap: 1,
          }),
        ],
        draw: drawLabel('dimensionText', part),
      }
    })
    const openings = end.openings.map(({ edge, length }): OutlineLabel => {
      const part: Part = { kind: 'hem', edge }
      const content = texts.opening(length)
      const at = edge === 'A' ? 0 : layout.stripWidth
      const tip = end.side === 'left' ? 0 : layout.blankLength
      const inner = end.side === 'left' ? length : layout.blankLength - length
      const measured = {
        text: content,
        from: toFrame(view, window, { along: tip, at }),
        to: toFrame(view, window, { along: inner, at }),
      }
      const normal = { x: 0, y: edge === 'A' ? 1 : -1 }
      return {
        meaning: { of: 'opening', text: content, part },
        weight: WEIGHT.opening,
        streams: [0.6, 1.6, 2.6].map((rows, row) =>
          dimensionAt(space, measured, normal, rows * view.text + 2, row),
        ),
        draw: drawLabel('dimensionText', part),
      }
    })
    return [...tabs, ...openings]
  })

/** Parts of a crease over which its turn may stand. */
const ALONG = [0.5, 0.36, 0.64, 0.22, 0.78, 0.29, 0.71, 0.43, 0.57, 0.14, 0.86]

/** A triangle's width and height in parts of the type size. */
const TRIANGLE = 0.75

/** What stands over a crease: its turn as text with a triangle, or the triangle alone. */
const turnsAlong = (
  space: LabelSpace,
  crease: DrawnCrease,
  others: readonly DrawnCrease[],
  content: string,
  size: number,
  cost: number,
): Stream<PlacedLabel> => {
  const width = textWidth(content, size) + (content === '' ? 1 : 1.3) * TRIANGLE * size
  const height = content === '' ? TRIANGLE * size : size * TEXT_HEIGHT
  const minY = crease.y - height / 2
  const maxY = crease.y + height / 2
  let index = 0
  return new Stream(cost, (stream) => {
    const part = ALONG[index]
    const here = stream.least
    index += 1
    stream.least = index < ALONG.length ? here + 0.2 : Infinity
    if (part === undefined) return undefined
    const x = crease.from + (crease.to - crease.from) * part
    const minX = x - width / 2
    const maxX = x + width / 2
    // Some of the crease must be left on either side.
    if (minX < crease.from + size || maxX > crease.to - size) return undefined
    const isCrossed = others.some(
      ({ y, from, to }) => y > minY - 2 && y < maxY + 2 && from < maxX && to > minX,
    )
    if (isCrossed || !isFree(space, minX, minY, maxX, maxY)) return undefined
    return {
      text: content,
      size,
      radius: undefined,
      isDimension: false,
      boxes: [minX, minY, maxX, maxY],
      lines: [],
      cost: here,
    }
  })
}

/** The turn of each crease, on its line. */
export const turnLabels = (
  creases: readonly DrawnCrease[],
  space: LabelSpace,
  size: number,
  textOf: (turn: number) => string,
): OutlineLabel[] => {
  const folds = new Map<number, DrawnCrease[]>()
  for (const crease of creases) {
    folds.set(crease.index, [...(folds.get(crease.index) ?? []), crease])
  }
  return [...folds.values()].flatMap((pieces) => {
    const [first] = pieces
    if (first === undefined) return []
    const { crease, part } = first
    const content = typeof crease.fold === 'string' ? '' : textOf(crease.turn)
    const others = creases.filter((other) => other.index !== first.index)
    const places = (shown: string, cost: number) =>
      pieces.map((piece) => turnsAlong(space, piece, others, shown, size, cost))
    return {
      meaning: { of: 'turn', text: content, part },
      crease: first.index,
      weight: WEIGHT.turn,
      streams: [...places(content, 0), ...(content === '' ? [] : places('', 4))],
      draw: (label) => drawTurn(label, crease.turn, part),
    }
  })
}

const drawTurn = (label: PlacedLabel, turn: number, part: Part): DisplayItem[] => {
  const [minX = 0, , maxX = 0] = label.boxes
  const { y } = middleOfLabel(label)
  const reach = (TRIANGLE * label.size) / 2
  const x = maxX - reach
  const up = turn > 0 ? -1 : 1
  const triangle = [
    { x: x - reach, y: y - up * reach },
    { x: x + reach, y: y - up * reach },
    { x, y: y + up * reach },
  ]
  const width = textWidth(label.text, label.size)
  return [
    filledPath('crease', triangle, part),
    ...(label.text === ''
      ? []
      : [text('angleText', label.text, { x: minX + width / 2, y }, label.size, part)]),
  ]
}
