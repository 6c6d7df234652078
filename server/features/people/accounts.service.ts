import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { audit } from '#server/features/audit/audit'
import { createOwningCompany } from '#server/features/jobs/owning-company'
import type { MailPorts } from '#server/features/mail/mail-ports'
import { mailInvitation } from '#server/features/people/account-mails'
import {
  createCompany,
  createPerson,
  deleteSessions,
  lockManagersWhoSignIn,
  lockPerson,
  updatePerson,
} from '#server/features/people/people.store'
import {
  findActivePerson,
  findPersonRow,
  listCompanyPeople,
} from '#server/features/people/people.queries'
import { removePasswordLinks } from '#server/features/people/password-links.store'
import { invalidField, notFound, wrongState } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { announce } from '#server/live/announce'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import type { AuditAction, AuditFields } from '#shared/audit/audit.contract'
import type { BodyOf } from '#shared/http/endpoint'
import type { invitePerson } from '#shared/people/accounts.contract'
import type { Company, PersonRow } from '#shared/people/people.contract'

export type AccountsService = ReturnType<typeof createAccountsService>

/** Accounts of people and companies. Every change is in the log, and told to the screens. */
export const createAccountsService = (db: Db, ports: MailPorts) => {
  const owningCompany = createOwningCompany(db)

  const getRow = async (id: string): Promise<PersonRow> => {
    const row = await findPersonRow(db, id)
    if (!row) throw notFound('person')
    return row
  }

  const changed = async (
    by: SignedIn,
    person: Pick<PersonRow, 'id' | 'name'>,
    action: AuditAction,
    fields: { readonly before?: AuditFields; readonly after?: AuditFields } = {},
  ): Promise<void> => {
    const subject = { kind: 'person', id: person.id, name: person.name } as const
    await audit(db, { by, at: ports.clock.now(), subject, action, ...fields })
    await announce(db, {
      topic: 'people',
      entityId: person.id,
      companyId: null,
      audience: 'shop',
    })
  }

  const mailTo = async (id: string, by: SignedIn): Promise<void> => {
    const person = await findActivePerson(db, id)
    if (!person) throw notFound('person')
    await mailInvitation(db, person, by, ports)
  }

  return {
    listCrew: (person: SignedIn): Promise<PersonRow[]> => listCompanyPeople(db, person.companyId),

    /** @throws invalid-input for the role, the company or an address that has an account; not-found */
    async invite(
      { name, email, role, companyId, language }: BodyOf<typeof invitePerson>,
      by: SignedIn,
    ): Promise<PersonRow> {
      if (seesOnlyOwnCompany(by.role) && role !== 'crewLead') {
        throw invalidField('role', 'A crew lead invites crew leads of the own company only.')
      }
      if (role !== 'crewLead' && companyId !== undefined) {
        throw invalidField(
          'companyId',
          "Only crew leads belong to a company; the shop's own do not.",
        )
      }
      const company = role === 'crewLead' ? await owningCompany(companyId, by) : null
      const id = await createPerson(db, { name, email, role, language, company_id: company })
      const row = await getRow(id)
      await mailTo(id, by)
      await changed(by, row, 'invited', {
        after: { name, email, role, company: row.company?.name ?? null, language },
      })
      return row
    },

    /** @throws not-found outside the own company, wrong-state when a password is set or the account closed */
    async inviteAgain(id: string, by: SignedIn): Promise<PersonRow> {
      const scope = companyScope(by)
      const person = await lockPerson(db, id)
      if (!person || (scope !== null && person.company_id !== scope)) throw notFound('person')
      if (person.password_hash !== null) {
        throw wrongState('This account has its password. A lost one is reset on the sign-in page.')
      }
      if (!person.active) throw wrongState('This account is closed. Open it again first.')
      await mailTo(id, by)
      await changed(by, person, 'invitedAgain')
      return getRow(id)
    },

    /** Sessions and links end with the transaction. @throws wrong-state for the last manager */
    async deactivate(id: string, by: SignedIn): Promise<PersonRow> {
      // Before the person: of two managers who close each other's account at once one must wait.
      const managers = await lockManagersWhoSignIn(db)
      const person = await lockPerson(db, id)
      if (!person) throw notFound('person')
      if (managers.length === 1 && managers[0] === id) {
        throw wrongState('This is the last manager who can sign in. Invite another one first.')
      }
      if (person.active) {
        await updatePerson(db, id, { active: false })
        await deleteSessions(db, id)
        await removePasswordLinks(db, id)
        await changed(by, person, 'deactivated', {
          before: { active: true },
          after: { active: false },
        })
      }
      return getRow(id)
    },

    async reactivate(id: string, by: SignedIn): Promise<PersonRow> {
      const person = await lockPerson(db, id)
      if (!person) throw notFound('person')
      if (!person.active) {
        await updatePerson(db, id, { active: true })
        await changed(by, person, 'reactivated', {
          before: { active: false },
          after: { active: true },
        })
      }
      return getRow(id)
    },

    /** @throws invalid-input for a name that is taken */
    async createCompany({ name }: { readonly name: string }, by: SignedIn): Promise<Company> {
      const company = await createCompany(db, name)
      await audit(db, {
        by,
        at: ports.clock.now(),
        subject: { kind: 'company', ...company },
        action: 'created',
        after: { name },
      })
      await announce(db, { topic: 'people', entityId: null, companyId: null, audience: 'shop' })
      return company
    },
  }
}
