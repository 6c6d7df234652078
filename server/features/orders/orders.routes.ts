import type { Db } from '#server/db/knex'
import type { OrderPlanning } from '#server/features/orders/order-planning'
import type { OrdersService } from '#server/features/orders/orders.service'
import {
  defineRoute,
  defineRouteAhead,
  type Route,
  type RouteInput,
} from '#server/http/define-route'
import { planAhead } from '#server/planning/plan-ahead'
import type { Planner } from '#server/planning/planner'
import type { AnswerOf, Endpoint } from '#shared/http/endpoint'
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

export interface OrdersRoutesDeps {
  readonly planner: Planner
  readonly makeService: (db: Db, planner: Planner) => OrdersService
  readonly makePlanning: (pool: Db, planner: Planner) => OrderPlanning
}

export function ordersRoutes({ planner, makeService, makePlanning }: OrdersRoutesDeps): Route[] {
  const read = (db: Db) => makeService(db, planner)

  /** Plans first, on the pool; the transaction then knows these plans and makes none. */
  const change = <E extends Endpoint>(
    endpoint: E,
    plan: (planning: OrderPlanning, input: RouteInput<E>) => Promise<void>,
    act: (orders: OrdersService, input: RouteInput<E>) => Promise<AnswerOf<E>>,
  ): Route =>
    defineRouteAhead(endpoint, {
      ahead: async (input) => {
        const ahead = planAhead(planner)
        await plan(makePlanning(input.db, ahead.planner), input)
        return ahead.known
      },
      handle: ({ ahead: known, ...input }) => act(makeService(input.db, known), input),
    })

  return [
    defineRoute(listOrders, ({ db, query, person }) => read(db).listOrders(query, person)),
    defineRoute(getOrder, ({ db, params, person, signal }) =>
      read(db).getOrder(params.orderId, person, signal),
    ),
    change(
      submitOrder,
      (planning, { body, person }) => planning.forNew(body, person),
      (orders, { body, person }) => orders.submitOrder(body, person),
    ),
    change(
      amendOrder,
      (planning, { params, body, person }) => planning.forAmended(params.orderId, body, person),
      (orders, { params, body, person }) => orders.amendOrder(params.orderId, body, person),
    ),
    change(
      askAboutOrder,
      (planning, { params, person }) => planning.forStored(params.orderId, person),
      (orders, { params, body, person }) => orders.askAboutOrder(params.orderId, body, person),
    ),
    change(
      answerQuestion,
      (planning, { params, person }) => planning.forStored(params.orderId, person),
      (orders, { params, body, person }) => orders.answerQuestion(params.orderId, body, person),
    ),
    change(
      releaseOrder,
      (planning, { params, person }) => planning.forStored(params.orderId, person),
      (orders, { params, body, person }) => orders.releaseOrder(params.orderId, body, person),
    ),
    change(
      withdrawOrder,
      (planning, { params, person }) => planning.forStored(params.orderId, person),
      (orders, { params, body, person }) => orders.withdrawOrder(params.orderId, body, person),
    ),
  ]
}
