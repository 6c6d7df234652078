import type { Db } from '#server/db/knex'
import type { MailsService } from '#server/features/mail/mails.service'
import { defineRoute, type Route } from '#server/http/define-route'
import * as contract from '#shared/mail/mail.contract'

export const mailRoutes = (make: (db: Db) => MailsService): Route[] => [
  defineRoute(contract.listMails, ({ db, query }) => make(db).listMails(query)),
  defineRoute(contract.getMail, ({ db, params }) => make(db).getMail(params.mailId)),
  defineRoute(contract.mailAttachment, ({ db, params }) =>
    make(db).attachment(params.mailId, params.position),
  ),
  defineRoute(contract.sendMailAgain, ({ db, params }) => make(db).sendAgain(params.mailId)),
]
