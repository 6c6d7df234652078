import { queryOptions } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import { planDrawing } from '#shared/plans/plans.contract'
import { call } from '@/lib/api/call'

export type DrawingToPlan = BodyInputOf<typeof planDrawing>

/** The server's word on a drawing. A question, though it is sent as a POST: the drawing is too long for an address. */
export const planQuery = (drawing: DrawingToPlan) =>
  queryOptions({
    queryKey: ['plans', drawing],
    queryFn: ({ signal }) => call(planDrawing, { body: drawing, signal }),
    staleTime: Infinity,
  })
