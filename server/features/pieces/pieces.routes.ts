import type { Db } from '#server/db/knex'
import type { PiecesService } from '#server/features/pieces/pieces.service'
import { defineRoute, type Route } from '#server/http/define-route'
import { resolveCode } from '#shared/pieces/lookup.contract'
import { bendPiece, getPiece, scrapPiece, undoMoves } from '#shared/pieces/pieces.contract'

export const piecesRoutes = (make: (db: Db) => PiecesService): Route[] => [
  defineRoute(getPiece, ({ db, params, person }) => make(db).getPiece(params.code, person)),
  defineRoute(resolveCode, ({ db, params }) => make(db).resolveCode(params.code)),
  defineRoute(bendPiece, ({ db, params, body, person }) =>
    make(db).bendPiece(params.code, body.runId, person),
  ),
  defineRoute(scrapPiece, ({ db, params, body, person }) =>
    make(db).scrapPiece(params.code, body.reason, person),
  ),
  defineRoute(undoMoves, ({ db, body, person }) => make(db).undoMoves(body, person)),
]
