import { mailTemplate } from '#server/features/mail/templates/mail-template'
import {
  orderFacts,
  orderLines,
  type OrderMailData,
} from '#server/features/mail/templates/order-facts'

export const orderReleasedMail = mailTemplate<OrderMailData>({
  en: (order) => ({
    subject: `Order ${order.number} is released: ${order.job}`,
    heading: `The shop bends your order ${order.number}`,
    blocks: [
      {
        kind: 'text',
        text: 'From now on it cannot be changed. You get a mail with the slip when all of it lies on the rack.',
      },
      orderFacts('en', order),
      orderLines('en', order),
      { kind: 'link', label: 'See how far it is', url: order.url },
    ],
  }),
  es: (order) => ({
    subject: `Pedido ${order.number} liberado: ${order.job}`,
    heading: `El taller dobla su pedido ${order.number}`,
    blocks: [
      {
        kind: 'text',
        text: 'Desde ahora no se puede cambiar. Recibirá un correo con el pase cuando todo esté en la estantería.',
      },
      orderFacts('es', order),
      orderLines('es', order),
      { kind: 'link', label: 'Ver cómo va', url: order.url },
    ],
  }),
})
