import type { Db } from '#server/db/knex'
import type { MailPorts } from '#server/features/mail/mail-ports'
import { writeMail } from '#server/features/mail/mails.store'
import {
  listBundlesForMail,
  readOrderForMail,
  type OrderForMail,
} from '#server/features/mail/order-mail.queries'
import { slipCodeOf } from '#server/features/mail/slips.store'
import { orderQuestionMail } from '#server/features/mail/templates/order-question'
import { orderReadyMail } from '#server/features/mail/templates/order-ready'
import { orderReceivedMail } from '#server/features/mail/templates/order-received'
import { orderReleasedMail } from '#server/features/mail/templates/order-released'
import type { MailContent } from '#server/features/mail/templates/mail-words'
import type { MakingPorts } from '#server/features/pieces/making-ports'
import type { SignedIn } from '#server/http/signed-in'
import type { MailDraws, MailTemplate } from '#shared/mail/mail.contract'

/** Mails to who ordered. Each is written in the transaction of what it tells of. */
export interface OrderMails {
  readonly received: (orderId: string) => Promise<void>
  readonly question: (orderId: string, asker: { name: string }, question: string) => Promise<void>
  readonly released: (orderId: string) => Promise<void>
  /** Writes only when all of the order lies in bundles, and then with its slip. */
  readonly bundled: (orderId: string) => Promise<void>
}

export type OrderMailPorts = MailPorts & Pick<MakingPorts, 'drawCode'>

interface Writing {
  readonly template: MailTemplate
  readonly draws?: MailDraws
  readonly content: (order: OrderForMail, person: SignedIn) => MailContent
}

export const createOrderMails = (db: Db, ports: OrderMailPorts): OrderMails => {
  const read = async (orderId: string): Promise<OrderForMail> => {
    const order = await readOrderForMail(db, orderId, ports.publicUrl)
    if (!order) throw new Error(`Order ${orderId} of a mail is not there.`)
    return order
  }

  /** Whoever's account is closed gets no mail. */
  const write = async (
    orderId: string,
    { template, draws, content }: Writing,
    order?: OrderForMail,
  ): Promise<void> => {
    const known = order ?? (await read(orderId))
    const { person } = known
    if (!person) return
    await writeMail(
      db,
      {
        to: person,
        template,
        content: content(known, person),
        order: { id: orderId, ...(draws && { draws }) },
      },
      ports,
    )
  }

  return {
    received: (orderId) =>
      write(orderId, {
        template: 'orderReceived',
        draws: 'drawings',
        content: ({ data }, { language }) => orderReceivedMail(language, data),
      }),

    question: (orderId, asker, question) =>
      write(orderId, {
        template: 'question',
        content: ({ data }, { language }) =>
          orderQuestionMail(language, { ...data, asker: asker.name, question }),
      }),

    released: (orderId) =>
      write(orderId, {
        template: 'released',
        content: ({ data }, { language }) => orderReleasedMail(language, data),
      }),

    bundled: async (orderId) => {
      const order = await read(orderId)
      if (order.state !== 'ready') return
      const bundles = await listBundlesForMail(db, orderId)
      const at = ports.clock.now()
      const slipCode = await slipCodeOf(db, orderId, { at, drawCode: ports.drawCode })
      await write(
        orderId,
        {
          template: 'ready',
          draws: 'slip',
          content: ({ data }, { language }) =>
            orderReadyMail(language, { ...data, slipCode, bundles }),
        },
        order,
      )
    },
  }
}
