import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DEMO_STOCKS } from '#seeds/demo/stocks'
import { includedFromRoof, resolveFollows } from '#shared/profile/follows'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import { profileSchema, type Profile } from '#shared/profile/profile.schema'
import {
  findStarter,
  findStarterRefusal,
  getStarter,
  STARTER_KEYS,
  starterHeading,
  STARTER_PITCH,
  starterProfile,
  STARTERS,
  type Starter,
  type StarterKey,
  type StarterParameters,
} from '#shared/profile/starters'
import { ANY_PITCH, STARTER_KINDS, STARTER_PARAMETER_KEYS } from '#shared/profile/starters/starter'
import { stockLimits } from '#shared/profile/stock-limits'
import { flatStrip } from '#shared/strip/flat-strip'
import { includedAngle, pitchAngle } from '#shared/units/angle'
import en from '../../../src/locales/en/starters.json'
import es from '../../../src/locales/es/starters.json'
import { STEEL } from '../../support/arbitrary-profile'

const stocks = Object.entries(DEMO_STOCKS).map(([name, row]) => ({
  name,
  sheet: {
    metal: row.metal,
    thickness: row.thickness,
    insideRadius: row.inside_radius,
    kFactor: row.k_factor,
  },
  widestStrip: row.widest_strip,
  painted: row.painted,
  paintTBend: row.paint_t_bend,
  alloy: row.alloy,
}))

/** Every parameter anywhere in its range, its bounds among them, and any pitch it is meant for. */
const madeOf = ({ key, parameters, pitch }: Starter) => {
  const within = ({ least, most }: { least: number; most: number }) =>
    fc.oneof(fc.double({ min: least, max: most, noNaN: true }), fc.constantFrom(least, most))
  return fc
    .record({
      given: fc.record(
        Object.fromEntries(parameters.map((parameter) => [parameter.key, within(parameter)])),
        { requiredKeys: [] },
      ),
      rise: within(pitch ?? ANY_PITCH),
    })
    .map(({ given, rise }): { given: StarterParameters; rise: number; key: StarterKey } => ({
      given,
      rise,
      key,
    }))
}

describe('starter profiles', () => {
  it('are sixteen, one for each key', () => {
    expect(new Set(STARTERS.map(({ key }) => key))).toEqual(new Set(STARTER_KEYS))
    expect(STARTERS).toHaveLength(16)
  })

  it.each(STARTERS)('$key is of the shape that is stored', ({ key, profile, kind }) => {
    expect(profileSchema.parse(profile)).toEqual(profile)
    expect(starterProfile(key, {}, STARTER_PITCH)).toEqual(profile)
    expect(STARTER_KINDS).toContain(kind)
  })

  it.each(STARTERS)('$key has no fault at all in 24 gauge steel', ({ profile }) => {
    expect(profileProblems(profile, STEEL)).toEqual([])
  })

  it('have a name and a description in both languages, and so has what is set of them', () => {
    for (const texts of [en, es]) {
      for (const key of STARTER_KEYS) {
        expect(texts[key].name).not.toBe('')
        expect(texts[key].about).not.toBe('')
      }
      for (const kind of STARTER_KINDS) expect(texts.kind[kind]).not.toBe('')
      for (const parameter of STARTER_PARAMETER_KEYS)
        expect(texts.parameter[parameter]).toBeTruthy()
    }
  })

  it('are found by key', () => {
    expect(getStarter('ridge').kind).toBe('ridge')
    expect(findStarter('zClosure')?.kind).toBe('closure')
    expect(findStarter('nothing')).toBeUndefined()
  })
})

