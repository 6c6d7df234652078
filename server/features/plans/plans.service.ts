import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import { invalidField, profileProblem } from '#server/http/errors'
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
}

export const createPlansService = ({ stocks, brakes, planner }: PlansDeps) => ({
  /** @throws invalid-input for an unknown stock, profile-problem */
  async planDrawing({
    profile,
    stockId,
    pieceLength,
  }: BodyOf<typeof planDrawing>): Promise<AnswerOf<typeof planDrawing>> {
    const stock = await stocks.findStock(stockId)
    if (!stock) throw invalidField('stockId', 'There is no such stock. Choose one of the list.')
    const errors = profileErrors(profile, stock, 'profile')
    if (errors.length > 0) throw profileProblem(errors)
    const strip = flatStrip(profile, stock.sheet)
    const shopBrakes = await brakes.listBrakes()
    return {
      strip,
      weight: pieceWeight(strip, stock.sheet, pieceLength),
      brakes: await planner.planOnAll(profile, stock.sheet, pieceLength, shopBrakes),
    }
  },
})

export type PlansService = ReturnType<typeof createPlansService>
