import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { answerKernel } from '#server/kernel/answer'

const line = { pieceLength: 126, lap: 4, mode: 'full', minimum: 24 }

const ask = (input: unknown) => answerKernel('roof-run', JSON.stringify(input))

const errorsOf = (output: unknown) =>
  z
    .object({ error: z.array(z.object({ path: z.string() })) })
    .parse(output)
    .error.map(({ path }) => path)

describe('kernel roof-run', () => {
  it('answers pieces and laps, exact, and what to read at the shear', () => {
    const { exit, output } = ask({ ...line, length: 250.01 })
    expect(exit).toBe(0)
    expect(output).toMatchObject({
      pieces: [
        { length: 126, count: 1 },
        { length: 66.005, count: 2 },
      ],
      laps: [122, 184.005],
      rounded: {
        pieces: [
          { length: 126, count: 1 },
          { length: 66, count: 2 },
        ],
      },
      notes: [],
    })
    expect(output).not.toHaveProperty('movement')
  })

  it('takes a rake flat or under length', () => {
    const flat = ask({ ...line, planRun: 192, rise: 9 })
    expect(flat).toMatchObject({ exit: 0, output: { length: 240, laps: [122] } })
    expect(ask({ ...line, length: { planRun: 192, rise: 9 } })).toEqual(flat)
  })

  it('holds pieces over 24 in. unless told otherwise', () => {
    const { minimum: _, ...rest } = line
    expect(ask({ ...rest, length: 262 })).toEqual(ask({ ...line, length: 262 }))
    expect(ask({ ...line, minimum: 12, length: 262 })).toMatchObject({
      output: {
        pieces: [
          { length: 126, count: 2 },
          { length: 18, count: 1 },
        ],
      },
    })
  })

  it('tells the movement of the longest piece for a metal', () => {
    // Steel 12e-6 per degree C, 170 F.
    const { output } = ask({ ...line, length: 250, metal: 'steel' })
    const { movement } = z.object({ movement: z.number() }).parse(output)
    expect(movement).toBeCloseTo((126 * 12e-6 * 170) / 1.8, 12)
  })

  it('exits with 3 for a line without an answer', () => {
    expect(ask({ ...line, length: 250, lap: 20, pieceLength: 20, minimum: 0 })).toEqual({
      exit: 3,
      output: {
        problems: [
          {
            code: 'lapOverPiece',
            field: 'lap',
            found: 20,
            limit: 20,
            unit: 'inches',
            cure: 'shortenLap',
          },
        ],
      },
    })
  })

  it.each<[string, unknown, string[]]>([
    ['nothing', {}, ['pieceLength', 'lap', 'mode']],
    ['null', null, ['']],
    ['no length', line, ['length']],
    ['a length of nothing', { ...line, length: 0 }, ['length']],
    ['a length as text', { ...line, length: '20 ft' }, ['length']],
    ['length and rake', { ...line, length: 240, planRun: 100, rise: 6 }, ['length']],
    [
      'the rake twice',
      { ...line, length: { planRun: 100, rise: 6 }, planRun: 100, rise: 6 },
      ['length'],
    ],
    ['a rake without rise', { ...line, planRun: 100 }, ['length']],
    ['a rake with a negative rise', { ...line, length: { planRun: 100, rise: -1 } }, ['rise']],
    ['another mode', { ...line, length: 240, mode: 'best' }, ['mode']],
    ['a misspelt key', { ...line, length: 240, minimun: 30 }, ['']],
    ['no such metal', { ...line, length: 240, metal: 'tin' }, ['metal']],
  ])('exits with 2 for %s and names it', (_, input, paths) => {
    const { exit, output } = ask(input)
    expect(exit).toBe(2)
    expect(errorsOf(output)).toEqual(expect.arrayContaining(paths))
  })
})
