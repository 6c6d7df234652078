import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import {
  createShelfProfile,
  listShelf,
  listShelfVersions,
  shelfProfileSchema,
  updateShelfProfile,
} from '#shared/shelf/shelf.contract'
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
    const ordered = { ...body, name: 'Drawn at the counter', companyId }
    expect((await shop.counter.post('/profiles', ordered)).status).toBe(201)
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

describe('A name on the shelf', () => {
  const body = { name: 'Porch drip', profile: zProfile([3, 2, 1]) }

  it('stands there once, whatever its case, and is free on another company’s', async () => {
    await shop.crew.agent.call(createShelfProfile, { body })
    const again = await shop.crew.agent.post('/profiles', { ...body, name: 'PORCH drip' })
    expect(again.status).toBe(400)
    expect(again.problem().errors).toMatchObject([{ path: 'name' }])
    expect((await shop.otherCrew.agent.post('/profiles', body)).status).toBe(201)
  })

  it('is not taken over from another profile by a change', async () => {
    const other = await createSavedProfile(shop.db, { companyId: shop.crew.companyId })
    const answer = await shop.crew.agent.put(`/profiles/${other}`, { ...body, version: 1 })
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path: 'name' }])
  })
})

describe('Versions of a saved profile', () => {
  const versionsOf = async (profileId: string, agent = shop.crew.agent) =>
    (await agent.call(listShelfVersions, { params: { profileId } })).items

  it('all stay as they were saved, the latest first, with who saved them', async () => {
    const { agent, lead } = shop.crew
    const first = { name: 'Barn eave', profile: zProfile([3, 2, 1]) }
    const second = { name: 'Barn eave, deep', profile: zProfile([3, 4, 1]) }
    const saved = await agent.call(createShelfProfile, { body: first })
    const params = { profileId: saved.id }
    await agent.call(updateShelfProfile, { params, body: { ...second, version: 1 } })
    const versions = await versionsOf(saved.id)
    expect(versions).toMatchObject([
      { ...second, version: 2, savedBy: lead.name },
      { ...first, version: 1, savedBy: lead.name },
    ])
    // An old one is taken up again as a new one.
    const body = { name: second.name, profile: first.profile, version: 2 }
    await agent.call(updateShelfProfile, { params, body })
    expect((await versionsOf(saved.id)).map(({ version, profile }) => [version, profile])).toEqual([
      [3, first.profile],
      [2, second.profile],
      [1, first.profile],
    ])
  })

  it('are the shop’s to see too, and nobody else’s', async () => {
    const saved = await createSavedProfile(shop.db, { companyId: shop.crew.companyId })
    expect(await versionsOf(saved, shop.counter)).toMatchObject([{ version: 1, savedBy: null }])
    expect((await shop.otherCrew.agent.get(`/profiles/${saved}/versions`)).status).toBe(404)
  })

  it('are none of a starter', async () => {
    expect(await versionsOf(starter)).toEqual([])
  })

  it('cannot be changed, not even by hand', async () => {
    const change = () => shop.db('shelf_versions').update({ name: 'Another' })
    await expect(change()).rejects.toMatchObject({ code: 'FY004' })
    await expect(shop.db('shelf_versions').delete()).rejects.toMatchObject({ code: 'FY004' })
  })

  it('cannot be written over: a change without a new version is refused', async () => {
    const id = await createSavedProfile(shop.db, { companyId: shop.crew.companyId })
    const change = shop.db('shelf_profiles').where({ id }).update({ name: 'In silence' })
    await expect(change).rejects.toMatchObject({ constraint: 'shelf_versions_pkey' })
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

  it('does not reach an order that was drawn from it, released or not', async () => {
    const id = await createSavedProfile(shop.db, { companyId: shop.crew.companyId })
    const { items } = await shop.crew.agent.call(listShelf)
    const saved = items.find((item) => item.id === id)
    const order = await shop.submit([shop.line({ profile: saved?.profile })])
    const body = { ...changed, name: 'Drawn from', version: 1 }
    expect((await shop.crew.agent.put(`/profiles/${id}`, body)).status).toBe(200)
    expect(await shop.readOrder(order.id)).toEqual(order)
    const released = await shop.release(order)
    const again = { ...body, profile: zProfile([1, 6, 1]), version: 2 }
    expect((await shop.crew.agent.put(`/profiles/${id}`, again)).status).toBe(200)
    expect(await shop.readOrder(order.id)).toEqual(released)
  })
})
