import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { addJob } from '#server/jobs/add-job'

/** What writing a mail needs besides the transaction that causes it. */
export interface MailPorts {
  readonly clock: Clock
  /** What links begin with; without a slash at the end. */
  readonly publicUrl: string
  /** Sees to it that the mail is sent once the transaction has committed. */
  readonly enqueue: (db: Db, mailId: string) => Promise<void>
}

export const enqueueMail: MailPorts['enqueue'] = (db, mailId) =>
  addJob(db, { name: 'send-mail', payload: { mailId }, key: `mail ${mailId}` })
