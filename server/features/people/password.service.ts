import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { audit } from '#server/features/audit/audit'
import { findActivePerson } from '#server/features/people/people.queries'
import {
  deleteOtherSessions,
  deleteSessions,
  lockPerson,
  updatePerson,
} from '#server/features/people/people.store'
import {
  findPasswordLink,
  removePasswordLinks,
  takePasswordLink,
} from '#server/features/people/password-links.store'
import { hashNewPassword, passwordFits } from '#server/features/people/passwords'
import { invalidInput, ProblemError } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { announce } from '#server/live/announce'
import type { AuditAction } from '#shared/audit/audit.contract'
import type { AnswerOf, BodyOf } from '#shared/http/endpoint'
import type {
  changePassword,
  readPasswordLink,
  setPassword,
} from '#shared/people/accounts.contract'

/** The same for one that never was, was used, or is too old. */
const linkIsOver = () =>
  new ProblemError('not-found', 'This link is used up or too old. Ask for a new one.')

export type PasswordService = ReturnType<typeof createPasswordService>

export const createPasswordService = (db: Db, clock: Clock) => {
  /** Sets it and writes down that, not what. */
  const store = async (person: SignedIn, password: string, action: AuditAction): Promise<void> => {
    const passwordHash = await hashNewPassword(password, {
      name: person.name,
      email: person.email,
      company: person.company?.name ?? null,
    })
    await updatePerson(db, person.id, { password_hash: passwordHash })
    await removePasswordLinks(db, person.id)
    await audit(db, {
      by: person,
      at: clock.now(),
      subject: { kind: 'person', id: person.id, name: person.name },
      action,
    })
    // The hub ends streams whose session is over when it hears of people.
    await announce(db, {
      topic: 'people',
      entityId: person.id,
      companyId: null,
      audience: 'shop',
    })
  }

  return {
    /** @throws not-found for a link that does not hold */
    async readLink(token: string): Promise<AnswerOf<typeof readPasswordLink>> {
      const link = await findPasswordLink(db, token, clock.now())
      const person = link && (await findActivePerson(db, link.person_id))
      if (!link || !person) throw linkIsOver()
      const { name, email, language } = person
      return { kind: link.kind, name, email, language }
    },

    /** In one transaction: a password that is refused leaves the link as it was. @throws as readLink */
    async setByLink({ token, password }: BodyOf<typeof setPassword>): Promise<void> {
      const link = await takePasswordLink(db, token, clock.now())
      const person = link && (await findActivePerson(db, link.person_id))
      if (!link || !person) throw linkIsOver()
      await deleteSessions(db, person.id)
      await store(person, password, 'passwordSet')
    },

    /** @throws invalid-input naming `current` or `password` */
    async change(
      { current, password }: BodyOf<typeof changePassword>,
      person: SignedIn,
      sessionId: string,
    ): Promise<void> {
      const row = await lockPerson(db, person.id)
      if (!(await passwordFits(row?.password_hash, current))) {
        throw invalidInput([
          { path: 'current', message: 'This is not your password. Type it again.', code: 'wrong' },
        ])
      }
      await deleteOtherSessions(db, person.id, sessionId)
      await store(person, password, 'passwordChanged')
    },
  }
}
