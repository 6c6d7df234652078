import { z } from 'zod'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { longestPieceMovement } from '#shared/roof-line/roof-movement'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import { metalSchema } from '#shared/stock/stock.schema'
import { roundToShear } from '#shared/strip/flat-strip'
import { defineVerb } from './verb'

const rake = z.strictObject({ planRun: z.number(), rise: z.number() })

/** A rake may stand under `length` or beside it; one schema then judges both alike. */
const roofRunInput = z
  .looseObject({ length: z.union([z.number(), rake]).optional() })
  .transform(({ length, ...rest }, context) => {
    if (typeof length !== 'object') return length === undefined ? rest : { ...rest, length }
    if (!('planRun' in rest) && !('rise' in rest)) return { ...rest, ...length }
    context.addIssue({ code: 'custom', path: ['length'], message: 'Give the rake once.' })
    return z.NEVER
  })
  .pipe(roofLineSchema.safeExtend({ metal: metalSchema.optional() }))

/**
 * `roof-run`: the pieces and laps of a line on the roof, inches. `length`, or a rake's `planRun`
 * and `rise` in 12, flat or as an object under `length`; a lap's position is where it begins, from
 * the low or left end. The lengths are exact, those in `rounded` are to be read at the shear. With
 * a `metal`, `movement` is what the longest piece grows over the year. Exits with 3 for a line that
 * has no answer, the problems listed.
 */
export const roofRunVerb = defineVerb(roofRunInput, ({ metal, ...line }) => {
  const found = roofPieces(line)
  if (!found.ok) return { exit: 3, output: { problems: found.problems } }
  const { answer } = found
  return {
    exit: 0,
    output: {
      ...answer,
      rounded: {
        pieces: answer.pieces.map(({ length, count }) => ({ length: roundToShear(length), count })),
      },
      ...(metal === undefined ? {} : { movement: longestPieceMovement(answer, metal) }),
    },
  }
})
