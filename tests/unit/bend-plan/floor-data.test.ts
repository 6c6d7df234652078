import { describe, expect, test } from 'vitest'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { planBends } from '#shared/bend-plan/planner'
import { foldedSection } from '#shared/strip/folded-section'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Fold } from '#shared/strip/strip.schema'
import { withFloorData } from '#shared/bend-plan/floor-data'
import type { PlanStep } from '#shared/bend-plan/plan.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { STEEL_24, hem, request, section } from '../../support/bend-plan-cases'

const T = STEEL_24.thickness
const { upOnly, upAndDown, site } = DEMO_BRAKE

const profile = (legs: number[], turns: number[], rest: Partial<Profile> = {}): Profile => ({
  version: 1,
  legs,
  bends: turns.map((turn) => ({ turn })),
  hemA: null,
  hemB: null,
  colorSide: 'left',
  ...rest,
})

const stepsOf = (of: Profile, brake: Brake) => planProfile(of, STEEL_24, brake, 120).steps
const plain: Brake = { ...upOnly, lineOffset: undefined, scale: undefined, hemsFirst: false }

/** The settings of a sequence as given: each fold with the edge that lies at the back. */
const settings = (of: Profile, folds: readonly (readonly [Fold, 'A' | 'B'])[]) => {
  const plan = planProfile(profile([4, 6], [90]), STEEL_24, plain, 120)
  const [step] = plan.steps
  if (step === undefined) throw new Error('The plan has a step.')
  const steps = folds.map(([bend, back], i): PlanStep => ({
    ...step,
    bend,
    aBack: back === 'A',
    restsOn: i === 0 ? 'rawEdge' : 'formedFace',
  }))
  return withFloorData({ ...plan, steps }, of, STEEL_24, plain).steps.map(
    ({ gaugeSetting }) => gaugeSetting,
  )
}

describe('gauge setting', () => {
  test('with flat sheet behind, from the edge at the back to the near border of the bend zone', () => {
    const square = profile([4, 6], [90])
    const [step] = stepsOf(square, plain)
    const strip = flatStrip(square, STEEL_24)
    expect(step).toMatchObject({ aBack: false, restsOn: 'rawEdge' })
    expect(step?.gaugeSetting).toBe(strip.stripWidth - (strip.creases[0]?.to ?? NaN))
    // By hand: the outside dimension less its set-back, (R + T) tan 45.
    expect(step?.gaugeSetting).toBeCloseTo(6 - (STEEL_24.insideRadius + T), 12)
  })

  test('the line offset is added', () => {
    const square = profile([4, 6], [90])
    const [before] = stepsOf(square, plain)
    const [after] = stepsOf(square, { ...plain, lineOffset: 0.05 })
    expect((after?.gaugeSetting ?? NaN) - (before?.gaugeSetting ?? NaN)).toBeCloseTo(0.05, 12)
  })

  test('on a closed hem, to the outside of its fold', () => {
    const hemA = { style: 'closed', length: 0.5, turn: 1 } as const
    const [, last] = settings(profile([4, 2], [90], { hemA }), [
      ['hemA', 'B'],
      [1, 'A'],
    ])
    // The leg is measured to the outside of the hem already.
    expect(last).toBeCloseTo(4 - (STEEL_24.insideRadius + T), 5)
  })

  test('on a formed face, to its outside, whichever edge is at the back', () => {
    const tray = profile([0.4, 5, 3], [90, 90])
    const outside = 5 - (STEEL_24.insideRadius + T)
    const gauged = [1, 2].map(
      (last) =>
        settings(
          tray,
          last === 2
            ? [
                [1, 'B'],
                [2, 'A'],
              ]
            : [
                [2, 'A'],
                [1, 'B'],
              ],
        )[1],
    )
    gauged.forEach((setting) => {
      expect(setting).toBeCloseTo(outside, 5)
    })
  })

  test('a face bent over 90 is met at the roundest point of its bend, as the finished section shows', () => {
    const beak = profile([0.45, 5, 3], [120, 60])
    const [, last] = settings(beak, [
      [1, 'B'],
      [2, 'A'],
    ])
    const folded = foldedSection(beak, STEEL_24)
    const leg = folded.legs[1]
    if (leg === undefined) throw new Error('The beak has a second leg.')
    const along = { x: leg.to.x - leg.from.x, y: leg.to.y - leg.from.y }
    const length = Math.hypot(along.x, along.y)
    const behind = folded.outline.map(
      ({ x, y }) => ((leg.to.x - x) * along.x + (leg.to.y - y) * along.y) / length,
    )
    expect(last).toBeCloseTo(Math.max(...behind), 4)
  })

  test('what is not bent yet lies flat behind with its allowance, out of the stop where it rises', () => {
    const kicked = profile([1, 2, 3, 4], [30, 90, 45])
    const [, , last] = settings(kicked, [
      [2, 'B'],
      [1, 'B'],
      [3, 'A'],
    ])
    // Bend 2 stands up 90: the stop meets its outside, whatever is bent beyond.
    const setBack = (turn: number) => (STEEL_24.insideRadius + T) * Math.tan((turn * Math.PI) / 360)
    expect(last).toBeCloseTo(3 - setBack(45), 5)
    const [first] = settings(kicked, [[3, 'A']])
    expect(first).toBe(flatStrip(kicked, STEEL_24).creases[2]?.from)
  })

  test('of a bare section it is the model figure, and none without a gauge', () => {
    const [bare] = planBends(request(section([4, 6], [90]), upOnly)).steps
    expect(bare?.gaugeSetting).toBe(bare?.gauge)
    expect(stepsOf(profile([4, 6], [90]), site)[0]?.gaugeSetting).toBeNull()
  })
})

