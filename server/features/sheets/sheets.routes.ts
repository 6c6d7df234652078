import type { Db } from '#server/db/knex'
import type { SheetsService } from '#server/features/sheets/sheets.service'
import { defineRoute, type Route } from '#server/http/define-route'
import {
  orderEndTemplates,
  orderSheet,
  orderStripDxf,
  orderStripSheet,
  orderStripSvg,
  runEndTemplates,
  runStripSheet,
} from '#shared/sheets/sheets.contract'

export const sheetsRoutes = (make: (db: Db) => SheetsService): Route[] => [
  defineRoute(orderSheet, ({ db, params, query, person }) =>
    make(db).orderSheet(params.orderId, query, person),
  ),
  defineRoute(orderStripSheet, ({ db, params, query, person }) =>
    make(db).stripSheet(params, query, person),
  ),
  defineRoute(orderEndTemplates, ({ db, params, query, person }) =>
    make(db).endTemplates(params, query, person),
  ),
  defineRoute(orderStripSvg, ({ db, params, query, person }) =>
    make(db).stripSvg(params, query, person),
  ),
  defineRoute(orderStripDxf, ({ db, params, query, person }) =>
    make(db).stripDxf(params, query, person),
  ),
  defineRoute(runStripSheet, ({ db, params, query, person }) =>
    make(db).stripSheet(params, query, person),
  ),
  defineRoute(runEndTemplates, ({ db, params, query, person }) =>
    make(db).endTemplates(params, query, person),
  ),
]
