import { describe, expect, it } from 'vitest'
import type { EndLayout, StripLayout } from '#shared/ends/end-layout'
import type { End, PieceEnds } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_END } from '#shared/ends/strip-borders'
import type { Profile } from '#shared/profile/profile.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { closedHem, profileOf, STEEL } from '../../support/arbitrary-profile'
import { naiveArea } from '../../support/naive-polygon'

const lay = (profile: Profile, ends: Partial<PieceEnds>): StripLayout => {
  const laid = layStrip({
    profile,
    sheet: STEEL,
    pieceLength: 120,
    ends: { left: SQUARE_END, right: SQUARE_END, lowEnd: null, ...ends },
  })
  if (!laid.ok) throw new Error(laid.problems.map(({ code }) => code).join())
  return laid.layout
}

const lap = (side: 'under' | 'over', length = 4, tabs: End['tabs'] = []): End => ({
  kind: 'lap',
  side,
  length,
  tabs,
})

const tabs = (...given: End['tabs']): End => ({ kind: 'square', tabs: given })

const cutArea = ({ cutAways }: EndLayout): number =>
  cutAways.reduce((sum, polygon) => sum + naiveArea(polygon), 0)

describe('an under lap', () => {
  it('trims both free edges by 1/8 in. over its length', () => {
    const { left, outline, stripWidth } = lay(profileOf([4, 6], [-90]), { left: lap('under') })
    expect(cutArea(left)).toBeCloseTo(2 * 4 * 0.125, 12)
    expect(left.marks.every(({ along }) => along === 0)).toBe(true)
    const atEnd = outline.filter(({ along }) => along === 0).map(({ at }) => at)
    expect(atEnd).toEqual([0.125, stripWidth - 0.125])
  })

  it('cuts the lips of its hems away up to their creases, open ones too', () => {
    const profile = profileOf([4, 6], [-90], {
      hemA: closedHem(0.5, 1),
      hemB: { style: 'open', length: 0.75, gap: 0.125, turn: -1 },
    })
    const { creases, stripWidth } = flatStrip(profile, STEEL)
    const lips = (creases[0]?.at ?? NaN) + stripWidth - (creases.at(-1)?.at ?? NaN)
    expect(cutArea(lay(profile, { right: lap('under') }).right)).toBeCloseTo(4 * lips, 9)
  })

  it('leaves half of a free leg narrower than 1/2 in.', () => {
    const profile = profileOf([0.25, 6], [-90])
    const width = flatStrip(profile, STEEL).creases[0]?.at ?? NaN
    const { left } = lay(profile, { left: lap('under') })
    expect(cutArea(left)).toBeCloseTo(4 * (width / 4 + 0.125), 12)
    // A profile of one leg is trimmed at both of its edges.
    expect(cutArea(lay(profileOf([0.25]), { left: lap('under') }).left)).toBeCloseTo(4 * 0.125, 12)
  })

  it('keeps a tab within what the trim leaves of its leg', () => {
    const { left } = lay(profileOf([4, 6], [-90]), {
      left: lap('under', 4, [{ leg: 1, length: 1 }]),
    })
    expect(left.tabs[0]?.fold[0].at).toBe(0.125)
    expect(left.marks.every(({ along }) => along === 1)).toBe(true)
  })
})

describe('an over lap', () => {
  it('opens closed hems over its length by a thickness and 1/32 in., and cuts nothing', () => {
    const profile = profileOf([4, 6], [-90], { hemA: closedHem(0.5, 1), hemB: closedHem(0.5, -1) })
    const { right, left } = lay(profile, { right: lap('over', 6) })
    const opened = { length: 6, gap: STEEL.thickness + 1 / 32 }
    expect(right.openings).toEqual([
      { edge: 'A', ...opened },
      { edge: 'B', ...opened },
    ])
    expect(right.cutAways).toEqual([])
    expect(left.openings).toEqual([])
  })

  it('opens an open hem only where it is narrower than that', () => {
    const withGap = (gap: number) =>
      lay(profileOf([4], [], { hemB: { style: 'open', length: 0.5, gap, turn: 1 } }), {
        left: lap('over'),
      }).left.openings
    expect(withGap(0.05)).toHaveLength(1)
    expect(withGap(STEEL.thickness + 1 / 32)).toEqual([])
  })
})

