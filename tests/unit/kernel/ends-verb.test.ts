import { spawnSync } from 'node:child_process'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { layStrip } from '#shared/ends/lay-strip'
import { flatStrip } from '#shared/strip/flat-strip'
import { answerKernel } from '#server/kernel/answer'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const profile = profileOf([4, 6], [-90])
const square = { kind: 'square' }
const common = { profile, stock: STEEL, pieceLength: 63 }

const ask = (input: unknown) => answerKernel('ends', JSON.stringify(input))

const endsOf = (output: unknown) =>
  z.looseObject({ ends: z.tuple([z.looseObject({}), z.looseObject({})]) }).parse(output).ends

const pathsOf = (output: unknown) =>
  z
    .object({ error: z.array(z.object({ path: z.string(), message: z.string().min(1) })) })
    .parse(output)
    .error.map(({ path }) => path)

describe('kernel ends', () => {
  it('answers the blank, its outline and creases, and both ends', () => {
    const corner = { slopeIn: 14, slopeOut: 0, plan: -90 }
    const right = { kind: 'miter', plane: { corner }, lay: 5, tabs: [{ leg: 2, length: 1 }] }
    const left = { kind: 'lap', side: 'under', length: 4 }
    const { exit, output } = ask({ ...common, ends: [left, right] })
    expect(exit).toBe(0)
    const laid = layStrip({
      profile,
      sheet: STEEL,
      pieceLength: 63,
      ends: {
        left: { kind: 'lap', side: 'under', length: 4, tabs: [] },
        right: {
          kind: 'miter',
          plane: { corner },
          lay: 5,
          legs: [],
          tabs: [{ leg: 2, length: 1 }],
        },
        lowEnd: null,
      },
    })
    if (!laid.ok) throw new Error('The piece cannot be laid out.')
    const { layout } = laid
    const endOf = ({ side, ...rest }: typeof layout.left) => ({
      end: side,
      ...rest,
      outlines: [layout.outline],
      marksRounded: rest.marks.map((mark) => ({
        ...mark,
        at: Math.round(mark.at * 16) / 16,
        along: Math.round(mark.along * 16) / 16,
      })),
    })
    expect(output).toEqual({
      ends: [endOf(layout.left), endOf(layout.right)],
      blankLength: layout.blankLength,
      stripWidth: layout.stripWidth,
      outline: layout.outline,
      creases: flatStrip(profile, STEEL).creases,
      problems: [],
    })
  })

  it('takes a tab for a square end with tabs, 1 in. unless its length is given', () => {
    const tab = { kind: 'tab', tabs: [{ leg: 2 }] }
    const { exit, output } = ask({ ...common, ends: [square, tab] })
    expect(exit).toBe(0)
    expect(output).toMatchObject({ blankLength: 64 })
    expect(endsOf(output)[1]).toMatchObject({ end: 'right', tabs: [{ leg: 2, length: 1 }] })
  })

  it('takes a lap of 4 in. and a lay of 0 where none is given', () => {
    const plane = { plumb: 20 }
    const short = ask({
      ...common,
      ends: [
        { kind: 'lap', side: 'under' },
        { kind: 'miter', plane },
      ],
    })
    const long = ask({
      ...common,
      ends: [
        { kind: 'lap', side: 'under', length: 4, tabs: [] },
        { kind: 'miter', plane, lay: 0, legs: [], tabs: [] },
      ],
    })
    expect(short).toEqual(long)
    expect(short.exit).toBe(0)
  })

  it('needs of the stock only thickness and inside radius', () => {
    const stock = { thickness: 0.024, insideRadius: 0.03, color: 'Kiln 4' }
    expect(ask({ ...common, stock, ends: [square, square] }).exit).toBe(0)
  })

  it('exits with 3 for an end that cannot be cut, with end, leg and values', () => {
    const { exit, output } = ask({
      ...common,
      ends: [
        { kind: 'miter', plane: { normal: [0, 1, 0] } },
        { kind: 'tab', tabs: [{ leg: 3, length: 1 }] },
      ],
    })
    expect(exit).toBe(3)
    expect(output).toEqual({
      problems: [
        { code: 'planeAlongPiece', end: 'left', leg: null, found: 0, limit: 1 },
        { code: 'noSuchLeg', end: 'right', leg: 3, found: 3, limit: 2 },
      ],
    })
  })

  it('exits with 3 for a profile that cannot be made, and says why', () => {
    const { exit, output } = ask({
      ...common,
      profile: profileOf([4, -6], [-90]),
      ends: [square, square],
    })
    expect(exit).toBe(3)
    expect(output).toMatchObject({ problems: [{ code: 'legNotPositive', leg: 2 }] })
  })

  it.each<[string, unknown, string[]]>([
    ['one end', { ...common, ends: [square] }, ['ends']],
    ['no ends', common, ['ends']],
    ['no piece length', { profile, stock: STEEL, ends: [square, square] }, ['pieceLength']],
    ['an unknown kind', { ...common, ends: [{ kind: 'fold' }, square] }, ['ends.0.kind']],
    ['a word for an end', { ...common, ends: ['square', square] }, ['ends.0']],
    ['a key too many', { ...common, ends: [square, { kind: 'square', lap: 4 }] }, ['ends.1']],
    [
      'a slope of 90',
      { ...common, ends: [{ kind: 'miter', plane: { plumb: 90 } }, square] },
      ['ends.0.plane.plumb'],
    ],
    ['a miter without a plane', { ...common, ends: [square, { kind: 'miter' }] }, ['ends.1.plane']],
    ['a lap without a side', { ...common, ends: [square, { kind: 'lap' }] }, ['ends.1.side']],
    [
      'a tab without a leg',
      { ...common, ends: [square, { kind: 'tab', tabs: [{}] }] },
      ['ends.1.tabs.0.leg'],
    ],
    [
      'text for a length',
      { ...common, ends: [square, { kind: 'tab', tabs: [{ leg: 1, length: '1' }] }] },
      ['ends.1.tabs.0.length'],
    ],
  ])('exits with 2 for %s and names it', (_, input, paths) => {
    const { exit, output } = ask(input)
    expect(exit).toBe(2)
    expect(pathsOf(output)).toEqual(paths)
  })

  it('answers the shell', () => {
    const run = spawnSync(process.execPath, ['--import', 'tsx', 'server/kernel/main.ts', 'ends'], {
      input: JSON.stringify({ ...common, ends: [square, square] }),
      encoding: 'utf8',
    })
    expect(run.status).toBe(0)
    expect(JSON.parse(run.stdout)).toMatchObject({ blankLength: 63 })
  })
})
