import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import { invalidField, profileProblem } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type { PersonalMessage } from '#server/live/live-message'
import { brakesFor } from '#server/planning/brakes-for'
import type { Planner } from '#server/planning/planner'
import { profileErrors } from '#server/planning/profile-errors'
import type { AnswerOf, BodyOf } from '#shared/http/endpoint'
import type { planDrawing } from '#shared/plans/plans.contract'
import { flatStrip } from '#shared/strip/flat-strip'
import { pieceWeight } from '#shared/strip/weight'

export interface PlansDeps {
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly planner: Planner
  /** Never rejects: a plan does not fail for want of news. */
  readonly tellProgress: (message: PersonalMessage) => Promise<void>
}

export const createPlansService = ({ stocks, brakes, planner, tellProgress }: PlansDeps) => ({
  /** @throws invalid-input for an unknown stock, profile-problem, not-ready; the signal's reason */
  async planDrawing(
    { profile, stockId, pieceLength, progressKey }: BodyOf<typeof planDrawing>,
    person: Pick<SignedIn, 'id'>,
    signal: AbortSignal,
  ): Promise<AnswerOf<typeof planDrawing>> {
    const stock = await stocks.findStock(stockId)
    if (!stock) throw invalidField('stockId', 'There is no such stock. Choose one of the list.')
    const errors = profileErrors(profile, stock, 'profile')
    if (errors.length > 0) throw profileProblem(errors)
    const strip = flatStrip(profile, stock.sheet)
    const able = brakesFor(profile, stock, await brakes.listBrakes(), 'profile').brakes
    const progress = oneAtATime(tellProgress)
    try {
      const plans = await planner.planOnAll(profile, stock, pieceLength, able, {
        signal,
        ...(progressKey !== undefined && {
          onProgress: (done) =>
            progress.tell({ personId: person.id, plan: { key: progressKey, ...done } }),
        }),
      })
      return { strip, weight: pieceWeight(strip, stock.sheet, pieceLength), brakes: plans }
    } finally {
      await progress.told()
    }
  },
})

/** What comes while one message is on its way would be out of date before it could be sent. */
function oneAtATime(tell: PlansDeps['tellProgress']) {
  let underWay: Promise<void> | undefined
  return {
    tell: (message: PersonalMessage) => {
      underWay ??= tell(message).finally(() => {
        underWay = undefined
      })
    },
    told: async () => underWay,
  }
}

export type PlansService = ReturnType<typeof createPlansService>
