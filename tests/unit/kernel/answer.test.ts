import { spawnSync } from 'node:child_process'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { planSchema } from '#shared/bend-plan/plan.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { foldedSection } from '#shared/strip/folded-section'
import { sectionMeasures } from '#shared/strip/section-measures'
import { answerKernel } from '#server/kernel/answer'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const face = profileOf([3.5, 5.5, 0.75], [-90, 40], {
  hemB: { style: 'closed', length: 0.5, turn: -1 },
})

const ask = (verb: string, input: unknown) => answerKernel(verb, JSON.stringify(input))

const errorsOf = (output: unknown) =>
  z
    .object({ error: z.array(z.object({ path: z.string(), message: z.string() })) })
    .parse(output)
    .error.map(({ path }) => path)

describe('kernel strip', () => {
  it('answers girth, strip width, creases, rounded width, weight and the folded section', () => {
    const { exit, output } = ask('strip', { profile: face, stock: STEEL, pieceLength: 120 })
    const strip = flatStrip(face, STEEL)
    const folded = foldedSection(face, STEEL)
    expect(exit).toBe(0)
    expect(output).toEqual({
      ...strip,
      rounded: { stripWidth: 10.1875 },
      weight: strip.stripWidth * 120 * STEEL.thickness * STEEL.density,
      paintedArea: strip.stripWidth * 120,
      section: {
        outline: folded.outline,
        legs: folded.legs.map(({ leg, from, to }) => ({ leg, from, to })),
        ...sectionMeasures(folded),
      },
      problems: [],
    })
  })

  it('needs of the stock only thickness and inside radius; K is then the handbook value', () => {
    const { exit, output } = ask('strip', {
      profile: { legs: [3, 2], bends: [{ turn: 90 }] },
      stock: { thickness: 0.024, insideRadius: 0.03, color: 'Kiln 4' },
    })
    expect(exit).toBe(0)
    const strip = flatStrip(profileOf([3, 2], [90]), { ...STEEL, kFactor: 0.64 / (Math.PI / 2) })
    expect(output).toMatchObject({ stripWidth: strip.stripWidth })
    expect(output).not.toHaveProperty('weight')
  })

  it('exits with 3 for what cannot be made, the cause named', () => {
    const { exit, output } = ask('strip', { profile: profileOf([40, 30], [90]), stock: STEEL })
    expect(exit).toBe(3)
    expect(output).toMatchObject({ problems: [{ code: 'stripTooWide', limit: 60 }] })
  })

  it('gives no figures for values that mean nothing', () => {
    const { exit, output } = ask('strip', { profile: profileOf([3, -2], [90]), stock: STEEL })
    expect(exit).toBe(3)
    expect(output).toMatchObject({ problems: [{ code: 'legNotPositive', leg: 2, found: -2 }] })
    expect(output).not.toHaveProperty('stripWidth')
  })

  it('holds the width against the stock where the stock says it', () => {
    const stock = { ...STEEL, widestStrip: 8 }
    expect(ask('strip', { profile: face, stock })).toMatchObject({
      exit: 3,
      output: { problems: [{ code: 'stripWiderThanStock', limit: 8 }] },
    })
  })

  it('warns of radii below what alloy and paint of the stock bear', () => {
    // 3003-H16 takes a whole thickness at 1/32 in.; a paint of 2T likewise.
    const stock = { ...STEEL, metal: 'aluminum', thickness: 1 / 32, alloy: '3003-H16' }
    expect(ask('strip', { profile: face, stock: { ...stock, paintTBend: 2 } })).toMatchObject({
      exit: 0,
      output: {
        problems: [
          { code: 'radiusBelowMetal', found: 0.03, limit: 1 / 32, severity: 'warning' },
          { code: 'radiusBelowPaint', bend: 1, limit: 1 / 32 },
          { code: 'hemBelowPaint', hem: 'B', found: 0, limit: 1 / 32 },
        ],
      },
    })
    expect(
      ask('plan', { profile: face, stock, brake: 'upAndDown', pieceLength: 120 }),
    ).toMatchObject({ output: { problems: [{ code: 'radiusBelowMetal' }] } })
  })

  it.each<[string, unknown, string[]]>([
    ['nothing', {}, ['profile', 'stock']],
    ['null', null, ['']],
    ['a key too many', { profile: { ...face, gauge: 24 }, stock: STEEL }, ['profile']],
    [
      'text for a leg',
      { profile: { ...face, legs: ['4', 1, 1] }, stock: STEEL },
      ['profile.legs.0'],
    ],
    ['a bend too few', { profile: { ...face, bends: [] }, stock: STEEL }, ['profile.bends']],
    ['another version', { profile: { ...face, version: 2 }, stock: STEEL }, ['profile.version']],
    ['no thickness', { profile: face, stock: { insideRadius: 0 } }, ['stock.thickness']],
    ['no length', { profile: face, stock: STEEL, pieceLength: 0 }, ['pieceLength']],
  ])('exits with 2 for %s and names it', (_, input, paths) => {
    const { exit, output } = ask('strip', input)
    expect(exit).toBe(2)
    expect(errorsOf(output)).toEqual(paths)
  })
})

