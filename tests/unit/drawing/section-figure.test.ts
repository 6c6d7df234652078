import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Profile } from '#shared/profile/profile.schema'
import { profileProblems } from '#shared/profile/problems'
import { sectionFigure } from '#shared/drawing/section-figure'
import { foldedSection } from '#shared/strip/folded-section'
import { distanceToPath } from '#shared/geometry/polyline'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'
import { profileArbitrary, profileOf, STEEL } from '../../support/arbitrary-profile'
import { anyProfileArbitrary, frameArbitrary } from './arbitrary-frame'
import { figureFaults } from './figure-faults'
import { NAMED_PROFILES } from './named-profiles'

const labels = {
  length: (inches: number) => printSize(inches, 'fraction'),
  angle: (turn: number) => printAngle(180 - Math.abs(turn)),
}

const draw = (profile: Profile, width: number, height: number) =>
  sectionFigure(profile, STEEL, { width, height, labels })

const SIZES = [
  [200, 120],
  [390, 300],
  [900, 600],
] as const

describe.each(Object.entries(NAMED_PROFILES))('%s', (_, profile) => {
  it.each(SIZES)('keeps text off metal, text and border at %d x %d', (width, height) => {
    const { display } = draw(profile, width, height)
    expect(figureFaults(display)).toEqual([])
  })

  it.each(SIZES.slice(1))('has a number for every leg at %d x %d', (width, height) => {
    const { leftOut } = draw(profile, width, height)
    if (profile.legs.length <= 8) expect(leftOut.legs).toEqual([])
    expect(leftOut.legs.length).toBeLessThan(profile.legs.length / 4)
    expect(leftOut.edges).toEqual([])
  })

  it('comes out the same twice', () => {
    expect(draw(profile, 390, 300).display).toEqual(draw(profile, 390, 300).display)
  })
})

/** Profiles that can be made; others have nothing to promise about their dimensions. */
const soundProfile = profileArbitrary.filter(
  (profile) => profileProblems(profile, STEEL).length === 0,
)

/** Room for a busy machine; nothing here depends on the clock. */
const PATIENCE = 60_000

describe('any profile', { timeout: PATIENCE }, () => {
  it('never sets text on metal, text, lines or the border at any size, even of a piece that cannot be made', () => {
    const turn = fc.integer({ min: 0, max: 359 })
    fc.assert(
      fc.property(anyProfileArbitrary, frameArbitrary, turn, (profile, frame, rotation) => {
        const { display } = sectionFigure(profile, STEEL, { ...frame, labels, rotation })
        expect(figureFaults(display)).toEqual([])
      }),
      { seed: 20_260_801, numRuns: 150 },
    )
  })

  it('has a number for every leg of up to eight that can be made', () => {
    const few = soundProfile.filter((profile) => profile.legs.length <= 8)
    fc.assert(
      fc.property(few, (profile) => {
        expect(draw(profile, 390, 300).leftOut.legs).toEqual([])
      }),
      { seed: 20_260_801, numRuns: 40 },
    )
  })
})

