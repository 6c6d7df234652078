import { describe, expect, test } from 'vitest'
import { closeEnds } from '#shared/ends/close-ends'
import { endSchema, type End, type Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter } from '#shared/profile/starters'
import { resolveFollows } from '#shared/profile/follows'
import { pitchAngle } from '#shared/units/angle'
import { printSlope } from '#shared/units/print-slope'
import {
  cornerKind,
  cornerPlane,
  cornersOf,
  plumbPlane,
  riseOf,
  turnsTo,
  withTurn,
  type Run,
} from '@/features/ends/model/corner-presets'
import type { DraftPlane } from '@/features/ends/model/draft-end'
import {
  layFor,
  legLies,
  legsOnRoof,
  outerEdge,
  turnOfLeg,
  usualLay,
} from '@/features/ends/model/lay-presets'
import { withLowEnd } from '@/features/ends/model/run-edits'
import { parseSlope } from '@/features/ends/model/slope'
import { STOCK } from '../orders/draft-lines'

const PITCH = 3
const SLOPE = pitchAngle(PITCH)
const LEVEL: Run = { slope: SLOPE, lowEnd: null }
const UP_RIGHT: Run = { slope: SLOPE, lowEnd: 'left' }
const UP_LEFT: Run = { slope: SLOPE, lowEnd: 'right' }

const eave = resolveFollows(getStarter('eaveDrip').profile, PITCH)
const sheet = STOCK.sheet

const miter = (
  plane: DraftPlane,
  lay: number,
  legs: { leg: number; plane: DraftPlane }[] = [],
): End => endSchema.parse({ kind: 'miter', plane, lay, legs })

/** Leg numbers of the entering piece with the leg that each closes on. */
function closing(
  entering: { profile: Profile; end: End },
  leaving: { profile: Profile; end: End },
) {
  const closed = closeEnds(
    { ...entering, sheet, side: 'right' },
    { ...leaving, sheet, side: 'left' },
  )
  if (!closed.ok) throw new Error(`The ends are refused: ${closed.code}.`)
  return closed
}

describe('a level corner', () => {
  test.each(['A', 'B'] as const)(
    'closes on every leg of the same drawing, turned to edge %s',
    (to) => {
      const lay = usualLay(eave, LEVEL)
      const [right, left] = (['right', 'left'] as const).map((side) =>
        miter(cornerPlane('level', to, side, LEVEL), lay),
      )
      if (!right || !left) throw new Error('Two ends are expected.')
      expect(closing({ profile: eave, end: right }, { profile: eave, end: left }).closes).toBe(true)
    },
  )
})

describe('a gable that meets a level eave', () => {
  // Published rule of the corner: the bottoms meet when the level face is the gable's / cos(slope).
  const gable: Profile = {
    version: 1,
    legs: [3.5, 6],
    bends: [{ turn: -90 }],
    hemA: null,
    hemB: null,
    colorSide: 'left',
  }
  const level: Profile = {
    ...gable,
    legs: [3.5, 6 / Math.cos(Math.atan2(PITCH, 12))],
    bends: [{ turn: -(90 - SLOPE) }],
  }
  const levelLay = layFor(level, 2, 'plumb', 0, LEVEL)

  test('comes to the very corner that the eave leaves, and the other way round', () => {
    expect(cornerPlane('level', 'A', 'right', UP_LEFT)).toEqual(
      cornerPlane('gableUp', 'A', 'left', LEVEL),
    )
    expect(cornerPlane('gableUp', 'B', 'right', LEVEL)).toEqual(
      cornerPlane('level', 'B', 'left', UP_RIGHT),
    )
    expect(cornerPlane('gableDown', 'B', 'left', LEVEL)).toEqual(
      cornerPlane('level', 'B', 'right', UP_RIGHT),
    )
  })

  test('closes on the roof with the corner alone, but not on the face', () => {
    const closed = closing(
      { profile: gable, end: miter(cornerPlane('level', 'A', 'right', UP_LEFT), 0) },
      { profile: level, end: miter(cornerPlane('gableUp', 'A', 'left', LEVEL), levelLay) },
    )
    expect(closed.a.map(({ closesOn }) => closesOn)).toEqual([1, null])
  })

  test("closes on the face too where the gable's is cut plumb and the level one square", () => {
    const closed = closing(
      {
        profile: gable,
        end: miter(cornerPlane('level', 'A', 'right', UP_LEFT), 0, [
          { leg: 2, plane: plumbPlane(UP_LEFT) },
        ]),
      },
      {
        profile: level,
        end: miter(cornerPlane('gableUp', 'A', 'left', LEVEL), levelLay, [
          { leg: 2, plane: { normal: [1, 0, 0] } },
        ]),
      },
    )
    expect(closed.closes).toBe(true)
  })

  test('has its legs on the roof found, on the gable and on the eave', () => {
    expect(legsOnRoof(gable, 0, UP_LEFT)).toEqual([1])
    expect(legsOnRoof(level, levelLay, LEVEL)).toEqual([1])
  })
})

