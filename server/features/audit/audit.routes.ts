import { listAudit } from '#server/features/audit/audit.queries'
import { defineRoute, type Route } from '#server/http/define-route'
import * as contract from '#shared/audit/audit.contract'

export const auditRoutes = (): Route[] => [
  defineRoute(contract.listAudit, ({ db, query }) => listAudit(db, query)),
]
