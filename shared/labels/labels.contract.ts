import { z } from 'zod'
import { endpoint, fileEndpoint } from '#shared/http/endpoint'
import { idParams, momentSchema } from '#shared/http/fields'

/** A thermal roll of 4 x 2 in. labels, or a sheet of them on letter or A4 paper. */
export const labelPaperSchema = z.enum(['roll4x2', 'letter', 'a4'])

/** What labels are asked for. */
export const labelsOfSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('piece'), code: z.string().max(40) }),
  z.strictObject({ kind: z.literal('run'), runId: z.uuid() }),
  z.strictObject({ kind: z.literal('order'), orderId: z.uuid() }),
])

export const labelPrintSchema = z.strictObject({
  id: z.uuid(),
  paper: labelPaperSchema,
  /** Codes of the pieces in the order of the labels. */
  codes: z.array(z.string()),
  /** Those of them that had a label before. */
  reprinted: z.array(z.string()),
  by: z.string(),
  at: momentSchema,
})

export const printLabels = endpoint({
  method: 'POST',
  path: '/label-prints',
  permission: 'labels.print',
  summary: 'Print labels of a piece, a run or an order; who printed what is kept.',
  body: z.strictObject({ of: labelsOfSchema, paper: labelPaperSchema.default('roll4x2') }),
  answer: labelPrintSchema,
  success: 201,
  idempotent: true,
})

export const listLabelPrints = endpoint({
  method: 'GET',
  path: '/pieces/:code/label-prints',
  permission: 'labels.print',
  summary: 'When labels of a piece were printed, newest first.',
  params: z.strictObject({ code: z.string().max(40) }),
  answer: z.strictObject({ items: z.array(labelPrintSchema) }),
})

export const labelsPdf = fileEndpoint({
  path: '/label-prints/:printId/labels.pdf',
  permission: 'labels.print',
  summary: 'The labels of a print.',
  params: idParams('printId'),
  produces: 'application/pdf',
})

export type LabelPaper = z.infer<typeof labelPaperSchema>
export type LabelsOf = z.infer<typeof labelsOfSchema>
export type LabelPrint = z.infer<typeof labelPrintSchema>
