import { queryOptions } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import { planDrawing } from '#shared/plans/plans.contract'
import { call } from '@/lib/api/call'
import { forgetPlanProgress } from '@/lib/live/plan-progress'

export type DrawingToPlan = BodyInputOf<typeof planDrawing>

/**
 * The server's word on a drawing; under `progressKey` it tells how far it is when it takes long. A question, though it is sent as a POST: the drawing is too long for an address.
 */
export const planQuery = (drawing: DrawingToPlan, progressKey?: string) =>
  queryOptions({
    queryKey: ['plans', drawing],
    queryFn: ({ signal }) =>
      call(planDrawing, {
        body: progressKey === undefined ? drawing : { ...drawing, progressKey },
        signal,
      }).finally(() => progressKey !== undefined && forgetPlanProgress(progressKey)),
    staleTime: Infinity,
  })
