import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { distance, rotate, vector } from '#shared/geometry/vector'
import { profileCorners, profileFromCorners } from '#shared/profile/corners'
import { applyEdit } from '#shared/profile/edits'
import { mirrorProfile, reverseProfile } from '#shared/profile/flips'
import { profileProblems } from '#shared/profile/problems'
import { profileSchema } from '#shared/profile/profile.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { closedHem, profileArbitrary, profileOf, STEEL } from '../../support/arbitrary-profile'

const face = profileOf([3, 5, 1], [-90, 45], { hemB: closedHem(0.5, -1) })

describe('corners', () => {
  it('chain the outside dimensions from the origin along +x', () => {
    const corners = profileCorners(profileOf([3, 5], [-90]))
    expect(corners).toHaveLength(3)
    expect(corners[1]).toEqual({ x: 3, y: 0 })
    expect(corners[2]?.x).toBeCloseTo(3, 12)
    expect(corners[2]?.y).toBeCloseTo(-5, 12)
  })

  it('give the very profile back', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        expect(profileFromCorners(profileCorners(profile), profile)).toEqual(profile)
      }),
    )
  })

  it('give the same profile wherever the chain lies', () => {
    fc.assert(
      fc.property(profileArbitrary, fc.integer({ min: 0, max: 359 }), (profile, angle) => {
        const moved = profileCorners(profile).map((corner) =>
          rotate(vector(corner.x + 7, corner.y - 3), angle),
        )
        expect(profileFromCorners(moved, profile)).toEqual(profile)
      }),
    )
  })

  it('need two points', () => {
    expect(() => profileFromCorners([vector(0, 0)], face)).toThrow(RangeError)
  })
})

describe('moveCorner', () => {
  it('changes the two legs and three turns beside it and keeps the other numbers to the bit', () => {
    fc.assert(
      fc.property(
        profileArbitrary,
        fc.nat(),
        fc.integer({ min: -40, max: 40 }),
        fc.integer({ min: -40, max: 40 }),
        (profile, pick, dx, dy) => {
          const corners = profileCorners(profile)
          const corner = pick % corners.length
          const old = corners[corner] ?? vector(0, 0)
          const to = vector(old.x + dx / 8, old.y + dy / 8)
          const moved = applyEdit(profile, { kind: 'moveCorner', corner, to })
          moved.legs.forEach((leg, index) => {
            if (index < corner - 1 || index > corner) expect(leg).toBe(profile.legs[index])
          })
          moved.bends.forEach((bend, index) => {
            if (Math.abs(index + 1 - corner) > 1) expect(bend).toBe(profile.bends[index])
          })
          expect(moved.hemA).toBe(profile.hemA)
          const before = corners[corner - 1]
          if (before) expect(moved.legs[corner - 1]).toBeCloseTo(distance(before, to), 9)
        },
      ),
    )
  })

  it('keeps a tie to the roof only where the turn stays', () => {
    const tied = {
      ...face,
      bends: [
        { turn: -90, follows: { rule: 'gable' as const, pitch: 'job' as const } },
        { turn: 45 },
      ],
    }
    const end = profileCorners(tied)[3] ?? vector(0, 0)
    const kept = applyEdit(tied, { kind: 'moveCorner', corner: 3, to: vector(end.x + 1, end.y) })
    expect(kept.bends[0]?.follows).toBeTruthy()
    const lost = applyEdit(tied, { kind: 'moveCorner', corner: 1, to: vector(3, 1) })
    expect(lost.bends[0]?.follows).toBeUndefined()
  })
})

