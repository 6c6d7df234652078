import type { PieceState } from '#shared/pieces/piece-state'
import type { DisplayItem, DisplayList } from './display-list'
import { path } from './strip-items'

/** Glyphs are drawn in a square of this side. */
export const GLYPH_SIZE = 24

const WEIGHT = 2.4

type Pair = readonly [number, number]

/** Three lines in one glyph are lighter, so that they stay three. */
const STRAPPED_WEIGHT = 1.9

const line = (points: readonly Pair[], width = WEIGHT): DisplayItem =>
  path(
    'metal',
    points.map(([x, y]) => ({ x, y })),
    width,
  )

/** Three folded lines in each other and the strap around them; `drop` moves them down. */
const strapped = (drop: number): DisplayItem[] => [
  ...[0, 1, 2].map((row) =>
    line(
      [
        [2, 14 - 4.5 * row + drop],
        [21 - 4.5 * row, 14 - 4.5 * row + drop],
        [21 - 4.5 * row, 1 + drop],
      ],
      STRAPPED_WEIGHT,
    ),
  ),
  line(
    [
      [6.5, 2.2 + drop],
      [6.5, 16.8 + drop],
    ],
    1.4,
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
  bundled: strapped(4.5),
  pickedUp: [
    ...strapped(0),
    {
      kind: 'circle',
      role: 'metal',
      center: { x: 13, y: 20 },
      radius: 2.8,
      width: 1.9,
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
