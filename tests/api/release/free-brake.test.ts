import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { bendPiece } from '#shared/pieces/pieces.contract'
import { claimRun } from '#shared/runs/runs.contract'
import { getStarter } from '#shared/profile/starters'
import type { ApiAgent } from '../../support/api-agent'
import { openShop, type Shop } from '../../support/shop-scene'

/** Costs the same on each of the demo brakes: nothing is turned, nothing is wide. */
const { profile } = getStarter('sidewall')
const FIRST = DEMO_BRAKE.upOnly.name
const SECOND = DEMO_BRAKE.upAndDown.name
const THIRD = DEMO_BRAKE.site.name

let shop: Shop
let bender: ApiAgent
beforeEach(async () => {
  shop = await openShop()
  bender = await shop.api.signInAs('bender')
})
afterEach(() => shop.close())

/** Releases an order with lines of so many pieces and says on which brakes they are bent. */
async function release(...quantities: number[]) {
  const lines = quantities.map((quantity, index) =>
    // Each of its own length of leg, so that each is a run of its own.
    shop.line({
      mark: `L${index}`,
      quantity,
      profile: { ...profile, legs: profile.legs.map((leg) => leg + index / 8) },
    }),
  )
  const order = await shop.release(await shop.submit(lines))
  return {
    brakes: order.lines.map(({ bendsOn }) => bendsOn[0]),
    codes: order.lines.flatMap(({ pieces }) => pieces.map(({ code }) => code)),
    runId: async () => {
      const run = await shop.db('runs').where({ order_id: order.id }).first()
      return run?.id ?? ''
    },
  }
}

describe('Of brakes that bend it at the same cost a run goes to', () => {
  it("the shop's first where nothing is to be bent", async () => {
    expect((await release(3)).brakes).toEqual([FIRST])
  })

  it('the one with the least to bend, what this release brings included', async () => {
    expect((await release(3, 5, 4, 1, 1)).brakes).toEqual([FIRST, SECOND, THIRD, FIRST, FIRST])
    expect((await release(1)).brakes).toEqual([THIRD])
  })

  it('a free one before one at which somebody is bending, however much waits there', async () => {
    const begun = await release(1)
    expect((await release(20, 20)).brakes).toEqual([SECOND, THIRD])
    await bender.call(claimRun, { params: { runId: await begun.runId() }, body: {} })
    expect((await release(1)).brakes).toEqual([SECOND])
    for (const code of begun.codes) await bender.call(bendPiece, { params: { code }, body: {} })
    // All of the claimed run is bent: the brake is free.
    expect((await release(1)).brakes).toEqual([FIRST])
  })

  it('the one on which lines of its shape are bent already, so that they are one run', async () => {
    const order = await shop.release(
      await shop.submit([
        shop.line({ mark: 'A', profile, length: 120, quantity: 9 }),
        shop.line({ mark: 'B', profile, length: 96, quantity: 9 }),
      ]),
    )
    const numbers = order.lines.flatMap(({ pieces }) => pieces.map(({ runNumber }) => runNumber))
    expect(new Set(numbers).size).toBe(1)
  })

  it('never a dearer one, however free it is', async () => {
    const dear = getStarter('ridge').profile
    const lines = ['A', 'B'].map((mark, index) =>
      shop.line({
        mark,
        quantity: 20,
        profile: { ...dear, legs: dear.legs.map((leg) => leg + index / 8) },
      }),
    )
    const order = await shop.release(await shop.submit(lines))
    expect(order.lines.map(({ bendsOn }) => bendsOn)).toEqual([[THIRD], [THIRD]])
  })
})
