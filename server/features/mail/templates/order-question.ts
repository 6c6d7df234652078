import { mailTemplate } from '#server/features/mail/templates/mail-template'
import { orderFacts, type OrderMailData } from '#server/features/mail/templates/order-facts'

export interface OrderQuestionData extends OrderMailData {
  readonly asker: string
  readonly question: string
}

export const orderQuestionMail = mailTemplate<OrderQuestionData>({
  en: (order) => ({
    subject: `Question about order ${order.number}: ${order.job}`,
    heading: `${order.asker} asks about order ${order.number}`,
    blocks: [
      { kind: 'quote', text: order.question },
      {
        kind: 'text',
        text: 'The order waits until you answer or change it. Answer in the order, not to this mail.',
      },
      { kind: 'link', label: 'Answer', url: order.url },
      orderFacts('en', order),
    ],
  }),
  es: (order) => ({
    subject: `Pregunta sobre el pedido ${order.number}: ${order.job}`,
    heading: `${order.asker} pregunta por el pedido ${order.number}`,
    blocks: [
      { kind: 'quote', text: order.question },
      {
        kind: 'text',
        text: 'El pedido espera hasta que usted responda o lo cambie. Responda en el pedido, no a este correo.',
      },
      { kind: 'link', label: 'Responder', url: order.url },
      orderFacts('es', order),
    ],
  }),
})