describe('the frame', () => {
  it('turns inches into pixels and back', () => {
    const { toFrame, toSection, scale } = draw(profileOf([4, 3], [90]), 390, 300)
    const corner = toFrame({ x: 4, y: 0 })
    const begin = toFrame({ x: 0, y: 0 })
    expect(corner.x - begin.x).toBeCloseTo(4 * scale, 9)
    expect(corner.y).toBeCloseTo(begin.y, 9)
    expect(toFrame({ x: 4, y: 1 }).y).toBeLessThan(corner.y)
    expect(toSection(corner).x).toBeCloseTo(4, 9)
    expect(toSection(corner).y).toBeCloseTo(0, 9)
  })

  it('draws the corners of the metal where the true piece has them', () => {
    const profile = NAMED_PROFILES['kicked ridge'] ?? profileOf([1])
    const { display, toFrame, scale } = draw(profile, 390, 300)
    const metal = display.items.find((item) => item.role === 'metal')
    if (metal?.kind !== 'path') throw new Error('No metal was drawn.')
    for (const leg of foldedSection(profile, STEEL).legs) {
      const middle = { x: (leg.from.x + leg.to.x) / 2, y: (leg.from.y + leg.to.y) / 2 }
      expect(distanceToPath(metal.points, toFrame(middle))).toBeLessThan(0.1)
    }
    expect(scale).toBeGreaterThan(10)
  })

  it('keeps scale and place when it is given a view, and turns with the rotation', () => {
    const first = draw(profileOf([4, 3], [90]), 390, 300)
    const longer = sectionFigure(profileOf([4, 3.5], [90]), STEEL, {
      width: 390,
      height: 300,
      labels,
      view: first.view,
    })
    expect(longer.view).toEqual(first.view)
    const turned = sectionFigure(profileOf([4]), STEEL, {
      width: 390,
      height: 300,
      labels,
      rotation: 90,
    })
    const from = turned.toFrame({ x: 0, y: 0 })
    const to = turned.toFrame({ x: 4, y: 0 })
    expect(to.x).toBeCloseTo(from.x, 9)
    expect(to.y).toBeLessThan(from.y)
  })
})

describe('parts', () => {
  const gable = NAMED_PROFILES.gable ?? profileOf([1])

  it('finds the leg, the bend and the hem under a point', () => {
    const { findPart, toFrame } = draw(gable, 390, 300)
    expect(findPart(toFrame({ x: 2, y: 0 }), 8)).toEqual({ kind: 'leg', leg: 1 })
    expect(findPart(toFrame({ x: 4, y: 0 }), 8)).toEqual({ kind: 'bend', bend: 1 })
    expect(findPart(toFrame({ x: 0, y: -3 }), 8)).toBeUndefined()
  })

  it('draws what cannot be made as a problem, what deserves a look as a warning', () => {
    const leg = { kind: 'leg', leg: 1 } as const
    const hem = { kind: 'hem', edge: 'B' } as const
    const { display } = sectionFigure(gable, STEEL, {
      width: 390,
      height: 300,
      labels,
      problems: [leg],
      warnings: [leg, hem],
    })
    const partsOf = (role: string) =>
      display.items.filter((item) => item.role === role).map(({ part }) => part)
    expect(partsOf('problem')).toContainEqual(leg)
    expect(partsOf('warning')).toContainEqual(hem)
    expect(partsOf('warning')).not.toContainEqual(leg)
  })

  it('draws a chosen leg and its dimension as selected, and only that', () => {
    const selected = { kind: 'leg', leg: 2 } as const
    const { display } = sectionFigure(gable, STEEL, { width: 390, height: 300, labels, selected })
    const marked = display.items.filter((item) => item.role === 'selected')
    expect(marked.some((item) => item.kind === 'text' && item.text === labels.length(4))).toBe(true)
    expect(marked.every((item) => item.part?.kind === 'leg' && item.part.leg === 2)).toBe(true)
  })

  it('puts the band of color on the color side', () => {
    const heightOfBand = (colorSide: Profile['colorSide']) => {
      const { display, toFrame } = draw(profileOf([6], [], { colorSide }), 390, 300)
      const middle = toFrame({ x: 0, y: 0 }).y
      return display.items.flatMap((item) =>
        item.role === 'paint' && item.kind === 'path' ? [(item.points[0]?.y ?? 0) - middle] : [],
      )
    }
    expect(heightOfBand('left').every((offset) => offset < 0)).toBe(true)
    expect(heightOfBand('right').every((offset) => offset > 0)).toBe(true)
    expect(heightOfBand('both')).toHaveLength(2)
    expect(heightOfBand('none')).toHaveLength(0)
  })

  it('draws no text in a thumbnail', () => {
    const show = { dimensions: false, angles: false, edges: false }
    const { display } = sectionFigure(gable, STEEL, { width: 96, height: 64, labels, show })
    expect(display.items.some((item) => item.kind === 'text')).toBe(false)
    expect(figureFaults(display)).toEqual([])
  })
})
