import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { profileSchema } from '#shared/profile/profile.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { foldSchema } from '#shared/strip/strip.schema'

const CASES = new URL('../../cases/strip/', import.meta.url)

const inputSchema = z.strictObject({
  profile: profileSchema,
  stock: z.strictObject({
    thickness: z.number(),
    insideRadius: z.number(),
    kFactor: z.number(),
  }),
})

const expectedSchema = z.strictObject({
  source: z.string().min(1),
  note: z.string().optional(),
  girth: z.number().optional(),
  stripWidth: z.number(),
  /** How far the width may be from the one named: the source's own rounding. */
  within: z.number().positive(),
  creases: z
    .array(z.strictObject({ fold: foldSchema, at: z.number(), turn: z.number(), zone: z.number() }))
    .optional(),
})

const read = (folder: string, file: string): unknown =>
  JSON.parse(readFileSync(new URL(`${folder}/${file}`, CASES), 'utf8'))

const folders = readdirSync(CASES).toSorted()

describe('strip cases', () => {
  it('are there', () => {
    expect(folders.length).toBeGreaterThanOrEqual(12)
  })

  it.each(folders)('%s', (folder) => {
    const { profile, stock } = inputSchema.parse(read(folder, 'input.json'))
    const expected = expectedSchema.parse(read(folder, 'expected.json'))
    const strip = flatStrip(profile, stock)

    expect(Math.abs(strip.stripWidth - expected.stripWidth)).toBeLessThanOrEqual(expected.within)
    if (expected.girth !== undefined) expect(strip.girth).toBeCloseTo(expected.girth, 12)
    if (!expected.creases) return
    expect(strip.creases.map(({ fold, turn }) => ({ fold, turn }))).toEqual(
      expected.creases.map(({ fold, turn }) => ({ fold, turn })),
    )
    strip.creases.forEach((crease, index) => {
      const wanted = expected.creases?.[index]
      expect(crease.at).toBeCloseTo(wanted?.at ?? NaN, 9)
      expect(crease.to - crease.from).toBeCloseTo(wanted?.zone ?? NaN, 9)
    })
  })
})