describe('a starter made to a roof', () => {
  it.each(STARTERS)(
    '$key can be made of every stock, whatever is set within its range',
    (starter) => {
      fc.assert(
        fc.property(madeOf(starter), ({ key, given, rise }) => {
          const profile = starterProfile(key, given, rise)
          for (const stock of stocks) {
            const problems = profileProblems(profile, stock.sheet, stockLimits(stock))
            expect(hasErrors(problems), `${stock.name}: ${JSON.stringify(problems)}`).toBe(false)
          }
        }),
      )
    },
  )

  it.each(STARTERS.filter(({ key }) => key !== 'transition'))(
    '$key stays tied: the pitch of another job gives what that job would have been given',
    (starter) => {
      fc.assert(
        fc.property(madeOf(starter), madeOf(starter), ({ key, given, rise }, { rise: other }) => {
          const moved = resolveFollows(starterProfile(key, given, rise), other)
          expect(moved).toEqual(starterProfile(key, given, other))
        }),
      )
    },
  )

  it.each(STARTERS)('$key has every parameter at work', (starter) => {
    for (const { key, least, most } of starter.parameters) {
      expect(starterProfile(starter.key, { [key]: least }, 6)).not.toEqual(
        starterProfile(starter.key, { [key]: most }, 6),
      )
    }
  })

  it.each(STARTERS)('$key follows the pitch exactly where it says so', ({ key, pitch }) => {
    const flat = starterProfile(key, {}, 3)
    const steep = starterProfile(key, {}, 9)
    expect(JSON.stringify(flat) !== JSON.stringify(steep)).toBe(pitch !== null)
  })

  it('is as wide and as high as it was said', () => {
    expect(starterProfile('headwall', { wallHeight: 8, apronWidth: 6 }, 6).legs).toEqual([
      0.75, 6, 8,
    ])
    expect(starterProfile('zClosure', { ribHeight: 1.5 }, 6).legs).toEqual([1.25, 1.5, 1.25])
    expect(starterProfile('coping', { wallWidth: 8, faceWidth: 3 }, 6).legs).toEqual([
      0.75, 3, 8, 2.5, 0.75,
    ])
  })

  it('bends a W valley over both wings as far as a valley without a rib', () => {
    const sum = (profile: Profile) => profile.bends.reduce((total, { turn }) => total + turn, 0)
    for (const rise of [0.25, 4, 6, 12, 24]) {
      expect(sum(starterProfile('wValley', {}, rise))).toBeCloseTo(
        sum(starterProfile('valley', {}, rise)),
        9,
      )
    }
  })

  it('opens a transition by the difference of its two slopes', () => {
    const { bends } = starterProfile('transition', { steeperBy: 6 }, 4)
    const second = bends[1]?.follows?.second
    expect(second).toBe(pitchAngle(10))
    expect(180 - includedAngle(bends[1]?.turn ?? 0)).toBeCloseTo(pitchAngle(10) - pitchAngle(4), 9)
    expect(
      includedFromRoof({ rule: 'transition', pitch: 'job', second }, pitchAngle(4)),
    ).toBeCloseTo(includedAngle(bends[1]?.turn ?? 0), 9)
  })

  it('gives a hat at least the height that was asked for, in sides a tape shows', () => {
    const heights = fc.double({ min: 0.75, max: 3, noNaN: true })
    fc.assert(
      fc.property(heights, (ribHeight) => {
        const side = starterProfile('hat', { ribHeight }, null).legs[1] ?? 0
        const height = side * Math.sin(Math.PI / 3)
        expect(height).toBeGreaterThan(ribHeight - 1e-9)
        expect(height).toBeLessThan(ribHeight + 1 / 16)
        expect(side * 16).toBe(Math.round(side * 16))
      }),
    )
  })

  it('shows its color where it is seen: on the outside of a gutter, on the weather side elsewhere', () => {
    const sides = STARTERS.filter(({ profile }) => profile.colorSide !== 'left')
    expect(sides.map(({ key }) => key)).toEqual(['boxGutter'])
    expect(flatStrip(getStarter('boxGutter').profile, STEEL).girth).toBe(16.25)
  })
})

describe('a starter as it lies in place', () => {
  /** Directions of its legs from A to B, degrees counter-clockwise from the right. */
  const directions = (key: StarterKey, rise: number): number[] => {
    const profile = starterProfile(key, {}, rise)
    const turns = [starterHeading(key, profile, rise), ...profile.bends.map(({ turn }) => turn)]
    return turns.map((_, leg) => {
      const sum = turns.slice(0, leg + 1).reduce((total, turn) => total + turn, 0)
      const wrapped = ((((sum + 180) % 360) + 360) % 360) - 180
      return Math.round(wrapped * 1e6) / 1e6
    })
  }
  const a = Math.round(pitchAngle(6) * 1e6) / 1e6
  const v =
    Math.round(
      (180 - (includedFromRoof({ rule: 'valley', pitch: 'job' }, pitchAngle(6)) ?? 0)) * 5e5,
    ) / 1e6

  it.each<[StarterKey, number[]]>([
    ['eaveDrip', [-a, -90, -60]],
    ['gableRake', [0, -90, -50]],
    ['boxGutter', [-180, -90, 0, 90]],
    ['ridge', [a + 30, a, -a, -a - 30]],
    ['highSidePeak', [a, -90, -50]],
    ['transition', [a + 20, a, Math.round(pitchAngle(10) * 1e6) / 1e6]],
    ['valley', [-v, v]],
    ['wValley', [-v, 45, -45, v]],
    ['headwall', [a + 20, a, 90]],
    ['sidewall', [0, 90]],
    ['coping', [45, 90, 0, -90, -45]],
    ['insideCorner', [-45, 45]],
    ['outsideCorner', [45, -45]],
    ['zClosure', [0, 90, 0]],
    ['jTrim', [-90, -180, 90]],
    ['hat', [0, 60, 0, -60, 0]],
  ])('%s at 6 in 12', (key, expected) => {
    directions(key, 6).forEach((direction, leg) => {
      expect(direction).toBeCloseTo(expected[leg] ?? NaN, 4)
    })
  })
})

describe('what is set of a starter', () => {
  const [face] = getStarter('eaveDrip').parameters

  it('is refused out of its bounds, naming parameter and range', () => {
    expect(() => starterProfile('eaveDrip', { faceWidth: 9 }, 6)).toThrow(
      new RangeError('faceWidth must be from 1.5 to 8 inches, not 9.'),
    )
    expect(() => starterProfile('ridge', { wallHeight: 3 }, 6)).toThrow(
      new RangeError('The starter ridge has no parameter wallHeight.'),
    )
  })

  it.each([
    [1.5, null],
    [8, null],
    [1.4, 'belowLeast'],
    [8.1, 'aboveMost'],
    [Number.NaN, 'notFinite'],
    [Number.POSITIVE_INFINITY, 'notFinite'],
  ])('%s: %s', (value, reason) => {
    if (!face) throw new Error('The eave drip has a parameter.')
    expect(findStarterRefusal(face, value)?.reason ?? null).toBe(reason)
  })

  it('has a default within its own bounds', () => {
    for (const { parameters } of STARTERS) {
      for (const parameter of parameters) {
        expect(findStarterRefusal(parameter, parameter.default)).toBeNull()
      }
    }
  })
})
