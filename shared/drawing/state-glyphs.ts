import type { PieceState } from '#shared/pieces/piece-state'
import type { DisplayItem, DisplayList } from './display-list'
import { path } from './strip-items'

/** Glyphs are drawn in a square of this side. */
export const GLYPH_SIZE = 24

const WEIGHT = 2.4

type Pair = readonly [number, number]

const line = (points: readonly Pair[], width = WEIGHT): DisplayItem =>
  path(
    'metal',
    points.map(([x, y]) => ({ x, y })),
    width,
  )

/** Three folded lines in each other and the strap around them; `drop` moves them down. */
const strapped = (drop: number): DisplayItem[] => [
  line([
    [2, 13 + drop],
    [21, 13 + drop],
    [21, 2 + drop],
  ]),
  line([
    [2, 9 + drop],
    [17, 9 + drop],
    [17, 2 + drop],
  ]),
  line([
    [2, 5 + drop],
    [13, 5 + drop],
    [13, 2 + drop],
  ]),
  line(
    [
      [6.5, 2.4 + drop],
      [6.5, 15.6 + drop],
    ],
    1.6,
  ),
]

const GLYPHS: Readonly<Record<PieceState, readonly DisplayItem[]>> = {
  queued: [
    line([
      [3, 12],
      [21, 12],
    ]),
  ],
  bent: [
    line([
      [3, 18],
      [19, 18],
      [19, 5],
    ]),
  ],
  bundled: strapped(4),
  pickedUp: [
    ...strapped(-0.5),
    {
      kind: 'circle',
      role: 'metal',
      center: { x: 12, y: 19.6 },
      radius: 3,
      width: 2,
      filled: false,
    },
  ],
  scrapped: [
    line([
      [2, 12],
      [8, 12],
      [10.5, 6],
    ]),
    line([
      [13.5, 18],
      [16, 12],
      [22, 12],
    ]),
  ],
  withdrawn: [
    {
      ...path(
        'metal',
        [
          { x: 3, y: 12 },
          { x: 21, y: 12 },
        ],
        WEIGHT,
      ),
      dash: [4.5, 2.25],
    },
  ],
}

/**
 * The state of a piece as the piece itself: a flat line, the line folded once, three strapped, the
 * three on a wheel, the line snapped, the line only dashed (withdrawn). It never stands without
 * its word.
 */
export const stateGlyph = (state: PieceState): DisplayList => ({
  width: GLYPH_SIZE,
  height: GLYPH_SIZE,
  items: GLYPHS[state],
})