describe('angle on the scale', () => {
  const scaled = (reads: 'bend' | 'included', overbend: 'hand' | 'machine') =>
    planBends(
      request(section([4, 4], [90], { B: hem(1) }), { ...upOnly, scale: { reads, overbend } }),
    ).steps.map(({ scaleAngle }) => scaleAngle)

  test('degrees of bend or the included angle, overbent by hand or by the machine', () => {
    // Hem first: its angle is 135 either way; springback is 2 per 90.
    expect(scaled('bend', 'hand')).toEqual([135, 92])
    expect(scaled('bend', 'machine')).toEqual([135, 90])
    expect(scaled('included', 'hand')).toEqual([45, 88])
    expect(scaled('included', 'machine')).toEqual([45, 90])
  })
})

describe('seconds', () => {
  const speeds = { load: 1000, hit: 100, roll: 10, endForEnd: 20, both: 30, gaugeMove: 1 }
  const plan = planBends(
    request(section([4, 4], [90], { B: hem(1) }), { ...upOnly, gauge: null, speeds }),
  )

  test('load, two hits of a hem, the move before the next hit', () => {
    expect(plan.steps.map(({ move, seconds }) => [move, seconds])).toEqual([
      ['load', 1200],
      ['none', 100],
    ])
    expect(plan.seconds).toBe(1300)
  })

  test('the gauge moves where its setting changes, and back before the next piece', () => {
    const legs = section([2, 4, 3], [90, 90])
    const { steps } = planBends(request(legs, { ...upAndDown, speeds }))
    expect(new Set(steps.map(({ gauge }) => gauge)).size).toBe(2)
    expect(steps.map(({ seconds }) => (seconds ?? NaN) % 10)).toEqual([1, 1])
    const same = planBends(request(section([2, 4, 2], [90, 90]), { ...upAndDown, speeds }))
    const moved = same.steps.map(({ gauge, seconds }) => [gauge, (seconds ?? NaN) % 10])
    expect(new Set(moved.map(([gauge]) => gauge)).size).toBe(moved[0]?.[1] === 1 ? 2 : 1)
  })

  test('without speeds none are told', () => {
    const quiet = planBends(request(section([4, 4], [90]), { ...upOnly, speeds: undefined }))
    expect([quiet.seconds, quiet.steps[0]?.seconds]).toEqual([null, null])
  })
})

describe('a brake as data', () => {
  test('needs none of it', () => {
    const { speeds, hours, scale, lineOffset, ...bare } = upOnly
    expect([speeds, hours, scale, lineOffset]).not.toContain(undefined)
    expect(brakeSchema.safeParse(bare).success).toBe(true)
  })

  test('hours are of the clock and end after they begin', () => {
    const opens = (from: string, to: string) =>
      brakeSchema.safeParse({ ...upOnly, hours: [{ days: ['mon'], from, to }] }).success
    expect(opens('06:30', '15:00')).toBe(true)
    expect(opens('15:00', '06:30')).toBe(false)
    expect(opens('6:30', '25:00')).toBe(false)
  })
})
