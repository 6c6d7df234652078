import { z } from 'zod'
import { sideSchema } from '#shared/ends/end.schema'
import { fileEndpoint } from '#shared/http/endpoint'

/** The paper a person prints on. */
export const paperSchema = z.enum(['letter', 'a4'])

const orderLine = z.strictObject({ orderId: z.uuid(), lineId: z.uuid() })
const runLine = z.strictObject({ runId: z.uuid(), lineId: z.uuid() })

/** Which of a pair is meant; absent: as drawn. */
const hand = sideSchema.optional()
const sheetQuery = z.strictObject({ hand, paper: paperSchema.default('letter') })
const drawingQuery = z.strictObject({ hand })

export const orderSheet = fileEndpoint({
  path: '/orders/:orderId/order-sheet.pdf',
  permission: 'orders.read',
  summary: 'The order sheet: what was ordered, every line drawn and dimensioned, with cautions.',
  params: z.strictObject({ orderId: z.uuid() }),
  query: z.strictObject({ paper: paperSchema.default('letter') }),
  produces: 'application/pdf',
})

export const orderStripSheet = fileEndpoint({
  path: '/orders/:orderId/lines/:lineId/strip-sheet.pdf',
  permission: 'orders.read',
  summary: 'The strip sheet of an order line: section, strip, creases, ends with marking tables.',
  params: orderLine,
  query: sheetQuery,
  produces: 'application/pdf',
})

export const orderEndTemplates = fileEndpoint({
  path: '/orders/:orderId/lines/:lineId/ends.pdf',
  permission: 'orders.read',
  summary:
    'The ends of the strip at full size, to lay on the metal, with a line to check the print.',
  params: orderLine,
  query: sheetQuery,
  produces: 'application/pdf',
})

export const orderStripSvg = fileEndpoint({
  path: '/orders/:orderId/lines/:lineId/strip.svg',
  permission: 'orders.read',
  summary: 'Section and strip with dimensions as SVG.',
  params: orderLine,
  query: drawingQuery,
  produces: 'image/svg+xml',
})

export const orderStripDxf = fileEndpoint({
  path: '/orders/:orderId/lines/:lineId/strip.dxf',
  permission: 'orders.read',
  summary:
    'The strip at full size in inches as DXF: outline, creases, slits, tabs and the section.',
  params: orderLine,
  query: drawingQuery,
  produces: 'image/vnd.dxf',
})

export const runStripSheet = fileEndpoint({
  path: '/runs/:runId/lines/:lineId/strip-sheet.pdf',
  permission: 'runs.read',
  summary: 'The strip sheet of a line of a run.',
  params: runLine,
  query: sheetQuery,
  produces: 'application/pdf',
})

export const runEndTemplates = fileEndpoint({
  path: '/runs/:runId/lines/:lineId/ends.pdf',
  permission: 'runs.read',
  summary: 'The ends of the strip of a line of a run at full size.',
  params: runLine,
  query: sheetQuery,
  produces: 'application/pdf',
})

export type Paper = z.infer<typeof paperSchema>
