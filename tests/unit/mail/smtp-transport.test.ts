import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { MailRefused, type OutgoingMail } from '#server/adapters/mail/mail-transport'
import { smtpTransport } from '#server/adapters/mail/smtp-transport'
import { startSmtpCatcher, type SmtpCatcher } from '../../support/smtp-catcher'

const BYTES = Buffer.from('%PDF-1.7 not a real one')

const mail: OutgoingMail = {
  id: '6a3f0b8e-0000-4000-8000-000000000001',
  to: { name: 'Íñigo Pizarra', address: 'inigo@example.com' },
  language: 'es',
  subject: 'Llegó su pedido',
  text: 'Hola\n',
  html: '<p>Hola <img src="cid:slip"></p>',
  attachments: [
    { name: 'F-2001.pdf', mediaType: 'application/pdf', contentId: null, bytes: BYTES },
    { name: 'slip.png', mediaType: 'image/png', contentId: 'slip', bytes: Buffer.from('png') },
  ],
}

let smtp: SmtpCatcher
beforeEach(async () => {
  smtp = await startSmtpCatcher()
})
afterEach(() => smtp.close())

const open = () => smtpTransport({ url: smtp.url, from: 'Shop <shop@trim.example.com>' })

describe('a mail through a mail server', () => {
  it('carries text, HTML, the drawing and the picture that the HTML shows', async () => {
    const transport = open()
    await transport.send(mail)
    transport.close()
    const [message = ''] = smtp.messages
    expect(message).toContain(`Message-ID: <${mail.id}@trim.example.com>`)
    expect(message).toContain('Auto-Submitted: auto-generated')
    expect(message).toContain('Content-Type: text/plain')
    expect(message).toContain('Content-Type: text/html')
    expect(message).toContain('filename=F-2001.pdf')
    expect(message).toContain(BYTES.toString('base64'))
    expect(message).toContain('Content-ID: <slip>')
  })

  it('is refused for good when there is no such mailbox', async () => {
    smtp.refuseWith = { code: 550, text: 'No such user' }
    const transport = open()
    await expect(transport.send(mail)).rejects.toThrow(MailRefused)
    transport.close()
  })

  it('fails for now when the server is busy, or not there', async () => {
    smtp.refuseWith = { code: 451, text: 'Come back later' }
    const busy = open()
    await expect(busy.send(mail)).rejects.not.toBeInstanceOf(MailRefused)
    busy.close()
    const nobody = smtpTransport({ url: 'smtp://127.0.0.1:1', from: 'shop@example.com' })
    await expect(nobody.send(mail)).rejects.not.toBeInstanceOf(MailRefused)
    nobody.close()
  })
})
