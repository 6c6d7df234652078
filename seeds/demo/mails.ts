import { localCatcher } from '#server/adapters/mail/local-catcher'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createDrawOrder } from '#server/features/mail/draw-order'
import { drawSlip } from '#server/features/mail/draw-slip'
import type { MailPorts } from '#server/features/mail/mail-ports'
import { createOrderMails, type OrderMails } from '#server/features/mail/order-mails'
import { createSendMail } from '#server/features/mail/send-mail'
import { createOrderSheetForMail } from '#server/features/mail/order-sheet-for-mail'
import { createAccountsService } from '#server/features/people/accounts.service'
import { createDemoRandom } from './demo-random'
import { DEMO_PEOPLE } from './people'
import type { ShopStep } from './story'

/** Codes of slips are drawn apart, so that they move no code of the pieces. */
const SLIP_SEED = 20_262
/** Where `npm start` serves, unless it is told another port. */
const DEMO_URL = 'http://localhost:4310'

/** Mails are caught in the moment that causes them: no worker runs while stories are told. */
export function demoMailPorts(db: Db, clock: Clock): MailPorts {
  const send = createSendMail({
    db,
    clock,
    transport: localCatcher(),
    draw: {
      drawings: createDrawOrder(createOrderSheetForMail({ clock, shopTimeZone: 'UTC' })),
      slip: drawSlip,
    },
  })
  return { clock, publicUrl: DEMO_URL, enqueue: (_, mailId) => send({ mailId }, { last: true }) }
}

/**
 * Mails of before `since` are not there any more, so that the drawings of three weeks need not be
 * made; those with the slip of a ready order are, whatever their age.
 */
export function createDemoMails(db: Db, clock: Clock, since: Date): OrderMails {
  const mails = createOrderMails(db, {
    ...demoMailPorts(db, clock),
    drawCode: createDemoRandom(SLIP_SEED).drawCode,
  })
  const isKept = (): boolean => clock.now() >= since
  return {
    ...mails,
    received: async (...mail) => {
      if (isKept()) await mails.received(...mail)
    },
    question: async (...mail) => {
      if (isKept()) await mails.question(...mail)
    },
    released: async (...mail) => {
      if (isKept()) await mails.released(...mail)
    },
  }
}

/** Somebody new, whose invitation can be taken up from the page of mails. */
export const ACCOUNT_STEPS: readonly ShopStep[] = [
  {
    day: -1,
    time: '20:40',
    act: async ({ db, clock }) => {
      await createAccountsService(db, demoMailPorts(db, clock)).invite(
        {
          name: 'Pilar Sorrelwood',
          email: 'pilar@example.com',
          role: 'bender',
          language: 'es',
        },
        DEMO_PEOPLE.juno,
      )
    },
  },
]
