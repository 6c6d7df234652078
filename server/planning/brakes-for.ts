import type { PlannedBrake } from '#server/planning/planner'
import { profileErrors } from '#server/planning/profile-errors'
import type { FieldError } from '#shared/http/problem'
import type { Profile } from '#shared/profile/profile.schema'
import { stockOn } from '#shared/stock/sheet-on'
import type { Stock } from '#shared/stock/stock.schema'

export interface BrakesFor<Brake extends PlannedBrake> {
  /** Those on which the stock leaves room for the profile, in the order given. */
  readonly brakes: readonly Brake[]
  /** What keeps it from being made on the others, by brake, named by the fields below `path`. */
  readonly errorsOn: ReadonlyMap<string, FieldError[]>
}

/**
 * On which brakes a profile can be made of a stock at all, before anything is planned: where a
 * brake was measured to bend round a larger radius, a short leg may be used up there.
 */
export function brakesFor<Brake extends PlannedBrake>(
  profile: Profile,
  stock: Stock,
  brakes: readonly Brake[],
  path: string,
): BrakesFor<Brake> {
  const errorsOn = new Map<string, FieldError[]>()
  for (const { id } of brakes) {
    const errors = profileErrors(profile, stockOn(stock, id), path)
    if (errors.length > 0) errorsOn.set(id, errors)
  }
  return { brakes: brakes.filter(({ id }) => !errorsOn.has(id)), errorsOn }
}
