import { afterAll, beforeAll, expect, it } from 'vitest'
import { migrateToLatest } from '#server/db/migrate'
import { migrationSource } from '#server/db/migrations'
import { listShelf, listShelfVersions, updateShelfProfile } from '#shared/shelf/shelf.contract'
import { createSavedProfile, zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
beforeAll(async () => {
  shop = await openShop()
})
afterAll(() => shop.close())

const FIRST = '0019_shelf_versions'

it('Profiles of one name are told apart, and what was on the shelf is the version it was at', async () => {
  const { agent, companyId } = shop.crew
  const all = (await migrationSource.getMigrations([])).map(({ name }) => name)
  const names = all.slice(all.indexOf(FIRST)).toReversed()
  for (const name of names) await shop.db.migrate.down({ migrationSource, name })

  const first = await createSavedProfile(shop.db, { companyId }, 'Rake')
  const second = await createSavedProfile(shop.db, { companyId }, 'rake')
  const foreign = await createSavedProfile(shop.db, { companyId: shop.otherCrew.companyId }, 'Rake')
  const starter = await createSavedProfile(shop.db, { starterKey: 'zClosure' }, 'zClosure')
  await shop.db('shelf_profiles').where({ id: second }).update({ version: 4 })
  expect(await migrateToLatest(shop.db)).toEqual(names.toReversed())

  const items = [
    ...(await agent.call(listShelf)).items,
    ...(await shop.otherCrew.agent.call(listShelf)).items,
  ]
  const nameOf = (id: string) => items.find((item) => item.id === id)?.name
  expect(nameOf(first)).toBe('Rake')
  expect(nameOf(second)).toBe(`rake (${second.slice(0, 8)})`)
  expect(nameOf(foreign)).toBe('Rake')

  const versionsOf = async (profileId: string) =>
    (await agent.call(listShelfVersions, { params: { profileId } })).items
  expect(await versionsOf(first)).toMatchObject([{ version: 1, name: 'Rake', savedBy: null }])
  expect(await versionsOf(second)).toMatchObject([{ version: 4, profile: zProfile() }])
  expect(await versionsOf(starter)).toEqual([])

  const body = { name: 'Rake, tall', profile: zProfile([1, 5, 1]), version: 4 }
  await agent.call(updateShelfProfile, { params: { profileId: second }, body })
  expect((await versionsOf(second)).map(({ version }) => version)).toEqual([5, 4])
})
