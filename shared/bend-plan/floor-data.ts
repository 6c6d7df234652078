import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip } from '#shared/strip/flat-strip'
import type { Fold, Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import { stopReach } from './gauge-stop'
import { rearSide } from './orientation'
import type { Plan, PlanStep } from './plan.schema'
import { secondsOf, withSeconds } from './step-seconds'
import { trueRear } from './true-rear'

/** From the edge at the back to the near border of the bend zone, on the flat strip. */
const flatBehind = ({ creases, stripWidth }: Strip, { bend, aBack }: PlanStep): Inches => {
  const crease = creases.find(({ fold }) => fold === bend)
  if (crease === undefined) throw new RangeError(`The strip has no crease ${bend}.`)
  return aBack ? crease.from : stripWidth - crease.to
}

/**
 * The plan with what the floor sets and reads instead of the model's figures: gauge settings by the
 * true strip where the sheet behind is flat and by the true folded outside where something is bent
 * there, each with the brake's line offset; and the seconds that follow from them.
 *
 * `profile`, `sheet` and `brake` are those planned with. Throws RangeError where the plan has a fold
 * that the profile has not.
 */
export const withFloorData = (plan: Plan, profile: Profile, sheet: Sheet, brake: Brake): Plan => {
  const strip = flatStrip(profile, sheet)
  const parts = flatParts(profile, sheet)
  const made = new Set<Fold>()
  const settingOf = (step: PlanStep): Inches | null => {
    if (step.gauge === null) return null
    const behind =
      step.restsOn === 'rawEdge'
        ? flatBehind(strip, step)
        : stopReach(trueRear(parts, step.bend, rearSide(step), made, sheet.thickness))
    return behind + (brake.lineOffset ?? 0)
  }
  const steps = plan.steps.map((step) => {
    const gaugeSetting = settingOf(step)
    made.add(step.bend)
    return { ...step, gaugeSetting }
  })
  const timed = withSeconds(steps, brake)
  return { ...plan, steps: timed, seconds: secondsOf(timed) }
}
