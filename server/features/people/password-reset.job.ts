import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { inTransaction } from '#server/db/transaction'
import type { MailPorts } from '#server/features/mail/mail-ports'
import { mailPasswordReset } from '#server/features/people/account-mails'
import { findActiveAccount } from '#server/features/people/people.queries'
import { addJob } from '#server/jobs/add-job'
import type { JobTask } from '#server/jobs/job'

/**
 * Somebody asks for a new password. The request only leaves a job, whoever's address it is: neither
 * its answer nor its time tells who has an account.
 */
export const leavePasswordReset = (db: Db, email: string): Promise<void> =>
  addJob(db, { name: 'password-reset', payload: { email }, key: `password reset ${email}` })

const payloadSchema = z.object({ email: z.string() })

/**
 * Mails a link to the account of the address, if there is one that is open and was taken up. Run
 * twice it sends a second link, and the first one ends.
 */
export const createPasswordResetJob =
  (db: Db, ports: MailPorts): JobTask =>
  async (payload) => {
    const { email } = payloadSchema.parse(payload)
    await inTransaction(db, async (trx) => {
      const account = await findActiveAccount(trx, email)
      if (!account || account.passwordHash === null) return
      await mailPasswordReset(trx, account.person, ports)
    })
  }
