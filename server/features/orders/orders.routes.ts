import type { Db } from '#server/db/knex'
import type { OrdersService } from '#server/features/orders/orders.service'
import { defineRoute, type Route } from '#server/http/define-route'
import {
  amendOrder,
  answerQuestion,
  askAboutOrder,
  getOrder,
  listOrders,
  releaseOrder,
  submitOrder,
  withdrawOrder,
} from '#shared/orders/orders.contract'

export const ordersRoutes = (make: (db: Db) => OrdersService): Route[] => [
  defineRoute(listOrders, ({ db, query, person }) => make(db).listOrders(query, person)),
  defineRoute(getOrder, ({ db, params, person }) => make(db).getOrder(params.orderId, person)),
  defineRoute(submitOrder, ({ db, body, person }) => make(db).submitOrder(body, person)),
  defineRoute(amendOrder, ({ db, params, body, person }) =>
    make(db).amendOrder(params.orderId, body, person),
  ),
  defineRoute(askAboutOrder, ({ db, params, body, person }) =>
    make(db).askAboutOrder(params.orderId, body, person),
  ),
  defineRoute(answerQuestion, ({ db, params, body, person }) =>
    make(db).answerQuestion(params.orderId, body, person),
  ),
  defineRoute(releaseOrder, ({ db, params, body, person }) =>
    make(db).releaseOrder(params.orderId, body, person),
  ),
  defineRoute(withdrawOrder, ({ db, params, body, person }) =>
    make(db).withdrawOrder(params.orderId, body, person),
  ),
]
