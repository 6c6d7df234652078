import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { layStrip } from '#shared/ends/lay-strip'
import { pieceEndsSchema } from '#shared/ends/end.schema'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import { roofLineSchema, type RoofLineInput } from '#shared/roof-line/roof-line.schema'
import { BOTH_SQUARE, SQUARE } from '@/features/ends/model/end-edits'
import type { DraftEnds } from '@/features/ends/model/draft-end'
import type { DraftLine } from '@/features/orders/draft/order-draft'
import {
  completeRoofLine,
  newRoofLine,
  type DraftRoofLine,
} from '@/features/roof-line/model/draft-roof-line'
import { endsOfPiece, extraOf, NO_EXTRA } from '@/features/roof-line/model/line-ends'
import {
  linesOfRoofLine,
  outsideEnds,
  pieceGroups,
  withRoofLine,
} from '@/features/roof-line/model/use-pieces'
import { line, RAKE, STOCK } from '../orders/draft-lines'

const NOTHING = { first: NO_EXTRA, last: NO_EXTRA }
const MITERED: DraftEnds = {
  left: { kind: 'miter', plane: { plumb: 0 }, lay: 0, legs: [], tabs: [] },
  right: { kind: 'square', tabs: [{ leg: 2, length: 1 }] },
  lowEnd: null,
}

function groupsOf(
  asked: Partial<RoofLineInput>,
  outside: DraftEnds = BOTH_SQUARE,
  dressLaps = false,
  extras = NOTHING,
) {
  const roofLine = roofLineSchema.parse({
    length: 348,
    pieceLength: 120,
    lap: 4,
    mode: 'full',
    ...asked,
  })
  const found = roofPieces(roofLine)
  if (!found.ok) throw new Error('The line has an answer.')
  return pieceGroups(found.answer, roofLine, outside, extras, dressLaps)
}

/** New keys in the order in which they are asked for. */
const counter = () => {
  let count = 0
  return () => `new-${(count += 1)}`
}

const draft: DraftRoofLine = { ...newRoofLine(6, 120), length: 348 }

describe('pieces of a line', () => {
  test('square and level are told apart by their length alone', () => {
    expect(groupsOf({}).map(({ count, length }) => [count, length])).toEqual([
      [2, 120],
      [1, 116],
    ])
  })

  test('with dressed outer ends the first and the last are pieces of their own', () => {
    const groups = groupsOf({ length: 468 }, MITERED)
    expect(groups.map(({ count, length }) => [count, length])).toEqual([
      [1, 120],
      [2, 120],
      [1, 120],
    ])
    expect(groups[0]?.ends).toMatchObject({ left: { kind: 'miter' }, right: { kind: 'square' } })
    expect(groups[1]?.ends).toEqual(BOTH_SQUARE)
    expect(groups[2]?.ends.right.tabs).toEqual([{ leg: 2, length: 1 }])
  })

  test('dressed laps: the uphill piece lies over the downhill one', () => {
    const rising = endsOfPiece({ ...BOTH_SQUARE, lowEnd: 'left' }, 1, 3, 4)
    expect(rising).toMatchObject({
      left: { kind: 'lap', side: 'over', length: 4 },
      right: { kind: 'lap', side: 'under', length: 4 },
    })
    const falling = endsOfPiece({ ...BOTH_SQUARE, lowEnd: 'right' }, 0, 3, 4)
    expect(falling).toMatchObject({ left: { kind: 'lap', side: 'under' }, right: SQUARE })
  })

  test('without a lap nothing is dressed', () => {
    expect(endsOfPiece(BOTH_SQUARE, 1, 3, 0)).toEqual(BOTH_SQUARE)
  })

  test('lengths are counted up to a sixteenth and never beyond the longest piece', () => {
    const groups = groupsOf({ mode: 'equal', length: 200 + 1 / 3 })
    expect(groups).toHaveLength(1)
    expect(groups[0]?.length).toBe(102 + 3 / 16)
    expect(groupsOf({ pieceLength: 120.03, length: 2 * 120.03 - 4 })[0]?.length).toBe(120.03)
  })

  test('a tab is no part of the length of its order line', () => {
    const groups = groupsOf({ length: 100, rightExtra: 1 }, MITERED, false, {
      first: NO_EXTRA,
      last: { point: 0, tab: 1 },
    })
    expect(groups.map(({ length }) => length)).toEqual([100])
  })

  test('a full piece with a tab is as long as the shop makes both together', () => {
    const tab = { point: 0, tab: 0.91 }
    const groups = groupsOf({ length: 2 * 120 - 4 - 0.91, rightExtra: 0.91 }, MITERED, false, {
      first: NO_EXTRA,
      last: tab,
    })
    expect(groups.map(({ length }) => length)).toEqual([120, 119 + 1 / 16])
  })

  test('always cover the line', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.constantFrom('full' as const, 'equal' as const),
        fc.integer({ min: 0, max: 8 }),
        fc.boolean(),
        (length, mode, lap, dressLaps) => {
          const groups = groupsOf({ length, mode, lap, minimum: 0 }, MITERED, dressLaps)
          const count = groups.reduce((sum, group) => sum + group.count, 0)
          const sum = groups.reduce((total, group) => total + group.count * group.length, 0)
          expect(sum - (count - 1) * lap).toBeGreaterThanOrEqual(length - 1e-6)
          for (const group of groups) expect(group.length).toBeLessThanOrEqual(120)
        },
      ),
    )
  })
})

