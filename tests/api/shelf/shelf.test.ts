import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createShelfProfile, listShelf, shelfProfileSchema } from '#shared/shelf/shelf.contract'
import { createSavedProfile, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
let starter: string
let own: string
let foreign: string

beforeAll(async () => {
  shop = await openShop()
  own = await createSavedProfile(shop.db, { companyId: shop.crew.companyId }, 'Barn rake')
  foreign = await createSavedProfile(shop.db, { companyId: shop.otherCrew.companyId })
  starter = await createSavedProfile(shop.db, { starterKey: 'zClosure' }, 'Z closure')
})
afterAll(() => shop.close())

const idsFor = async (agent: Shop['counter']) =>
  (await agent.call(listShelf)).items.map(({ id }) => id)

describe('The shelf', () => {
  it('shows a crew lead the starters first and then the own profiles, and no others', async () => {
    expect(await idsFor(shop.crew.agent)).toEqual([starter, own])
    expect(await idsFor(shop.otherCrew.agent)).toEqual([starter, foreign])
  })

  it('shows the shop’s people the profiles of every company', async () => {
    expect(new Set(await idsFor(shop.counter))).toEqual(new Set([starter, own, foreign]))
  })
})

describe('Putting a profile on the shelf', () => {
  const body = { name: 'Eave of the mill', profile: zProfile([3, 2, 1]) }

  it('keeps it for the company of the crew lead, as it was drawn', async () => {
    const saved = await shop.otherCrew.agent.call(createShelfProfile, { body })
    expect(saved).toMatchObject({
      ...body,
      company: { id: shop.otherCrew.companyId },
      starterKey: null,
      version: 1,
    })
    expect(await idsFor(shop.crew.agent)).not.toContain(saved.id)
    expect(await idsFor(shop.otherCrew.agent)).toContain(saved.id)
  })

  it('needs a company from the shop’s people and takes no foreign one from a crew lead', async () => {
    const without = await shop.counter.post('/profiles', body)
    expect(without.problem().errors).toMatchObject([{ path: 'companyId' }])
    const companyId = shop.otherCrew.companyId
    expect((await shop.crew.agent.post('/profiles', { ...body, companyId })).status).toBe(404)
    expect((await shop.counter.post('/profiles', { ...body, companyId })).status).toBe(201)
  })

  it('refuses what no sheet could be bent to, naming the leg', async () => {
    const profile = { ...zProfile(), legs: [1, 0, 1] }
    const answer = await shop.crew.agent.post('/profiles', { name: 'Nothing', profile })
    expect(answer.status).toBe(422)
    expect(answer.problem().errors).toMatchObject([
      { path: 'profile.legs.1', code: 'legNotPositive' },
    ])
  })

  it('refuses what is no profile, naming the field', async () => {
    const profile = { ...zProfile(), colorSide: 'outside' }
    const answer = await shop.crew.agent.post('/profiles', { name: 'Garbage', profile })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path: 'profile.colorSide' }])
  })
})

describe('Changing a profile of the shelf', () => {
  const changed = { name: 'Barn rake, longer', profile: zProfile([2, 5, 2]) }

  it('saves over the version that was seen, and refuses an older one with what is there now', async () => {
    const saved = await shop.crew.agent.put(`/profiles/${own}`, { ...changed, version: 1 })
    expect(saved.status).toBe(200)
    expect(shelfProfileSchema.parse(saved.body)).toMatchObject({ ...changed, version: 2 })
    const late = await shop.counter.put(`/profiles/${own}`, { ...changed, name: 'X', version: 1 })
    expect(late.status).toBe(409)
    expect(late.problem().code).toBe('changed-meanwhile')
    expect(late.problem().current).toEqual(saved.body)
  })

  it('does not find a profile of another company', async () => {
    const answer = await shop.crew.agent.put(`/profiles/${foreign}`, { ...changed, version: 1 })
    expect(answer.status).toBe(404)
    const { items } = await shop.otherCrew.agent.call(listShelf)
    expect(items.find(({ id }) => id === foreign)?.version).toBe(1)
  })

  it('leaves the starters as they are, whoever asks', async () => {
    for (const agent of [shop.crew.agent, shop.counter]) {
      const answer = await agent.put(`/profiles/${starter}`, { ...changed, version: 1 })
      expect(answer.status).toBe(403)
      expect(answer.problem().code).toBe('not-allowed')
    }
    const { items } = await shop.crew.agent.call(listShelf)
    expect(items.find(({ id }) => id === starter)?.name).toBe('Z closure')
  })

  it('does not reach an order that was drawn from it', async () => {
    const id = await createSavedProfile(shop.db, { companyId: shop.crew.companyId })
    const { items } = await shop.crew.agent.call(listShelf)
    const saved = items.find((item) => item.id === id)
    const order = await shop.submit([shop.line({ profile: saved?.profile })])
    const answer = await shop.crew.agent.put(`/profiles/${id}`, { ...changed, version: 1 })
    expect(answer.status).toBe(200)
    expect(await shop.readOrder(order.id)).toEqual(order)
  })
})
