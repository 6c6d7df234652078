import { describe, expect, test } from 'vitest'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { findBlockedFold } from '#shared/bend-plan/explain/blocked-fold'
import type { BlockedFold } from '#shared/bend-plan/explain/blocked-fold'
import { cutSetup } from '#shared/bend-plan/explain/cut-setup'
import { nearestDeadEnd } from '#shared/bend-plan/explain/dead-ends'
import { findOverlap } from '#shared/bend-plan/explain/overlap'
import { foldSetup } from '#shared/bend-plan/fold-setup'
import { FOLD_TESTS } from '#shared/bend-plan/fold-tests/fold-tests'
import { frontSide, getOrientation, rearSide } from '#shared/bend-plan/orientation'
import { planSection } from '#shared/bend-plan/plan-profile'
import type { Section } from '#shared/bend-plan/plan.schema'
import { searchGroundOf } from '#shared/bend-plan/search-ground-of'
import { KNOWN_PLANS } from '../../../support/known-bend-plans'
import { anyHemOrder, request, section } from '../../../support/bend-plan-cases'

const knownSection = (name: string): Section => {
  const known = KNOWN_PLANS.find((each) => each.name === name)
  if (known === undefined) throw new Error(`No known plan ${name}`)
  return known.section
}

const foldTest = (check: BlockedFold['failure']['check']) => {
  const found = FOLD_TESTS.find((each) => each.check === check)
  if (found === undefined) throw new Error(`No test ${check}`)
  return found
}

/** The section with its outermost leg or lip at an edge shortened; undefined where that is not enough. */
const shortened = (of: Section, edge: 'A' | 'B', by: number): Section | undefined => {
  const hem = edge === 'A' ? of.hemA : of.hemB
  if (hem !== null) {
    const cut = hem.lip > by ? { ...hem, lip: hem.lip - by } : undefined
    return cut && (edge === 'A' ? { ...of, hemA: cut } : { ...of, hemB: cut })
  }
  const at = edge === 'A' ? 0 : of.legs.length - 1
  const leg = of.legs[at] ?? 0
  return leg > by ? { ...of, legs: of.legs.with(at, leg - by) } : undefined
}

const passes = (of: Section, brake: Brake, { made, bend, orientation, failure }: BlockedFold) => {
  const ground = searchGroundOf(request(of, brake))
  const setup = foldSetup(ground, made, bend, getOrientation(orientation))
  return foldTest(failure.check).find(setup) === undefined
}

describe('the dead end nearest to bending', () => {
  const cases: [string, keyof typeof DEMO_BRAKE, [string, number][]][] = [
    [
      'corner with pockets',
      'upOnly',
      [
        ['rearMeetsTool', 3],
        ['rearMeetsTool', 2],
      ],
    ],
    [
      'corner with pockets',
      'upAndDown',
      [
        ['rearMeetsTool', 3],
        ['rearMeetsTool', 2],
      ],
    ],
    [
      'corner with pockets',
      'site',
      [
        ['rearMeetsTool', 2],
        ['rearMeetsTool', 4],
      ],
    ],
    [
      'square spiral',
      'upOnly',
      [
        ['rearMeetsTool', 2],
        ['rearMeetsTool', 3],
      ],
    ],
    [
      'closed tube',
      'upOnly',
      [
        ['rearMeetsTool', 2],
        ['rearMeetsTool', 3],
      ],
    ],
    [
      'closed tube',
      'site',
      [
        ['rearMeetsTool', 2],
        ['frontMeetsTool', 4],
      ],
    ],
  ]
  test.each(cases)('of %s on %s names bend and check', (name, key, first) => {
    const { reasons } = planSection(request(knownSection(name), anyHemOrder(DEMO_BRAKE[key])))
    expect(reasons[0]).toMatchObject({ code: 'noOrder', bend: null, overlap: null })
    expect(reasons.slice(1, 3).map(({ code, bend }) => [code, bend])).toEqual(first)
    const overlaps = reasons.slice(1).map(({ overlap }) => overlap ?? Infinity)
    expect(overlaps).toEqual(overlaps.toSorted((a, b) => a - b))
    // The finished piece itself: every bend is one that cannot be left for last.
    expect(reasons).toHaveLength(knownSection(name).turns.length + 1)
  })

  test.each([
    ['corner with pockets', 'upOnly'],
    ['corner with pockets', 'site'],
    ['square spiral', 'upOnly'],
    ['closed tube', 'upOnly'],
    ['closed tube', 'site'],
  ] as const)('%s on %s: the overlap is exactly what is too much', (name, key) => {
    const of = knownSection(name)
    const brake = anyHemOrder(DEMO_BRAKE[key])
    let cut = 0
    for (const fold of nearestDeadEnd(searchGroundOf(request(of, brake)))) {
      const { overlap, orientation } = fold
      if (overlap === null) throw new Error(`Nothing to cut at bend ${fold.bend.fold}`)
      const o = getOrientation(orientation)
      const edge = overlap.place === 'front' ? frontSide(o) : rearSide(o)
      const more = shortened(of, edge, overlap.length + 1e-4)
      const less = shortened(of, edge, overlap.length - 1e-4)
      if (more === undefined || less === undefined) continue
      cut += 1
      expect(passes(more, brake, fold)).toBe(true)
      expect(passes(less, brake, fold)).toBe(false)
    }
    expect(cut).toBeGreaterThan(0)
  })

  test('corner with pockets: the lip of the pocket against the nose, by the formula of its slope', () => {
    const { reasons } = planSection(
      request(knownSection('corner with pockets'), anyHemOrder(DEMO_BRAKE.upOnly)),
    )
    // The nose runs from (-0.75, 0) to (-5, 2), opened by e up and back; the pocket's end lies at
    // y 1.25, c away from it. Unshortened it would reach to x = -4 + 0.75.
    const c = 0.012 + 0.02
    const e = c + 0.001
    const nose = -0.75 - e - (1.25 - e) * (4.25 / 2)
    const reach = nose - c * (Math.hypot(4.25, 2) / 2)
    expect(reasons[1]?.overlap).toBeCloseTo(-4 + 0.75 - reach, 7)
  })
})