describe('kernel plan', () => {
  const common = { stock: STEEL, brake: 'upAndDown', pieceLength: 120 }

  it('plans a profile on a demo brake', () => {
    const { exit, output } = ask('plan', { ...common, profile: face })
    expect(exit).toBe(0)
    const plan = planSchema.parse(z.looseObject({}).transform(withoutProblems).parse(output))
    expect(plan).toMatchObject({ feasible: true, proven: true })
    expect(plan.steps).toHaveLength(3)
  })

  it('plans a section as it stands, on a brake given as data with keys of its own', () => {
    const section = { legs: [4, 4, 0.75], turns: [-90, 45], hemB: { lip: 0.5, gap: 0, turn: -1 } }
    const stock = { thickness: 0.024, density: 0.284, springbackPer90: 2 }
    const byName = ask('plan', { ...common, stock, section })
    expect(byName.exit).toBe(0)
    expect(byName.output).toMatchObject({ section: { legs: [4, 4, 0.75], hemA: null } })
    expect(planSchema.parse(byName.output).cost).not.toBeNull()
  })

  it('exits with 3 where the piece is longer than the brake, with the reason', () => {
    const { exit, output } = ask('plan', { ...common, profile: face, pieceLength: 200 })
    expect(exit).toBe(3)
    expect(output).toMatchObject({ feasible: false, reasons: [{ code: 'length', found: 200 }] })
  })

  it('exits with 3 for a profile that cannot be folded at all', () => {
    const { exit, output } = ask('plan', { ...common, profile: profileOf([2, 0.05, 2], [90, -90]) })
    expect(exit).toBe(3)
    expect(output).toMatchObject({
      feasible: false,
      problems: [{ code: 'legEatenByBends', leg: 2 }],
    })
  })

  const section = { legs: [2, 2], turns: [90] }

  it.each<[string, unknown, string[]]>([
    ['both', { ...common, profile: face, section }, ['']],
    ['neither', common, ['profile']],
    ['no such brake', { ...common, section, brake: 'Anvil' }, ['brake']],
    ['a brake without a length', { ...common, section, brake: {} }, ['brake.length']],
    ['no density', { ...common, section, stock: { thickness: 0.024 } }, ['stock.density']],
    ['a turn too few', { ...common, section: { legs: [2, 2], turns: [] } }, ['section.turns']],
    ['a turn of 180', { ...common, section: { legs: [2, 2], turns: [180] } }, ['section.turns.0']],
    ['a leg of zero', { ...common, section: { legs: [0, 2], turns: [90] } }, ['section.legs.0']],
  ])('exits with 2 for %s and names it', (_, input, paths) => {
    const { exit, output } = ask('plan', input)
    expect(exit).toBe(2)
    expect(errorsOf(output)).toEqual(expect.arrayContaining(paths))
  })
})

describe('kernel', () => {
  it('answers an array with an array and exits with the worst of it', () => {
    const good = { profile: face, stock: STEEL }
    const wide = { profile: profileOf([40, 30], [90]), stock: STEEL }
    expect(ask('strip', [good, good]).exit).toBe(0)
    expect(ask('strip', [good, wide]).exit).toBe(3)
    const all = ask('strip', [good, wide, {}])
    expect(all.exit).toBe(2)
    expect(all.output).toMatchObject([
      { problems: [] },
      { problems: [{ code: 'stripTooWide' }] },
      { error: [{ path: 'profile' }, { path: 'stock' }] },
    ])
  })

  it.each([undefined, 'fold', 'toString'])('refuses the verb %s', (verb) => {
    const { exit, output } = answerKernel(verb, '{}')
    expect(exit).toBe(2)
    expect(errorsOf(output)).toEqual(['verb'])
  })

  it.each(['', '{', 'legs: 4'])('refuses %j, which is not JSON', (text) => {
    const { exit, output } = answerKernel('strip', text)
    expect(exit).toBe(2)
    expect(errorsOf(output)).toEqual([''])
  })

  it('reads standard input and gives its exit code to the shell', () => {
    const run = (input: unknown) =>
      spawnSync(process.execPath, ['--import', 'tsx', 'server/kernel/main.ts', 'strip'], {
        input: JSON.stringify(input),
        encoding: 'utf8',
      })
    const good = run({ profile: face, stock: STEEL })
    expect(good.status).toBe(0)
    expect(JSON.parse(good.stdout)).toMatchObject({ girth: 10.25 })
    expect(run({ profile: profileOf([70]), stock: STEEL }).status).toBe(3)
    expect(run({}).status).toBe(2)
  })
})

function withoutProblems(plan: Record<string, unknown>): Record<string, unknown> {
  const { problems: _, ...rest } = plan
  return rest
}