describe('a tab', () => {
  it('makes the blank longer at its own end by its length', () => {
    const profile = profileOf([4, 6], [-90])
    const both = { left: tabs({ leg: 1, length: 2 }), right: tabs({ leg: 2, length: 1.25 }) }
    const { blankLength, left, right } = lay(profile, both)
    expect(blankLength).toBe(123.25)
    expect(left.marks.map(({ along }) => along)).toEqual([2, 2, 2])
    expect(right.marks.map(({ along }) => along)).toEqual([1.25, 1.25, 1.25])
  })

  it('stands as tall over a slanted fold line as it is long', () => {
    const corner = { slopeIn: 0, slopeOut: 0, plan: 90 }
    const { right, blankLength } = lay(profileOf([4]), {
      right: {
        kind: 'miter',
        plane: { corner },
        lay: 0,
        legs: [],
        tabs: [{ leg: 1, length: 1 }],
      },
    })
    const [tab] = right.tabs
    if (!tab) throw new Error('There is one tab.')
    const [from, to] = tab.fold
    const direction = [(to.along - from.along) / 4, (to.at - from.at) / 4] as const
    const heights = tab.polygon.map(
      ({ along, at }) =>
        ((along - from.along) * direction[1] - (at - from.at) * direction[0]) /
        Math.hypot(...direction),
    )
    expect(Math.max(...heights)).toBeCloseTo(1, 12)
    // Along the piece a 45-degree cut makes 1.414 in. of it; the tip's own corner is taken back.
    expect(blankLength).toBeCloseTo(120 + Math.SQRT2 - 0.25, 12)
  })

  it('adds nothing to the blank where it stays behind the point of a miter', () => {
    const plane = { corner: { slopeIn: 0, slopeOut: 0, plan: 90 } }
    const profile = profileOf([6, 1, 6], [90, -90])
    const { blankLength, right } = lay(profile, {
      right: { kind: 'miter', plane, lay: 0, legs: [], tabs: [{ leg: 2, length: 1 }] },
    })
    expect(blankLength).toBe(120)
    expect(Math.min(...right.marks.map(({ along }) => along))).toBe(0)
  })

  it('has its outer corners taken back by 1/4 in., less on a small one', () => {
    const cornerOf = (leg: number, length: number) => {
      const { left } = lay(profileOf([0.5, 6], [-90]), { left: tabs({ leg, length }) })
      const [, side, top] = left.tabs[0]?.polygon ?? []
      return side && top ? [side.along - top.along, top.at - side.at] : []
    }
    const quarterOfWidth = (flatStrip(profileOf([0.5, 6], [-90]), STEEL).creases[0]?.at ?? NaN) / 4
    expect(cornerOf(2, 1)).toEqual([0.25, 0.25])
    expect(cornerOf(2, 0.5)).toEqual([0.125, 0.125])
    cornerOf(1, 1).forEach((back) => {
      expect(back).toBeCloseTo(quarterOfWidth, 12)
    })
  })

  it('is slit off its neighbor only where that has a tab as well', () => {
    const profile = profileOf([2, 3, 2, 3], [90, 90, -90])
    const slitsOf = (...legs: number[]) =>
      lay(profile, { left: tabs(...legs.map((leg) => ({ leg, length: 1 }))) }).left.slits
    const { creases } = flatStrip(profile, STEEL)
    expect(slitsOf(2)).toEqual([])
    expect(slitsOf(1, 3)).toEqual([])
    expect(slitsOf(4, 3)).toEqual([
      { from: { at: creases[2]?.at, along: 1 }, to: { at: creases[2]?.at, along: 0.25 } },
    ])
    expect(slitsOf(1, 2, 3, 4)).toHaveLength(3)
  })

  it('may stand on every leg of a hemmed piece, and the lips stay cut', () => {
    const profile = profileOf([4], [], { hemA: closedHem(0.5, 1) })
    const { left } = lay(profile, { left: tabs({ leg: 1, length: 1 }) })
    const { creases } = flatStrip(profile, STEEL)
    expect(left.tabs[0]?.fold[0].at).toBe(creases[0]?.at)
    expect(left.marks).toHaveLength(3)
  })
})
