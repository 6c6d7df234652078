import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { closeEnds } from '#shared/ends/close-ends'
import type { EndLayout, StripPoint } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { endSchema, sideSchema } from '#shared/ends/end.schema'
import { foldedEnd } from '#shared/ends/folded-end'
import { layStrip } from '#shared/ends/lay-strip'
import { profileSchema } from '#shared/profile/profile.schema'
import { answerKernel } from '#server/kernel/answer'
import { endInput } from '#server/kernel/ends-input'
import { naiveArea } from '../../support/naive-polygon'

const CASES = new URL('../../cases/ends/', import.meta.url)

const stockSchema = z.strictObject({
  thickness: z.number(),
  insideRadius: z.number(),
  kFactor: z.number(),
})

/** A strip with two ends, as the shell verb takes it. */
const stripSchema = z.strictObject({
  profile: profileSchema,
  stock: stockSchema,
  pieceLength: z.number(),
  ends: z.tuple([endInput, endInput]),
})

/** Two pieces that meet in a corner. */
const pieceSchema = z.strictObject({ profile: profileSchema, end: endSchema, side: sideSchema })
const cornerSchema = z.strictObject({ stock: stockSchema, a: pieceSchema, b: pieceSchema })

const bothEnds = <T extends z.ZodType>(value: T) =>
  z.strictObject({ left: value.optional(), right: value.optional() }).default({})

/** A corner of a polygon: along from the blank's left end, at from edge A. */
const pointSchema = z.tuple([z.number(), z.number()])

const expectedStripSchema = z.strictObject({
  source: z.string().min(1),
  note: z.string().optional(),
  blankLength: z.number(),
  within: z.number().positive(),
  marks: bothEnds(z.array(z.strictObject({ at: z.number(), along: z.number() }))),
  /** Of each leg as folded, degrees from square. */
  cutAngle: bothEnds(z.array(z.number())),
  tabs: bothEnds(z.array(z.strictObject({ leg: z.number(), polygon: z.array(pointSchema) }))),
  cutAways: bothEnds(z.array(z.array(pointSchema))),
  cutAwayArea: bothEnds(z.number()),
  slits: bothEnds(z.array(z.tuple([pointSchema, pointSchema]))),
  openings: bothEnds(
    z.array(z.strictObject({ edge: z.enum(['A', 'B']), length: z.number(), gap: z.number() })),
  ),
})

const expectedProblemsSchema = z.strictObject({
  source: z.string().min(1),
  note: z.string().optional(),
  problems: z.array(
    z.strictObject({
      code: z.string(),
      end: sideSchema,
      leg: z.number().nullable(),
      found: z.number(),
      limit: z.number(),
    }),
  ),
})

const expectedCornerSchema = z.strictObject({
  source: z.string().min(1),
  note: z.string(),
  within: z.number().positive(),
  closes: z.boolean(),
  a: z.array(z.strictObject({ leg: z.number(), closesOn: z.number().nullable(), gap: z.number() })),
})

const read = (folder: string, file: string): unknown =>
  JSON.parse(readFileSync(new URL(`${folder}/${file}`, CASES), 'utf8'))

const folders = readdirSync(CASES).toSorted()
const ofKind = (schema: z.ZodType) =>
  folders.filter((folder) => schema.safeParse(read(folder, 'expected.json')).success)

const strips = ofKind(expectedStripSchema)
const refused = ofKind(expectedProblemsSchema)
const corners = ofKind(expectedCornerSchema)

const points = (polygon: readonly StripPoint[]): number[] =>
  polygon.flatMap(({ along, at }) => [along, at])

const expectNear = (found: readonly number[], wanted: readonly number[], within: number): void => {
  expect(found).toHaveLength(wanted.length)
  found.forEach((value, index) => {
    expect(Math.abs(value - (wanted[index] ?? NaN))).toBeLessThanOrEqual(within)
  })
}

