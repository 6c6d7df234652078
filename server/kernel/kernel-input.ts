import { z } from 'zod'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKES, findDemoBrake } from '#shared/bend-plan/demo-brakes'
import { sectionSchema } from '#shared/bend-plan/plan.schema'
import { MAX_BENDS, profileSchema } from '#shared/profile/profile.schema'
import { sheetSchema, stockSchema } from '#shared/stock/stock.schema'
import { K_HALF_HARD } from '#shared/strip/bend-allowance'

/**
 * A profile as in the API. From the shell, what is absent may be left out: `version`, hems and
 * the color side.
 */
export const profileInput = z.preprocess(
  (given) =>
    typeof given === 'object' && given !== null
      ? { version: 1, hemA: null, hemB: null, colorSide: 'none', ...given }
      : given,
  profileSchema,
)

const turnInput = z
  .number()
  .refine((turn) => Math.abs(turn) < 180, { error: 'A bend turns less than 180 degrees.' })

/** A section to be planned as it stands; hems may be left out. */
export const sectionInput = z
  .strictObject({
    ...sectionSchema.shape,
    legs: sectionSchema.shape.legs.max(MAX_BENDS + 1),
    turns: z.array(turnInput).max(MAX_BENDS),
    hemA: sectionSchema.shape.hemA.default(null),
    hemB: sectionSchema.shape.hemB.default(null),
  })
  .refine((section) => section.turns.length === section.legs.length - 1, {
    path: ['turns'],
    error: 'A section has one turn fewer than it has legs.',
  })

/**
 * The stock of every verb: keys that the kernel does not know are left alone, since a stock
 * carries more (color, name, price). Metal is steel and K the handbook's for soft steel, half-hard
 * copper and brass, and aluminum, unless given.
 */
export const stockInput = z.object({
  ...sheetSchema.shape,
  metal: sheetSchema.shape.metal.default('steel'),
  kFactor: sheetSchema.shape.kFactor.default(K_HALF_HARD),
})

/** What a stock may say of its alloy and paint, for warnings of radii below what they bear. */
export const limitsInput = {
  alloy: stockSchema.shape.alloy.optional(),
  paintTBend: stockSchema.shape.paintTBend.optional(),
}

const brakeObject = z.object(brakeSchema.shape)

/** A brake as data, with keys of its own besides, or the name of a demo brake. */
export const brakeInput = z.unknown().transform((given, context) => {
  if (typeof given === 'string') {
    const brake = findDemoBrake(given)
    if (brake) return brake
    const names = DEMO_BRAKES.map(({ name }) => name).join(', ')
    context.addIssue({
      code: 'custom',
      message: `No demo brake has this name; there are ${names}.`,
    })
    return z.NEVER
  }
  const parsed = brakeObject.safeParse(given)
  if (parsed.success) return parsed.data
  for (const { path, message } of parsed.error.issues) {
    context.addIssue({ code: 'custom', path, message })
  }
  return z.NEVER
})

export const pieceLengthInput = z.number().positive()
