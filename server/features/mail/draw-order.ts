import type { Db } from '#server/db/knex'
import type { DrawForMail } from '#server/features/mail/send-mail'
import { findActivePerson } from '#server/features/people/people.queries'
import type { SignedIn } from '#server/http/signed-in'
import type { FileAnswer } from '#shared/http/endpoint'

/** The PDFs of an order, in language and units of a person. */
export type OrderPdf = (db: Db, orderId: string, reader: SignedIn) => Promise<readonly FileAnswer[]>

/** Attaches the drawings of an order as they are when the mail is first sent. */
export const createDrawOrder =
  (orderPdf: OrderPdf): DrawForMail =>
  async (db, { orderId, personId }) => {
    const reader = await findActivePerson(db, personId)
    if (!reader) return []
    const files = await orderPdf(db, orderId, reader)
    return files.map(({ name, bytes }) => ({
      name,
      bytes,
      mediaType: 'application/pdf',
      contentId: null,
    }))
  }