describe('cases of piece ends', () => {
  it('are each of one kind', () => {
    expect([...strips, ...refused, ...corners].toSorted()).toEqual(folders)
    expect(folders.length).toBeGreaterThanOrEqual(20)
  })

  it.each(strips)('%s', (folder) => {
    const input = stripSchema.parse(read(folder, 'input.json'))
    const expected = expectedStripSchema.parse(read(folder, 'expected.json'))
    const { within } = expected
    const { profile, stock: sheet, pieceLength } = input
    const [left, right] = input.ends
    const laid = layStrip({ profile, sheet, pieceLength, ends: { left, right, lowEnd: null } })
    if (!laid.ok) throw new Error(laid.problems.map(({ code }) => code).join())
    expectNear([laid.layout.blankLength], [expected.blankLength], within)

    const check = (side: Side, layout: EndLayout): void => {
      const marks = expected.marks[side]
      if (marks) {
        expectNear(
          layout.marks.flatMap(({ at, along }) => [at, along]),
          marks.flatMap(({ at, along }) => [at, along]),
          within,
        )
      }
      const angles = expected.cutAngle[side]
      if (angles) {
        const faces = foldedEnd({
          profile,
          sheet,
          end: side === 'left' ? left : right,
          side,
          stub: 1,
        })
        const cutAngles = faces.flatMap(({ of, cut: [from, to] }) =>
          typeof of === 'number'
            ? [Math.atan2(Math.abs(to.x - from.x), Math.hypot(to.y - from.y, to.z - from.z))]
            : [],
        )
        expectNear(
          cutAngles.map((angle) => (angle / Math.PI) * 180),
          angles,
          1e-9,
        )
      }
      const tabs = expected.tabs[side]
      if (tabs) {
        expect(layout.tabs.map(({ leg }) => leg)).toEqual(tabs.map(({ leg }) => leg))
        layout.tabs.forEach(({ polygon }, index) => {
          expectNear(points(polygon), tabs[index]?.polygon.flat() ?? [], within)
        })
      }
      const cutAways = expected.cutAways[side]
      if (cutAways) {
        expect(layout.cutAways).toHaveLength(cutAways.length)
        for (const wanted of cutAways) {
          const area = naiveArea(wanted.map(([along, at]) => ({ along, at })))
          const same = layout.cutAways.find((polygon) =>
            polygon.every((point) =>
              wanted.some(
                ([along, at]) => Math.hypot(along - point.along, at - point.at) <= within,
              ),
            ),
          )
          expect(naiveArea(same ?? [])).toBeCloseTo(area, 9)
        }
      }
      const area = expected.cutAwayArea[side]
      if (area !== undefined) {
        const found = layout.cutAways.reduce((sum, polygon) => sum + naiveArea(polygon), 0)
        expect(found).toBeCloseTo(area, 9)
      }
      const slits = expected.slits[side]
      if (slits) {
        expectNear(
          layout.slits.flatMap(({ from, to }) => points([from, to])),
          slits.flat(2),
          within,
        )
      }
      const openings = expected.openings[side]
      if (openings) expect(layout.openings).toEqual(openings)
    }
    check('left', laid.layout.left)
    check('right', laid.layout.right)
  })

  it.each(refused)('%s', (folder) => {
    const input = read(folder, 'input.json')
    const { problems } = expectedProblemsSchema.parse(read(folder, 'expected.json'))
    const { exit, output } = answerKernel('ends', JSON.stringify(input))
    expect(exit).toBe(3)
    expect(output).toEqual({
      problems: problems.map(({ found, limit, ...rest }): unknown => ({
        ...rest,
        found: expect.closeTo(found, 9) as unknown,
        limit,
      })),
    })
  })

  it.each(corners)('%s', (folder) => {
    const { stock: sheet, a, b } = cornerSchema.parse(read(folder, 'input.json'))
    const expected = expectedCornerSchema.parse(read(folder, 'expected.json'))
    const closed = closeEnds({ ...a, sheet }, { ...b, sheet })
    if (!closed.ok) throw new Error(closed.code)
    expect(closed.closes).toBe(expected.closes)
    expect(closed.a.map(({ leg, closesOn }) => ({ leg, closesOn }))).toEqual(
      expected.a.map(({ leg, closesOn }) => ({ leg, closesOn })),
    )
    expectNear(
      closed.a.map(({ gap }) => gap),
      expected.a.map(({ gap }) => gap),
      expected.within,
    )
  })
})
