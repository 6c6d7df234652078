import type { ShopBrake } from '#shared/brakes/brakes.contract'
import type { FoldFit, TestBendRecord } from '#shared/stock/stock.contract'
import { fitTestBends } from '#shared/strip/fit-test-bends'

/** What the bends that count give on each brake, in the shop's order; none where they give nothing. */
export const foldFits = (
  bends: readonly TestBendRecord[],
  brakes: readonly ShopBrake[],
): FoldFit[] =>
  brakes.flatMap(({ id }) => {
    const counted = bends.filter(({ brakeId, withdrawn }) => brakeId === id && withdrawn === null)
    const fit = fitTestBends(counted)
    if (!fit.ok) return []
    const { kFactor, insideRadius, spread } = fit
    return [{ brakeId: id, kFactor, insideRadius, bends: counted.length, spread }]
  })
