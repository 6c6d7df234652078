import type { Clock } from '#server/adapters/clock'
import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import { foldFits } from '#server/features/stocks/fold-fits'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { TestBendsStore } from '#server/features/stocks/test-bends.store'
import { changedMeanwhile, invalidField, notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import type { Announcement } from '#server/live/announce'
import { isEqual } from '#shared/geometry/tolerance'
import type { AnswerOf, BodyOf } from '#shared/http/endpoint'
import type {
  calibrateStock,
  FoldFit,
  listTestBends,
  TestBendInput,
  TestBendRecord,
} from '#shared/stock/stock.contract'
import { kFactorFromTestBend } from '#shared/strip/calibrate-k-factor'

export interface TestBendsDeps {
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly listBends: (stockId: string) => Promise<TestBendRecord[]>
  readonly store: TestBendsStore
  /** Absent: everything happens when the database says. */
  readonly clock?: Clock | undefined
  readonly announce: (announcement: Announcement) => Promise<void>
}

type TestBends = AnswerOf<typeof listTestBends>
type Person = Pick<SignedIn, 'id'>

/** Test bends of the stocks, what they give, and what of it is in use. */
export const createTestBendsService = (deps: TestBendsDeps) => {
  const { stocks, brakes, listBends, store, clock, announce } = deps
  const now = () => (clock ? { at: clock.now() } : {})

  async function getTestBends(stockId: string): Promise<TestBends> {
    const stock = await stocks.findStock(stockId)
    if (!stock) throw notFound('stock')
    const bends = await listBends(stockId)
    return { stock, bends, fits: foldFits(bends, await brakes.listBrakes()) }
  }

  const checkBrake = async (brakeId: string): Promise<void> => {
    if ((await brakes.listBrakes()).some(({ id }) => id === brakeId)) return
    throw invalidField('brakeId', 'There is no such brake. Choose one of the list.')
  }

  const tell = (stockId: string, audience: 'shop' | 'all') =>
    announce({ topic: 'stocks', entityId: stockId, companyId: null, audience })

  return {
    getTestBends,

    /** @throws not-found, invalid-input for an unknown brake and for measures that give no K */
    async recordTestBend(stockId: string, bend: TestBendInput, person: Person): Promise<TestBends> {
      if (!(await stocks.findStock(stockId))) throw notFound('stock')
      await checkBrake(bend.brakeId)
      checkMeasures(bend)
      await store.addTestBend({
        stock_id: stockId,
        brake_id: bend.brakeId,
        strip_width: bend.stripWidth,
        leg_a: bend.legA,
        leg_b: bend.legB,
        turn: bend.turn,
        thickness: bend.thickness,
        inside_radius: bend.insideRadius,
        note: bend.note,
        person_id: person.id,
        ...now(),
      })
      await tell(stockId, 'shop')
      return getTestBends(stockId)
    },

    /** @throws not-found; wrong-state with who withdrew it already */
    async withdrawTestBend(
      of: { readonly stockId: string; readonly bendId: string },
      reason: string,
      person: Person,
    ): Promise<TestBends> {
      const done = await store.withdrawTestBend(of, { personId: person.id, reason, ...now() })
      const answer = await getTestBends(of.stockId)
      if (!done) throw notWithdrawn(answer, of.bendId)
      await tell(of.stockId, 'shop')
      return answer
    },

    /**
     * Takes a fit into use, or goes back to the stock's own K. What is in use already stays as it is.
     *
     * @throws not-found, invalid-input for an unknown brake; changed-meanwhile with the fits as
     *   they are now
     */
    async calibrateStock(
      stockId: string,
      { brakeId, fit: seen }: BodyOf<typeof calibrateStock>,
      person: Person,
    ): Promise<TestBends> {
      if (!(await store.lockStock(stockId))) throw notFound('stock')
      await checkBrake(brakeId)
      const found = await getTestBends(stockId)
      const inUse = found.stock.calibrations.find((each) => each.brakeId === brakeId)
      if (seen === null && !inUse) return found
      const fit = found.fits.find((each) => each.brakeId === brakeId)
      if (seen !== null) {
        if (!fit || !isSameFit(seen, fit)) throw changedMeanwhile(found)
        if (inUse && isSameFit(inUse, fit) && inUse.bends === fit.bends) return found
      }
      const taken = seen === null ? undefined : fit
      await store.addCalibration({
        stock_id: stockId,
        brake_id: brakeId,
        k_factor: taken?.kFactor ?? null,
        inside_radius: taken?.insideRadius ?? null,
        bends: taken?.bends ?? null,
        person_id: person.id,
        ...now(),
      })
      await tell(stockId, 'all')
      return getTestBends(stockId)
    },
  }
}

type Fitted = Pick<FoldFit, 'kFactor' | 'insideRadius'>

const isSameFit = (one: Fitted, other: Fitted): boolean =>
  isEqual(one.kFactor, other.kFactor) && isEqual(one.insideRadius, other.insideRadius)

/** Where the radius was measured, one bend says whether its measures can be true. */
function checkMeasures({ insideRadius, ...bend }: TestBendInput): void {
  if (insideRadius === null) return
  const result = kFactorFromTestBend({ ...bend, insideRadius })
  if (result.ok) return
  throw invalidField(
    'stripWidth',
    `These measures give K ${result.found.toFixed(2)}, outside the sheet, where it lies between 0 and 1. Measure strip, legs and radius again.`,
  )
}

function notWithdrawn({ bends }: TestBends, bendId: string) {
  const withdrawn = bends.find(({ id }) => id === bendId)?.withdrawn
  if (!withdrawn) return notFound('test bend')
  return wrongState(`${withdrawn.by} withdrew this test bend at ${withdrawn.at}.`, withdrawn)
}

export type TestBendsService = ReturnType<typeof createTestBendsService>