describe('legs, turns and corners', () => {
  it('setLeg and setTurn set one number; a turn by hand lets go of the roof', () => {
    expect(applyEdit(face, { kind: 'setLeg', leg: 2, length: 6 }).legs).toEqual([3, 6, 1])
    const tied = applyEdit(face, {
      kind: 'setFollows',
      bend: 1,
      follows: { rule: 'eave', pitch: 'job' },
    })
    expect(tied.bends[0]).toEqual({ turn: -90, follows: { rule: 'eave', pitch: 'job' } })
    expect(applyEdit(tied, { kind: 'setTurn', bend: 1, turn: -80 }).bends[0]).toEqual({ turn: -80 })
    expect(applyEdit(tied, { kind: 'setFollows', bend: 1, follows: null })).toEqual(face)
  })

  it('addLeg puts a leg outside either edge and leaves the hem at the edge', () => {
    const b = applyEdit(face, { kind: 'addLeg', edge: 'B', length: 2, turn: 30 })
    expect(b).toMatchObject({ legs: [3, 5, 1, 2], hemB: face.hemB })
    expect(b.bends.map(({ turn }) => turn)).toEqual([-90, 45, 30])
    const a = applyEdit(face, { kind: 'addLeg', edge: 'A', length: 2, turn: 30 })
    expect(a.legs).toEqual([2, 3, 5, 1])
    expect(a.bends.map(({ turn }) => turn)).toEqual([30, -90, 45])
  })

  it('splitLeg makes two legs of one, and removing the corner makes one of two again', () => {
    fc.assert(
      fc.property(
        profileArbitrary,
        fc.nat(),
        fc.integer({ min: 1, max: 7 }),
        (profile, pick, n) => {
          const leg = (pick % profile.legs.length) + 1
          const at = ((profile.legs[leg - 1] ?? 0) * n) / 8
          const split = applyEdit(profile, { kind: 'splitLeg', leg, at, turn: 0 })
          expect(split.legs).toHaveLength(profile.legs.length + 1)
          expect(profileSchema.safeParse(split).success).toBe(true)
          const merged = applyEdit(split, { kind: 'removeCorner', corner: leg })
          expect(flatStrip(merged, STEEL).stripWidth).toBeCloseTo(
            flatStrip(profile, STEEL).stripWidth,
            9,
          )
          expect(merged.bends.map(({ turn }) => turn.toFixed(9))).toEqual(
            profile.bends.map(({ turn }) => turn.toFixed(9)),
          )
        },
      ),
    )
  })

  it('removeCorner joins the corners beside it and leaves them where they are', () => {
    fc.assert(
      fc.property(profileArbitrary, fc.nat(), (profile, pick) => {
        fc.pre(profile.legs.length > 1)
        const corners = profileCorners(profile)
        const corner = pick % corners.length
        const rest = corners.toSpliced(corner, 1)
        fc.pre(
          rest.every(
            (point, index) => index === 0 || distance(point, rest[index - 1] ?? point) > 1e-3,
          ),
        )
        const after = profileCorners(applyEdit(profile, { kind: 'removeCorner', corner }))
        expect(after).toHaveLength(rest.length)
        rest.forEach((point, index) => {
          const first = rest[0] ?? point
          const afterFirst = after[0] ?? first
          expect(distance(after[index] ?? first, afterFirst)).toBeCloseTo(distance(point, first), 6)
        })
      }),
    )
  })

  it('removing an end takes its leg and bend away', () => {
    expect(applyEdit(face, { kind: 'removeCorner', corner: 3 })).toEqual({
      ...face,
      legs: [3, 5],
      bends: [{ turn: -90 }],
    })
    expect(applyEdit(face, { kind: 'removeCorner', corner: 0 })).toEqual({
      ...face,
      legs: [5, 1],
      bends: [{ turn: 45 }],
    })
  })

  it('cannot touch what is not there', () => {
    expect(() => applyEdit(face, { kind: 'setLeg', leg: 4, length: 1 })).toThrow(RangeError)
    expect(() => applyEdit(face, { kind: 'setTurn', bend: 0, turn: 1 })).toThrow(RangeError)
    expect(() => applyEdit(face, { kind: 'removeCorner', corner: 4 })).toThrow(RangeError)
    expect(() => applyEdit(profileOf([2]), { kind: 'removeCorner', corner: 0 })).toThrow(RangeError)
  })
})

