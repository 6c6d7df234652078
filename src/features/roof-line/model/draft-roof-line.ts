import { z } from 'zod'
import { roofLineSchema, type RoofLine } from '#shared/roof-line/roof-line.schema'

const measure = z.number().nullable()

/** A line on the roof while it is written: what is not filled in yet is null. Inches; rise in 12. */
export const draftRoofLineSchema = z.strictObject({
  /** The length as it lies on the roof, or the level run under a rake. */
  by: z.enum(['length', 'planRun']),
  length: measure,
  planRun: measure,
  rise: measure,
  pieceLength: measure,
  lap: measure,
  mode: z.enum(['full', 'equal']),
  minimum: measure,
  /** The length was measured to the tips of the miters, so their points are not added. */
  toTips: z.boolean(),
  /** Ends inside the line are dressed as laps; square otherwise. */
  dressLaps: z.boolean(),
})

export type DraftRoofLine = z.infer<typeof draftRoofLineSchema>

/** What a lap and a least piece begin with, inches. Common practice, no source. */
const USUAL = { lap: 4, minimum: 24 } as const

export const newRoofLine = (rise: number, pieceLength: number): DraftRoofLine => ({
  by: 'length',
  length: null,
  planRun: null,
  rise,
  pieceLength,
  ...USUAL,
  mode: 'full',
  toTips: false,
  dressLaps: false,
})

/** What the ends of the whole line add to it, from its low or left end to the other, inches. */
export interface LineExtras {
  readonly first: number
  readonly last: number
}

/** The line as the kernel takes it; null while a measure is missing or out of its bounds. */
export function completeRoofLine(draft: DraftRoofLine, extras: LineExtras): RoofLine | null {
  const { by, length, planRun, rise, pieceLength, lap, mode, minimum } = draft
  const asked = by === 'length' ? { length } : { planRun, rise }
  return (
    roofLineSchema.safeParse({
      ...asked,
      pieceLength,
      lap,
      mode,
      minimum,
      leftExtra: extras.first,
      rightExtra: extras.last,
    }).data ?? null
  )
}
