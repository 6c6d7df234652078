import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import { ROOF_LINE_NOTES } from '#shared/roof-line/roof-line-problem'

const CASES = new URL('../../cases/roof-line/', import.meta.url)

const expectedSchema = z.strictObject({
  source: z.string().min(1),
  /** How far lengths and positions may be from the ones named: the source's own rounding. */
  within: z.number().positive().default(1e-9),
  length: z.number().optional(),
  /** Length and count. */
  pieces: z.array(z.tuple([z.number(), z.int()])),
  laps: z.array(z.number()),
  notes: z.array(z.enum(ROOF_LINE_NOTES)).default([]),
})

const read = (folder: string, file: string): unknown =>
  JSON.parse(readFileSync(new URL(`${folder}/${file}`, CASES), 'utf8'))

const folders = readdirSync(CASES).toSorted()

describe('roof line cases', () => {
  it('are there', () => {
    expect(folders.length).toBeGreaterThanOrEqual(12)
  })

  it.each(folders)('%s', (folder) => {
    const expected = expectedSchema.parse(read(folder, 'expected.json'))
    const found = roofPieces(roofLineSchema.parse(read(folder, 'input.json')))
    if (!found.ok) throw new Error(JSON.stringify(found.problems))
    const { pieces, laps, length, notes } = found.answer
    const near = (values: number[], wanted: number[]) => {
      expect(values).toHaveLength(wanted.length)
      values.forEach((value, index) => {
        expect(Math.abs(value - (wanted[index] ?? NaN))).toBeLessThanOrEqual(expected.within)
      })
    }

    near(
      pieces.map((piece) => piece.length),
      expected.pieces.map(([wanted]) => wanted),
    )
    expect(pieces.map(({ count }) => count)).toEqual(expected.pieces.map(([, count]) => count))
    near([...laps], expected.laps)
    if (expected.length !== undefined) near([length], [expected.length])
    expect(notes).toEqual(expected.notes)
  })
})