describe('too deep for the throat', () => {
  test.each([
    ['W valley', 2.75],
    ['coping', 1.5],
  ])('%s on the site brake, by what is beyond it', (name, overlap) => {
    const brake = anyHemOrder(DEMO_BRAKE.site)
    const of = knownSection(name)
    const { reasons } = planSection(request(of, brake))
    expect(reasons.map(({ code, bend, edge }) => [code, bend, edge])).toEqual([
      ['throat', 'hemA', 'B'],
      ['throat', 'hemB', 'A'],
    ])
    for (const reason of reasons) {
      expect(reason.overlap).toBeCloseTo(overlap, 7)
      expect(reason.contact).toBeNull()
    }
    // Cut off the last leg, which shortens a flat rear by as much.
    const ground = searchGroundOf(request(of, brake))
    const [hem] = ground.piece.bends
    const fold = hem && findBlockedFold(ground, 0, hem, { below: Infinity })
    if (fold === undefined) throw new Error('The hem is not blocked')
    const last = of.legs.length - 1
    const cutLast = (by: number) => ({ ...of, legs: of.legs.with(last, (of.legs[last] ?? 0) - by) })
    expect(passes(cutLast(overlap + 1e-4), brake, fold)).toBe(true)
    expect(passes(cutLast(overlap - 1e-4), brake, fold)).toBe(false)
  })
})

describe('an overlap', () => {
  test('is asked for no further than it can win', () => {
    const ground = searchGroundOf(
      request(knownSection('corner with pockets'), anyHemOrder(DEMO_BRAKE.upOnly)),
    )
    const [nearest] = nearestDeadEnd(ground)
    const length = nearest?.overlap?.length
    if (nearest === undefined || length === undefined) throw new Error('No overlap')
    const setup = foldSetup(ground, nearest.made, nearest.bend, getOrientation(nearest.orientation))
    expect(findOverlap(setup, 'rearMeetsTool', length - 1e-4)).toBeNull()
    expect(findOverlap(setup, 'rearMeetsTool', length + 1e-4)?.length).toBeCloseTo(length, 7)
  })

  test('of a gauge out of reach is what lies beyond it; too near, no cut helps', () => {
    const brake = { ...DEMO_BRAKE.upOnly, gauge: { min: 2, max: 5 } }
    const wide = planSection(request(section([7, 7], [90]), brake))
    expect(wide.reasons).toMatchObject([{ code: 'gauge', bend: 1, found: 7, limit: 5, edge: 'B' }])
    expect(wide.reasons[0]?.overlap).toBeCloseTo(2, 7)
    const narrow = planSection(request(section([1, 1], [90]), brake))
    expect(narrow.reasons).toMatchObject([{ code: 'gauge', found: 1, limit: 2, overlap: null }])
  })

  test('of a wall that does not go under the clamp is what the clamp does not open', () => {
    // 5 1/2 in. stand up behind the bend, beyond the nose; the clamp opens 5 in.
    const ground = searchGroundOf(request(section([5.5, 14, 3], [90, 90]), DEMO_BRAKE.upOnly))
    const bend = ground.piece.bends[1]
    if (bend === undefined) throw new Error('No bend')
    const setup = foldSetup(ground, 0b01, bend, { leftUp: true, aBack: true })
    for (const check of ['cannotLoad', 'trapped'] as const) {
      const overlap = findOverlap(setup, check)
      if (overlap === null) throw new Error('No overlap')
      const { place, length } = overlap
      expect(place).toBe('rear')
      expect(length).toBeCloseTo(0.5, 7)
      const { find } = foldTest(check)
      expect(find(cutSetup(setup, place, length + 1e-4))).toBeUndefined()
      expect(find(cutSetup(setup, place, length - 1e-4))).toBeDefined()
    }
  })
})