describe('hems and color', () => {
  it('are set at their edge', () => {
    const hem = closedHem(0.375, 1)
    expect(applyEdit(face, { kind: 'setHem', edge: 'A', hem }).hemA).toEqual(hem)
    expect(applyEdit(face, { kind: 'setHem', edge: 'B', hem: null }).hemB).toBeNull()
    expect(applyEdit(face, { kind: 'setColorSide', colorSide: 'both' }).colorSide).toBe('both')
    expect(applyEdit(face, { kind: 'flipColorSide' }).colorSide).toBe('right')
  })
})

describe('reverse and mirror', () => {
  it('reverse swaps the order, negates turns, carries hems over and changes the color side', () => {
    expect(applyEdit(face, { kind: 'reverse' })).toEqual({
      ...face,
      legs: [1, 5, 3],
      bends: [{ turn: -45 }, { turn: 90 }],
      hemA: closedHem(0.5, 1),
      hemB: null,
      colorSide: 'right',
    })
  })

  it('mirror negates turns and lips and changes the color side', () => {
    expect(applyEdit(face, { kind: 'mirror' })).toEqual({
      ...face,
      bends: [{ turn: 90 }, { turn: -45 }],
      hemB: closedHem(0.5, 1),
      colorSide: 'right',
    })
  })

  it('each undo themselves, and neither minds the other', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        expect(reverseProfile(reverseProfile(profile))).toEqual(profile)
        expect(mirrorProfile(mirrorProfile(profile))).toEqual(profile)
        expect(mirrorProfile(reverseProfile(profile))).toEqual(
          reverseProfile(mirrorProfile(profile)),
        )
      }),
    )
  })

  it('reverse keeps the drawn shape: the same corners from the other end', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        const there = profileCorners(profile)
        const back = profileCorners(reverseProfile(profile)).toReversed()
        const first = there[0] ?? vector(0, 0)
        const backFirst = back[0] ?? first
        there.forEach((corner, index) => {
          expect(distance(back[index] ?? first, backFirst)).toBeCloseTo(distance(corner, first), 9)
        })
      }),
    )
  })
})

describe('edits with any numbers', () => {
  it('give a profile whose faults can be named, or are refused as a place that is not there', () => {
    const value = fc.oneof(
      fc.double(),
      fc.constantFrom(NaN, Infinity, -Infinity, 1e308, -1e308, 5e-324, 0, -0, 2, 90),
    )
    const place = fc.oneof(fc.integer({ min: -1, max: 12 }), value)
    const edge = fc.constantFrom('A' as const, 'B' as const)
    const kind = <Kind extends string>(name: Kind) => fc.constant(name)
    const edit = fc.oneof(
      fc.record({ kind: kind('setLeg'), leg: place, length: value }),
      fc.record({ kind: kind('setTurn'), bend: place, turn: value }),
      fc.record({ kind: kind('addLeg'), edge, length: value, turn: value }),
      fc.record({ kind: kind('splitLeg'), leg: place, at: value, turn: value }),
      fc.record({ kind: kind('removeCorner'), corner: place }),
      fc.record({ kind: kind('moveCorner'), corner: place, to: fc.record({ x: value, y: value }) }),
    )
    fc.assert(
      fc.property(profileArbitrary, edit, (profile, one) => {
        const edited = (() => {
          try {
            return applyEdit(profile, one)
          } catch (error) {
            expect(error).toBeInstanceOf(RangeError)
            expect(String(error)).toMatch(/There is no (leg|bend|corner)|The last leg/)
            return null
          }
        })()
        if (edited === null) return
        expect(edited.bends).toHaveLength(edited.legs.length - 1)
        const isSound = edited.legs.every((leg) => Number.isFinite(leg) && leg > 0)
        const named = profileProblems(edited, STEEL).some(({ leg }) => leg !== null)
        if (!isSound) expect(named).toBe(true)
      }),
      { numRuns: 1000 },
    )
  })
})
