import type { Clock } from '#server/adapters/clock'
import { companyScope } from '#server/db/company-scope'
import type { OwningCompany } from '#server/features/jobs/owning-company'
import type { ShelfQueries } from '#server/features/shelf/shelf.queries'
import type { ShelfStore } from '#server/features/shelf/shelf.store'
import type { SignedIn } from '#server/http/define-route'
import { changedMeanwhile, notAllowed, notFound, profileProblem } from '#server/http/errors'
import type { Announcement } from '#server/live/announce'
import { profileErrors } from '#server/planning/profile-errors'
import type { BodyOf } from '#shared/http/endpoint'
import type { Profile } from '#shared/profile/profile.schema'
import type {
  createShelfProfile,
  ShelfProfile,
  ShelfVersion,
  updateShelfProfile,
} from '#shared/shelf/shelf.contract'

export interface ShelfDeps {
  readonly queries: ShelfQueries
  readonly store: ShelfStore
  readonly owningCompany: OwningCompany
  readonly clock: Clock
  readonly announce: (announcement: Announcement) => Promise<void>
}

/** A shelf holds what some sheet could be bent to; which one is settled with the order. */
function checkProfile(profile: Profile): void {
  const errors = profileErrors(profile, null, 'profile')
  if (errors.length > 0) throw profileProblem(errors)
}

export const createShelfService = (deps: ShelfDeps) => {
  const { queries, store, owningCompany, clock, announce } = deps

  const getShelfProfile = async (id: string, person: SignedIn): Promise<ShelfProfile> => {
    const found = await queries.findShelfProfile(id, companyScope(person))
    if (!found) throw notFound('profile')
    return found
  }

  const tell = (id: string, companyId: string) =>
    announce({ topic: 'shelf', entityId: id, companyId, audience: 'company' })

  return {
    listShelf: (person: SignedIn) => queries.listShelf(companyScope(person)),

    /** The latest first; starters have none. */
    async listVersions(id: string, person: SignedIn): Promise<ShelfVersion[]> {
      await getShelfProfile(id, person)
      return queries.listVersions(id)
    },

    /** @throws profile-problem, invalid-input naming `name` where the shelf has it already */
    async createShelfProfile(
      body: BodyOf<typeof createShelfProfile>,
      person: SignedIn,
    ): Promise<ShelfProfile> {
      const companyId = await owningCompany(body.companyId, person)
      checkProfile(body.profile)
      const id = await store.createShelfProfile(companyId, { ...body, savedBy: person.id })
      await tell(id, companyId)
      return getShelfProfile(id, person)
    },

    /**
     * Makes a new version; the old ones stay.
     *
     * @throws not-allowed for a starter, profile-problem, invalid-input naming `name` where another
     * profile of the shelf has it, changed-meanwhile with the profile now
     */
    async updateShelfProfile(
      id: string,
      body: BodyOf<typeof updateShelfProfile>,
      person: SignedIn,
    ): Promise<ShelfProfile> {
      const { company } = await getShelfProfile(id, person)
      if (company === null) {
        throw notAllowed('Starters stay as they are. Save a copy on a shelf and change that.')
      }
      checkProfile(body.profile)
      const changed = await store.updateShelfProfile(
        id,
        body.version,
        { ...body, savedBy: person.id },
        clock.now(),
      )
      const profile = await getShelfProfile(id, person)
      if (!changed) throw changedMeanwhile(profile)
      await tell(id, company.id)
      return profile
    },
  }
}

export type ShelfService = ReturnType<typeof createShelfService>
