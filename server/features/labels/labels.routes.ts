import type { Db } from '#server/db/knex'
import type { LabelsService } from '#server/features/labels/labels.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { labelsPdf, listLabelPrints, printLabels } from '#shared/labels/labels.contract'

export const labelsRoutes = (make: (db: Db) => LabelsService): Route[] => [
  defineRoute(printLabels, ({ db, body, person }) => make(db).print(body, person)),
  defineRoute(listLabelPrints, ({ db, params }) => make(db).listPrints(params.code)),
  defineRoute(labelsPdf, ({ db, params, person, signal }) =>
    make(db).labelsPdf(params.printId, person, signal),
  ),
]