describe('how a piece runs', () => {
  test('gives its rise from left to right, and the plumb cut', () => {
    expect(riseOf(LEVEL)).toBe(0)
    expect(riseOf(UP_RIGHT)).toBe(SLOPE)
    expect(plumbPlane(UP_LEFT)).toEqual({ plumb: -SLOPE })
  })

  test.each<[Run, Side]>([
    [LEVEL, 'left'],
    [LEVEL, 'right'],
    [UP_RIGHT, 'left'],
    [UP_LEFT, 'right'],
  ])('%j: the corner it was given is told again at its %s end', (run, side) => {
    for (const kind of cornersOf(run)) {
      if (kind === 'own') continue
      expect(cornerKind(cornerPlane(kind, 'B', side, run), side, run)).toBe(kind)
    }
    expect(cornerKind({ corner: { slopeIn: 1, slopeOut: 2, plan: 90 } }, side, run)).toBe('own')
    expect(cornerKind({ corner: { slopeIn: null, slopeOut: 0, plan: 90 } }, side, run)).toBe('own')
  })

  test('a turn in plan keeps its angle when it goes to the other edge', () => {
    expect(turnsTo(-45)).toBe('A')
    expect(withTurn(-45, 'B')).toBe(45)
    expect(withTurn(null, 'A')).toBe(-90)
  })

  test('changed, takes with it what came from it and leaves what was set by hand', () => {
    const before = {
      left: {
        kind: 'miter' as const,
        plane: cornerPlane('level', 'A', 'left', LEVEL),
        lay: usualLay(eave, LEVEL),
        legs: [{ leg: 2, plane: plumbPlane(LEVEL) }],
        tabs: [],
      },
      right: {
        kind: 'miter' as const,
        plane: { corner: { slopeIn: 5, slopeOut: 0, plan: 60 } },
        lay: usualLay(eave, LEVEL),
        legs: [],
        tabs: [],
      },
      lowEnd: null,
    }
    const after = withLowEnd(before, 'left', SLOPE, eave)
    expect(after.left).toMatchObject({
      plane: cornerPlane('level', 'A', 'left', UP_RIGHT),
      legs: [{ leg: 2, plane: { plumb: SLOPE } }],
      lay: usualLay(eave, UP_RIGHT),
    })
    expect(after.right).toMatchObject({ plane: before.right.plane })
    expect(after.lowEnd).toBe('left')
  })
})

describe('how the section lies', () => {
  test('an eave drip: its roof flange on the slope, its face plumb', () => {
    const lay = usualLay(eave, LEVEL)
    expect(legLies(eave, 1, lay, LEVEL)).toBe('downSlope')
    expect(legLies(eave, 2, lay, LEVEL)).toBe('plumb')
    expect(outerEdge(eave, lay)).toBe('B')
  })

  test('a headwall: its apron on the slope, its leg plumb up the wall', () => {
    const wall = resolveFollows(getStarter('headwall').profile, PITCH)
    const lay = usualLay(wall, LEVEL)
    expect(legLies(wall, 2, lay, LEVEL)).toBe('upSlope')
    expect(legLies(wall, 3, lay, LEVEL)).toBe('plumb')
    expect(outerEdge(wall, lay)).toBe('A')
  })

  test('a ridge: a wing on each slope', () => {
    const ridge = resolveFollows(getStarter('ridge').profile, PITCH)
    const lay = usualLay(ridge, LEVEL)
    expect([2, 3].map((leg) => legLies(ridge, leg, lay, LEVEL))).toEqual(['upSlope', 'downSlope'])
  })

  test('a valley along its slope: both wings as steep as each other', () => {
    const valley = resolveFollows(getStarter('valley').profile, PITCH)
    const lay = usualLay(valley, UP_RIGHT)
    const wings = [1, valley.legs.length].map((leg) => lay + turnOfLeg(valley, leg))
    expect(wings[0]).toBeCloseTo(-(wings[1] ?? NaN), 9)
  })

  test('a leg is laid with the least turn of the piece', () => {
    expect(layFor(eave, 1, 'level', -14, LEVEL)).toBe(0)
    expect(layFor(eave, 1, 'level', 170, LEVEL)).toBe(-180)
    expect(legLies(eave, 2, layFor(eave, 2, 'plumb', 0, LEVEL), LEVEL)).toBe('plumb')
  })

  test('a lay that is none of them, or still missing, is its own', () => {
    expect(legLies(eave, 1, 33, LEVEL)).toBe('own')
    expect(legLies(eave, 1, null, LEVEL)).toBe('own')
  })
})

describe('a slope', () => {
  test.each([
    ['6/12', Math.atan2(6, 12)],
    ['4.5 in 12', Math.atan2(4.5, 12)],
    ['6 : 12', Math.atan2(6, 12)],
    ['26.6°', (26.6 * Math.PI) / 180],
    ['0', 0],
  ])('%s is read', (text, angle) => {
    const read = parseSlope(text)
    expect(read.ok && read.degrees).toBeCloseTo((angle * 180) / Math.PI, 9)
  })

  test.each([
    ['', 'empty'],
    ['steep', 'malformed'],
    ['90', 'outOfRange'],
    ['-5', 'outOfRange'],
    ['30/12', 'outOfRange'],
  ])('“%s” is refused as %s', (text, refusal) => {
    expect(parseSlope(text)).toEqual({ ok: false, refusal })
  })

  test('is printed as the pitch that it is, in degrees otherwise', () => {
    expect(printSlope(-pitchAngle(4.5))).toBe('4.5/12')
    expect(printSlope(26.6)).toBe('26.6°')
    expect(printSlope(89)).toBe('89°')
  })
})
