import type { Db } from '#server/db/knex'
import type { MailPorts } from '#server/features/mail/mail-ports'
import { writeMail } from '#server/features/mail/mails.store'
import { invitationMail } from '#server/features/mail/templates/invitation'
import { passwordResetMail } from '#server/features/mail/templates/password-reset'
import { createPasswordLink } from '#server/features/people/password-links.store'
import type { SignedIn } from '#server/http/signed-in'
import { INVITATION_DAYS, RESET_MINUTES } from '#shared/people/accounts.contract'

/** Writes the mail with a link by which the person sets a first password. */
export async function mailInvitation(
  db: Db,
  person: SignedIn,
  inviter: Pick<SignedIn, 'name'>,
  ports: MailPorts,
): Promise<void> {
  const token = await createPasswordLink(db, {
    kind: 'invitation',
    personId: person.id,
    at: ports.clock.now(),
  })
  await writeMail(
    db,
    {
      to: person,
      template: 'invitation',
      secret: token,
      content: invitationMail(person.language, {
        name: person.name,
        inviter: inviter.name,
        role: person.role,
        company: person.company?.name ?? null,
        url: `${ports.publicUrl}/welcome/${token}`,
        days: INVITATION_DAYS,
      }),
    },
    ports,
  )
}

/** Writes the mail with a link by which the person sets another password. */
export async function mailPasswordReset(db: Db, person: SignedIn, ports: MailPorts): Promise<void> {
  const token = await createPasswordLink(db, {
    kind: 'reset',
    personId: person.id,
    at: ports.clock.now(),
  })
  await writeMail(
    db,
    {
      to: person,
      template: 'passwordReset',
      secret: token,
      content: passwordResetMail(person.language, {
        name: person.name,
        url: `${ports.publicUrl}/reset/${token}`,
        minutes: RESET_MINUTES,
      }),
    },
    ports,
  )
}
