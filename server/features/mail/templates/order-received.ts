import { mailTemplate } from '#server/features/mail/templates/mail-template'
import {
  orderFacts,
  orderLines,
  type OrderMailData,
} from '#server/features/mail/templates/order-facts'

export const orderReceivedMail = mailTemplate<OrderMailData>({
  en: (order) => ({
    subject: `Order ${order.number} is in: ${order.job}`,
    heading: `Your order ${order.number} has arrived`,
    blocks: [
      {
        kind: 'text',
        text: 'The shop looks it over and releases it. Until then you can change or withdraw it. Check the attached drawings: this is what will be bent.',
      },
      orderFacts('en', order),
      orderLines('en', order),
      { kind: 'link', label: 'Open the order', url: order.url },
      {
        kind: 'remark',
        text: 'Edge metal that must resist wind uplift is designed and tested to its own standard; local codes and licensed practice decide. Foldyard checks how a piece bends, not whether it keeps a roof on. Cut edges are sharp: wear gloves.',
      },
    ],
  }),
  es: (order) => ({
    subject: `Llegó su pedido ${order.number}: ${order.job}`,
    heading: `Llegó su pedido ${order.number}`,
    blocks: [
      {
        kind: 'text',
        text: 'El taller lo revisa y lo libera. Hasta entonces puede cambiarlo o retirarlo. Revise los dibujos adjuntos: eso es lo que se va a doblar.',
      },
      orderFacts('es', order),
      orderLines('es', order),
      { kind: 'link', label: 'Abrir el pedido', url: order.url },
      {
        kind: 'remark',
        text: 'El remate que debe resistir la succión del viento se diseña y se prueba según su propia norma; deciden los códigos locales y el profesional con licencia. Foldyard revisa cómo se dobla una pieza, no si sujeta un techo. Los bordes cortados tienen filo: use guantes.',
      },
    ],
  }),
})
