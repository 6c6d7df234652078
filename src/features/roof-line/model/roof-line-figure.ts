import type { DisplayItem, DisplayList, Role } from '#shared/drawing/display-list'
import { textWidth } from '#shared/drawing/text-box'
import type { RoofPieces } from '#shared/roof-line/roof-pieces'

export interface RoofLineLabels {
  /** A length along the roof as text. */
  readonly length: (inches: number) => string
}

const HEIGHT = 116
const SIDE = 14
const TEXT = 12
/** Pieces lie on two levels in turn, so that a lap is seen as what it is. */
const LEVELS = [48, 56]
const BASE = 78

const line = (role: Role, x1: number, y1: number, x2: number, y2: number, width: number) =>
  ({
    kind: 'path',
    role,
    points: [
      { x: x1, y: y1 },
      { x: x2, y: y2 },
    ],
    closed: false,
    filled: false,
    width,
  }) satisfies DisplayItem

const word = (role: Role, x: number, y: number, text: string): DisplayItem => ({
  kind: 'text',
  role,
  at: { x, y },
  text,
  size: TEXT,
  rotation: 0,
  bold: false,
})

interface Label {
  readonly x: number
  readonly text: string
}

const isApart = (a: Label, b: Label): boolean =>
  Math.abs(a.x - b.x) >= (textWidth(a.text, TEXT) + textWidth(b.text, TEXT)) / 2 + 6

/** The labels that touch none before them; those that matter most come first. */
const apart = (labels: readonly Label[]): Label[] =>
  labels.reduce<Label[]>(
    (placed, label) =>
      placed.every((other) => isApart(label, other)) ? [...placed, label] : placed,
    [],
  )

/**
 * A line on the roof from its low or left end: the pieces as they lie, where each lap begins, the
 * line itself below with what its ends add. Labels that find no room are left out; the words beside
 * the figure have them all.
 */
export function roofLineFigure(
  { order, laps, length, extras }: RoofPieces,
  width: number,
  { length: print }: RoofLineLabels,
): DisplayList {
  const scale = (width - 2 * SIDE) / (extras.left + length + extras.right)
  const toX = (at: number) => SIDE + (at + extras.left) * scale
  const inside = (x: number, text: string) => {
    const half = textWidth(text, TEXT) / 2 + 2
    return Math.min(Math.max(x, half), width - half)
  }
  const lengths = apart(
    order.map(({ from, to, length: piece }) => ({ x: toX((from + to) / 2), text: print(piece) })),
  )
  const places = apart(
    [length, 0, ...laps].map((at) => ({ x: inside(toX(at), print(at)), text: print(at) })),
  )
  const items: DisplayItem[] = [
    ...order.map(({ from, to }, index) =>
      line('metal', toX(from), LEVELS[index % 2] ?? 0, toX(to), LEVELS[index % 2] ?? 0, 5),
    ),
    ...laps.flatMap((lap, index) => {
      const end = toX(order[index]?.to ?? lap)
      return [
        line('selected', toX(lap), 52, end, 52, 3),
        { ...line('dimension', toX(lap), 62, toX(lap), BASE + 5, 1), dash: [3, 3] },
      ]
    }),
    line('dimension', toX(0), BASE, toX(length), BASE, 1.5),
    ...[0, length].map((at) => line('dimension', toX(at), BASE - 5, toX(at), BASE + 5, 1.5)),
    ...lengths.map(({ x, text }) => word('dimensionText', x, 28, text)),
    ...places.map(({ x, text }) => word('dimensionText', x, BASE + 20, text)),
  ]
  return { width, height: HEIGHT, items }
}