describe('what an end adds to the line', () => {
  const extras = (right: object) => {
    const ends = pieceEndsSchema.parse({ left: { kind: 'square' }, right, lowEnd: null })
    const laid = layStrip({ profile: RAKE, sheet: STOCK.sheet, pieceLength: 120, ends })
    if (!laid.ok) throw new Error('The strip can be laid out.')
    return extraOf(laid.layout.right)
  }

  test('a square end nothing, a tab its length', () => {
    expect(extras({ kind: 'square' })).toEqual({ point: 0, tab: 0 })
    expect(extras({ kind: 'square', tabs: [{ leg: 2, length: 1.5 }] })).toEqual({
      point: 0,
      tab: 1.5,
    })
  })

  test('a level square corner the reach of its section, at 45 degrees', () => {
    const plane = { corner: { slopeIn: 0, slopeOut: 0, plan: -90 } }
    const { point, tab } = extras({ kind: 'miter', plane, lay: 0 })
    // Leg 1 lies level, leg 2 hangs, leg 3 runs on at 45 degrees under the level.
    expect(point).toBeCloseTo(4 + 0.75 * Math.SQRT1_2, 1)
    expect(tab).toBe(0)
  })
})

describe('the order with a roof line covered', () => {
  const base = line({ quantity: 1, length: null, statedGirth: 9 })
  const other = line({ key: 'line-b', mark: 'B', name: 'Ridge' })
  const covered = withRoofLine([base, other], base, groupsOf({}), draft, counter())

  test('the line takes the first pieces, the rest is a line behind it under the next mark', () => {
    expect(covered.map(({ mark, quantity, length }) => [mark, quantity, length])).toEqual([
      ['A', 2, 120],
      ['C', 1, 116],
      ['B', 6, 120],
    ])
    expect(covered[1]).toMatchObject({ name: 'North rake', profile: RAKE, statedGirth: 9 })
    expect(covered[1]?.key).not.toBe(base.key)
  })

  test('the lines are known as those of one roof line, and what was asked with them', () => {
    const [first] = covered
    if (!first) throw new Error('A line is expected.')
    expect(linesOfRoofLine(first, covered).map(({ mark }) => mark)).toEqual(['A', 'C'])
    expect(first.covers?.line).toEqual(draft)
    expect(linesOfRoofLine(other, covered)).toEqual([other])
  })

  test('covered anew, the lines it had before are replaced, from whichever it is asked', () => {
    const [, remainder] = covered
    if (!remainder) throw new Error('A remainder is expected.')
    const longer = groupsOf({ length: 400, mode: 'equal' })
    const again = withRoofLine(covered, remainder, longer, draft, counter())
    expect(again.map(({ mark, quantity }) => [mark, quantity])).toEqual([
      ['A', 4],
      ['B', 6],
    ])
  })

  test('its outer ends stay where they are, however often it is covered', () => {
    const dressed = { ...base, ends: MITERED }
    const key = counter()
    const once = withRoofLine([dressed], dressed, groupsOf({}, MITERED, true), draft, key)
    const [first] = once
    if (!first) throw new Error('A line is expected.')
    expect(first.ends?.right).toMatchObject({ kind: 'lap', side: 'under' })
    expect(outsideEnds(linesOfRoofLine(first, once))).toEqual(MITERED)
    const twice = withRoofLine(once, first, groupsOf({}, MITERED, false), draft, key)
    expect(outsideEnds(twice)).toEqual(MITERED)
    expect(twice.at(-1)?.ends?.right.tabs).toEqual([{ leg: 2, length: 1 }])
  })

  test('from the low end, where that is the right one', () => {
    const falling: DraftEnds = { ...MITERED, lowEnd: 'right' }
    const dressed = { ...base, ends: falling }
    const lines = withRoofLine([dressed], dressed, groupsOf({}, falling), draft, counter())
    expect(lines[0]?.ends).toMatchObject({ left: SQUARE, right: falling.right })
    expect(lines.at(-1)?.ends).toMatchObject({ left: falling.left, right: SQUARE })
    expect(outsideEnds(lines)).toEqual(falling)
  })

  test('a pair covers both sides of the gable', () => {
    const pair: DraftLine = { ...base, hands: { drawn: 'left', left: 1, right: 1 }, quantity: 2 }
    const lines = withRoofLine([pair], pair, groupsOf({}), draft, counter())
    expect(lines.map(({ quantity, hands }) => [quantity, hands?.left, hands?.right])).toEqual([
      [4, 2, 2],
      [2, 1, 1],
    ])
  })

  test('a line of one hand alone stays so', () => {
    const right: DraftLine = { ...base, hands: { drawn: 'left', left: 0, right: 1 } }
    const [first] = withRoofLine([right], right, groupsOf({}), draft, counter())
    expect(first).toMatchObject({ quantity: 2, hands: { left: 0, right: 2 } })
  })
})

describe('a roof line that is written', () => {
  test('is complete with a length, or with a level run and its rise', () => {
    expect(completeRoofLine(draft, { first: 0, last: 2 })).toMatchObject({
      length: 348,
      leftExtra: 0,
      rightExtra: 2,
    })
    const run = { ...draft, by: 'planRun' as const, planRun: 120 }
    expect(completeRoofLine(run, { first: 0, last: 0 })).toMatchObject({ planRun: 120, rise: 6 })
  })

  test.each<Partial<DraftRoofLine>>([
    { length: null },
    { by: 'planRun' },
    { lap: null },
    { lap: 25 },
    { pieceLength: 0 },
  ])('waits for what is missing or out of bounds: %j', (part) => {
    expect(completeRoofLine({ ...draft, ...part }, { first: 0, last: 0 })).toBeNull()
  })
})
