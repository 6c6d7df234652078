import { mailTemplate } from '#server/features/mail/templates/mail-template'
import { orderFacts, type OrderMailData } from '#server/features/mail/templates/order-facts'

/** The Content-ID of the slip's picture. */
export const SLIP_PICTURE = 'slip'

export interface OrderReadyData extends OrderMailData {
  readonly slipCode: string
  readonly bundles: readonly {
    readonly code: string
    readonly rackPlace: string
    readonly pieces: number
  }[]
}

export const orderReadyMail = mailTemplate<OrderReadyData>({
  en: (order) => ({
    subject: `Order ${order.number} is ready: ${order.job}`,
    heading: `Your order ${order.number} is ready`,
    blocks: [
      { kind: 'text', text: 'Show this slip at the counter, on the phone or printed.' },
      {
        kind: 'picture',
        contentId: SLIP_PICTURE,
        alt: `Slip ${order.slipCode} of order ${order.number}`,
      },
      { kind: 'facts', rows: [['Slip', order.slipCode]] },
      orderFacts('en', order),
      {
        kind: 'table',
        head: ['Bundle', 'Lies at', 'Pieces'],
        rows: order.bundles.map(({ code, rackPlace, pieces }) => [code, rackPlace, String(pieces)]),
      },
      { kind: 'link', label: 'Open the order', url: order.url },
      {
        kind: 'remark',
        text: 'Cut edges are sharp: wear gloves. Lift long or heavy bundles with two people. Strip the film soon after fixing.',
      },
    ],
  }),
  es: (order) => ({
    subject: `Pedido ${order.number} listo: ${order.job}`,
    heading: `Su pedido ${order.number} está listo`,
    blocks: [
      { kind: 'text', text: 'Muestre este pase en el mostrador, en el teléfono o impreso.' },
      {
        kind: 'picture',
        contentId: SLIP_PICTURE,
        alt: `Pase ${order.slipCode} del pedido ${order.number}`,
      },
      { kind: 'facts', rows: [['Pase', order.slipCode]] },
      orderFacts('es', order),
      {
        kind: 'table',
        head: ['Atado', 'Está en', 'Piezas'],
        rows: order.bundles.map(({ code, rackPlace, pieces }) => [code, rackPlace, String(pieces)]),
      },
      { kind: 'link', label: 'Abrir el pedido', url: order.url },
      {
        kind: 'remark',
        text: 'Los bordes cortados tienen filo: use guantes. Los atados largos o pesados se levantan entre dos. Quite la película poco después de fijar.',
      },
    ],
  }),
})
